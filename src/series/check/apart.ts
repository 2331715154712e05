/** Nearer than this share of the whole stretch, two times are one to a polynomial in double precision. */
const leastShare = 1e-10;

/**
 * How many of the times, in ascending order, stand apart enough to carry a curve.
 *
 * @param at where the curve is wanted, which may lie beyond them
 */
export function timesApart(times: Float64Array, at: number): number {
  let [count, last] = [1, times[0]];
  const end = times[times.length - 1];
  const least = leastShare * (Math.max(end, at) - Math.min(last, at));
  for (const time of times) {
    if (time - last > least) [count, last] = [count + 1, time];
  }
  return count;
}
