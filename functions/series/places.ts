/** Rows of a range as a person counts them, many at a time. */
import type { Column } from '../column';

/**
 * `row 7`, `rows 3 and 5`, `rows 3, 5 and 9 to 14`; a row of cells is counted in columns.
 *
 * @param nameOf what a place is called, where it is not counted from 1
 */
export function placesInWords(
  places: readonly number[],
  shape: Pick<Column, 'rows' | 'columns'>,
  nameOf: (place: number) => string = (place) => String(place + 1),
): string {
  if (places.length === 0) return 'the whole run';
  const noun = shape.rows === 1 && shape.columns > 1 ? 'column' : 'row';
  const stretches = stretchesOf(places).flatMap((stretch) => inWords(stretch, nameOf));
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
function inWords([first, last]: Stretch, nameOf: (place: number) => string): string[] {
  if (last - first >= 2) return [`${nameOf(first)} to ${nameOf(last)}`];
  return first === last ? [nameOf(first)] : [nameOf(first), nameOf(last)];
}
