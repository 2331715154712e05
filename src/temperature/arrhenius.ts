/** Activation energy: how a rate coefficient moves with temperature, k = A exp(−Ea/RT). */
import { gasConstant } from '../constants';
import type { Estimate } from '../estimate';
import { affine } from './affine';
import { heightEstimate, slopeEstimate, type CentredLine } from './centredLine';
import { rangeOf, requireMeasured, type MeasuredCoefficients } from './measured';
import { lineOverTemperature, type Scatter } from './overTemperature';

export interface ArrheniusFit {
  /** Ea, kJ/mol. */
  readonly activationEnergy: Estimate;
  /** ln A, for A in the unit of the coefficients. */
  readonly logFactor: Estimate;
  /** ln k against 1/T, T in K. */
  readonly line: CentredLine;
  /** Lowest and highest temperature measured, K. */
  readonly range: readonly [number, number];
}

/**
 * Fits ln k = ln A − Ea/RT by least squares. Weights are (k/u)² where uncertainties are given; the scale comes
 * from the scatter about the line. Limits are Student's.
 *
 * @param scatter `coefficients` for a nonlinear fit to k itself: see {@link Scatter} for how far it differs
 * @throws InvalidInput, NotDetermined as {@link requireMeasured}
 * @see IUPAC Gold Book, Arrhenius equation, doi:10.1351/goldbook.A00446
 * @example fitArrhenius({ temperatures: Float64Array.of(298.15, 308.15), coefficients: Float64Array.of(1, 2) }).activationEnergy.value // 52.9489
 */
export function fitArrhenius(measured: MeasuredCoefficients, scatter: Scatter = 'logarithms'): ArrheniusFit {
  requireMeasured(measured, 'an activation energy');
  const line = lineOverTemperature(measured, scatter, () => 1);
  return {
    activationEnergy: affine(slopeEstimate(line), -gasConstant / 1000),
    logFactor: heightEstimate(line, 0),
    line,
    range: rangeOf(measured.temperatures),
  };
}
