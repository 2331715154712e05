import { avogadroConstant, boltzmannConstant, elementaryCharge, vacuumPermittivity } from '../constants';
import { InvalidInput, requireFinite, shown } from '../errors';
import { waterDielectricConstant } from './dielectric';
import { waterDensity } from './water';

/**
 * Slope of the limiting law of Debye and Hückel in water, for decimal logarithms and molality.
 *
 * A = √(2π N_A ρ) [e²/(4π ε₀ ε k T)]^1.5 / ln 10
 *
 * @param temperature K, from 273.15 to 373.15
 * @returns A, (kg/mol)^½
 * @throws InvalidInput outside that range
 * @see Debye–Hückel theory, IUPAC Gold Book doi:10.1351/goldbook.D01539
 * @example debyeHueckelSlope(298.15) // 0.50978
 */
export function debyeHueckelSlope(temperature: number): number {
  const permittivity = vacuumPermittivity * waterDielectricConstant(temperature);
  const length = elementaryCharge ** 2 / (4 * Math.PI * permittivity * boltzmannConstant * temperature);
  return (Math.sqrt(2 * Math.PI * avogadroConstant * waterDensity(temperature)) * length ** 1.5) / Math.LN10;
}

/** Above this ionic strength the equation of Davies is not to be trusted, mol/L. */
export const highestIonicStrength = 0.5;

/**
 * Activity coefficient of an ion by the equation of Davies:
 * lg γ = −A z² [√I/(1 + √I) − 0.3 I].
 *
 * @param charge z
 * @param ionicStrength I, mol/L, from 0 to 0.5
 * @param slope A, (L/mol)^½; 0.509 is usual at 25 °C
 * @returns γ
 * @throws InvalidInput outside those ranges
 * @see C. W. Davies, Ion Association, Butterworths (1962)
 * @example activityCoefficient(1, 0.1, 0.509) // 0.781594
 */
export function activityCoefficient(charge: number, ionicStrength: number, slope: number): number {
  requireFinite({ charge, slope });
  if (!(ionicStrength >= 0 && ionicStrength <= highestIonicStrength)) {
    throw new InvalidInput(
      `ionic strength must be from 0 to ${highestIonicStrength} mol/L: got ${shown(ionicStrength)} mol/L`,
    );
  }
  const root = Math.sqrt(ionicStrength);
  return 10 ** (-slope * charge ** 2 * (root / (1 + root) - 0.3 * ionicStrength));
}
