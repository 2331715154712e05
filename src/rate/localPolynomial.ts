/**
 * Unweighted least-squares polynomial over a window of points, with its slope at one time.
 *
 * Built on polynomials that are orthogonal over the window's own times, by their three-term recurrence
 * (G. E. Forsythe, J. SIAM 5 (1957) 74, doi:10.1137/0105007): no matrix, no loss of digits on uneven
 * spacing, and no allocation, so that a column of slopes costs little more than a column of means.
 */
import { InvalidInput } from '../errors';

export interface LocalFit {
  /** Height of the polynomial at `at`. */
  value: number;
  slope: number;
  /** Residual sum of squares in the window. */
  residualSumOfSquares: number;
  /** Variance of the slope in units of the readings' variance. */
  slopeVariance: number;
  /** Variance of the height in units of the readings' variance. */
  valueVariance: number;
  degreesOfFreedom: number;
}

/** @example emptyLocalFit().slope // 0 */
export const emptyLocalFit = (): LocalFit => ({
  value: 0,
  slope: 0,
  residualSumOfSquares: 0,
  slopeVariance: 0,
  valueVariance: 0,
  degreesOfFreedom: 0,
});

export const highestDegree = 5;

// scratch space for one window, grown as needed
let scaled = new Float64Array(64);
let current = new Float64Array(64);
let previous = new Float64Array(64);
let residuals = new Float64Array(64);

function makeRoom(count: number): void {
  if (current.length >= count) return;
  scaled = new Float64Array(2 * count);
  current = new Float64Array(2 * count);
  previous = new Float64Array(2 * count);
  residuals = new Float64Array(2 * count);
}

/**
 * Fits the points `first … first + count − 1` and writes the result into `fit`.
 *
 * @param at time at which height and slope are wanted
 * @param below gets the polynomial of one degree less, which is met on the way
 * @throws InvalidInput when the window holds fewer different times than degree + 1
 * @example fitLocalPolynomial(Float64Array.of(0, 1, 2), Float64Array.of(0, 1, 4), 0, 3, 2, 1, emptyLocalFit()).slope // 2
 */
export function fitLocalPolynomial(
  times: Float64Array,
  values: Float64Array,
  first: number,
  count: number,
  degree: number,
  at: number,
  fit: LocalFit,
  below?: LocalFit,
): LocalFit {
  makeRoom(count);
  // times are taken from `at` in units of the window's half-width, so that powers keep their digits
  const scale =
    Math.max(at - times[first], times[first + count - 1] - at, times[first + count - 1] - times[first]) || 1;
  fit.value = fit.slope = fit.slopeVariance = fit.valueVariance = 0;
  let norm = count;
  let product = 0;
  let centre = 0;
  for (let i = 0; i < count; i++) {
    const time = (times[first + i] - at) / scale;
    const value = values[first + i];
    scaled[i] = time;
    current[i] = 1;
    previous[i] = 0;
    residuals[i] = value;
    product += value;
    centre += time;
  }
  // at the point itself: height and slope of the current and the previous polynomial
  let height = 1;
  let rise = 0;
  let heightBefore = 0;
  let riseBefore = 0;
  let normBefore = 1;
  let share = 0;
  for (let k = 0; ; k++) {
    if (!(norm > 1e-24 * normBefore)) {
      throw new InvalidInput(
        `a polynomial of degree ${degree} needs ${degree + 1} different times in its window: got ${k}`,
      );
    }
    if (below && k === degree) Object.assign(below, fit);
    share = product / norm;
    fit.value += share * height;
    fit.slope += share * rise;
    fit.valueVariance += (height * height) / norm;
    fit.slopeVariance += (rise * rise) / norm;
    if (k === degree) break;
    const alpha = centre / norm;
    const beta = k === 0 ? 0 : norm / normBefore;
    normBefore = norm;
    norm = product = centre = 0;
    for (let i = 0; i < count; i++) {
      const p = current[i];
      const next = (scaled[i] - alpha) * p - beta * previous[i];
      const residual = residuals[i] - share * p;
      const square = next * next;
      previous[i] = p;
      current[i] = next;
      residuals[i] = residual;
      norm += square;
      product += next * residual;
      centre += scaled[i] * square;
    }
    // the same recurrence and its derivative, at t = at where the scaled time is 0
    const nextHeight = -alpha * height - beta * heightBefore;
    const nextRise = height - alpha * rise - beta * riseBefore;
    heightBefore = height;
    riseBefore = rise;
    height = nextHeight;
    rise = nextRise;
  }
  let squares = 0;
  let squaresBelow = 0;
  for (let i = 0; i < count; i++) {
    const residual = residuals[i] - share * current[i];
    squares += residual * residual;
    squaresBelow += residuals[i] * residuals[i];
  }
  finish(fit, squares, scale, count - degree - 1);
  if (below) finish(below, squaresBelow, scale, count - degree);
  return fit;
}

/** From the window's own units of time to those of the run. */
function finish(fit: LocalFit, squares: number, scale: number, degreesOfFreedom: number): void {
  fit.residualSumOfSquares = squares;
  fit.slope /= scale;
  fit.slopeVariance /= scale * scale;
  fit.degreesOfFreedom = degreesOfFreedom;
}

/** Two readings count as equally near where rounding of times, to this share of them, could decide. */
export const timeRounding = 1e-13;

/**
 * From when on a window does without its first reading and has the next one ahead: halfway between the two, and
 * later by more than rounding, so that of readings as near the earlier counts.
 *
 * @example turningTime(0.1, 0.3) > 0.2 // true
 */
export const turningTime = (first: number, ahead: number): number =>
  (first + ahead) / 2 + timeRounding * (Math.abs(first) + Math.abs(ahead));

/**
 * The window of the `count` points nearest to a time, ties to the earlier; times in ascending order.
 *
 * @param from where to begin looking, a first index that is not too far right (a column walks forward)
 * @returns first index
 * @example nearestWindow(Float64Array.of(0, 1, 2, 3), 2, 2) // 1
 */
export function nearestWindow(times: Float64Array, count: number, at: number, from = 0): number {
  let first = from;
  while (first + count < times.length && at >= turningTime(times[first], times[first + count])) first++;
  return first;
}
