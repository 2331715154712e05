/** The line of ln y fitted to y itself. */
import { fitLeastSquares } from '../numerics/leastSquares';
import { fitCentredLine, scatterAbout, type CentredLine } from './centredLine';

/**
 * y = exp(line) with least Σw(y − exp(line))²: nonlinear least squares, standard uncertainties from the full
 * Jacobian. Starts from the straight line through ln y.
 *
 * @param x two different values at least
 * @param y above 0
 * @param weights of y, above 0, up to a common factor
 * @returns the line of ln y; its scatter is that of a y of weight 1
 * @throws NotDetermined where the search finds no end
 * @example fitUntransformed(Float64Array.of(0, 1, 2), Float64Array.of(1, 2, 4), Float64Array.of(1, 1, 1)).slope // 0.693147
 */
export function fitUntransformed(x: Float64Array, y: Float64Array, weights: Float64Array): CentredLine {
  const start = fitCentredLine(
    x,
    y.map(Math.log),
    weights.map((w, i) => w * y[i] ** 2), // w(y − exp)² is about wy²(ln y − line)²
  );
  const roots = weights.map(Math.sqrt);
  const distances = x.map((place) => place - start.centre);
  const fitted = ([height, slope]: Float64Array, i: number): number =>
    roots[i] * Math.exp(height + slope * distances[i]);
  const fit = fitLeastSquares(
    {
      parameters: 2,
      residuals: x.length,
      residualsAt: (parameters, residuals) =>
        y.forEach((value, i) => (residuals[i] = roots[i] * value - fitted(parameters, i))),
      derivativesAt: (parameters, [byHeight, bySlope]) =>
        y.forEach((_, i) => {
          byHeight[i] = fitted(parameters, i);
          bySlope[i] = byHeight[i] * distances[i];
        }),
    },
    [start.height, start.slope],
  );
  const [height, slope] = fit.parameters;
  return {
    centre: start.centre,
    height,
    slope,
    factor: fit.factor,
    ...scatterAbout(fit.residualSumOfSquares, x.length),
  };
}
