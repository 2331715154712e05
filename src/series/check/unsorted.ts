import { shown } from '../../errors';
import type { Finding } from './finding';
import { numbersIn, type RawRun } from './rawRun';
import { unrolled } from './midnight';
import { counted, listed } from './words';

/**
 * The rows whose time is out of order: as few as can be, so that one slip counts once. They are those
 * outside the longest run of rows whose times never fall (C. Schensted, Canad. J. Math. 13 (1961) 179,
 * doi:10.4153/CJM-1961-015-3: by patience sorting).
 */
export function rowsOutOfOrder(times: readonly (number | null)[]): number[] {
  const tops: number[] = []; // the row that ends the best run of each length
  const before = new Int32Array(times.length).fill(-1);
  times.forEach((time, row) => {
    if (time === null) return;
    let [low, high] = [0, tops.length];
    while (low < high) {
      const middle = (low + high) >> 1;
      if (times[tops[middle]]! <= time) low = middle + 1;
      else high = middle;
    }
    if (low > 0) before[row] = tops[low - 1];
    tops[low] = row;
  });
  const inOrder = new Set<number>();
  for (let row = tops[tops.length - 1] ?? -1; row >= 0; row = before[row]) inOrder.add(row);
  return times.flatMap((time, row) => (time === null || inOrder.has(row) ? [] : [row]));
}

/** Times that go back. Midnight is no such case: {@link unrolled} first. */
export function unsorted(run: RawRun, misplaced: ReadonlySet<number>): Finding | null {
  const times = unrolled(numbersIn(run.times));
  const places = rowsOutOfOrder(times);
  if (places.length === 0) return null;
  const slips = places.filter((row) => misplaced.has(row));
  const seen = listed(
    places.map((row) => `${shown(times[row]!)}`),
    4,
  );
  if (slips.length > 0) {
    return {
      kind: 'time slip',
      places: slips,
      finding: `${counted(slips.length, 'time is', 'times are')} out of order, and the reading does not fit there: time ${listed(
        slips.map((row) => shown(times[row]!)),
        4,
      )}`,
      meaning:
        'most likely a slip in typing the time: the reading stands in the wrong part of the run and bends every tangent and fit near it',
      advice: 'compare the time with the notebook; blank the pair if it cannot be settled',
    };
  }
  const backwards = places.length === times.filter((time) => time !== null).length - 1;
  return {
    kind: 'unsorted',
    places: backwards ? [] : places,
    finding: backwards
      ? 'the times run backwards, latest first'
      : `${counted(places.length, 'time is', 'times are')} out of order: ${seen}`,
    meaning: 'harmless in itself: readings are put in order of time before anything is calculated',
    advice: backwards
      ? 'nothing, if that is how the run was written down'
      : 'make sure that it is no slip in typing the time',
  };
}
