/** The order in a reactant by which two runs fall on one curve. */
import { NotDetermined } from '../errors';
import type { Estimate } from '../estimate';
import { findRoot } from '../numerics/findRoot';
import { studentQuantile } from '../numerics/studentT';
import { emptyLocalFit, fitLocalPolynomial } from '../rate/localPolynomial';
import { requireDistinctTimes, type Series } from '../series/series';
import { normalisedTimes } from './normalisedTime';
import { correctedAic } from './orders';

/** A run: product formed, and the concentration of the reactant whose order is asked for. */
export interface OverlayRun {
  readonly product: Series;
  /** At the same times. */
  readonly reactant: Series;
}

/** Exponents that are looked at. */
const lowest = -3;
const highest = 4;
const step = 0.1;

/** Polynomials tried as the curve: a straight line to one that bends as runs do. */
const degrees = [1, 2, 3, 4, 5] as const;

/**
 * The exponent β for which both runs' products lie on one curve against ∫cᵝdt.
 *
 * Curves are polynomials of a degree that AICc chooses. What counts is how much worse one curve for both does
 * than a curve for each, so that only the overlay is evidence and not how smooth the curve is: β is where that
 * excess E is least, its limits where E has grown by s² F(1, ν), s² being the scatter about the separate
 * curves; the standard uncertainty comes from the bend of E.
 *
 * @throws NotDetermined with too few readings, or when every exponent does as well
 * @see J. Burés, Angew. Chem. Int. Ed. 55 (2016) 16084, doi:10.1002/anie.201609757 (overlay by eye)
 * @example overlayExponent({ product: pairReadings([0, 1, 2, 3], [0, 4, 6, 7]), reactant: pairReadings([0, 1, 2, 3], [8, 4, 2, 1]) }, { product: pairReadings([0, 1, 2, 3], [0, 2, 3, 3.5]), reactant: pairReadings([0, 1, 2, 3], [4, 2, 1, 0.5]) }).degreesOfFreedom // 4
 */
export function overlayExponent(first: OverlayRun, second: OverlayRun): Estimate {
  const runs = [first, second];
  for (const { product } of runs) requireDistinctTimes(product, 3, 'an overlay');
  const readings = first.product.times.length + second.product.times.length;
  const best = degrees
    .filter((degree) => runs.every(({ product }) => product.distinctTimes > degree + 1))
    .map((degree) => bestOverlay(runs, degree, readings))
    .sort((a, b) => a.criterion - b.criterion)[0];
  if (!best || best.degreesOfFreedom < 1 || best.criterion === Infinity) {
    throw new NotDetermined(`an overlay needs more readings: got ${readings}`);
  }
  return withLimits(best, (exponent) => overlayAt(runs, exponent, best.degree).excess);
}

interface Overlay {
  /** By how much one curve for both leaves more squares than a curve for each. */
  readonly excess: number;
  /** About the curve for both. */
  readonly common: number;
  /** About the curves for each. */
  readonly separate: number;
}

function overlayAt(runs: readonly OverlayRun[], exponent: number, degree: number): Overlay {
  const times = runs.map(({ reactant }) => normalisedTimes(reactant, exponent));
  const products = runs.map(({ product }) => product.values);
  const common = squaresAbout(...merged(times, products), degree);
  const separate = squaresAbout(times[0], products[0], degree) + squaresAbout(times[1], products[1], degree);
  return { excess: common - separate, common, separate };
}

const scratch = emptyLocalFit();

const squaresAbout = (times: Float64Array, values: Float64Array, degree: number): number =>
  fitLocalPolynomial(times, values, 0, times.length, degree, times[0], scratch).residualSumOfSquares;

/** Both runs as one, in order of normalised time. */
function merged(
  times: readonly Float64Array[],
  products: readonly Float64Array[],
): [Float64Array, Float64Array] {
  const pairs = times.flatMap((column, run) =>
    Array.from(column, (time, i) => [time, products[run][i]] as const),
  );
  pairs.sort((a, b) => a[0] - b[0]);
  return [Float64Array.from(pairs, ([time]) => time), Float64Array.from(pairs, ([, product]) => product)];
}

interface Best {
  readonly exponent: number;
  readonly excess: number;
  readonly degree: number;
  /** Scatter about the separate curves. */
  readonly variance: number;
  readonly degreesOfFreedom: number;
  /** AICc of one curve for both. */
  readonly criterion: number;
}

function bestOverlay(runs: readonly OverlayRun[], degree: number, readings: number): Best {
  const exponent = lowestPlace((trial) => overlayAt(runs, trial, degree).excess);
  const { excess, common, separate } = overlayAt(runs, exponent, degree);
  const degreesOfFreedom = readings - 2 * (degree + 1);
  return {
    exponent,
    excess,
    degree,
    variance: separate / degreesOfFreedom,
    degreesOfFreedom,
    criterion: correctedAic(common, readings, degree + 2) ?? Infinity,
  };
}

/** The lowest of a scan, refined by golden section. */
function lowestPlace(height: (exponent: number) => number): number {
  let scanned = { exponent: lowest, height: Infinity };
  for (let i = 0; i <= Math.round((highest - lowest) / step); i++) {
    const exponent = lowest + i * step;
    const found = height(exponent);
    if (found < scanned.height) scanned = { exponent, height: found };
  }
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = scanned.exponent - step;
  let high = scanned.exponent + step;
  while (high - low > 1e-7) {
    const [left, right] = [high - golden * (high - low), low + golden * (high - low)];
    if (height(left) < height(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}

function withLimits(best: Best, excessAt: (exponent: number) => number): Estimate {
  const { exponent, degreesOfFreedom, variance } = best;
  const level = best.excess + variance * studentQuantile(0.975, degreesOfFreedom) ** 2;
  const above = (trial: number): number => excessAt(trial) - level;
  const limit = (end: number): number | null =>
    above(end) > 0 ? findRoot(above, exponent, end, 1e-7) : null;
  const [lower, upper] = [limit(lowest), limit(highest)];
  if (lower === null && upper === null) {
    throw new NotDetermined(
      'the exponent cannot be told: every one lays the runs on one curve as well, as when both hold the reactant alike',
    );
  }
  const bend = bendAt(excessAt, exponent);
  const standardUncertainty = bend > 0 ? Math.sqrt((2 * variance) / bend) : null;
  return { value: exponent, standardUncertainty, lower, upper, degreesOfFreedom };
}

/** Second derivative. */
function bendAt(f: (x: number) => number, at: number): number {
  const h = 0.02;
  return (f(at + h) - 2 * f(at) + f(at - h)) / (h * h);
}
