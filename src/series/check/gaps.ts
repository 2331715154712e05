import { shown } from '../../errors';
import type { Finding } from './finding';
import { hasNumber, isText, numberIn, rowsWhere, type RawCell, type RawRun } from './rawRun';
import { isCensored, isNumberAsText } from './textKind';
import { counted, listed } from './words';

/** Nothing to calculate with: blank, or words. */
const isEmpty = (cell: RawCell): boolean =>
  cell === null || (isText(cell) && !hasNumber(cell) && !isNumberAsText(cell.text) && !isCensored(cell.text));

/** Half a pair. Rule: one column holds a number and the other, in the same row, is blank or holds words. */
export function gaps(run: RawRun): Finding | null {
  const noReading = rowsWhere(run, (time, value) => hasNumber(time) && isEmpty(value));
  const noTime = rowsWhere(run, (time, value) => hasNumber(value) && isEmpty(time));
  const places = [...noReading, ...noTime].sort((a, b) => a - b);
  if (places.length === 0) return null;
  const said = [
    noReading.length > 0 ? `no reading at ${atTimes(noReading.map((row) => numberIn(run.times[row])!))}` : '',
    noTime.length > 0
      ? `no time for ${listed(
          noTime.map((row) => `the reading ${shown(numberIn(run.values[row])!)}`),
          4,
        )}`
      : '',
  ].filter(Boolean);
  const words = [...new Set(places.flatMap((row) => [run.times[row], run.values[row]]).filter(isText))];
  const quoted =
    words.length > 0 ? ` (${listed([...new Set(words.map(({ text }) => `"${text.trim()}"`))], 4)})` : '';
  return {
    kind: 'gap',
    places,
    finding: `${counted(places.length, 'gap')}: ${said.join('; ')}${quoted}`,
    meaning: 'they are skipped, which harms nothing while enough readings are left around them',
    advice: 'fill in what was forgotten; leave blank what was never read, and never type 0 for it',
  };
}

const atTimes = (times: readonly number[]): string =>
  `${times.length === 1 ? 'time' : 'times'} ${listed(times.map(shown))}`;
