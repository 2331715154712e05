/** Initial rate: the slope at the first time, from the early part of a run. */
import { InvalidInput, shown } from '../errors';
import type { Estimate } from '../estimate';
import { requireDistinctTimes, stoichiometricNumberFor, type Series } from '../series/series';
import { emptyLocalFit, fitLocalPolynomial } from './localPolynomial';
import { slopeAsRate } from './tangent';

/** A parabola, and two readings to judge its scatter by. */
const fewestReadings = 5;
const degree = 2;

export interface StartOptions {
  /** Share of the whole change up to which readings count, above 0 and not above 1; 0.2 when left out. */
  readonly share?: number;
  /** Signed ν of the species; left out, the sign of the trend. */
  readonly stoichiometricNumber?: number;
}

/**
 * Initial rate of reaction: slope at the first time of the parabola through the early readings, those before
 * the run has gone through `share` of its whole change, and at least five.
 *
 * @returns rate in reading units per time unit, with n − 3 degrees of freedom
 * @throws InvalidInput for a share outside its range; NotDetermined with fewer than three times
 * @see IUPAC Gold Book, initial rate method: rate of reaction, doi:10.1351/goldbook.R05156
 * @example startRateOf(pairReadings([0, 1, 2, 3, 4, 5], [0, 9, 16, 21, 24, 25]), { share: 1 }).value // 10
 */
export function startRateOf(
  series: Series,
  { share = 0.2, stoichiometricNumber }: StartOptions = {},
): Estimate {
  if (!(share > 0 && share <= 1)) {
    throw new InvalidInput(`share must be above 0 and not above 1: got ${shown(share)}`);
  }
  requireDistinctTimes(series, degree + 1, 'an initial rate');
  const { times, values } = series;
  const fit = fitLocalPolynomial(
    times,
    values,
    0,
    earlyReadings(series, share),
    degree,
    times[0],
    emptyLocalFit(),
  );
  return slopeAsRate(fit, stoichiometricNumberFor(series, stoichiometricNumber));
}

/**
 * How many readings count as early. The whole change is that from the first reading to the mean of the last, a
 * fifth of all but no more than three, so that the scatter of one does not decide.
 *
 * @example earlyReadings(pairReadings([0, 1, 2, 3, 4, 5, 6], [10, 9, 8, 7, 6, 5, 4]), 0.2) // 5
 */
export function earlyReadings({ times, values }: Series, share: number): number {
  const all = times.length;
  const few = Math.max(1, Math.min(3, Math.floor(all / 5)));
  const end = values.slice(all - few).reduce((sum, y) => sum + y, 0) / few;
  const limit = share * Math.abs(end - values[0]);
  let count = 0;
  while (count < all && Math.abs(values[count] - values[0]) <= limit) count++;
  count = Math.min(all, Math.max(count, fewestReadings));
  // replicates belong together, and a parabola needs three different times
  while (count < all && (times[count] === times[count - 1] || differentTimes(times, count) <= degree))
    count++;
  return count;
}

function differentTimes(times: Float64Array, count: number): number {
  let different = 1;
  for (let i = 1; i < count; i++) if (times[i] !== times[i - 1]) different++;
  return different;
}
