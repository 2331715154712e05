/**
 * The general search on NIST's certified nonlinear sets, from both of NIST's starts, and on published data as R
 * fits them.
 */
import nist from '../../reference/nist-strd-nonlinear.json';
import rSets from '../../reference/r-data-sets.json';
import { combinationVariance } from '../../../src/numerics/qr';
import { fitLeastSquares, type LeastSquaresModel } from '../../../src/numerics/leastSquares';
import { agreeingDigits, relative } from '../../support/compare';
import { writtenModel } from '../../support/writtenModel';

function modelOf({ model, response, data, certified }: (typeof nist.cases)[number]): LeastSquaresModel {
  const names = certified.parameters.map((_, j) => `b${j + 1}`);
  return writtenModel(model, names, data, response === 'log(y)' ? data.y.map(Math.log) : data.y);
}

describe.each(nist.cases)('NIST $name', (set) => {
  const { certified, degreesOfFreedom } = set;
  test.each(['start1', 'start2'] as const)('from %s', (start) => {
    const fit = fitLeastSquares(modelOf(set), set[start]);
    const deviation = Math.sqrt(fit.residualSumOfSquares / degreesOfFreedom);
    const digits = certified.parameters.map((b, j) => agreeingDigits(fit.parameters[j], b));
    const deviations = certified.standardDeviations.map((s, j) => {
      const unit = certified.parameters.map((_, k) => (k === j ? 1 : 0));
      return agreeingDigits(deviation * Math.sqrt(combinationVariance(fit.factor, unit)), s);
    });
    expect(Math.min(...digits)).toBeGreaterThan(10);
    // Lanczos1 is made of numbers with 14 digits: its certified residuals, 1e-13, are those digits' rounding
    if (set.name !== 'Lanczos1') expect(Math.min(...deviations)).toBeGreaterThan(10);
  });
});

test('a start at which the model is not finite is refused', () => {
  const model: LeastSquaresModel = {
    parameters: 1,
    residuals: 1,
    residualsAt: (p, r) => void (r[0] = Math.log(p[0])),
    derivativesAt: (p, columns) => void (columns[0][0] = -1 / p[0]),
  };
  expect(() => fitLeastSquares(model, [-1])).toThrow(
    'least squares needs a start at which the model is finite',
  );
});

test.each(rSets.cases)(
  '$name: parameters and standard errors to 1e-8',
  ({ model, response, data, parameters, expected }) => {
    const columns = data as unknown as Readonly<Record<string, number[]>>;
    const readings = columns[response];
    // a start a fifth off, as a rough plot would give it
    const fit = fitLeastSquares(
      writtenModel(model, parameters, columns, readings),
      expected.parameters.map((value, j) => value * (j % 2 === 0 ? 1.2 : 0.8)),
    );
    const deviation = Math.sqrt(fit.residualSumOfSquares / (readings.length - parameters.length));
    parameters.forEach((_, j) => {
      const unit = parameters.map((__, k) => (k === j ? 1 : 0));
      const error = deviation * Math.sqrt(combinationVariance(fit.factor, unit));
      expect(relative(fit.parameters[j], expected.parameters[j])).toBeLessThan(1e-8);
      expect(relative(error, expected.standardErrors[j])).toBeLessThan(1e-8);
    });
  },
);
