/** The best κ for an order, and the best order: searches over {@link ReducedFit}. */
import { NotDetermined } from '../errors';
import { findRoot } from '../numerics/findRoot';
import { reducedHalfLife } from './law';
import type { ReducedFit } from './reducedFit';

/** Range of half lives that is searched, as multiples of the shortest spacing and of the whole run. */
const shortestHalfLife = 1 / 8;
const longestHalfLife = 1000;
const scanPoints = 28;

/** ln κ between which the half life is neither far below the spacing nor far beyond the run. */
export function rateBounds(times: Float64Array, order: number): { low: number; high: number } {
  let spacing = Infinity;
  for (let i = 1; i < times.length; i++) {
    const step = times[i] - times[i - 1];
    if (step > 0 && step < spacing) spacing = step;
  }
  const span = times[times.length - 1] - times[0];
  const reduced = reducedHalfLife(order);
  return { low: Math.log(reduced / (longestHalfLife * span)), high: Math.log(reduced / (shortestHalfLife * spacing)) };
}

/**
 * ln κ of least squares at a fixed order. The whole range is scanned first, since a free endpoint can
 * give the surface more than one valley; then the slope's zero in the deepest valley is found to the
 * last digits.
 *
 * @param start a first guess of ln κ, tried beside the scan
 * @throws NotDetermined where the best half life lies outside the range, or κ makes no difference
 */
export function bestRate(fit: ReducedFit, order: number, start?: number): number {
  const { low, high } = rateBounds(fit.problem.times, order);
  const step = (high - low) / (scanPoints - 1);
  let best = low;
  let least = Infinity;
  const consider = (logRate: number): void => {
    const squares = fit.at(logRate, order).residualSumOfSquares;
    if (squares < least) [best, least] = [logRate, squares];
  };
  for (let i = 0; i < scanPoints; i++) consider(low + i * step);
  if (start !== undefined && start > low && start < high) consider(start);
  const logRate = zeroSlope(fit, order, Math.max(low, best - step), Math.min(high, best + step), best);
  requireDetermined(fit, order, logRate, low, high);
  return logRate;
}

/** The same from a good start, for a search over the order: the valley is followed, not looked for. */
export function followRate(fit: ReducedFit, order: number, start: number): number {
  let reach = 0.05;
  for (let tries = 0; tries < 12; tries++, reach *= 2) {
    const below = fit.at(start - reach, order).rateGradient;
    const above = fit.at(start + reach, order).rateGradient;
    if (below < 0 && above > 0) return zeroSlope(fit, order, start - reach, start + reach, start);
  }
  return bestRate(fit, order, start);
}

/** Zero of d(RSS)/d ln κ in a bracket around a point lower than its ends. */
function zeroSlope(fit: ReducedFit, order: number, low: number, high: number, inside: number): number {
  const slope = (logRate: number): number => fit.at(logRate, order).rateGradient;
  const here = slope(inside);
  if (here === 0) return inside;
  const [from, to] = here > 0 ? [low, inside] : [inside, high];
  if (slope(from) >= 0) return from;
  if (slope(to) <= 0) return to;
  return findRoot(slope, from, to, 1e-15);
}

function requireDetermined(fit: ReducedFit, order: number, logRate: number, low: number, high: number): void {
  if (logRate <= low + 1e-9) {
    throw new NotDetermined('rate coefficient cannot be told: the column hardly changes, or bends too little for its half life to be seen');
  }
  if (logRate >= high - 1e-9) {
    throw new NotDetermined('rate coefficient cannot be told: all of the change lies between the first readings');
  }
  const { rateCurvature, rateLength } = fit.at(logRate, order);
  if (!(rateCurvature > 1e-14 * rateLength) || rateLength === 0) {
    throw new NotDetermined(
      `rate coefficient cannot be told at order ${order} with a free endpoint: another endpoint and coefficient fit as well`,
    );
  }
}

/** Orders between which a free order is looked for. */
export const lowestOrder = -1;
export const highestOrder = 6;

/**
 * The order and ln κ of least squares with the order free: the valley of best κ is followed along n.
 *
 * @throws NotDetermined when the best order lies at an end of the range looked through
 */
export function bestOrder(fit: ReducedFit): { order: number; logRate: number } {
  const step = 0.5;
  let best = { order: NaN, logRate: NaN, squares: Infinity };
  for (let order = lowestOrder; order <= highestOrder + 1e-9; order += step) {
    const logRate = tryRate(fit, order);
    if (logRate === undefined) continue;
    const squares = fit.at(logRate, order).residualSumOfSquares;
    if (squares < best.squares) best = { order, logRate, squares };
  }
  if (Number.isNaN(best.order)) throw new NotDetermined('order cannot be told: no order between −1 and 6 gives a rate coefficient');
  let followed = best.logRate;
  const slope = (order: number): number => {
    followed = followRate(fit, order, followed);
    return fit.at(followed, order).orderGradient;
  };
  const [from, to] = slope(best.order) > 0 ? [best.order - step, best.order] : [best.order, best.order + step];
  if (from < lowestOrder || to > highestOrder || slope(from) >= 0 || slope(to) <= 0) {
    throw new NotDetermined(`order cannot be told: the best lies near ${best.order}, at the end of what was tried or in a valley without a bottom`);
  }
  const order = findRoot(slope, from, to, 1e-14);
  return { order, logRate: followRate(fit, order, followed) };
}

function tryRate(fit: ReducedFit, order: number): number | undefined {
  try {
    return bestRate(fit, order);
  } catch (error) {
    if (error instanceof NotDetermined) return undefined;
    throw error;
  }
}
