import type { Finding } from './finding';
import { isError, rowsWhere, type RawCell, type RawRun } from './rawRun';
import { counted, listed } from './words';

/** Error cells. Rule: any cell of the two columns that shows an error. */
export function errorCells(run: RawRun): Finding | null {
  const places = rowsWhere(run, (time, value) => isError(time) || isError(value));
  if (places.length === 0) return null;
  const codes = places.flatMap((row) => [run.times[row], run.values[row]].filter(isError));
  const seen = listed([...new Set(codes.map(({ error }: Extract<RawCell, { error: string }>) => error))]);
  return {
    kind: 'error',
    places,
    finding: `${counted(places.length, 'pair shows', 'pairs show')} an error: ${seen}`,
    meaning:
      'every rate, order or half life from this range answers with that error; the rest of this check leaves the pairs out',
    advice: 'mend the formula or the link there, or clear the cell: a blank cell is only a gap',
  };
}
