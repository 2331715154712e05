/** ln y against 1/T, the line beneath both Arrhenius's and Eyring's law, with what is taken to scatter evenly. */
import { fitCentredLine, type CentredLine } from './centredLine';
import type { MeasuredCoefficients } from './measured';
import { fitUntransformed } from './untransformed';

/**
 * What the least squares are of. `logarithms`: ln k, a straight line. `coefficients`: k itself, a nonlinear
 * fit. With uncertainties in proportion to k the two all but agree; without any, the second heeds the hottest
 * runs and little else. On five published coefficients over 226 K (OpenStax Chemistry 2e, 12.5) they give an
 * activation energy of 185.3 ± 2.2 and 197.9 ± 0.6 kJ/mol; the second, with 5 % of each k as uncertainty,
 * 185.1 ± 2.3. Limits are Student's for both; those of the nonlinear fit differ from its profile likelihood's by
 * less than a tenth of their reach on the fits checked.
 */
export type Scatter = 'logarithms' | 'coefficients';

/**
 * @param scaleAt y is k divided by this; 1 or T
 * @returns the line centred at the (weighted) harmonic-mean temperature
 * @example lineOverTemperature({ temperatures: Float64Array.of(250, 500), coefficients: Float64Array.of(1, Math.E) }, 'logarithms', () => 1).slope // -500
 */
export function lineOverTemperature(
  measured: MeasuredCoefficients,
  scatter: Scatter,
  scaleAt: (temperature: number) => number,
): CentredLine {
  const { temperatures, coefficients } = measured;
  const x = temperatures.map((temperature) => 1 / temperature);
  const y = coefficients.map((k, i) => k / scaleAt(temperatures[i]));
  if (scatter === 'logarithms') return fitCentredLine(x, y.map(Math.log), logWeights(measured));
  return fitUntransformed(x, y, weightsOfScaled(measured, scaleAt));
}

/** (k/u)², since u(ln k) = u/k to first order; 1 where no uncertainties were given. */
function logWeights({ coefficients, uncertainties }: MeasuredCoefficients): Float64Array {
  return uncertainties
    ? coefficients.map((k, i) => (k / uncertainties[i]) ** 2)
    : new Float64Array(coefficients.length).fill(1);
}

/** 1/u² of k, carried to k divided by its scale; u = 1 where no uncertainties were given. */
function weightsOfScaled(
  { temperatures, uncertainties }: MeasuredCoefficients,
  scaleAt: (temperature: number) => number,
): Float64Array {
  return temperatures.map((temperature, i) => (scaleAt(temperature) / (uncertainties?.[i] ?? 1)) ** 2);
}
