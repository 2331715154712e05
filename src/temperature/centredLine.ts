/**
 * A straight line kept about a centre amid its points, where height and slope are uncorrelated. Against 1/T
 * the origin lies so far off that slope and intercept alone would say nearly the same thing twice.
 *
 * @see N. R. Draper and H. Smith, Applied Regression Analysis, 3rd ed. (1998), 1.4, 3.1 and 9.2
 */
import { withStudentLimits, type Estimate } from '../estimate';
import { fitLinear } from '../numerics/linearFit';
import { combinationVariance, type QrFactor } from '../numerics/qr';

export interface CentredLine {
  readonly centre: number;
  /** y of the line at the centre. */
  readonly height: number;
  readonly slope: number;
  /** Of the weighted design, columns height and slope. */
  readonly factor: QrFactor;
  /** Scatter of a point of weight 1; `null` without degrees of freedom. */
  readonly deviation: number | null;
  readonly degreesOfFreedom: number;
}

/**
 * The line of least Σw(y − line)², centred at the weighted mean of x.
 *
 * @param x two different values at least
 * @param weights above 0, up to a common factor
 * @example fitCentredLine(Float64Array.of(0, 1, 2), Float64Array.of(1, 3, 5), Float64Array.of(1, 1, 1)) // { centre: 1, height: 3, slope: 2 }
 */
export function fitCentredLine(x: Float64Array, y: Float64Array, weights: Float64Array): CentredLine {
  const centre = weightedMean(x, weights);
  const roots = weights.map(Math.sqrt);
  const columns = [roots, roots.map((root, i) => root * (x[i] - centre))];
  const { coefficients, residualSumOfSquares, factor } = fitLinear(
    columns,
    y.map((value, i) => roots[i] * value),
  );
  const [height, slope] = coefficients;
  return { centre, height, slope, factor, ...scatterAbout(residualSumOfSquares, x.length) };
}

/** Deviations from the first are averaged, so that numbers nearly alike keep their digits. */
function weightedMean(values: Float64Array, weights: Float64Array): number {
  const weight = weights.reduce((sum, w) => sum + w, 0);
  return values[0] + values.reduce((sum, value, i) => sum + weights[i] * (value - values[0]), 0) / weight;
}

/**
 * Of points about a line of two parameters.
 *
 * @example scatterAbout(8, 4) // { deviation: 2, degreesOfFreedom: 2 }
 */
export function scatterAbout(
  residualSumOfSquares: number,
  points: number,
): Pick<CentredLine, 'deviation' | 'degreesOfFreedom'> {
  const degreesOfFreedom = points - 2;
  const deviation = degreesOfFreedom > 0 ? Math.sqrt(residualSumOfSquares / degreesOfFreedom) : null;
  return { deviation, degreesOfFreedom };
}

/**
 * y of the line at x, its uncertainty that of the line, not of one more point. Limits are Student's.
 *
 * @example heightEstimate(fitCentredLine(Float64Array.of(0, 1, 2), Float64Array.of(1, 3, 5), Float64Array.of(1, 1, 1)), 0).value // 1
 */
export function heightEstimate(line: CentredLine, x: number): Estimate {
  const distance = x - line.centre;
  return lineEstimate(line, line.height + line.slope * distance, [1, distance]);
}

/**
 * The slope, with Student's limits.
 *
 * @example slopeEstimate(fitCentredLine(Float64Array.of(0, 1, 2), Float64Array.of(1, 3, 5), Float64Array.of(1, 1, 1))).value // 2
 */
export const slopeEstimate = (line: CentredLine): Estimate => lineEstimate(line, line.slope, [0, 1]);

/** @param combination of height and slope that makes the value */
function lineEstimate(line: CentredLine, value: number, combination: readonly number[]): Estimate {
  const { factor, deviation, degreesOfFreedom } = line;
  const uncertainty =
    deviation === null ? null : deviation * Math.sqrt(combinationVariance(factor, combination));
  return withStudentLimits(value, uncertainty, degreesOfFreedom);
}
