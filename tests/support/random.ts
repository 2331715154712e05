/** Chance that can be repeated: the same seed, the same numbers, on every machine. */

/**
 * Numbers between 0 and 1 from a 32-bit counter and a mixing function (mulberry32, T. Ettinger 2017,
 * public domain).
 */
export function uniform(seed: number): () => number {
  let counter = seed | 0;
  return () => {
    counter = (counter + 0x6d2b79f5) | 0;
    let mixed = Math.imul(counter ^ (counter >>> 15), 1 | counter);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Normal deviates of mean 0 and variance 1 (G. E. P. Box and M. E. Muller, Ann. Math. Stat. 29 (1958) 610). */
export function normal(seed: number): () => number {
  const next = uniform(seed);
  return () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());
}

/** The same things in another order (R. A. Fisher and F. Yates, as by R. Durstenfeld, Commun. ACM 7 (1964) 420). */
export function shuffled<T>(things: readonly T[], seed: number): T[] {
  const next = uniform(seed);
  const mixed = [...things];
  for (let last = mixed.length - 1; last > 0; last--) {
    const chosen = Math.floor(next() * (last + 1));
    [mixed[last], mixed[chosen]] = [mixed[chosen], mixed[last]];
  }
  return mixed;
}
