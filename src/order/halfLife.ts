import { requireFinite, requirePositive } from '../errors';
import { reducedHalfLife } from './law';

/**
 * Half life of a fully consumed reactant A that follows −d[A]/dt = k[A]ⁿ.
 *
 * t½ = (2ⁿ⁻¹ − 1) / ((n − 1) k [A]₀ⁿ⁻¹), tending to ln 2 / k as n → 1.
 *
 * @param rateCoefficient k, (mol/L)¹⁻ⁿ s⁻¹, above 0
 * @param order n, any finite number
 * @param initialConcentration [A]₀, mol/L, above 0
 * @returns t½, s
 * @throws InvalidInput outside those ranges
 * @see IUPAC Gold Book, half life, doi:10.1351/goldbook.H02716
 * @example halfLife(3.21e-5, 1, 1) // 21593.4
 */
export function halfLife(rateCoefficient: number, order: number, initialConcentration: number): number {
  requirePositive({ rateCoefficient, initialConcentration });
  requireFinite({ order });
  return reducedHalfLife(order) / (rateCoefficient * initialConcentration ** (order - 1));
}
