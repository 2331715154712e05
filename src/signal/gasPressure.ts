import { gasConstant } from '../constants';
import { InvalidInput, requireFinite, requireNotNegative, requirePositive, shown } from '../errors';

/** Gas in a closed space, at one moment. SI units. */
export interface GasState {
  /** Pa */
  readonly pressure: number;
  /** K */
  readonly temperature: number;
}

/**
 * Amount of gas formed in a closed space of constant volume, as an ideal gas:
 * n = (V/R)(p/T − p₀/T₀).
 *
 * Air and water vapour that were there from the start cancel as long as the temperature stays.
 *
 * @param now pressure 0 or more, temperature above 0
 * @param start the same before the reaction
 * @param volume of the space above the liquid, m³, above 0
 * @returns n, mol; negative where gas was used up
 * @throws InvalidInput outside those ranges
 * @see ideal gas, IUPAC Gold Book doi:10.1351/goldbook.I02935
 * @example gasFormed({ pressure: 104575, temperature: 298.15 }, { pressure: 101325, temperature: 298.15 }, 135e-6) // 0.00017699
 */
export function gasFormed(now: GasState, start: GasState, volume: number): number {
  requireNotNegative({ pressure: now.pressure, start: start.pressure });
  requirePositive({ temperature: now.temperature, volume });
  requirePositive({ temperature: start.temperature });
  return (volume / gasConstant) * (now.pressure / now.temperature - start.pressure / start.temperature);
}

/**
 * Pressure of a gas A that is left, from the total pressure while A turns into other gases:
 * p(A) = p₀ − (p − p₀)/Δν.
 *
 * @param total p
 * @param start p₀, pressure of A alone at the start, in the unit of `total`
 * @param gain Δν, moles of gas gained for each mole of A used, not 0
 * @returns p(A), in the same unit
 * @throws InvalidInput outside those ranges, or where more than 5 % below nothing would be left, since
 *   then the gain or the start cannot be right (common practice)
 * @example pressureLeft(55.1, 46.4, 1.5) // 40.6
 */
export function pressureLeft(total: number, start: number, gain: number): number {
  requireFinite({ total, gain });
  requirePositive({ start });
  if (gain === 0) throw new InvalidInput('gain must not be 0: the total pressure would tell nothing');
  const left = start - (total - start) / gain;
  if (left < -0.05 * start) {
    throw new InvalidInput(
      `pressure left must not be more than 5 % below 0: a total of ${shown(total)} from ${shown(start)} with a gain of ${shown(gain)} leaves ${shown(left)}`,
    );
  }
  return left;
}
