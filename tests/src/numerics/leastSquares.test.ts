/**
 * The general search on NIST's certified nonlinear sets, from both of NIST's starts. Derivatives are worked
 * out from the printed model by mathjs, so that nothing of ours stands between NIST's formula and the search.
 */
import { derivative, parse, type EvalFunction } from 'mathjs';
import nist from '../../reference/nist-strd-nonlinear.json';
import { combinationVariance } from '../../../src/numerics/qr';
import { fitLeastSquares, type LeastSquaresModel } from '../../../src/numerics/leastSquares';
import { agreeingDigits } from '../../support/compare';

type NistSet = (typeof nist.cases)[number];

function modelOf({ model, response, data, certified }: NistSet): LeastSquaresModel {
  const text = model.replaceAll('**', '^');
  const names = certified.parameters.map((_, j) => `b${j + 1}`);
  const value = parse(text).compile();
  const slopes = names.map((name) => derivative(text, name).compile());
  const { x, y } = data;
  const readings = response === 'log(y)' ? y.map(Math.log) : y;
  const at = (f: EvalFunction, parameters: Float64Array, i: number): number =>
    f.evaluate({
      x: x[i],
      pi: Math.PI,
      ...Object.fromEntries(names.map((name, j) => [name, parameters[j]])),
    });
  return {
    parameters: names.length,
    residuals: y.length,
    residualsAt: (parameters, residuals) => {
      for (let i = 0; i < x.length; i++) residuals[i] = readings[i] - at(value, parameters, i);
    },
    derivativesAt: (parameters, columns) => {
      slopes.forEach((slope, j) => {
        for (let i = 0; i < x.length; i++) columns[j][i] = at(slope, parameters, i);
      });
    },
  };
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
