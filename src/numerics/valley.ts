import { findRoot } from './findRoot';

/**
 * Lowest place of a valley, from its slope: looked for on both sides of a start, further out at each try.
 *
 * @param slope below 0 on the near side of the lowest place, above 0 beyond it
 * @param tolerance on the place, absolute
 * @returns `undefined` where no valley lies within about a hundred of the start
 * @example valleyNear((x) => x - 3, 2, 1e-15) // 3
 */
export function valleyNear(
  slope: (x: number) => number,
  start: number,
  tolerance: number,
): number | undefined {
  let reach = 0.05;
  for (let tries = 0; tries < 12; tries++, reach *= 2) {
    const low = start - reach;
    const high = start + reach;
    if (slope(low) < 0 && slope(high) > 0) return findRoot(slope, low, high, tolerance);
  }
  return undefined;
}
