/** When to take readings so that one order of reaction can be told from another. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { studentQuantile, studentTail } from '../numerics/studentT';
import { fitRateLaw } from '../order/fit';
import { reducedTimeTo, shareLeft } from '../order/law';
import type { Tell } from '../progress';
import { pairReadings } from '../series/series';
import { longestPlan, reducedRate, requirePlannedRun, type PlannedRun } from './sampling';

export interface DiscriminationPlan {
  /** In order; a time that comes twice asks for two readings then. */
  readonly times: readonly number[];
  /** How far the best curve of the rival order misses the readings, in standard deviations of one reading. */
  readonly separation: number;
  /** Chance that a test at the 5 % level rejects the rival order. */
  readonly power: number;
}

/**
 * The times at which the best curve of a rival order, c₀ and k fitted, misses the true one most.
 *
 * @param rival the order to be ruled out
 * @param tell takes what is being done; how far it is nobody knows
 * @throws InvalidInput for numbers that make no run or an order that is no rival; NotDetermined with fewer than
 *   three readings, which two parameters can always meet
 * @see A. C. Atkinson and V. V. Fedorov, Biometrika 62 (1975) 57, doi:10.1093/biomet/62.1.57 (T-optimality)
 * @example planAgainst({ order: 1, rateCoefficient: 0.1, initial: 1, noise: 0.01, samples: 3 }, 2).times[0] // 0
 */
export function planAgainst(run: PlannedRun, rival: number, tell?: Tell): DiscriminationPlan {
  requirePlannedRun(run);
  requireFinite({ rival });
  const { order, initial, noise, samples } = run;
  if (rival === order)
    throw new InvalidInput(`goal must be another order than ${shown(order)} to tell it from`);
  if (samples < 3)
    throw new NotDetermined(`to tell two orders apart takes 3 readings or more: got ${samples}`);
  const longest = reducedTimeTo(2 ** -longestPlan, order);
  const reduced = forAll(
    mostMissed(order, rival, Math.min(samples, mostSearched), longest, tell),
    samples,
    longest,
  );
  const separation = (Math.sqrt(missedBy(reduced, order, rival).squares) * initial) / noise;
  return {
    times: reduced.map((s) => s / reducedRate(run)),
    separation,
    power: normalAbove(limit - separation) + normalAbove(limit + separation),
  };
}

/** So many readings are searched for one by one; a larger plan repeats their times. */
const mostSearched = 12;

/** The plan's times with as many readings each as their share of it (largest remainders). */
function forAll(times: readonly number[], samples: number, longest: number): number[] {
  if (samples === times.length) return [...times];
  const groups: number[][] = [];
  for (const time of times) {
    const last = groups.at(-1);
    if (last && time - last[0] < 0.02 * longest) last.push(time);
    else groups.push([time]);
  }
  const shares = groups.map((group) => (samples * group.length) / times.length);
  const counts = shares.map(Math.floor);
  const byRemainder = [...shares.keys()].sort((a, b) => shares[b] - counts[b] - (shares[a] - counts[a]));
  for (let i = 0, left = samples - counts.reduce((sum, n) => sum + n, 0); i < left; i++)
    counts[byRemainder[i]]++;
  return groups.flatMap((group, i) =>
    new Array<number>(counts[i]).fill(group.reduce((sum, time) => sum + time, 0) / group.length),
  );
}

/** Two-sided 5 % of the normal distribution. */
const limit = studentQuantile(0.975, Infinity);

const normalAbove = (z: number): number => (z < 0 ? 1 - studentTail(-z, Infinity) : studentTail(z, Infinity));

interface Missed {
  readonly squares: number;
  /** By how much the rival's best curve misses at a time. */
  readonly at: (time: number) => number;
}

/** The rival's best curve through the true law at some times. */
function missedBy(times: readonly number[], order: number, rival: number): Missed {
  const series = pairReadings(
    times,
    times.map((s) => shareLeft(s, order)),
  );
  try {
    const fit = fitRateLaw(series, { order: rival, endpoint: 0 });
    const rate = Math.exp(fit.search.logRate);
    const at = (time: number): number =>
      shareLeft(time, order) - fit.start * shareLeft(rate * Math.max(0, time - series.times[0]), rival);
    return { squares: fit.residualSumOfSquares, at };
  } catch (error) {
    // all readings so early or so late that nothing changes
    if (error instanceof NotDetermined || error instanceof InvalidInput) return { squares: 0, at: () => 0 };
    throw error;
  }
}

const gridPlaces = 240;

/**
 * Readings are moved to where the rival's best curve misses most, as long as that makes it miss more; then
 * each is moved by ever smaller steps.
 */
function mostMissed(order: number, rival: number, samples: number, longest: number, tell?: Tell): number[] {
  // the first reading stays at the start, from where the rival's curve is counted
  let times = Array.from({ length: samples }, (_, i) => (longest * i) / (samples - 1) / 2);
  let missed = missedBy(times, order, rival);
  const tryWith = (trial: number[]): boolean => {
    const found = missedBy(trial, order, rival);
    if (!(found.squares > missed.squares * (1 + 1e-9))) return false;
    times = trial;
    missed = found;
    return true;
  };
  for (let round = 0; round < 100; round++) {
    tell?.({ doing: `moving readings to where the orders differ most, round ${round + 1}` });
    const target = furthest(missed.at, longest);
    const byMiss = times
      .map((time, i) => [Math.abs(missed.at(time)), i] as const)
      .sort((a, b) => a[0] - b[0]);
    if (!byMiss.some(([, i]) => i > 0 && tryWith(replaced(times, i, target)))) break;
  }
  for (let step = longest / gridPlaces; step > longest * 1e-5; step /= 2) {
    tell?.({ doing: 'moving each reading by smaller and smaller steps' });
    for (let i = 1; i < samples; i++) {
      for (const sign of [-1, 1]) {
        const moved = Math.min(longest, Math.max(0, times[i] + sign * step));
        tryWith(replaced(times, i, moved));
      }
    }
  }
  return [...times].sort((a, b) => a - b);
}

const replaced = (times: readonly number[], place: number, time: number): number[] =>
  times.map((old, i) => (i === place ? time : old));

function furthest(at: (time: number) => number, longest: number): number {
  let best = 0;
  for (let i = 0; i <= gridPlaces; i++) {
    const time = (longest * i) / gridPlaces;
    if (Math.abs(at(time)) > Math.abs(at(best))) best = time;
  }
  return best;
}
