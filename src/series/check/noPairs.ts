import type { Finding } from './finding';
import { numbersIn, type RawRun } from './rawRun';

/** Nothing to work with. Rule: nowhere do times and readings both hold a number. */
export function noPairs(run: RawRun): Finding | null {
  const [times, values] = [numbersIn(run.times), numbersIn(run.values)];
  if (times.some((time, row) => time !== null && values[row] !== null)) return null;
  return {
    kind: 'no pairs',
    places: [],
    finding: 'no time and reading make a pair',
    meaning: 'nothing can be calculated',
    advice: 'select times and readings again, one time for each reading',
  };
}
