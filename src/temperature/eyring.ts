/** Enthalpy, entropy and Gibbs energy of activation: k = (kB T/h) exp(ΔS‡/R) exp(−ΔH‡/RT). */
import { boltzmannConstant, gasConstant, planckConstant } from '../constants';
import { requirePositive } from '../errors';
import type { Estimate } from '../estimate';
import { affine } from './affine';
import { heightEstimate, slopeEstimate, type CentredLine } from './centredLine';
import { requireMeasured, type MeasuredCoefficients } from './measured';
import { lineOverTemperature, type Scatter } from './overTemperature';

export interface EyringFit {
  /** ΔH‡, kJ/mol. */
  readonly enthalpy: Estimate;
  /** ΔS‡, J/(mol K), for k in s⁻¹, or with 1 mol/L as the standard concentration. */
  readonly entropy: Estimate;
  /** ln(k/T) against 1/T, T in K. */
  readonly line: CentredLine;
}

/** ln(kB/h), of k in 1/(K s). */
const logUniversalFactor = Math.log(boltzmannConstant / planckConstant);

/**
 * Fits ln(k/T) = ln(kB/h) + ΔS‡/R − ΔH‡/RT by least squares, transmission coefficient 1. Weights and limits as for
 * {@link fitArrhenius}.
 *
 * @param measured time in seconds
 * @param scatter `coefficients` for a nonlinear fit to k itself
 * @throws InvalidInput, NotDetermined as {@link requireMeasured}
 * @see IUPAC Gold Book, enthalpy and entropy of activation, doi:10.1351/goldbook.E02142 and doi:10.1351/goldbook.E02150
 * @example fitEyring({ temperatures: Float64Array.of(298.15, 308.15), coefficients: Float64Array.of(1, 2) }).enthalpy.value // 50.4288
 */
export function fitEyring(measured: MeasuredCoefficients, scatter: Scatter = 'logarithms'): EyringFit {
  requireMeasured(measured, 'an enthalpy of activation');
  const line = lineOverTemperature(measured, scatter, (temperature) => temperature);
  return {
    enthalpy: affine(slopeEstimate(line), -gasConstant / 1000),
    entropy: affine(heightEstimate(line, 0), gasConstant, -gasConstant * logUniversalFactor),
    line,
  };
}

/**
 * ΔG‡ = ΔH‡ − TΔS‡ = −RT ln[kh/(kB T)], kJ/mol, of the line at a temperature. Read off the line itself, since
 * ΔH‡ and ΔS‡ move together and their uncertainties must not be added.
 *
 * @param temperature K, above 0
 * @throws InvalidInput for a temperature that is not above 0
 * @see IUPAC Gold Book, Gibbs energy of activation, doi:10.1351/goldbook.G02631
 * @example gibbsEnergyAt(fitEyring({ temperatures: Float64Array.of(298.15, 308.15), coefficients: Float64Array.of(1, 2) }), 298.15).value // 73.0241
 */
export function gibbsEnergyAt({ line }: EyringFit, temperature: number): Estimate {
  requirePositive({ temperature });
  const factor = (-gasConstant * temperature) / 1000;
  return affine(heightEstimate(line, 1 / temperature), factor, -factor * logUniversalFactor);
}
