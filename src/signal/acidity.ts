/** From a pH reading to the concentration of an ion. */
import { InvalidInput, requireFinite, shown } from '../errors';
import { activityCoefficient, debyeHueckelSlope } from './activity';
import { waterDensity } from './water';

/**
 * Ion product of liquid water at 101.325 kPa, pK_w = −lg(K_w), of molalities.
 *
 * @param temperature K, from 273.15 to 373.15
 * @returns pK_w
 * @throws InvalidInput outside that range
 * @see IAPWS R11-24; H. Arcis et al., J. Phys. Chem. Ref. Data 53 (2024) 023103, doi:10.1063/5.0198792
 * @example waterIonProduct(298.15) // 13.9944
 */
export function waterIonProduct(temperature: number): number {
  return ionProductAt(temperature, waterDensity(temperature));
}

/**
 * The release's equation; density in kg/m³.
 *
 * @example ionProductAt(300, 1000) // 13.906672
 */
export function ionProductAt(temperature: number, density: number): number {
  const d = density / 1000;
  const z = d * Math.exp(-0.702132 + 8681.05 / temperature - (24145.1 * d ** (2 / 3)) / temperature ** 2);
  const gas = 0.61415 + 48251.33 / temperature - 67707.93 / temperature ** 2 + 10102100 / temperature ** 3;
  const solvation = Math.log10(1 + z) - (z / (1 + z)) * d * (0.813876 - 51.4471 / temperature - 0.46992 * d);
  return -12 * solvation + gas + 2 * Math.log10(0.018015268);
}

/** Ions whose concentration a pH tells. */
export type AcidityIon = 'H' | 'OH';

export interface AcidityConditions {
  /** mol/L, from 0 to 0.5; left out, activity stands for concentration. */
  readonly ionicStrength?: number;
  /** K */
  readonly temperature: number;
}

/**
 * Concentration of H⁺ or OH⁻ from a pH: c(H⁺) = 10^−pH/γ, c(OH⁻) = 10^(pH − pK_w)/γ.
 *
 * The difference between molality and concentration, 0.3 % at 25 °C, is left aside: no pH meter sees it.
 *
 * @param pH from −2 to 16
 * @returns mol/L
 * @throws InvalidInput outside those ranges
 * @see pH, IUPAC Gold Book doi:10.1351/goldbook.P04524
 * @example ionFromPH(3, 'H', { temperature: 298.15 }) // 0.001
 */
export function ionFromPH(
  pH: number,
  ion: AcidityIon,
  { ionicStrength, temperature }: AcidityConditions,
): number {
  requireFinite({ pH });
  if (pH < -2 || pH > 16) throw new InvalidInput(`pH must be from -2 to 16: got ${shown(pH)}`);
  const activity = ion === 'H' ? 10 ** -pH : 10 ** (pH - waterIonProduct(temperature));
  if (ionicStrength === undefined) return activity;
  return activity / activityCoefficient(1, ionicStrength, debyeHueckelSlope(temperature));
}
