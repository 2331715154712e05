/** A picture within a page. */
import { asText } from '../drawing/shape';
import { escaped } from './html';
import type { Picture } from './pictures/picture';

/** @param level of its heading; left out where the page has another place for its title */
export function figure({ name, title, caption, panels }: Picture, level: number): string {
  const drawn = panels.map(
    ({ heading, drawn: shape }) =>
      `<div class="panel"><p class="heading">${escaped(heading)}</p>\n${asText(shape)}</div>`,
  );
  return `<h${level} id="${name}">${escaped(title)}</h${level}>
<figure>
<div class="panels">
${drawn.join('\n')}
</div>
<figcaption>${escaped(caption)}</figcaption>
</figure>`;
}
