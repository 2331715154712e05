import { logGamma } from './studentT';

const logChoose = (n: number, k: number): number => logGamma(n + 1) - logGamma(k + 1) - logGamma(n - k + 1);

/** P(exactly r runs) of `a` signs of one kind and `b` of the other in random order. */
function probabilityOfRuns(r: number, a: number, b: number): number {
  const total = logChoose(a + b, a);
  const ways = (i: number, j: number): number =>
    i < 1 || j < 1 || i > a || j > b
      ? 0
      : Math.exp(logChoose(a - 1, i - 1) + logChoose(b - 1, j - 1) - total);
  const half = Math.floor(r / 2);
  return r % 2 === 0 ? 2 * ways(half, half) : ways(half, half + 1) + ways(half + 1, half);
}

/**
 * Runs test: how likely so few or so many runs of equal sign are when signs come in random order. Few
 * runs mean that a curve passes above the readings here and below them there.
 *
 * Exact, two-sided: twice the smaller tail, at most 1. Residuals of 0 are passed over.
 *
 * @param residuals in order of time
 * @returns p, or `null` when fewer than two signs of either kind leave nothing to judge
 * @see A. Wald and J. Wolfowitz, Ann. Math. Stat. 11 (1940) 147, doi:10.1214/aoms/1177731909
 * @example runsTest([1, 1, 1, 1, -1, -1, -1, -1]) // 0.0571429
 */
export function runsTest(residuals: ArrayLike<number>): number | null {
  let above = 0;
  let below = 0;
  let runs = 0;
  let last = 0;
  for (let i = 0; i < residuals.length; i++) {
    const sign = Math.sign(residuals[i]);
    if (sign === 0) continue;
    if (sign > 0) above++;
    else below++;
    if (sign !== last) runs++;
    last = sign;
  }
  if (above < 2 || below < 2) return null;
  // each tail summed from its far end: the other as a remainder would lose its digits
  const most = Math.min(above + below, 2 * Math.min(above, below) + 1);
  let few = 0;
  for (let r = 2; r <= runs; r++) few += probabilityOfRuns(r, above, below);
  let many = 0;
  for (let r = most; r >= runs; r--) many += probabilityOfRuns(r, above, below);
  return Math.min(1, 2 * Math.min(few, many));
}
