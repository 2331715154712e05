/** What must hold for any run: changes of unit, the order of the rows, what uncertainties mean, which way is up. */
import { fitRateLaw, type RateLawFit, type RateLawOptions } from '../../../src/order/fit';
import { halfLifeEstimate, orderEstimate, rateCoefficientEstimate } from '../../../src/order/profile';
import { pairReadings } from '../../../src/series/series';
import { relative } from '../../support/compare';
import { shuffled } from '../../support/random';
import { simulatedRun } from '../../support/simulatedRun';

const { times, values } = simulatedRun({ order: 1.5, halfLives: 4, readings: 16, noise: 0.01, seed: 3 });
const fitted = (t: readonly number[], y: readonly number[], options: RateLawOptions): RateLawFit =>
  fitRateLaw(pairReadings(t, y), options);

const orders = [0, 0.5, 1, 1.5, 2, 3];
const endpoints: (number | 'free')[] = [0, 'free'];
const settings = orders.flatMap((order) => endpoints.map((endpoint) => ({ order, endpoint })));

test.each(settings)(
  'order $order, endpoint $endpoint: k scales as (reading unit)¹⁻ⁿ per time unit, and so do its limits',
  ({ order, endpoint }) => {
    const own = rateCoefficientEstimate(fitted(times, values, { order, endpoint }));
    const other = rateCoefficientEstimate(
      fitted(
        times.map((t) => 60 * t),
        values.map((y) => 1000 * y),
        { order, endpoint },
      ),
    );
    const factor = 1000 ** (1 - order) / 60;
    expect(relative(other.value / own.value, factor)).toBeLessThan(1e-7);
    expect(relative(other.standardUncertainty! / own.standardUncertainty!, factor)).toBeLessThan(1e-6);
    for (const side of ['lower', 'upper'] as const) {
      if (own[side] === null) expect(other[side]).toBeNull();
      else expect(relative(other[side]! / own[side], factor)).toBeLessThan(1e-6);
    }
  },
);

test('a free order has no unit: it stays, and the half life scales with the time alone', () => {
  const own = fitted(times, values, { order: 'free' });
  const other = fitted(
    times.map((t) => t / 3600),
    values.map((y) => 1e-3 * y),
    { order: 'free' },
  );
  expect(other.order).toBeCloseTo(own.order, 8);
  expect(relative(orderEstimate(other).upper!, orderEstimate(own).upper!)).toBeLessThan(1e-7);
  expect(relative(other.halfLife * 3600, own.halfLife)).toBeLessThan(1e-7);
});

test.each(settings)(
  'order $order, endpoint $endpoint: the order of the rows and the zero of time do not matter',
  ({ order, endpoint }) => {
    const own = fitted(times, values, { order, endpoint });
    const rows = shuffled(
      times.map((_, i) => i),
      8,
    );
    const mixed = fitted(
      rows.map((i) => times[i]),
      rows.map((i) => values[i]),
      { order, endpoint },
    );
    expect(mixed.rateCoefficient).toBe(own.rateCoefficient);
    const later = fitted(
      times.map((t) => t + 1000),
      values,
      { order, endpoint },
    );
    expect(relative(later.rateCoefficient, own.rateCoefficient)).toBeLessThan(1e-8);
    expect(relative(later.halfLife, own.halfLife)).toBeLessThan(1e-8);
  },
);

test.each(settings)(
  'order $order, endpoint $endpoint: uncertainties count in proportion, equal ones not at all',
  ({ order, endpoint }) => {
    const uneven = Float64Array.from(values, (y) => 0.01 + 0.02 * Math.abs(y));
    const own = fitted(times, values, { order, endpoint, uncertainties: uneven });
    const scaled = fitted(times, values, { order, endpoint, uncertainties: uneven.map((u) => 250 * u) });
    expect(relative(scaled.rateCoefficient, own.rateCoefficient)).toBeLessThan(1e-8);
    expect(
      relative(scaled.standardUncertainties.rateCoefficient!, own.standardUncertainties.rateCoefficient!),
    ).toBeLessThan(1e-6);

    const plain = fitted(times, values, { order, endpoint });
    const equal = fitted(times, values, {
      order,
      endpoint,
      uncertainties: new Float64Array(times.length).fill(0.3),
    });
    expect(relative(equal.rateCoefficient, plain.rateCoefficient)).toBeLessThan(1e-8);
  },
);

test.each(settings)(
  'order $order, endpoint $endpoint: a run turned upside down has the same k and half life',
  ({ order, endpoint }) => {
    const own = fitted(times, values, { order, endpoint });
    const turned = fitted(
      times,
      values.map((y) => 7 - y),
      { order, endpoint: endpoint === 'free' ? 'free' : 7 },
    );
    expect(relative(turned.rateCoefficient, own.rateCoefficient)).toBeLessThan(1e-8);
    expect(relative(turned.halfLife, own.halfLife)).toBeLessThan(1e-8);
    expect(turned.start).toBeCloseTo(7 - own.start, 8);
  },
);

test.each(settings)(
  'order $order, endpoint $endpoint: limits hold the estimate, and those of half life and k turn round at order 1',
  ({ order, endpoint }) => {
    const fit = fitted(times, values, { order, endpoint });
    for (const { lower, upper, value } of [rateCoefficientEstimate(fit), halfLifeEstimate(fit)]) {
      if (lower !== null) expect(lower).toBeLessThan(value);
      if (upper !== null) expect(upper).toBeGreaterThan(value);
    }
    if (order !== 1) return;
    expect(
      relative(halfLifeEstimate(fit).upper! * rateCoefficientEstimate(fit).lower!, Math.LN2),
    ).toBeLessThan(1e-9);
  },
);

test('profile limits of the half life: where they are put, the sum of squares has risen by F/ν', () => {
  const fit = fitted(times, values, { order: 2 });
  const { lower, upper } = halfLifeEstimate(fit);
  for (const limit of [lower!, upper!]) {
    // order 2, endpoint 0: κ = 1/t½; the amplitude by linear least squares, done here
    const shape = times.map((t) => 1 / (1 + t / limit));
    const amplitude =
      shape.reduce((sum, g, i) => sum + g * values[i], 0) / shape.reduce((sum, g) => sum + g * g, 0);
    const squares = shape.reduce((sum, g, i) => sum + (values[i] - amplitude * g) ** 2, 0);
    // t(0.975, 14) = 2.144787 (NIST/SEMATECH e-Handbook, 1.3.6.7.2)
    expect(squares / fit.residualSumOfSquares).toBeCloseTo(1 + 2.1447866879169273 ** 2 / 14, 7);
  }
});

test('readings on the curve to the last digit leave limits no room, and as many parameters as readings leave none', () => {
  const clean = simulatedRun({ order: 1, halfLives: 3, readings: 8, noise: 0, seed: 1 });
  const { value, lower, upper } = rateCoefficientEstimate(fitted(clean.times, clean.values, { order: 1 }));
  expect([lower, upper]).toEqual([value, value]);
  const exact = rateCoefficientEstimate(fitted([0, 1, 3], [9, 4, 2], { order: 1, endpoint: 'free' }));
  expect(exact).toMatchObject({ standardUncertainty: null, lower: null, upper: null, degreesOfFreedom: 0 });
});
