import { hasNumber, numbersIn, rowsWhere, type RawRun } from './rawRun';
import { readingsForScatter } from './scatter';
import { counted } from './words';

/** What was looked for in a run in which nothing was found, so that the silence can be judged. */
export function nothingFound(run: RawRun): string {
  const pairs = rowsWhere(run, (time, value) => hasNumber(time) && hasNumber(value)).length;
  const times = new Set(numbersIn(run.times)).size;
  const cells = 'error cells, numbers kept as text, gaps, order of times, replicates, odd zeros';
  const course =
    'outliers, steps, drift, plateau, induction period, turning round, conversion reached, resolution, holes';
  return times < readingsForScatter
    ? `nothing found in ${counted(pairs, 'pair')}: looked for ${cells}, conversion reached, resolution, holes; outliers, steps, drift, plateau and induction need ${readingsForScatter} different times`
    : `nothing found in ${counted(pairs, 'pair')}: looked for ${cells}, ${course}`;
}
