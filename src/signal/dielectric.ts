import { criticalDensity, criticalTemperature, waterDensity } from './water';

/**
 * N, i, j of the dielectricRelease.
 *
 * @example dielectricTerms[1] // [-0.957771379375, 1, 1]
 */
export const dielectricTerms = [
  [0.978224486826, 1, 0.25],
  [-0.957771379375, 1, 1],
  [0.237511794148, 1, 2.5],
  [0.714692244396, 2, 1.5],
  [-0.298217036956, 3, 1.5],
  [-0.108863472196, 3, 2.5],
  [0.0949327488264, 4, 2],
  [-0.00980469816509, 5, 2],
  [0.000016516763497, 6, 5],
  [0.0000937359795772, 7, 0.5],
  [-1.2317921872e-10, 10, 10],
] as const;

/**
 * As the release prints them, older than today's constants: its equation was fitted with these.
 *
 * @example dielectricRelease.molarMass // 0.018015268
 */
export const dielectricRelease = {
  avogadro: 6.0221367e23, // 1/mol
  boltzmann: 1.380658e-23, // J/K
  vacuumPermittivity: 1 / (4e-7 * Math.PI * 299792458 ** 2), // C²/(J m)
  polarizability: 1.636e-40, // C² m²/J
  dipoleMoment: 6.138e-30, // C m
  molarMass: 0.018015268, // kg/mol
};

/**
 * Static dielectric constant of liquid water at 101.325 kPa.
 *
 * @param temperature K, from 273.15 to 373.15
 * @returns ε, relative to vacuum
 * @throws InvalidInput outside that range
 * @see IAPWS R8-97; D. P. Fernández et al., J. Phys. Chem. Ref. Data 26 (1997) 1125, doi:10.1063/1.555997
 * @example waterDielectricConstant(298.15) // 78.408
 */
export function waterDielectricConstant(temperature: number): number {
  const density = waterDensity(temperature);
  const delta = density / criticalDensity;
  const tau = criticalTemperature / temperature;
  let g = 1 + 0.00196096504426 * delta * (temperature / 228 - 1) ** -1.2;
  for (const [n, i, j] of dielectricTerms) g += n * delta ** i * tau ** j;
  const perVolume = (dielectricRelease.avogadro * density) / dielectricRelease.molarMass;
  const a =
    (perVolume * dielectricRelease.dipoleMoment ** 2 * g) /
    (dielectricRelease.vacuumPermittivity * dielectricRelease.boltzmann * temperature);
  const b = (perVolume * dielectricRelease.polarizability) / (3 * dielectricRelease.vacuumPermittivity);
  const root = Math.sqrt(9 + 2 * a + 18 * b + a ** 2 + 10 * a * b + 9 * b ** 2);
  return (1 + a + 5 * b + root) / (4 - 4 * b);
}
