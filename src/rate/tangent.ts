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
import { scatterAlong, type Scatter } from './scatter';
import { defaultWindow } from './window';

export interface TangentOptions {
  /** Readings in the window; left out, chosen from the data by {@link defaultWindow}. */
  readonly points?: number;
  /** Degree of the polynomial, 1 to 5; 2 when left out. */
  readonly degree?: number;
  /** Signed ν of the species; left out, the sign of the trend. */
  readonly stoichiometricNumber?: number;
}

export interface TangentWindow {
  readonly points: number;
  readonly degree: number;
  readonly stoichiometricNumber: number;
  /** Of one degree more, where the number of points was chosen from the data. */
  readonly scatter?: Scatter;
}

/**
 * The window that the tangents of a run rest on.
 *
 * @throws as {@link tangentRate}
 * @example tangentWindow(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), { points: 3 }).degree // 2
 */
export function tangentWindow(
  series: Series,
  { points, degree = 2, stoichiometricNumber }: TangentOptions,
): TangentWindow {
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
  const nu = stoichiometricNumberFor(series, stoichiometricNumber);
  const width = points === undefined ? widthChosenBy(series, degree) : { points };
  return { ...width, degree, stoichiometricNumber: nu };
}

type Width = Pick<TangentWindow, 'points' | 'scatter'>;

/** By degree. Tangents of one run mostly come in a column, and the choice is most of their work. */
const chosen = new WeakMap<Series, Map<number, Width>>();

function widthChosenBy(series: Series, degree: number): Width {
  const widths = chosen.get(series) ?? new Map<number, Width>();
  chosen.set(series, widths);
  const width = widths.get(degree) ?? chooseWidth(series, degree);
  widths.set(degree, width);
  return width;
}

function chooseWidth(series: Series, degree: number): Width {
  const points = defaultWindow(series, degree);
  return canBendMore(series, points, degree)
    ? { points, scatter: scatterAlong(series, points, degree + 1) }
    : { points };
}

/** Every window can carry one degree more and leave scatter to judge by. */
function canBendMore({ times, distinctTimes }: Series, points: number, degree: number): boolean {
  if (times.length <= degree + 2 || points < degree + 2) return false;
  if (points === times.length) return distinctTimes >= degree + 2;
  for (let first = 0; first + points <= times.length; first++) {
    if (differentTimes(times, first, points) < degree + 2) return false;
  }
  return true;
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

const own = emptyLocalFit();
const finer = emptyLocalFit();

function rateIn(series: Series, window: TangentWindow, first: number, time: number): Estimate {
  const { times, values } = series;
  const { points, degree, stoichiometricNumber, scatter } = window;
  if (!scatter) {
    fitLocalPolynomial(times, values, first, points, degree, time, own);
    return slopeAsRate(own, stoichiometricNumber);
  }
  fitLocalPolynomial(times, values, first, points, degree + 1, time, finer, own);
  return withoutBias(slopeAsRate(own, stoichiometricNumber), finer, stoichiometricNumber, scatter);
}

/**
 * A window of least error owes part of that error to the bend its polynomial cannot follow, of which the
 * scatter inside the window knows nothing. One degree more follows that bend: so its uncertainty and its
 * limits are given, widened to hold the rate itself where they do not. The choice has already taken the
 * readings to scatter alike along the run, so their scatter is pooled.
 */
function withoutBias(
  { value }: Estimate,
  fit: LocalFit,
  stoichiometricNumber: number,
  { variance, degreesOfFreedom }: Scatter,
): Estimate {
  const uncertainty = Math.sqrt(variance * fit.slopeVariance) / Math.abs(stoichiometricNumber);
  const limits = withStudentLimits(fit.slope / stoichiometricNumber, uncertainty, degreesOfFreedom);
  return { ...limits, value, lower: Math.min(value, limits.lower!), upper: Math.max(value, limits.upper!) };
}

function differentTimes(times: Float64Array, first: number, count: number): number {
  let different = 1;
  for (let i = first + 1; i < first + count; i++) if (times[i] !== times[i - 1]) different++;
  return different;
}

/**
 * Rate of reaction at one time: slope of the least-squares polynomial through the nearest readings.
 *
 * With `points` given, the standard uncertainty comes from the scatter about the polynomial inside the window,
 * and knows nothing of the bend that it cannot follow, which grows with the window. With `points` left out it
 * is that of the polynomial of one degree more in the same window, which is nearly free of bias, from the
 * scatter pooled over the run.
 *
 * @param series a run, times in any unit
 * @param time where the rate is wanted, within the run
 * @returns rate in reading units per time unit, with n − degree − 1 degrees of freedom; with `points` left out
 *   those of the pooled scatter, not whole
 * @throws InvalidInput for a window that cannot be; NotDetermined outside the run or with too few times
 * @see A. Savitzky and M. J. E. Golay, Anal. Chem. 36 (1964) 1627, doi:10.1021/ac60214a047 (even spacing);
 *   W. S. Cleveland, J. Am. Stat. Assoc. 74 (1979) 829 (nearest neighbours); limits free of bias: S. Calonico,
 *   M. D. Cattaneo and R. Titiunik, Econometrica 82 (2014) 2295, doi:10.3982/ECTA11757
 * @example tangentRate(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), 1, { points: 3 }).value // 4
 */
export function tangentRate(series: Series, time: number, options: TangentOptions = {}): Estimate {
  requireFinite({ time });
  const window = tangentWindow(series, options);
  requireWithinRun(series.times, time);
  return rateIn(series, window, nearestWindow(series.times, window.points, time), time);
}

/**
 * The rate at every reading's own time.
 *
 * @returns one estimate a reading, in order of time
 * @throws as {@link tangentRate}
 * @example ratesAlong(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), { points: 3 })[3].value // 0
 */
export function ratesAlong(series: Series, options: TangentOptions = {}): Estimate[] {
  const window = tangentWindow(series, options);
  const { times } = series;
  const rates: Estimate[] = new Array(times.length);
  for (let i = 0, first = 0; i < times.length; i++) {
    first = nearestWindow(times, window.points, times[i], first);
    rates[i] = rateIn(series, window, first, times[i]);
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
