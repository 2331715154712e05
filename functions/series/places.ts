/** Rows of a range as a person counts them, many at a time. */
import type { Column } from '../column';

/** `row 7`, `rows 3 and 5`, `rows 3, 5 and 9 to 14`; a row of cells is counted in columns. */
export function placesInWords(places: readonly number[], shape: Pick<Column, 'rows' | 'columns'>): string {
  if (places.length === 0) return 'the whole run';
  const noun = shape.rows === 1 && shape.columns > 1 ? 'column' : 'row';
  const stretches = stretchesOf(places).flatMap(inWords);
  const said = stretches.length > longest ? [...stretches.slice(0, longest), 'more'] : stretches;
  const list = said.length < 2 ? said[0] : `${said.slice(0, -1).join(', ')} and ${said[said.length - 1]}`;
  return `${noun}${places.length === 1 ? '' : 's'} ${list}`;
}

/** Stretches to name before the rest is only `more`. */
const longest = 8;

type Stretch = readonly [first: number, last: number];

function stretchesOf(places: readonly number[]): Stretch[] {
  const stretches: [number, number][] = [];
  for (const place of [...places].sort((a, b) => a - b)) {
    const last = stretches.at(-1);
    if (last && place <= last[1] + 1) last[1] = place;
    else stretches.push([place, place]);
  }
  return stretches;
}

/** Two rows are named both; three or more by the first and the last. */
function inWords([first, last]: Stretch): string[] {
  if (last - first >= 2) return [`${first + 1} to ${last + 1}`];
  return first === last ? [`${first + 1}`] : [`${first + 1}`, `${last + 1}`];
}
