/** How long until a given fraction is gone. */
import { InvalidInput, NotDetermined, requireFinite, requirePositive, shown } from '../errors';

export interface Conversion {
  /** Fraction converted, above 0 and below 1. */
  readonly fraction: number;
  /** k, (mol/L)¹⁻ⁿ s⁻¹, above 0. */
  readonly coefficient: number;
  /** n, any finite number. */
  readonly order: number;
  /** [A]₀, mol/L, above 0; not needed for order 1. */
  readonly initial?: number;
}

/**
 * Time until a fraction x of a reactant that follows −d[A]/dt = k[A]ⁿ is converted:
 *
 *   t = [(1 − x)^(1−n) − 1] / [(n − 1) k [A]₀ⁿ⁻¹],   tending to −ln(1 − x)/k as n → 1.
 *
 * Below order 1 the reactant is used up at 1/[(1 − n) k [A]₀ⁿ⁻¹], and every fraction is reached before.
 *
 * @returns t, s, or whatever unit of time k has
 * @throws InvalidInput outside those ranges, or without an initial concentration where one is needed;
 *   NotDetermined where the time is beyond what a number can hold
 * @see IUPAC Gold Book, half life, doi:10.1351/goldbook.H02716; order of reaction, doi:10.1351/goldbook.O04322
 * @example timeToConversion({ fraction: 0.5, coefficient: 3.21e-5, order: 1 }) // 21593.4
 * @example timeToConversion({ fraction: 0.75, coefficient: 0.1, order: 2, initial: 0.5 }) // 60
 */
export function timeToConversion({ fraction, coefficient, order, initial }: Conversion): number {
  if (!(fraction > 0 && fraction < 1)) {
    throw new InvalidInput(`fraction must be above 0 and below 1: got ${shown(fraction)}`);
  }
  requirePositive({ coefficient });
  requireFinite({ order });
  const perTime = coefficient * startingFactor(order, initial);
  const logShare = -Math.log1p(-fraction);
  const x = (order - 1) * logShare;
  const departure = x === 0 ? 1 : Math.expm1(x) / x; // keeps its digits near n = 1
  const time = (logShare * departure) / perTime;
  if (Number.isFinite(time) && time > 0) return time;
  throw new NotDetermined(`time must be a number that can be held: it is not for order ${shown(order)}`);
}

/** [A]₀ⁿ⁻¹. */
function startingFactor(order: number, initial: number | undefined): number {
  if (order === 1) return 1;
  if (initial === undefined) {
    throw new InvalidInput(`initial is needed for every order but 1: the order is ${shown(order)}`);
  }
  requirePositive({ initial });
  return initial ** (order - 1);
}
