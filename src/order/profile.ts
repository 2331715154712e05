/**
 * Profile-likelihood limits: how far a quantity can be moved, everything else adapting, before the fit
 * becomes significantly worse. The limits are where RSS reaches RSS_min [1 + F₀.₉₅(1, ν)/ν].
 *
 * Symmetric limits (estimate ± t u) mislead where the surface is skewed, as it is for rate coefficients.
 *
 * @see D. M. Bates and D. G. Watts, Nonlinear Regression Analysis and Its Applications (1988), 6.1
 */
import { NotDetermined } from '../errors';
import type { Estimate } from '../estimate';
import { findRoot } from '../numerics/findRoot';
import { studentQuantile } from '../numerics/studentT';
import { valleyNear } from '../numerics/valley';
import type { RateLawFit } from './fit';
import { reducedHalfLife, shareLeft, shareSlope } from './law';
import type { ReducedFit } from './reducedFit';
import { followRate, highestOrder, lowestOrder } from './search';

/** Beyond this many standard uncertainties no limit is looked for. */
const reachOfSearch = 40;

/** Nor for the order beyond these, where laws differ less than readings can show. */
const lowestLimit = lowestOrder - 4;
const highestLimit = highestOrder + 4;

/**
 * k with its profile limits, at a fixed order.
 *
 * @example rateCoefficientEstimate(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 })).value // 0.693147
 */
export function rateCoefficientEstimate(fit: RateLawFit): Estimate {
  const { search, order, rateCoefficient, standardUncertainties } = fit;
  const squaresAt =
    order === 1 ? (logK: number) => search.fit.at(logK, 1).residualSumOfSquares : profileOfCoefficient(fit);
  return logEstimate(fit, rateCoefficient, standardUncertainties.rateCoefficient, squaresAt);
}

/**
 * Half life with its profile limits, at a fixed order: one to one with κ.
 *
 * @example halfLifeEstimate(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 })).value // 1
 */
export function halfLifeEstimate(fit: RateLawFit): Estimate {
  const { search, order, halfLife, standardUncertainties } = fit;
  const reduced = Math.log(reducedHalfLife(order));
  return logEstimate(
    fit,
    halfLife,
    standardUncertainties.halfLife,
    (logHalfLife) => search.fit.at(reduced - logHalfLife, order).residualSumOfSquares,
  );
}

/**
 * Order with its profile limits; the fit's order must have been free. Where, on one side, the search
 * leaves the orders at which a rate coefficient can be told, the data set no limit there.
 *
 * @example orderEstimate(fitRateLaw(pairReadings([0, 1, 2, 3, 4], [12, 6, 4, 3, 2.4]), { order: 'free' })).value // 2
 */
export function orderEstimate(fit: RateLawFit): Estimate {
  const { search, order, standardUncertainties } = fit;
  // a start that keeps the half life: one handed on would make the answer depend on the way there
  const logHalfLife = Math.log(reducedHalfLife(order)) - search.logRate;
  const squaresAt = (n: number): number => {
    const logRate = followRate(search.fit, n, Math.log(reducedHalfLife(n)) - logHalfLife);
    return search.fit.at(logRate, n).residualSumOfSquares;
  };
  return limits(fit, order, standardUncertainties.order, order, squaresAt, (n) => n, {
    low: lowestLimit,
    high: highestLimit,
  });
}

function logEstimate(
  fit: RateLawFit,
  value: number,
  uncertainty: number | null,
  squaresAt: (log: number) => number,
): Estimate {
  return limits(fit, value, uncertainty, Math.log(value), squaresAt, Math.exp);
}

/**
 * @param at the estimate on the scale that is searched
 * @param back from that scale to the quantity
 * @param walk no limit is looked for beyond `low` and `high`
 */
function limits(
  { residualSumOfSquares, degreesOfFreedom, search }: RateLawFit,
  value: number,
  uncertainty: number | null,
  at: number,
  squaresAt: (place: number) => number,
  back: (place: number) => number,
  { low, high }: Walk = { low: -Infinity, high: Infinity },
): Estimate {
  if (uncertainty === null)
    return { value, standardUncertainty: null, lower: null, upper: null, degreesOfFreedom };
  const estimate = { value, standardUncertainty: uncertainty, degreesOfFreedom };
  // readings that lie on the curve to the last digit leave no room
  if (residualSumOfSquares <= roundingFloor(search.fit)) return { ...estimate, lower: value, upper: value };
  const t = studentQuantile(0.975, degreesOfFreedom);
  const rise = residualSumOfSquares * ((t * t) / degreesOfFreedom);
  // the root of the rise is nearly straight in the quantity; at the estimate itself there is none
  const riseTo = (place: number): number =>
    place === at ? 0 : Math.max(0, squaresAt(place) - residualSumOfSquares);
  const excess = (place: number): number => Math.sqrt(riseTo(place)) - Math.sqrt(rise);
  const step = back === Math.exp ? uncertainty / value : uncertainty;
  const side = (sign: number): number | null => {
    const found = whereDetermined(() => limitOn(excess, at, sign * step, t, sign < 0 ? low : high));
    return found === null ? null : back(found);
  };
  return { ...estimate, lower: side(-1), upper: side(1) };
}

interface Walk {
  readonly low: number;
  readonly high: number;
}

/** `null` where the search strays to places that the data do not determine. */
function whereDetermined(search: () => number | null): number | null {
  try {
    return search();
  } catch (error) {
    if (error instanceof NotDetermined) return null;
    throw error;
  }
}

/** @param end where the walk must turn back */
function limitOn(
  excess: (place: number) => number,
  at: number,
  step: number,
  t: number,
  end: number,
): number | null {
  let near = at;
  for (let reach = t; reach <= reachOfSearch; reach *= 1.5) {
    const far = step < 0 ? Math.max(end, at + reach * step) : Math.min(end, at + reach * step);
    if (excess(far) > 0) return findRoot(excess, near, far, 1e-12 * Math.max(1, Math.abs(at)));
    if (far === end) return null;
    near = far;
  }
  return null;
}

/**
 * RSS that rounding alone leaves.
 *
 * @example roundingFloor(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }).search.fit) // 6.62643e-29
 */
export function roundingFloor({ problem }: ReducedFit): number {
  let sum = 0;
  for (let i = 0; i < problem.values.length; i++) sum += (problem.rootWeights[i] * problem.values[i]) ** 2;
  return sum * (8 * Number.EPSILON) ** 2;
}

/**
 * RSS as a function of ln k where k belongs to the fitted distance: k = κ|A|¹⁻ⁿ. For a given k the
 * distance is searched, and κ follows from it. Every search starts from the fit's own distance, so that
 * the answer depends on k alone and not on the way there.
 */
function profileOfCoefficient({ order, search }: RateLawFit): (logK: number) => number {
  const { problem } = search.fit;
  const start = Math.log(Math.abs(search.amplitude));
  const sign = Math.sign(search.amplitude);
  return (logK) => {
    const at = (logAmplitude: number): Rise => alongDistance(problem, order, logK, logAmplitude, sign);
    const best = valleyNear((logAmplitude) => at(logAmplitude).slope, start, 1e-13);
    if (best === undefined)
      throw new NotDetermined('rate coefficient cannot be told: any distance from the end fits as well');
    return at(best).squares;
  };
}

interface Rise {
  readonly squares: number;
  /** Half of d(RSS)/d ln|A|. */
  readonly slope: number;
}

/** RSS at one distance and k, and its slope along the logarithm of the distance. */
function alongDistance(
  { times, values, rootWeights, offset, shape }: ReducedFit['problem'],
  order: number,
  logK: number,
  logAmplitude: number,
  sign: number,
): Rise {
  const amplitude = sign * Math.exp(logAmplitude);
  const rate = Math.exp(logK + (order - 1) * logAmplitude);
  const count = times.length;
  const sense = shape === 'left' ? 1 : -1;
  let norm = 0;
  let residualSum = 0;
  let slopeSum = 0;
  let squares = 0;
  let product = 0;
  for (let i = 0; i < count; i++) {
    const w2 = rootWeights[i] ** 2;
    const s = rate * times[i];
    const left = shareLeft(s, order);
    const g = shape === 'left' ? left : 1 - left;
    const r = values[i] - amplitude * g;
    const slope = amplitude * (g + sense * (order - 1) * shareSlope(s, order, left));
    norm += w2;
    residualSum += w2 * r;
    slopeSum += w2 * slope;
    squares += w2 * r * r;
    product += w2 * r * slope;
  }
  if (offset) {
    squares -= (residualSum * residualSum) / norm;
    product -= (residualSum * slopeSum) / norm;
  }
  return { squares, slope: -product };
}
