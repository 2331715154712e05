import { InvalidInput, NotDetermined, requireFinite, requirePositive, shown } from '../errors';
import { withStudentLimits, type Estimate } from '../estimate';
import { molarMass } from './molarMass';
import { saturationPressure } from './water';

/**
 * Mass that leaves a vessel with each mole of gas: the gas, and the water vapour it carries when it
 * leaves saturated: M + M(H₂O) p*⁄(p − p*).
 *
 * @param gasMolarMass g/mol
 * @param vapour temperature (K) and pressure (Pa) of the gas as it leaves; left out for a dry gas
 * @returns g/mol
 * @throws InvalidInput where the water would boil
 * @example massPerMole(44.009) // 44.009
 */
export function massPerMole(
  gasMolarMass: number,
  vapour?: { temperature: number; pressure: number },
): number {
  requirePositive({ molarMass: gasMolarMass });
  if (!vapour) return gasMolarMass;
  const water = saturationPressure(vapour.temperature);
  if (vapour.pressure <= water) {
    throw new InvalidInput(
      `pressure must be above that of saturated water vapour, ${shown(water / 1000)} kPa: got ${shown(vapour.pressure / 1000)} kPa`,
    );
  }
  return gasMolarMass + (molarMass('H2O') * water) / (vapour.pressure - water);
}

/**
 * Amount of gas gone, from the mass lost: n = (m₀ − m)/M.
 *
 * @param mass g
 * @param start m₀, g
 * @param perMole mass that leaves per mole of gas, g/mol
 * @returns n, mol; negative where the mass rose
 * @throws InvalidInput when not finite
 * @example amountLost(186.914, 187.352, 44.009) // 0.00995251
 */
export function amountLost(mass: number, start: number, perMole: number): number {
  requireFinite({ mass, start });
  requirePositive({ molarMass: perMole });
  return (start - mass) / perMole;
}

/**
 * Standard uncertainty of a difference of two readings of one display: each lies anywhere within half a
 * digit, d/√12, the difference d/√6.
 *
 * @param readability d, the smallest step of the display
 * @see JCGM 100:2008 (GUM) 4.3.7 and F.2.2.1
 * @example differenceUncertainty(0.01) // 0.00408248
 */
export function differenceUncertainty(readability: number): number {
  requirePositive({ readability });
  return readability / Math.sqrt(6);
}

/**
 * A mass loss must stand clear of the display's steps: more than 3.29 standard uncertainties.
 *
 * @throws NotDetermined where it does not
 * @see detection limit, L. A. Currie, Pure Appl. Chem. 67 (1995) 1699, doi:10.1351/pac199567101699
 * @example requireVisibleLoss(0.4, 0.01) // undefined
 */
export function requireVisibleLoss(largestLoss: number, readability: number): void {
  const least = 3.29 * differenceUncertainty(readability);
  if (largestLoss < least) {
    throw new NotDetermined(
      `mass loss must exceed ${shown(least)} g to be seen with a readability of ${shown(readability)} g: the largest is ${shown(largestLoss)} g`,
    );
  }
}

/**
 * The amount lost with its uncertainty from the balance's readability (type B, normal limits).
 *
 * @example amountLostEstimate(99.56, 100, 44, 0.01).value // 0.01
 */
export function amountLostEstimate(
  mass: number,
  start: number,
  perMole: number,
  readability: number,
): Estimate {
  const standardUncertainty = differenceUncertainty(readability) / perMole;
  return withStudentLimits(amountLost(mass, start, perMole), standardUncertainty, Infinity);
}
