import reference from '../../reference/rate-law-fits.json';
import { fitRateLaw } from '../../../src/order/fit';
import { halfLifeEstimate, orderEstimate, rateCoefficientEstimate } from '../../../src/order/profile';
import { pairReadings } from '../../../src/series/series';

const relative = (got: number, wanted: number): number => Math.abs(got / wanted - 1);

describe.each(reference.cases)('fitRateLaw $id: $description', (c) => {
  const series = pairReadings(c.t, c.y);
  const order = c.order as number | 'free';
  const fit = fitRateLaw(series, {
    order,
    endpoint: c.endpoint as number | 'free',
    ...(c.sd ? { uncertainties: Float64Array.from(c.sd as number[]) } : {}),
  });
  const { parameters, standardErrors } = c as {
    parameters: Record<string, number>;
    standardErrors: Record<string, number>;
  };

  test('k, y₀, y∞ and n meet fifty-digit arithmetic to 1e-8', () => {
    expect(relative(fit.rateCoefficient, parameters.k)).toBeLessThan(1e-8);
    expect(relative(fit.start, parameters.C0)).toBeLessThan(1e-8);
    if ('CI' in parameters) expect(relative(fit.endpoint, parameters.CI)).toBeLessThan(1e-7);
    if ('n' in parameters) expect(relative(fit.order, parameters.n)).toBeLessThan(1e-8);
    if (c.halfLife && c.endpoint === 0) expect(relative(fit.halfLife, c.halfLife)).toBeLessThan(1e-8);
  });

  test('standard uncertainties to 1e-6, residual sum of squares to 1e-12', () => {
    const u = fit.standardUncertainties;
    expect(relative(u.rateCoefficient!, standardErrors.k)).toBeLessThan(1e-6);
    expect(relative(u.start!, standardErrors.C0)).toBeLessThan(1e-6);
    if ('CI' in standardErrors) expect(relative(u.endpoint!, standardErrors.CI)).toBeLessThan(1e-6);
    if ('n' in standardErrors) expect(relative(u.order!, standardErrors.n)).toBeLessThan(1e-6);
    expect(relative(fit.residualSumOfSquares, c.residualSS)).toBeLessThan(1e-11);
    expect(fit.degreesOfFreedom).toBe(c.df);
  });

  test('profile limits to 1e-6', () => {
    const limits = c.profileCI95 as unknown as Record<string, [number, number] | undefined>;
    const k = order === 'free' ? undefined : rateCoefficientEstimate(fit);
    if (k && limits.k) {
      expect(relative(k.lower!, limits.k[0])).toBeLessThan(1e-6);
      expect(relative(k.upper!, limits.k[1])).toBeLessThan(1e-6);
    }
    if (limits.n) {
      const n = orderEstimate(fit);
      expect(relative(n.lower!, limits.n[0])).toBeLessThan(1e-6);
      expect(relative(n.upper!, limits.n[1])).toBeLessThan(1e-6);
    }
    if (order === 1) {
      // one to one: the half life's limits are those of k turned round
      const t = halfLifeEstimate(fit);
      expect(relative(t.lower!, Math.LN2 / limits.k![1])).toBeLessThan(1e-6);
      expect(relative(t.upper!, Math.LN2 / limits.k![0])).toBeLessThan(1e-6);
    }
  });
});
