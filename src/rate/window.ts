import { emptyLocalFit, fitLocalPolynomial, nearestWindow } from './localPolynomial';
import type { Series } from '../series/series';

/**
 * How many readings a tangent should use when nobody says: the count that makes the mean squared error
 * of the slopes, bias and scatter together, smallest over the run.
 *
 * For each count w the slopes s of degree d are set beside the slopes s⁺ of degree d + 1 over the same
 * windows. The difference shows the bend that degree d misses; its own scatter is known, since in nested
 * least squares var(s⁺ − s) = var(s⁺) − var(s). So (s⁺ − s)² − σ²(v⁺ − v), averaged over the readings,
 * estimates the squared bias and σ²v the scatter (the reasoning of C. L. Mallows, Technometrics 15 (1973)
 * 661, applied to the slope). σ² is the scatter about the polynomials of degree d + 1 in small windows.
 *
 * Small windows tell their bias so badly that their estimate is often far below 0, and one of them would
 * win by luck; a square is 0 or more, so there the scatter alone counts. A large window can look unbiased
 * because degree d + 1 misses the same bend: the trial ends at windows whose polynomials of that degree
 * miss the readings by twice their scatter or more, in squares.
 *
 * Wide windows that lie close together hold almost the same readings: of those, only every so many are tried,
 * so that the work grows with the readings and not with their square.
 *
 * @param degree of the tangent
 * @returns a count from degree + 3 (or all readings, if fewer) up to all readings
 * @example defaultWindow(pairReadings([0, 1, 2, 3], [4, 3, 1, 1]), 2) // 4
 */
export function defaultWindow({ times, values }: Series, degree: number): number {
  const all = times.length;
  const smallest = smallestWindow(times, degree);
  if (smallest >= all) return all;
  const variance = pooledVariance(
    times,
    values,
    Math.min(all, Math.max(smallest, 2 * degree + 3)),
    degree + 1,
  );
  let best = { count: smallest, error: Infinity };
  for (let count = smallest; ; count = nextCount(count, all)) {
    const { squaredBias, scatter, misfit } = tried(times, values, count, degree, variance);
    if (count > smallest && misfit > 2 * variance) return best.count;
    const error = Math.max(0, squaredBias) + scatter;
    if (error < best.error) best = { count, error };
    if (count === all) return best.count;
  }
}

interface Trial {
  /** Of the slopes, mean over the run; may come out below 0. */
  readonly squaredBias: number;
  /** Of the slopes, mean over the run. */
  readonly scatter: number;
  /** Mean square by which polynomials of one degree more miss the readings. */
  readonly misfit: number;
}

/** Windows tried for each width of a window; all of them where it holds fewer readings than that. */
const triedPerWidth = 32;

/** No more windows of one width than this: the mean of n is known to 1/√n of their scatter, here a sixtieth. */
const mostTried = 4096;

/** How far apart the windows that are tried begin. */
const strideOf = (count: number, all: number): number =>
  Math.max(1, Math.floor(count / triedPerWidth), Math.floor(all / mostTried));

/** Counts grow by about a quarter each. */
const nextCount = (count: number, all: number): number =>
  Math.min(all, Math.max(count + 2, Math.round(count * 1.25)));

function tried(
  times: Float64Array,
  values: Float64Array,
  count: number,
  degree: number,
  variance: number,
): Trial {
  const low = emptyLocalFit();
  const high = emptyLocalFit();
  let squaredBias = 0;
  let scatter = 0;
  let squares = 0;
  let windows = 0;
  const stride = strideOf(count, times.length);
  for (let i = 0, first = 0; i < times.length; i += stride, windows++) {
    first = nearestWindow(times, count, times[i], first);
    fitLocalPolynomial(times, values, first, count, degree + 1, times[i], high, low);
    squaredBias += (high.slope - low.slope) ** 2 - variance * (high.slopeVariance - low.slopeVariance);
    scatter += variance * low.slopeVariance;
    squares += high.residualSumOfSquares;
  }
  return {
    squaredBias: squaredBias / windows,
    scatter: scatter / windows,
    misfit: squares / (windows * high.degreesOfFreedom),
  };
}

/** Scatter of the readings: residual squares of all windows over their degrees of freedom. */
function pooledVariance(times: Float64Array, values: Float64Array, count: number, degree: number): number {
  const fit = emptyLocalFit();
  let squares = 0;
  let freedom = 0;
  for (let first = 0; first + count <= times.length; first++) {
    fitLocalPolynomial(times, values, first, count, degree, times[first], fit);
    squares += fit.residualSumOfSquares;
    freedom += fit.degreesOfFreedom;
  }
  return freedom > 0 ? squares / freedom : 0;
}

/** The smallest count, degree + 3 or more, whose every window can carry a polynomial of degree + 1. */
function smallestWindow(times: Float64Array, degree: number): number {
  let count = Math.min(times.length, degree + 3);
  while (count < times.length && !everyWindowHolds(times, count, degree + 2)) count++;
  return count;
}

function everyWindowHolds(times: Float64Array, count: number, distinct: number): boolean {
  for (let first = 0; first + count <= times.length; first++) {
    let different = 1;
    for (let i = first + 1; i < first + count; i++) if (times[i] !== times[i - 1]) different++;
    if (different < distinct) return false;
  }
  return true;
}
