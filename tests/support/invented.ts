/** Invented runs for tests, and seeded scatter that is the same on every machine. */

/** Uniform on 0 to 1, by the generator mulberry32 (T. Ettinger 2017, public domain). */
export function uniform(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Standard normal deviates, by G. E. P. Box and M. E. Muller, Ann. Math. Stat. 29 (1958) 610. */
export function normal(seed: number): () => number {
  const next = uniform(seed);
  return () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());
}

/** As an instrument prints it. */
export const printed = (value: number, decimals = 3): number => Number(value.toFixed(decimals));

/** Twenty deviations without trend or pattern, from −5 to 5: typed, so that each test sees the same scatter. */
export const wobble = [3, -5, 2, 4, -3, -2, 5, -4, 1, -1, 4, -2, -5, 3, 2, -4, 1, 5, -3, -1] as const;

/** 0, 10 … 190. */
export const tens = Array.from({ length: 20 }, (_, i) => 10 * i);

/** Twenty readings of a course with scatter of about 0.4 % of `size`. */
export const wobbling = (
  course: (time: number) => number,
  times = tens,
  size = 0.8,
  decimals = 4,
): number[] => times.map((time, i) => printed(course(time) + (size * wobble[i % 20]) / 900, decimals));

/** Halved every 60: an invented fading dye, just over three half lives. */
export const fading = (time: number): number => 0.8 * 2 ** (-time / 60);

export const replaced = <T>(
  column: readonly T[],
  ...changes: readonly (readonly [row: number, cell: T])[]
): T[] => column.map((cell, row) => changes.find(([place]) => place === row)?.[1] ?? cell);
