/**
 * The integrated rate law of −dc/dt = k cⁿ in its natural form: the share of the reactant left,
 *
 *   φ = [1 + (n − 1) s]^(−1/(n − 1)),   s = κt, κ = k c₀ⁿ⁻¹,   φ → exp(−s) as n → 1,
 *
 * with its derivatives, all digits kept near n = 1. Below order 1 the reactant is used up at
 * s = 1/(1 − n) and φ stays 0.
 *
 * @see P. Atkins, J. de Paula, J. Keeler, Physical Chemistry, 12th ed., topic 17B (integrated laws)
 */

/** ln(1 + u)/u, 1 at u = 0. */
const logRatio = (u: number): number => (u === 0 ? 1 : Math.log1p(u) / u);

/** [u/(1 + u) − ln(1 + u)]/u²; by its series near 0, where the difference cancels. */
function bend(u: number): number {
  if (Math.abs(u) > 0.02) return (u / (1 + u) - Math.log1p(u)) / (u * u);
  let sum = 0;
  for (let k = 11; k >= 2; k--) sum = (1 - 1 / k) * (k % 2 === 0 ? -1 : 1) + u * sum;
  return sum;
}

/**
 * Share of the reactant left.
 *
 * @param s reduced time κt, 0 or more
 * @param order n, any finite number
 * @returns φ, between 0 and 1
 * @example shareLeft(1, 1) // 0.3678794411714423
 * @example shareLeft(3, 2) // 0.25
 * @example shareLeft(2, 0) // 0
 */
export function shareLeft(s: number, order: number): number {
  const u = (order - 1) * s;
  return u <= -1 ? 0 : Math.exp(-s * logRatio(u));
}

/**
 * Share of the reactant converted, 1 − φ, with its digits at small s.
 *
 * @example shareConverted(1, 2) // 0.5
 */
export function shareConverted(s: number, order: number): number {
  const u = (order - 1) * s;
  return u <= -1 ? 1 : -Math.expm1(-s * logRatio(u));
}

/**
 * dφ/d ln κ = −s φ/(1 + u).
 *
 * @example shareSlope(1, 1, Math.exp(-1)) // -0.367879441171442
 */
export function shareSlope(s: number, order: number, share: number): number {
  const u = (order - 1) * s;
  return u <= -1 || share === 0 ? 0 : (-s * share) / (1 + u);
}

/**
 * dφ/dn at constant s.
 *
 * @example shareOrderSlope(2, 1, Math.exp(-2)) // 0.270670566473225
 */
export function shareOrderSlope(s: number, order: number, share: number): number {
  const u = (order - 1) * s;
  return u <= -1 || share === 0 ? 0 : -share * s * s * bend(u);
}

/**
 * Reduced time at which half of the reactant is left: κ t½ = (2ⁿ⁻¹ − 1)/(n − 1), ln 2 at n = 1.
 *
 * @example reducedHalfLife(2) // 1
 */
export function reducedHalfLife(order: number): number {
  const x = (order - 1) * Math.LN2;
  return Math.LN2 * (x === 0 ? 1 : Math.expm1(x) / x);
}

/**
 * Reduced time at which a share is left: the inverse of {@link shareLeft}.
 *
 * @example reducedTimeTo(0.25, 2) // 3
 */
export function reducedTimeTo(share: number, order: number): number {
  const x = -(order - 1) * Math.log(share);
  return -Math.log(share) * (x === 0 ? 1 : Math.expm1(x) / x);
}
