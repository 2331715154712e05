import { shown } from '../../errors';
import type { Series } from '../series';
import type { Finding } from './finding';
import { offCurve } from './outliers';
import { limitFor, readingsForScatter, scatterOf, spread } from './scatter';
import { keeping } from './subset';
import { counted, listed } from './words';

/** Readings this small beside the whole change may pass through 0 by chance. */
const smallShare = 0.05;

/** So many times faster than the fastest change before is no reaction that runs out, but a drop. */
const dropFactor = 5;

/**
 * Exact zeros to which the readings beside them do not lead.
 *
 * Rule: between two non-zero readings of the same sign, both clear of 0 by 5 standard deviations of scatter
 * and 5 % of the spread, no course of one direction passes 0; at the end of a run (or at the start of a
 * falling one) a zero is odd when reaching it takes 5 times the fastest change between other readings,
 * or when it is an outlier short of which the course would have stayed.
 * Common practice; a sheet hands a blank cell over as 0 in many ways.
 */
export function oddZeros(series: Series): number[] {
  const { times, values } = series;
  const others = keeping(series, (i) => values[i] !== 0);
  if (others.times.length === 0 || others.times.length === times.length) return [];
  const clear = Math.max(5 * scatterOf(others), smallShare * spread(others.values));
  const odd: number[] = [];
  for (let first = 0; first < times.length; first++) {
    if (values[first] !== 0) continue;
    let end = first;
    while (end < times.length && values[end] === 0) end++;
    const isOdd =
      first === 0
        ? oddStart(others, times[end - 1])
        : end === times.length
          ? oddEnd(others, times[first])
          : values[first - 1] * values[end] > 0 &&
            Math.min(Math.abs(values[first - 1]), Math.abs(values[end])) > clear;
    if (isOdd) for (let i = first; i < end; i++) odd.push(series.places[i]);
    first = end;
  }
  return odd.sort((a, b) => a - b);
}

/** A rising run starts at 0 by right. */
function oddStart({ times, values }: Series, zeroAt: number): boolean {
  const last = values.length - 1;
  if (values.length < 3 || Math.abs(values[last]) >= Math.abs(values[0])) return false;
  return Math.abs(values[0]) / (times[0] - zeroAt) > dropFactor * fastestChange(times, values);
}

/** A course that would have gone past 0 by then comes to rest there by right. */
function oddEnd(others: Series, zeroAt: number): boolean {
  const { times, values } = others;
  if (values.length < 3) return false;
  const last = values.length - 1;
  if (Math.abs(values[last]) / (zeroAt - times[last]) > dropFactor * fastestChange(times, values))
    return true;
  if (values.length < readingsForScatter) return false;
  const off = offCurve(withZero(others, zeroAt), last + 1, scatterOf(others));
  return off !== null && -off.distance * values[last] > 0 && off.deviations > limitFor(values.length);
}

const withZero = ({ times, values, places, distinctTimes }: Series, zeroAt: number): Series => ({
  times: Float64Array.from([...times, zeroAt]),
  values: Float64Array.from([...values, 0]),
  places: Int32Array.from([...places, -1]),
  distinctTimes: distinctTimes + 1,
});

function fastestChange(times: Float64Array, values: Float64Array): number {
  let fastest = 0;
  for (let i = 1; i < times.length; i++) {
    if (times[i] > times[i - 1]) {
      fastest = Math.max(fastest, Math.abs(values[i] - values[i - 1]) / (times[i] - times[i - 1]));
    }
  }
  return fastest;
}

export function zeroFinding({ times, places }: Series, odd: readonly number[]): Finding | null {
  if (odd.length === 0) return null;
  const at = odd.map((place) => shown(times[places.indexOf(place)]));
  return {
    kind: 'zero',
    places: odd,
    finding: `${counted(odd.length, 'reading is', 'readings are')} exactly 0 among readings that are not: at time ${listed(at)}`,
    meaning:
      'the readings beside do not lead to 0, so it is likely a cell that was left empty or a digit that was lost; counted as a reading it bends every tangent and fit',
    advice: 'blank the cell if nothing was read, or type the reading that belongs there',
  };
}
