/** When to take readings so that a rate coefficient comes out as surely as it can. */
import { InvalidInput, requireFinite, requirePositive, shown } from '../errors';
import { reducedTimeTo, shareLeft, shareSlope } from '../order/law';

/** What is believed of the run before it is made. */
export interface PlannedRun {
  readonly order: number;
  /** k in −dc/dt = kcⁿ, above 0. */
  readonly rateCoefficient: number;
  /** c₀, above 0. */
  readonly initial: number;
  /** Standard deviation of a reading, in the unit of c₀, above 0. */
  readonly noise: number;
  /** How many readings will be taken, replicates counted. */
  readonly samples: number;
}

export interface SamplingPlan {
  /** In order; a time that comes twice asks for two readings then. */
  readonly times: readonly number[];
  /** Standard uncertainty of k to expect. */
  readonly standardUncertainty: number;
}

/** No reading is planned beyond this many half lives. */
export const longestPlan = 6;

const mostSamples = 200;

/**
 * @throws InvalidInput for numbers that make no run
 * @example requirePlannedRun({ order: 1, rateCoefficient: 0.1, initial: 1, noise: 0.01, samples: 0 }) // throws samples must be a whole number from 1 to 200: got 0
 */
export function requirePlannedRun({ order, rateCoefficient, initial, noise, samples }: PlannedRun): void {
  requireFinite({ order });
  requirePositive({ rateCoefficient, initial, noise });
  if (!(Number.isInteger(samples) && samples >= 1 && samples <= mostSamples)) {
    throw new InvalidInput(`samples must be a whole number from 1 to ${mostSamples}: got ${shown(samples)}`);
  }
}

/**
 * κ = k c₀ⁿ⁻¹, which brings time to its reduced scale.
 *
 * @example reducedRate({ order: 2, rateCoefficient: 0.1, initial: 3, noise: 0.01, samples: 4 }) // 0.3
 */
export const reducedRate = ({ order, rateCoefficient, initial }: PlannedRun): number =>
  rateCoefficient * initial ** (order - 1);

/**
 * The times that make the variance of ln k smallest, c₀ being fitted as well; with one reading c₀ counts as
 * known. The end is taken to be 0.
 *
 * With two parameters the best plan has two times, each with replicates (Elfving's theorem): the start, and where
 * the law tells most of k.
 *
 * @throws InvalidInput for numbers that make no run
 * @see G. Elfving, Ann. Math. Stat. 23 (1952) 255, doi:10.1214/aoms/1177729442; A. C. Atkinson, A. N. Donev and
 *   R. D. Tobias, Optimum Experimental Designs, with SAS (2007), ch. 17
 * @example planForCoefficient({ order: 1, rateCoefficient: 0.1, initial: 1, noise: 0.01, samples: 1 }).times[0] // 10.0000
 */
export function planForCoefficient(run: PlannedRun): SamplingPlan {
  requirePlannedRun(run);
  const { order, rateCoefficient, initial, noise, samples } = run;
  const longest = reducedTimeTo(2 ** -longestPlan, order);
  const planWith = (atStart: number): { late: number; variance: number } => {
    const variance = (late: number): number =>
      varianceFrom([0, late], [atStart, samples - atStart], order, samples === 1);
    const late = leastPlace(variance, longest);
    return { late, variance: variance(late) };
  };
  // the variance has one lowest place in the number of readings at the start: walk there
  let atStart = samples === 1 ? 0 : Math.max(1, Math.round(samples / 5));
  let best = planWith(atStart);
  for (const step of [-1, 1]) {
    while (samples > 1 && atStart + step >= 1 && atStart + step < samples) {
      const next = planWith(atStart + step);
      if (!(next.variance < best.variance)) break;
      [atStart, best] = [atStart + step, next];
    }
  }
  const reduced = Array.from({ length: samples }, (_, i) => (i < atStart ? 0 : best.late));
  return {
    times: reduced.map((s) => s / reducedRate(run)),
    standardUncertainty: rateCoefficient * (noise / initial) * Math.sqrt(best.variance),
  };
}

/**
 * Variance of ln k from readings at reduced times, for a noise of c₀: with one reading c₀ is known.
 *
 * @returns Infinity where the readings tell nothing of k
 * @example varianceOfLogCoefficient([1], 1) // 7.389056098930649
 */
export const varianceOfLogCoefficient = (reducedTimes: readonly number[], order: number): number =>
  varianceFrom(
    reducedTimes,
    reducedTimes.map(() => 1),
    order,
    reducedTimes.length === 1,
  );

function varianceFrom(
  reducedTimes: readonly number[],
  counts: readonly number[],
  order: number,
  isStartKnown: boolean,
): number {
  // sums of squares and products of y = c₀ φ(k c₀ⁿ⁻¹ t) by ln c₀ and by ln k
  let starts = 0;
  let both = 0;
  let slopes = 0;
  reducedTimes.forEach((s, i) => {
    const share = shareLeft(s, order);
    const slope = shareSlope(s, order, share);
    const start = share + (order - 1) * slope;
    starts += counts[i] * start * start;
    both += counts[i] * start * slope;
    slopes += counts[i] * slope * slope;
  });
  const told = isStartKnown ? slopes : slopes - (both * both) / starts;
  return told > 1e-12 * slopes ? 1 / told : Infinity;
}

const gridPlaces = 200;

/** The lowest of an even scan from 0, refined by golden section. */
function leastPlace(height: (place: number) => number, longest: number): number {
  const step = longest / gridPlaces;
  let best = step;
  for (let i = 2; i <= gridPlaces; i++) if (height(i * step) < height(best)) best = i * step;
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [low, high] = [best - step, Math.min(longest, best + step)];
  while (high - low > 1e-10 * longest) {
    const [left, right] = [high - ratio * (high - low), low + ratio * (high - low)];
    if (height(left) < height(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}
