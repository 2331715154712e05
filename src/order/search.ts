/** The best κ for an order, and the best order: searches over {@link ReducedFit}. */
import { NotDetermined, shown } from '../errors';
import { findRoot } from '../numerics/findRoot';
import { valleyNear } from '../numerics/valley';
import { reducedHalfLife, reducedTimeTo } from './law';
import type { ReducedFit } from './reducedFit';

/** The slowest decay that is looked for: its half life as a multiple of the run. */
const longestHalfLife = 1000;

/** The fastest: the share it leaves after the shortest spacing, eight half lives at order 1. */
const leastShareLeft = 2 ** -8;

/** Distance in ln κ between the places that a scan looks at. */
const scanStep = 0.6;

/**
 * ln κ between which the change is neither too slow for the run nor over before the second reading.
 *
 * The fast end is set by the share left, not by the half life: at a high order most readings of a good
 * run come many half lives after the start.
 *
 * @example rateBounds(Float64Array.of(0, 10), 1).low // -9.57685329
 */
export function rateBounds(times: Float64Array, order: number): { low: number; high: number } {
  let spacing = Infinity;
  for (let i = 1; i < times.length; i++) {
    const step = times[i] - times[i - 1];
    if (step > 0 && step < spacing) spacing = step;
  }
  const span = times[times.length - 1] - times[0];
  return {
    low: Math.log(reducedHalfLife(order) / (longestHalfLife * span)),
    high: Math.log(reducedTimeTo(leastShareLeft, order) / spacing),
  };
}

/**
 * ln κ of least squares at a fixed order. The whole range is scanned first, since a free endpoint can
 * give the surface more than one valley; then the slope's zero in the deepest valley is found to the
 * last digits.
 *
 * @param start a first guess of ln κ, tried beside the scan
 * @throws NotDetermined where the best half life lies outside the range, or κ makes no difference
 * @example bestRate(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }).search.fit, 1) // -0.36651292
 */
export function bestRate(fit: ReducedFit, order: number, start?: number): number {
  const { low, high } = rateBounds(fit.problem.times, order);
  const steps = Math.ceil((high - low) / scanStep);
  const step = (high - low) / steps;
  let best = low;
  let least = Infinity;
  const consider = (logRate: number): void => {
    const squares = fit.squaresAt(logRate, order);
    if (squares < least) [best, least] = [logRate, squares];
  };
  for (let i = 0; i <= steps; i++) consider(low + i * step);
  if (start !== undefined && start > low && start < high) consider(start);
  const logRate = zeroSlope(fit, order, Math.max(low, best - step), Math.min(high, best + step), best);
  requireDetermined(fit, order, logRate, low, high);
  return logRate;
}

/**
 * The same from a good start, for a search over the order: the valley is followed, not looked for.
 *
 * @example followRate(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }).search.fit, 1, 0.5) // -0.36651292
 */
export function followRate(fit: ReducedFit, order: number, start: number): number {
  return (
    valleyNear((logRate) => fit.at(logRate, order).rateGradient, start, 1e-15) ?? bestRate(fit, order, start)
  );
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
    throw new NotDetermined(
      'rate coefficient cannot be told: the column hardly changes, or bends too little for its half life to be seen',
    );
  }
  if (logRate >= high - 1e-9) {
    throw new NotDetermined(
      'rate coefficient cannot be told: all of the change lies between the first readings',
    );
  }
  const { rateCurvature, rateLength } = fit.at(logRate, order);
  if (!(rateCurvature > 1e-14 * rateLength) || rateLength === 0) {
    throw new NotDetermined(
      `rate coefficient cannot be told at order ${shown(order)} with a free endpoint: another endpoint and coefficient fit as well`,
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
 * @example bestOrder(fitRateLaw(pairReadings([0, 1, 2, 3, 4], [12, 6, 4, 3, 2.4]), { order: 1 }).search.fit).order // 2
 */
export function bestOrder(fit: ReducedFit): { order: number; logRate: number } {
  const valley = valleyAlongOrders(fit);
  if (valley.length === 0)
    throw new NotDetermined('order cannot be told: no order between −1 and 6 gives a rate coefficient');
  const lowest = valley.reduce((best, place, i) => (place.squares < valley[best].squares ? i : best), 0);
  // from a start that depends on the order alone: a start handed on would make the slope depend on the path
  const logRateAt = (order: number): number => followRate(fit, order, interpolated(valley, order));
  const slope = (order: number): number => fit.at(logRateAt(order), order).orderGradient;
  const here = valley[lowest].order;
  const slopeHere = slope(here);
  if (slopeHere === 0) return { order: here, logRate: logRateAt(here) };
  const neighbour = valley[slopeHere > 0 ? lowest - 1 : lowest + 1]?.order;
  if (neighbour === undefined || slope(neighbour) > 0 === slopeHere > 0) {
    throw new NotDetermined(
      `order cannot be told: the best lies near ${here}, at the end of what was tried or in a valley without a bottom`,
    );
  }
  const order = findRoot(slope, here, neighbour, 1e-14);
  return { order, logRate: logRateAt(order) };
}

interface Place {
  readonly order: number;
  readonly logRate: number;
  readonly squares: number;
}

/** The best ln κ at orders half a step apart, where there is one. */
function valleyAlongOrders(fit: ReducedFit): Place[] {
  const places: Place[] = [];
  for (let order = lowestOrder; order <= highestOrder; order += 0.5) {
    const logRate = tryRate(fit, order);
    if (logRate !== undefined)
      places.push({ order, logRate, squares: fit.at(logRate, order).residualSumOfSquares });
  }
  return places;
}

/** ln κ between the places of a valley, in a straight line from one to the next. */
function interpolated(valley: readonly Place[], order: number): number {
  const right = valley.find((place) => place.order >= order) ?? valley[valley.length - 1];
  const left = valley[Math.max(0, valley.indexOf(right) - 1)];
  if (left === right) return right.logRate;
  return left.logRate + ((order - left.order) / (right.order - left.order)) * (right.logRate - left.logRate);
}

function tryRate(fit: ReducedFit, order: number): number | undefined {
  try {
    return bestRate(fit, order);
  } catch (error) {
    if (error instanceof NotDetermined) return undefined;
    throw error;
  }
}
