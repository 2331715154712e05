/** How much readings scatter, told by readings that a few bad ones cannot sway. */
import { studentQuantile } from '../../numerics/studentT';
import type { Series } from '../series';
import { expectedReading } from './neighbours';

/** So many distances, evenly chosen, settle a median to a few per cent. */
const readingsEnough = 1000;

/** Readings needed before scatter can be told from bend. */
export const readingsForScatter = 7;

export function median(numbers: readonly number[]): number {
  const sorted = [...numbers].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
}

/** The smallest step between readings that differ: the instrument's resolution, or finer. 0 when all are equal. */
export function smallestStep(values: ArrayLike<number>): number {
  const sorted = Float64Array.from(values).sort();
  const noise = 1e-12 * Math.max(Math.abs(sorted[0]), Math.abs(sorted[sorted.length - 1]));
  let step = Infinity;
  for (let i = 1; i < sorted.length; i++) {
    const gap = sorted[i] - sorted[i - 1];
    if (gap > noise && gap < step) step = gap;
  }
  return step === Infinity ? 0 : step;
}

/** One unit of the last decimal that any reading is written with: 0.01 for 0.3, 0.25 and 1. */
export function lastFigure(values: Iterable<number>): number {
  let decimals = 0;
  for (const value of values) {
    const [figures, exponent = '0'] = String(value).split('e');
    decimals = Math.max(decimals, (figures.split('.')[1]?.length ?? 0) - Number(exponent));
  }
  return 10 ** -decimals;
}

/** Largest less smallest reading. A loop: a long column does not fit into one call's arguments. */
export function spread(values: ArrayLike<number>): number {
  let [low, high] = [Infinity, -Infinity];
  for (let i = 0; i < values.length; i++) {
    low = Math.min(low, values[i]);
    high = Math.max(high, values[i]);
  }
  return Math.max(0, high - low);
}

/** What rounding alone adds to the scatter: to the resolution, or to the last digits of a computed column. */
export const roundingScatter = (values: ArrayLike<number>): number =>
  Math.max(smallestStep(values) / Math.sqrt(12), 1e-9 * spread(values), Number.MIN_VALUE);

/**
 * Standard deviation of one reading: the median distance of readings from the curve through their
 * neighbours, each divided by what that curve's own scatter adds, times 1.4826 (normal scatter).
 *
 * Never below {@link roundingScatter}.
 *
 * @see F. R. Hampel, J. Am. Stat. Assoc. 69 (1974) 383, doi:10.1080/01621459.1974.10482962
 */
export function scatterOf(series: Series): number {
  const { values } = series;
  const floor = roundingScatter(values);
  if (values.length < readingsForScatter) return floor;
  const distances: number[] = [];
  const stride = Math.ceil(values.length / readingsEnough);
  for (let i = 0; i < values.length; i += stride) {
    const expected = expectedReading(series, i, 'both');
    if (expected) distances.push(Math.abs(values[i] - expected.value) / Math.sqrt(1 + expected.variance));
  }
  return distances.length === 0 ? floor : Math.max(floor, 1.4826 * median(distances));
}

/** A median settles the scatter only as well as 37 % of the readings would by their standard deviation. */
const medianEfficiency = 0.37;

/**
 * How many standard deviations off counts as beyond scatter: Student's t for a chance of 1 % that any one
 * of the readings of a clean run goes beyond it, and never less than 4.5.
 *
 * @see efficiency of the median: P. J. Rousseeuw and C. Croux, J. Am. Stat. Assoc. 88 (1993) 1273,
 *   doi:10.1080/01621459.1993.10476408
 */
export const limitFor = (readings: number): number =>
  Math.max(4.5, studentQuantile(1 - 0.005 / readings, medianEfficiency * readings));
