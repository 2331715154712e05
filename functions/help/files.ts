/** All help pages as files, to be put beside each other anywhere. */
import { typedName, type CellFunction } from '../define';
import { errorsPage } from './errorsPage';
import { everythingPage } from './everythingPage';
import { functionPage } from './functionPage';
import { indexPage } from './indexPage';
import { pageName } from './pageName';
import { pictures } from './pictures/pictures';
import { picturesPage } from './picturesPage';
import { searched, searchScript, waysTo } from './search';
import { styles } from './styles';

/** By file name. */
export function helpFiles(catalogue: readonly CellFunction[]): ReadonlyMap<string, string> {
  const drawn = pictures();
  const pages = catalogue.map((f) => ({ f, to: pageName(f), html: functionPage(f, drawn) }));
  const errors = errorsPage();
  const gallery = picturesPage(drawn);
  const search = searchScript([
    ...pages.map(({ f, to, html }) =>
      searched(to, html, { title: typedName(f), summary: f.summary, more: waysTo(f.name) }),
    ),
    ...drawn.map(({ name, title, caption }) =>
      searched(`pictures.html#${name}`, caption, { title, summary: 'A picture.', more: title }),
    ),
    searched('errors.html', errors, {
      title: 'When a cell shows an error',
      summary: 'What any function may say, and what helps.',
    }),
  ]);
  return new Map([
    ['index.html', indexPage(catalogue)],
    ['errors.html', errors],
    ['pictures.html', gallery],
    ['everything.html', everythingPage(catalogue, drawn)],
    ['help.css', styles],
    ['help.js', search],
    ...pages.map(({ to, html }): [string, string] => [to, html]),
  ]);
}
