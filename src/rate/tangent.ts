/** Rate at one time or along a whole run: the slope of a local polynomial. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { withStudentLimits, type Estimate } from '../estimate';
import { requireDistinctTimes, stoichiometricNumberFor, type Series } from '../series/series';
import {
  emptyLocalFit,
  fitLocalPolynomial,
  highestDegree,
  nearestWindow,
  type LocalFit,
} from './localPolynomial';
import { defaultWindow } from './window';

export interface TangentOptions {
  /** Readings in the window; left out, chosen from the data by {@link defaultWindow}. */
  readonly points?: number;
  /** Degree of the polynomial, 1 to 5; 2 when left out. */
  readonly degree?: number;
  /** Signed ν of the species; left out, the sign of the trend. */
  readonly stoichiometricNumber?: number;
}

interface Window {
  readonly points: number;
  readonly degree: number;
  readonly stoichiometricNumber: number;
}

function settle(series: Series, { points, degree = 2, stoichiometricNumber }: TangentOptions): Window {
  if (!Number.isInteger(degree) || degree < 1 || degree > highestDegree) {
    throw new InvalidInput(`degree must be a whole number from 1 to ${highestDegree}: got ${shown(degree)}`);
  }
  requireDistinctTimes(series, degree + 1, `a tangent of degree ${degree}`);
  const count = series.times.length;
  if (points !== undefined) {
    if (!Number.isInteger(points) || points < degree + 1) {
      throw new InvalidInput(
        `points must be a whole number, ${degree + 1} or more for degree ${degree}: got ${shown(points)}`,
      );
    }
    if (points > count)
      throw new InvalidInput(`points must not exceed the ${count} readings there are: got ${points}`);
  }
  return {
    points: points ?? defaultWindow(series, degree),
    degree,
    stoichiometricNumber: stoichiometricNumberFor(series, stoichiometricNumber),
  };
}

/**
 * A polynomial in its window, as a rate of reaction: r = (1/ν) dy/dt with Student's limits.
 *
 * @example slopeAsRate({ ...emptyLocalFit(), slope: -6 }, -2).value // 3
 */
export function slopeAsRate(fit: LocalFit, stoichiometricNumber: number): Estimate {
  const { degreesOfFreedom } = fit;
  const variance = (fit.residualSumOfSquares / degreesOfFreedom) * fit.slopeVariance;
  return withStudentLimits(
    fit.slope / stoichiometricNumber,
    degreesOfFreedom === 0 ? null : Math.sqrt(variance) / Math.abs(stoichiometricNumber),
    degreesOfFreedom,
  );
}

/**
 * Rate of reaction at one time: slope of the least-squares polynomial through the nearest readings.
 *
 * The standard uncertainty comes from the scatter about the polynomial inside the window; it does not
 * know of the bend that the polynomial cannot follow, which grows with the window.
 *
 * @param series a run, times in any unit
 * @param time where the rate is wanted, within the run
 * @returns rate in reading units per time unit, with n − degree − 1 degrees of freedom
 * @throws InvalidInput for a window that cannot be; NotDetermined outside the run or with too few times
 * @see A. Savitzky and M. J. E. Golay, Anal. Chem. 36 (1964) 1627, doi:10.1021/ac60214a047 (even spacing);
 *   W. S. Cleveland, J. Am. Stat. Assoc. 74 (1979) 829 (nearest neighbours)
 * @example tangentRate(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), 1, { points: 3 }).value // 4
 */
export function tangentRate(series: Series, time: number, options: TangentOptions = {}): Estimate {
  requireFinite({ time });
  const { points, degree, stoichiometricNumber } = settle(series, options);
  const { times, values } = series;
  requireWithinRun(times, time);
  const first = nearestWindow(times, points, time);
  return slopeAsRate(
    fitLocalPolynomial(times, values, first, points, degree, time, emptyLocalFit()),
    stoichiometricNumber,
  );
}

/**
 * The rate at every reading's own time.
 *
 * @returns one estimate a reading, in order of time
 * @throws as {@link tangentRate}
 * @example ratesAlong(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), { points: 3 })[3].value // 0
 */
export function ratesAlong(series: Series, options: TangentOptions = {}): Estimate[] {
  const { points, degree, stoichiometricNumber } = settle(series, options);
  const { times, values } = series;
  const fit = emptyLocalFit();
  const rates: Estimate[] = new Array(times.length);
  for (let i = 0, first = 0; i < times.length; i++) {
    first = nearestWindow(times, points, times[i], first);
    rates[i] = slopeAsRate(
      fitLocalPolynomial(times, values, first, points, degree, times[i], fit),
      stoichiometricNumber,
    );
  }
  return rates;
}

function requireWithinRun(times: Float64Array, time: number): void {
  const last = times[times.length - 1];
  if (time < times[0] || time > last) {
    throw new NotDetermined(
      `time must lie within the run, ${shown(times[0])} to ${shown(last)}: got ${shown(time)}`,
    );
  }
}
