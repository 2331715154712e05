import { InvalidInput } from '../errors';

/**
 * Root of a continuous function between two points of opposite sign, by Brent's method.
 *
 * @param f called about ten times on a smooth function
 * @param tolerance on the root, absolute; never finer than the last digit of the root
 * @throws InvalidInput when both ends have the same sign
 * @see R. P. Brent, Algorithms for Minimization without Derivatives (1973), ch. 4
 * @example findRoot((x) => x * x - 2, 0, 2, 1e-15) // 1.4142135623730951
 */
export function findRoot(f: (x: number) => number, low: number, high: number, tolerance: number): number {
  let a = low;
  let b = high;
  let fa = f(a);
  let fb = f(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa > 0 === fb > 0) throw new InvalidInput('a root needs a change of sign between its bounds');
  let c = a;
  let fc = fa;
  let step = b - a;
  let before = step;
  for (let i = 0; i < 200; i++) {
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = before = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const least = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance;
    const half = 0.5 * (c - b);
    if (Math.abs(half) <= least || fb === 0) return b;
    [step, before] = interpolationStep({ a, b, c, fa, fb, fc, half, least, step, before }) ?? [half, half];
    a = b;
    fa = fb;
    b += Math.abs(step) > least ? step : Math.sign(half) * least;
    fb = f(b);
  }
  return b;
}

interface State {
  a: number;
  b: number;
  c: number;
  fa: number;
  fb: number;
  fc: number;
  half: number;
  least: number;
  step: number;
  before: number;
}

/** Secant or inverse quadratic step with the step before it, or nothing where bisection is the safer step. */
function interpolationStep({
  a,
  b,
  c,
  fa,
  fb,
  fc,
  half,
  least,
  step,
  before,
}: State): [number, number] | undefined {
  if (Math.abs(before) < least || Math.abs(fa) <= Math.abs(fb)) return undefined;
  const s = fb / fa;
  let p: number;
  let q: number;
  if (a === c) {
    p = 2 * half * s;
    q = 1 - s;
  } else {
    const r = fb / fc;
    q = fa / fc;
    p = s * (2 * half * q * (q - r) - (b - a) * (r - 1));
    q = (q - 1) * (r - 1) * (s - 1);
  }
  if (p > 0) q = -q;
  p = Math.abs(p);
  return 2 * p < Math.min(3 * half * q - Math.abs(least * q), Math.abs(before * q))
    ? [p / q, step]
    : undefined;
}
