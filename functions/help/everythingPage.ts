/** All functions on one page, for the printer. */
import type { CellFunction } from '../define';
import { byFamily } from '../readmeTable';
import { article } from './functionPage';
import { page } from './html';
import type { Picture } from './pictures/picture';

export function everythingPage(catalogue: readonly CellFunction[], pictures: readonly Picture[]): string {
  const linkTo = (name: string): string => `#${name}`;
  // each once, with the function that it is of first of all
  const firstOf = ({ name }: CellFunction): readonly Picture[] =>
    pictures.filter(({ functions }) => functions[0] === name);
  const body = [
    '<h1>All functions</h1>',
    '<p class="screen">To print, or to read from end to end.</p>',
    ...byFamily(catalogue).flatMap(([heading, functions]) => [
      `<h2>${heading}</h2>`,
      ...functions.map(
        (f) =>
          `<section class="one-function">\n${article(f, { linkTo, level: 3, pictures: firstOf(f) })}\n</section>`,
      ),
    ]),
  ];
  return page('Flaskpace: all functions', body.join('\n'));
}
