/** Successive half lives, read off the data without a fit. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { averageReplicates, requireDistinctTimes, trend, type Series } from '../series/series';

/**
 * The times that each halving of the distance from the end took, first to last: constant for order 1, halving
 * for order 0, doubling for order 2.
 *
 * Between two readings the distance is taken to fall exponentially, linearly where one of them is past the
 * end. Each level counts when it is first reached, from the first reading's own distance; replicates are
 * averaged.
 *
 * @param endpoint reading at infinite time; left out, 0 for a falling column
 * @returns half lives, in the unit of the times, as many as the run went through
 * @throws InvalidInput for a rising column without an end, or a start at the end; NotDetermined when the run
 *   does not reach half
 * @see IUPAC Gold Book, half life, doi:10.1351/goldbook.H02716
 * @example successiveHalfLives(pairReadings([0, 10, 20, 30], [8, 4, 2, 1])) // [10, 10, 10]
 */
export function successiveHalfLives(series: Series, endpoint?: number): number[] {
  requireDistinctTimes(series, 2, 'a half life');
  if (endpoint === undefined && trend(series) > 0) {
    throw new InvalidInput('a rising column needs its end: give endpoint a number');
  }
  const end = endpoint ?? 0;
  requireFinite({ endpoint: end });
  const { times, values } = averageReplicates(series);
  const start = values[0] - end;
  if (start === 0)
    throw new InvalidInput(`endpoint must differ from the first reading: both are ${shown(end)}`);
  const shares = values.map((value) => (value - end) / start);
  const reached = halvingTimes(times, shares);
  if (reached.length === 1) {
    const least = shares.reduce((low, share) => Math.min(low, share), 1);
    throw new NotDetermined(`a half life needs a run down to half: ${shown(100 * least)} % is left at least`);
  }
  return reached.slice(1).map((time, i) => time - reached[i]);
}

/**
 * The first time, then when 1/2, 1/4 … are first left. A reading at or past the end ends the reckoning: one more
 * level is met on the way to it, and all those below lie within its scatter.
 */
function halvingTimes(times: Float64Array, shares: Float64Array): number[] {
  const reached = [times[0]];
  let level = 0.5;
  for (let i = 1; i < times.length; i++) {
    while (shares[i] <= level) {
      reached.push(crossing(times[i - 1], shares[i - 1], times[i], shares[i], level));
      if (shares[i] <= 0) return reached;
      level /= 2;
    }
  }
  return reached;
}

function crossing(before: number, above: number, after: number, below: number, level: number): number {
  const part =
    below > 0 ? Math.log(above / level) / Math.log(above / below) : (above - level) / (above - below);
  return before + part * (after - before);
}
