/** All pictures, for those who would rather look than read. */
import { typedName } from '../define';
import { figure } from './figure';
import { page } from './html';
import { pageName } from './pageName';
import type { Picture } from './pictures/picture';

export function picturesPage(pictures: readonly Picture[]): string {
  const parts = pictures.map((picture) => {
    const links = picture.functions.map(
      (name) => `<a href="${pageName({ name })}">${typedName({ name })}</a>`,
    );
    return `<section>\n${figure(picture, 2)}\n<p class="quiet">${links.join(', ')}</p>\n</section>`;
  });
  const body = [
    '<h1>Pictures</h1>',
    '<p class="lead">Drawn from the invented runs of the demo workbook, by the functions themselves.</p>',
    ...parts,
  ];
  return page('Flaskpace: pictures', body.join('\n'));
}
