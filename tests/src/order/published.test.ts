import published from '../../reference/published-runs.json';
import { compareOrders } from '../../../src/order/orders';
import { fitRateLaw } from '../../../src/order/fit';
import { halfLife } from '../../../src/order/halfLife';
import { rateCoefficientEstimate } from '../../../src/order/profile';
import { averageRate } from '../../../src/rate/average';
import { pairReadings } from '../../../src/series/series';

describe.each(published.cases)('$what', ({ times, values, published: printed }) => {
  const series = pairReadings(times, values);
  const fit = fitRateLaw(series, { order: printed.order });

  test('the rate coefficient is that printed, within its last digit and the limits; so is the half life', () => {
    expect(Math.abs(fit.rateCoefficient - printed.rateCoefficient)).toBeLessThan(printed.lastDigit);
    const { lower, upper } = rateCoefficientEstimate(fit);
    expect(lower! - printed.lastDigit / 2).toBeLessThan(printed.rateCoefficient);
    expect(upper! + printed.lastDigit / 2).toBeGreaterThan(printed.rateCoefficient);
    if (printed.halfLife !== null) expect(fit.halfLife).toBeCloseTo(printed.halfLife, 10);
  });

  test('the order printed is the one that fits best', () => {
    const best = compareOrders(series, {}).rows.filter(({ weight }) => weight !== null && weight > 0.99);
    expect(best.map(({ order }) => order)).toEqual([printed.order]);
  });
});

test('average rates of the peroxide run as printed: 0.0833 and 0.010 mol L⁻¹ h⁻¹', () => {
  const [{ times, values }] = published.cases;
  const series = pairReadings(times, values);
  expect(averageRate(series, 0, 6).value).toBeCloseTo(0.0833, 4);
  expect(averageRate(series, 18, 24).value).toBeCloseTo(0.01, 3);
});

test('halfLife(0.0576, 2, 0.2) is the 86.8 min printed for butadiene', () => {
  expect(halfLife(0.0576, 2, 0.2)).toBeCloseTo(86.8, 1); // OpenStax, Chemistry 2e, 12.4
});
