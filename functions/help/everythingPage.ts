/** All functions on one page, for the printer. */
import type { CellFunction } from '../define';
import { byFamily } from '../readmeTable';
import { article } from './functionPage';
import { page } from './html';

export function everythingPage(catalogue: readonly CellFunction[]): string {
  const body = [
    '<h1>All functions</h1>',
    '<p class="screen">To print, or to read from end to end.</p>',
    ...byFamily(catalogue).flatMap(([heading, functions]) => [
      `<h2>${heading}</h2>`,
      ...functions.map(
        (f) => `<section class="one-function">\n${article(f, (name) => `#${name}`, 3)}\n</section>`,
      ),
    ]),
  ];
  return page('Flaskpace: all functions', body.join('\n'));
}
