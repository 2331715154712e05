/** How much of a gas water holds back. */
import { InvalidInput, requireNotNegative, requirePositive } from '../errors';
import { molarMass } from './molarMass';
import { criticalTemperature, saturationPressure, waterDensity } from './water';

/**
 * A, B, C of the IAPWS guideline for gases in water.
 *
 * @see IAPWS G7-04, Table 2; R. Fernández-Prini, J. L. Alvarez and A. H. Harvey, J. Phys. Chem. Ref. Data 32
 *   (2003) 903, doi:10.1063/1.1564818
 */
const coefficients: Readonly<Record<string, readonly [number, number, number]>> = {
  He: [-3.52839, 7.12983, 4.4777],
  Ne: [-3.18301, 5.31448, 5.43774],
  Ar: [-8.40954, 4.29587, 10.52779],
  Kr: [-8.97358, 3.61508, 11.29963],
  Xe: [-14.21635, 4.00041, 15.60999],
  H2: [-4.73284, 6.08954, 6.06066],
  N2: [-9.67578, 4.72162, 11.70585],
  O2: [-9.44833, 4.43822, 11.42005],
  CO: [-10.52862, 5.13259, 12.01421],
  CO2: [-8.55445, 4.01195, 9.52345],
  H2S: [-4.51499, 5.23538, 4.42126],
  CH4: [-10.44708, 4.66491, 12.12986],
  C2H6: [-19.67563, 4.51222, 20.62567],
  SF6: [-16.56118, 2.15289, 20.3544],
};

/** Formulas of the gases whose solubility is known here. */
export const dissolvingGases: readonly string[] = Object.keys(coefficients);

/**
 * A, B, C of a gas; nothing for one that the guideline does not know.
 *
 * @param gas formula
 * @example henryCoefficients('CO2') // [-8.55445, 4.01195, 9.52345]
 */
export const henryCoefficients = (gas: string): readonly [number, number, number] | undefined =>
  Object.hasOwn(coefficients, gas) ? coefficients[gas] : undefined;

/**
 * Henry's law constant of a gas in water, lim f/x.
 *
 * ln(k/p*) = A/T_R + B τ^0.355/T_R + C T_R^−0.41 exp τ, T_R = T/T_c, τ = 1 − T_R
 *
 * @param gas formula, one of {@link dissolvingGases}
 * @param temperature K, from 273.15; the guideline reaches far beyond boiling
 * @returns k, Pa
 * @throws InvalidInput for another gas, or outside the range
 * @see IAPWS G7-04
 * @example henryConstant('CO2', 298.15) // 165644589
 */
export function henryConstant(gas: string, temperature: number): number {
  const known = henryCoefficients(gas);
  if (!known) throw new InvalidInput(`gas must be one of ${dissolvingGases.join(', ')}: got "${gas}"`);
  const [a, b, c] = known;
  const reduced = temperature / criticalTemperature;
  const tau = 1 - reduced;
  const exponent = a / reduced + (b * tau ** 0.355) / reduced + c * reduced ** -0.41 * Math.exp(tau);
  return saturationPressure(temperature) * Math.exp(exponent);
}

/**
 * Amount of gas dissolved in water at equilibrium, n = H V p with H = ρ/(M(H₂O) k), in the limit of high
 * dilution and with the pressure for the fugacity.
 *
 * What reacts with water is not counted: CO₂ in hard or alkaline water, H₂S above pH 6.
 *
 * @param pressure of the gas itself, without water vapour, Pa, 0 or more
 * @param gas formula
 * @param volume of water, m³, above 0
 * @param temperature K, from 273.15 to 373.15
 * @returns n, mol
 * @throws InvalidInput outside those ranges
 * @see IUPAC Gold Book, Henry's law, doi:10.1351/goldbook.H02783
 * @example dissolvedAmount(97000, 'CO2', 1e-4, 298.15) // 0.003241
 */
export function dissolvedAmount(pressure: number, gas: string, volume: number, temperature: number): number {
  requireNotNegative({ pressure });
  requirePositive({ volume });
  const perPressure = waterDensity(temperature) / (molarMass('H2O') * 1e-3) / henryConstant(gas, temperature);
  return perPressure * volume * pressure;
}
