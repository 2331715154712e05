/**
 * NIST certified data sets whose models are integrated rate laws approaching a plateau from a start of 0:
 * Misra1a and BoxBOD order 1, Misra1b order 3/2, Misra1d order 2; Bennett5 a decay of free order n = 1 + b₃.
 */
import nist from '../../reference/nist-strd-nonlinear.json';
import { fitRateLaw } from '../../../src/order/fit';
import { pairReadings } from '../../../src/series/series';

const set = (name: string) => nist.cases.find((c) => c.name === name)!;

/** Agreeing significant digits: −log₁₀ of the relative difference. */
const digits = (got: number, certified: number): number =>
  got === certified ? 16 : -Math.log10(Math.abs(got / certified - 1));

test.each([
  ['Misra1a', 1],
  ['BoxBOD', 1],
  ['Misra1b', 1.5],
  ['Misra1d', 2],
])(
  'fitRateLaw on NIST %s (order %d) meets 10 certified digits of k and plateau, 9 of their deviations',
  (name, order) => {
    const { data, certified } = set(name);
    const fit = fitRateLaw(pairReadings(data.x, data.y), {
      order,
      endpoint: 'free',
      start: { time: 0, value: 0 },
    });
    const [plateau, rate] = certified.parameters;
    // NIST's coefficient is κ; the fitted k is κ c₀¹⁻ⁿ with c₀ the plateau
    expect(digits(Math.exp(fit.search.logRate), rate)).toBeGreaterThan(10);
    expect(digits(fit.endpoint, plateau)).toBeGreaterThan(10);
    expect(digits(fit.residualSumOfSquares, certified.residualSumOfSquares)).toBeGreaterThan(9);
    expect(digits(fit.standardUncertainties.endpoint!, certified.standardDeviations[0])).toBeGreaterThan(9);
    if (order === 1)
      expect(
        digits(fit.standardUncertainties.rateCoefficient!, certified.standardDeviations[1]),
      ).toBeGreaterThan(9);
  },
);

test('fitRateLaw on NIST Bennett5: the free order meets 9 certified digits, its deviation 7', () => {
  const { data, certified } = set('Bennett5');
  const fit = fitRateLaw(pairReadings(data.x, data.y), { order: 'free', endpoint: 0 });
  expect(digits(fit.order - 1, certified.parameters[2])).toBeGreaterThan(9);
  expect(digits(fit.standardUncertainties.order!, certified.standardDeviations[2])).toBeGreaterThan(7);
  expect(digits(fit.residualSumOfSquares, certified.residualSumOfSquares)).toBeGreaterThan(9);
});
