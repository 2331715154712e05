/**
 * The general search on NIST's certified nonlinear sets, from both of NIST's starts. Derivatives are worked
 * out from the printed model by mathjs, so that nothing of ours stands between NIST's formula and the search.
 */
import { derivative, parse, type MathNode } from 'mathjs';
import nist from '../../reference/nist-strd-nonlinear.json';
import { combinationVariance } from '../../../src/numerics/qr';
import { fitLeastSquares, type LeastSquaresModel } from '../../../src/numerics/leastSquares';
import { agreeingDigits } from '../../support/compare';

type NistSet = (typeof nist.cases)[number];
type Compiled = (b: Float64Array, x: number) => number;

/** mathjs's own evaluation takes a minute for all sets; the same tree as a function takes a second. */
function compiled(node: MathNode): Compiled {
  const text = node
    .toString({ parenthesis: 'all' })
    .replaceAll('^', '**')
    .replace(/\b(exp|log|sin|cos|atan)\b/g, 'Math.$1')
    .replace(/\bpi\b/g, 'Math.PI')
    .replace(/\bb(\d)\b/g, (_, j: string) => `b[${Number(j) - 1}]`);
  return new Function('b', 'x', `return ${text};`) as Compiled;
}

function modelOf({ model, response, data, certified }: NistSet): LeastSquaresModel {
  const text = model.replaceAll('**', '^');
  const value = compiled(parse(text));
  const slopes = certified.parameters.map((_, j) => compiled(derivative(text, `b${j + 1}`)));
  const { x, y } = data;
  const readings = response === 'log(y)' ? y.map(Math.log) : y;
  return {
    parameters: slopes.length,
    residuals: y.length,
    residualsAt: (parameters, residuals) => {
      for (let i = 0; i < x.length; i++) residuals[i] = readings[i] - value(parameters, x[i]);
    },
    derivativesAt: (parameters, columns) => {
      slopes.forEach((slope, j) => {
        for (let i = 0; i < x.length; i++) columns[j][i] = slope(parameters, x[i]);
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
