/**
 * Runs that tell little: few readings, half a half life, a free endpoint. A fit may say that it cannot be
 * told; what it does tell must be finite, in order, and had without a failure inside.
 */
import { NotDetermined } from '../../../src/errors';
import type { Estimate } from '../../../src/estimate';
import { fitRateLaw } from '../../../src/order/fit';
import { simpleOrders } from '../../../src/order/orders';
import { halfLifeEstimate, orderEstimate, rateCoefficientEstimate } from '../../../src/order/profile';
import { pairReadings, type Series } from '../../../src/series/series';
import { simulatedRun } from '../../support/simulatedRun';

/** The estimates of every order and of a free one; those that cannot be told are left out. */
function estimatesOf(series: Series, endpoint: number | 'free'): Estimate[] {
  return [...simpleOrders, 'free' as const].flatMap((order) => {
    try {
      const fit = fitRateLaw(series, { order, endpoint });
      return order === 'free' ? [orderEstimate(fit)] : [rateCoefficientEstimate(fit), halfLifeEstimate(fit)];
    } catch (error) {
      if (error instanceof NotDetermined) return [];
      throw error;
    }
  });
}

const settings = simpleOrders.flatMap((order) =>
  ([0, 'free'] as const).flatMap((endpoint) => [0.5, 5].map((halfLives) => ({ order, endpoint, halfLives }))),
);

test.each(settings)(
  'order $order, $halfLives half lives, endpoint $endpoint',
  ({ order, endpoint, halfLives }) => {
    for (const noise of [0.003, 0.03]) {
      for (const seed of [1, 2]) {
        const { times, values } = simulatedRun({ order, halfLives, readings: 6, noise, seed, endpoint: 0.2 });
        const series = pairReadings(times, endpoint === 'free' ? values : values.map((y) => y - 0.2));
        for (const { value, standardUncertainty, lower, upper } of estimatesOf(series, endpoint)) {
          expect([value, standardUncertainty, lower ?? 0, upper ?? 0].every(Number.isFinite)).toBe(true);
          expect(lower ?? -Infinity).toBeLessThanOrEqual(value);
          expect(upper ?? Infinity).toBeGreaterThanOrEqual(value);
        }
      }
    }
  },
);
