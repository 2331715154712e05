import { gasConstant, standardGravity } from '../constants';
import { InvalidInput, requireNotNegative, requirePositive, shown } from '../errors';
import { saturationPressure, waterDensity } from './water';

/** Conditions under which a volume of gas was read. SI units. */
export interface GasConditions {
  /** K */
  readonly temperature: number;
  /** Outside pressure, Pa. */
  readonly pressure: number;
  /** Fraction of saturation with water vapour, 0 dry to 1 saturated. */
  readonly saturation: number;
  /** Height of the water in the tube above that of the trough, m; negative where it stands below. */
  readonly head: number;
}

/**
 * Pressure of the gas itself: outside pressure less water column and water vapour.
 *
 * @returns Pa
 * @throws InvalidInput where nothing is left for the gas
 * @example dryGasPressure({ temperature: 298.15, pressure: 101325, saturation: 1, head: 0 }) // 98155.1755
 */
export function dryGasPressure({ temperature, pressure, saturation, head }: GasConditions): number {
  requirePositive({ temperature, pressure });
  if (!(saturation >= 0 && saturation <= 1)) {
    throw new InvalidInput(`wet must be from 0 (dry) to 1 (saturated): got ${shown(saturation)}`);
  }
  const column = head === 0 ? 0 : waterDensity(temperature) * standardGravity * head;
  const vapour = saturation === 0 ? 0 : saturation * saturationPressure(temperature);
  const dry = pressure - column - vapour;
  if (dry <= 0) {
    throw new InvalidInput(
      `pressure must be above that of the water vapour and column: ${shown(pressure / 1000)} kPa is not above ${shown((column + vapour) / 1000)} kPa`,
    );
  }
  return dry;
}

/**
 * Amount of gas in a volume, as an ideal gas: n = (p − ρ g h − φ p*(T)) V / (R T).
 *
 * @param volume m³, 0 or more
 * @returns n, mol
 * @throws InvalidInput outside those ranges
 * @see ideal gas, IUPAC Gold Book doi:10.1351/goldbook.I02935; water vapour IAPWS SR1-86(1992)
 * @example gasAmount(48.6e-6, { temperature: 295.15, pressure: 99450, saturation: 1, head: 0 }) // 0.00191715
 */
export function gasAmount(volume: number, conditions: GasConditions): number {
  requireNotNegative({ volume });
  return (dryGasPressure(conditions) * volume) / (gasConstant * conditions.temperature);
}
