/** Readings that follow concentration along a straight line between their start and their end. */
import { InvalidInput, requireFinite, requirePositive, shown } from '../errors';

/**
 * Fraction converted, from any reading linear in concentration: x = (r₀ − r)/(r₀ − r∞).
 *
 * @param reading r
 * @param start r₀, before anything has reacted
 * @param end r∞, when all has
 * @returns x, 0 at the start and 1 at the end; outside where readings scatter
 * @throws InvalidInput when not finite, or where end equals start
 * @example fractionConverted(1.688, 2.481, 0.91) // 0.504774
 */
export function fractionConverted(reading: number, start: number, end: number): number {
  requireFinite({ reading, start, end });
  if (start === end) throw new InvalidInput(`end must differ from start: both are ${shown(start)}`);
  return (start - reading) / (start - end);
}

/**
 * Concentration left, from a conductivity: c = c₀ (κ − κ∞)/(κ₀ − κ∞).
 *
 * @param reading κ
 * @param start κ₀
 * @param end κ∞
 * @param initial c₀, above 0
 * @returns c, in the unit of `initial`
 * @throws InvalidInput as {@link fractionConverted}
 * @see for dilute solutions, in which conductivity is linear in each ion: Kohlrausch's law of independent migration
 * @example concentrationFromConductivity(1.688, 2.481, 0.91, 0.01) // 0.00495226
 */
export function concentrationFromConductivity(
  reading: number,
  start: number,
  end: number,
  initial: number,
): number {
  requirePositive({ initial });
  return initial * (1 - fractionConverted(reading, start, end));
}

/**
 * A conductivity as it would be at 25 °C: κ₂₅ = κ/[1 + α(t − 25)].
 *
 * @param reading κ
 * @param temperature °C
 * @param percent 100 α, per °C; about 2 for most salts (common practice)
 * @throws InvalidInput where the factor would not be positive
 * @see ISO 7888:1985, temperature compensation
 * @example conductivityAt25(1.02, 26, 2) // 1
 */
export function conductivityAt25(reading: number, temperature: number, percent: number): number {
  requireFinite({ reading, temperature, percent });
  const factor = 1 + (percent / 100) * (temperature - 25);
  if (factor <= 0) {
    throw new InvalidInput(
      `temperature must be above ${shown(25 - 100 / percent)} degC for ${shown(percent)} % per degC: got ${shown(temperature)} degC`,
    );
  }
  return reading / factor;
}

/**
 * Concentration in a titrated aliquot: c = ratio c(titrant) V/V(aliquot).
 *
 * @param volume of titrant used, 0 or more
 * @param titrant its concentration, mol/L, above 0
 * @param aliquot volume that was titrated, in the unit of `volume`, above 0
 * @param ratio moles of analyte per mole of titrant, above 0
 * @returns c, mol/L
 * @throws InvalidInput outside those ranges
 * @example titratedConcentration(12.4, 0.02, 10, 2.5) // 0.062
 */
export function titratedConcentration(volume: number, titrant: number, aliquot: number, ratio = 1): number {
  requireFinite({ volume });
  if (volume < 0) throw new InvalidInput(`volume must be 0 or more: got ${shown(volume)}`);
  requirePositive({ titrant, aliquot, ratio });
  return (ratio * titrant * volume) / aliquot;
}
