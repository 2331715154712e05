/**
 * A run: times and readings, paired, without gaps, in order of time. Everything that is estimated
 * starts here.
 */
import { InvalidInput, NotDetermined, requireStoichiometricNumber } from '../errors';

export interface Series {
  /** In ascending order; equal times are replicates. */
  readonly times: Float64Array;
  readonly values: Float64Array;
  /** Where each pair stood in the columns given, counted from 0. */
  readonly places: Int32Array;
  /** How many of the times differ. */
  readonly distinctTimes: number;
}

/** A column as it comes: `null` is a gap. */
export type Readings = readonly (number | null)[];

/**
 * Pairs times with readings. A pair with a gap on either side is skipped; order and spacing are free.
 *
 * @throws InvalidInput when the lengths differ or nothing is left
 * @example pairReadings([20, 0, null], [3, 5, 7]).times // Float64Array [0, 20]
 */
export function pairReadings(times: Readings, values: Readings): Series {
  requireOneLength(times, values);
  const kept: number[] = [];
  for (let place = 0; place < times.length; place++) {
    if (times[place] !== null && values[place] !== null) kept.push(place);
  }
  if (kept.length === 0)
    throw new InvalidInput('times and values must hold numbers: no time and reading make a pair');
  if (!isAscending(kept, times)) kept.sort((a, b) => times[a]! - times[b]! || a - b);
  const series = {
    times: Float64Array.from(kept, (place) => times[place]!),
    values: Float64Array.from(kept, (place) => values[place]!),
    places: Int32Array.from(kept),
  };
  return { ...series, distinctTimes: countDistinct(series.times) };
}

/**
 * A time beside each reading.
 *
 * @throws InvalidInput
 * @example requireOneLength([1, 2], [3, 4]) // undefined
 */
export function requireOneLength(
  { length: times }: ArrayLike<unknown>,
  { length: values }: ArrayLike<unknown>,
): void {
  if (times === values) return;
  throw new InvalidInput(`times and values must be of one length: got ${times} times and ${values} values`);
}

function isAscending(places: readonly number[], times: Readings): boolean {
  for (let i = 1; i < places.length; i++) if (times[places[i]]! < times[places[i - 1]]!) return false;
  return true;
}

function countDistinct(sorted: Float64Array): number {
  let count = sorted.length > 0 ? 1 : 0;
  for (let i = 1; i < sorted.length; i++) if (sorted[i] !== sorted[i - 1]) count++;
  return count;
}

/**
 * @throws InvalidInput when all times are equal, NotDetermined when fewer differ than the method needs
 *
 * @example requireDistinctTimes(pairReadings([60, 60], [1, 2]), 2, 'a fit') // throws times must differ: all 2 are 60
 */
export function requireDistinctTimes(series: Series, needed: number, purpose: string): void {
  if (series.distinctTimes < 2) {
    throw new InvalidInput(
      `times must differ: ${series.times.length === 1 ? 'only one pair was given' : `all ${series.times.length} are ${series.times[0]}`}`,
    );
  }
  if (series.distinctTimes < needed) {
    throw new NotDetermined(`${purpose} needs ${needed} different times: got ${series.distinctTimes}`);
  }
}

/**
 * Replicates averaged: each time once, with the mean of its readings and how many there were.
 *
 * @example averageReplicates(pairReadings([0, 5, 5], [7, 1, 3])).values // Float64Array [7, 2]
 */
export function averageReplicates({ times, values, distinctTimes }: Series): {
  times: Float64Array;
  values: Float64Array;
  counts: Int32Array;
} {
  const mean = {
    times: new Float64Array(distinctTimes),
    values: new Float64Array(distinctTimes),
    counts: new Int32Array(distinctTimes),
  };
  for (let i = 0, j = -1; i < times.length; i++) {
    if (i === 0 || times[i] !== times[i - 1]) mean.times[++j] = times[i];
    mean.counts[j] += 1;
    mean.values[j] += (values[i] - mean.values[j]) / mean.counts[j];
  }
  return mean;
}

/**
 * Whether the column as a whole rises (+1) or falls (−1), by the slope of the straight line through all
 * points; 0 when it is level.
 *
 * @example trend(pairReadings([0, 1, 2], [9, 4, 1])) // -1
 */
export function trend({ times, values }: Series): -1 | 0 | 1 {
  let meanTime = 0;
  let meanValue = 0;
  for (let i = 0; i < times.length; i++) {
    meanTime += (times[i] - meanTime) / (i + 1);
    meanValue += (values[i] - meanValue) / (i + 1);
  }
  let slope = 0;
  for (let i = 0; i < times.length; i++) slope += (times[i] - meanTime) * (values[i] - meanValue);
  return slope > 0 ? 1 : slope < 0 ? -1 : 0;
}

/**
 * The signed stoichiometric number to use: the one given, else the sign of the trend (+1 for a level column).
 *
 * @throws InvalidInput for one that is 0 or not finite
 * @example stoichiometricNumberFor(pairReadings([0, 1], [5, 3])) // -1
 */
export function stoichiometricNumberFor(series: Series, given?: number): number {
  if (given === undefined) return trend(series) || 1;
  requireStoichiometricNumber(given);
  return given;
}
