/** Straight-line plots of the integrated laws: for first guesses and for showing, never for a result. */
import { SimpleLinearRegression } from 'ml-regression';
import type { ReducedProblem } from './reducedFit';

/** ln d at order 1, d¹⁻ⁿ otherwise: straight against time where the distance d from the end follows order n. */
const straightened = (distance: number, order: number): number =>
  order === 1 ? Math.log(distance) : distance ** (1 - order);

interface Plot {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** Points still clear of the end, whose distance from it is positive; nothing where they make no line. */
function plotOf(times: Float64Array, distances: Float64Array, order: number): Plot | undefined {
  const x: number[] = [];
  const y: number[] = [];
  for (let i = 0; i < times.length; i++) {
    if (!(distances[i] > 0)) continue;
    x.push(times[i]);
    y.push(straightened(distances[i], order));
  }
  return x.length < 3 || x.every((time) => time === x[0]) ? undefined : { x, y };
}

const meanOf = (numbers: readonly number[]): number =>
  numbers.reduce((sum, value) => sum + value, 0) / numbers.length;

/** Squared correlation from deviations: sums of squares lose all digits where times are dates. */
function squaredCorrelation({ x, y }: Plot): number | null {
  if (y.every((value) => value === y[0])) return null;
  const [meanX, meanY] = [meanOf(x), meanOf(y)];
  let [xx, xy, yy] = [0, 0, 0];
  for (let i = 0; i < x.length; i++) {
    xx += (x[i] - meanX) ** 2;
    xy += (x[i] - meanX) * (y[i] - meanY);
    yy += (y[i] - meanY) ** 2;
  }
  const share = (xy / xx) * (xy / yy);
  return Number.isFinite(share) ? Math.min(1, share) : null;
}

/**
 * R² of the straight-line plot, between 0 and 1.
 *
 * @returns `null` with fewer than three points clear of the end, or where they are level
 * @example straightLineFit(Float64Array.of(0, 1, 2), Float64Array.of(1, 0.5, 0.25), 0, 1) // 1
 */
export function straightLineFit(
  times: Float64Array,
  values: Float64Array,
  endpoint: number,
  order: number,
): number | null {
  const sign = Math.sign(values[0] - endpoint) || 1;
  const distances = values.map((value) => sign * (value - endpoint));
  const plot = plotOf(times, distances, order);
  return plot ? squaredCorrelation(plot) : null;
}

/**
 * A first guess of ln κ from the straight-line plot.
 *
 * @returns `undefined` where the end is not known beforehand, or the plot leads away from it
 * @example startRate(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }).search.fit.problem, 1) // -0.366513
 */
export function startRate(
  { times, values, offset, shape }: ReducedProblem,
  order: number,
): number | undefined {
  if (offset || shape === 'converted') return undefined;
  const sign = Math.sign(values[0]) || 1;
  const distances = values.map((value) => sign * value);
  const plot = plotOf(times, distances, order);
  if (!plot) return undefined;
  const { slope, intercept } = new SimpleLinearRegression([...plot.x], [...plot.y]);
  const rate = order === 1 ? -slope : slope / ((order - 1) * intercept);
  return rate > 0 && Number.isFinite(rate) ? Math.log(rate) : undefined;
}
