import type { Finding } from './finding';
import { numbersIn, type RawRun } from './rawRun';

/** Nothing to work with. Rule: no row has a number in both columns. */
export function noPairs(run: RawRun): Finding | null {
  const [times, values] = [numbersIn(run.times), numbersIn(run.values)];
  if (times.some((time, row) => time !== null && values[row] !== null)) return null;
  return {
    kind: 'no pairs',
    places: [],
    finding: 'no row has both a time and a reading',
    meaning: 'nothing can be calculated',
    advice: 'select the two columns again, one cell of time beside each reading',
  };
}
