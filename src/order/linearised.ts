/** Straight-line plots of the integrated laws: for first guesses and for showing, never for a result. */
import { SimpleLinearRegression } from 'ml-regression';
import type { ReducedProblem } from './reducedFit';

/** ln d at order 1, d¹⁻ⁿ otherwise: straight against time where the distance d from the end follows order n. */
const straightened = (distance: number, order: number): number =>
  order === 1 ? Math.log(distance) : distance ** (1 - order);

interface Line {
  readonly slope: number;
  readonly intercept: number;
  readonly r2: number;
}

/** Points still clear of the end: their distance from it is positive. */
function lineThrough(times: Float64Array, distances: Float64Array, order: number): Line | undefined {
  const x: number[] = [];
  const y: number[] = [];
  for (let i = 0; i < times.length; i++) {
    if (!(distances[i] > 0)) continue;
    x.push(times[i]);
    y.push(straightened(distances[i], order));
  }
  if (x.length < 3 || x.every((time) => time === x[0])) return undefined;
  const line = new SimpleLinearRegression(x, y);
  return { slope: line.slope, intercept: line.intercept, r2: line.score(x, y).r2 };
}

/** R² of the straight-line plot, between 0 and 1; `null` with fewer than three points clear of the end. */
export function straightLineFit(times: Float64Array, values: Float64Array, endpoint: number, order: number): number | null {
  const sign = Math.sign(values[0] - endpoint) || 1;
  const line = lineThrough(times, values.map((value) => sign * (value - endpoint)), order);
  return line && Number.isFinite(line.r2) ? line.r2 : null;
}

/** A first guess of ln κ from the straight-line plot; `undefined` where the end is not known beforehand. */
export function startRate({ times, values, offset, shape }: ReducedProblem, order: number): number | undefined {
  if (offset || shape === 'converted') return undefined;
  const sign = Math.sign(values[0]) || 1;
  const line = lineThrough(times, values.map((value) => sign * value), order);
  if (!line) return undefined;
  const rate = order === 1 ? -line.slope : line.slope / ((order - 1) * line.intercept);
  return rate > 0 && Number.isFinite(rate) ? Math.log(rate) : undefined;
}
