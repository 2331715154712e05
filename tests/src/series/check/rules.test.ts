/** The rules behind the findings, each against something that does not come from them. */
import { compareOrders } from '../../../../src/order/orders';
import { fitRateLaw } from '../../../../src/order/fit';
import { averageRate } from '../../../../src/rate/average';
import { tangentRate } from '../../../../src/rate/tangent';
import { findings } from '../../../../src/series/check/findings';
import { lastFigure, limitFor, scatterOf, smallestStep } from '../../../../src/series/check/scatter';
import { isCensored, isNumberAsText } from '../../../../src/series/check/textKind';
import { rowsOutOfOrder } from '../../../../src/series/check/unsorted';
import { pairReadings } from '../../../../src/series/series';
import { normal, uniform } from '../../../support/invented';

test('scatterOf: finds the standard deviation that was put in, on a curve, even with a reading in twenty spoilt', () => {
  let sum = 0;
  for (let seed = 1; seed <= 50; seed++) {
    const deviate = normal(seed);
    const times = Array.from({ length: 120 }, (_, i) => i);
    const values = times.map((t) => Math.exp(-t / 50) + 0.01 * deviate() + (t % 20 === 3 ? 0.5 : 0));
    const clean = times.map((t, i) => values[i] - (t % 20 === 3 ? 0.5 : 0));
    sum += scatterOf(pairReadings(times, clean));
    expect(scatterOf(pairReadings(times, values))).toBeLessThan(0.05); // the spoilt ones alone scatter by 0.11
  }
  expect(sum / 50 / 0.01).toBeGreaterThan(0.95);
  expect(sum / 50 / 0.01).toBeLessThan(1.05);
});

test('limitFor: never below 4.5, and higher the fewer readings settle the scatter', () => {
  expect(limitFor(10_000)).toBeCloseTo(5, 0); // normal: 1 − 0.005/10,000 lies at 4.89
  for (let count = 8; count < 200; count++)
    expect(limitFor(count)).toBeGreaterThanOrEqual(limitFor(count + 1) - 1e-9);
});

test('smallestStep and lastFigure: of readings to 0.02', () => {
  expect(smallestStep([0.1, 0.12, 0.12, 0.3])).toBeCloseTo(0.02, 12);
  expect(smallestStep([0.3, 0.3])).toBe(0);
  expect(lastFigure([0.1, 0.12, 3])).toBeCloseTo(0.01, 15);
  expect(lastFigure([1e-7, 3])).toBeCloseTo(1e-7, 20);
});

/** The fewest rows that leave the rest in order, by trying all subsets. */
function fewestOutOfOrder(times: readonly number[]): number {
  let most = 0;
  for (let chosen = 0; chosen < 2 ** times.length; chosen++) {
    const kept = times.filter((_, i) => (chosen >> i) & 1);
    if (kept.every((time, i) => i === 0 || kept[i - 1] <= time)) most = Math.max(most, kept.length);
  }
  return times.length - most;
}

test('rowsOutOfOrder: as few as any choice of rows could leave, and the rest is in order', () => {
  for (let seed = 1; seed <= 60; seed++) {
    const next = uniform(seed);
    const times = Array.from({ length: 9 }, () => Math.floor(8 * next()));
    const out = rowsOutOfOrder(times);
    const kept = times.filter((_, row) => !out.includes(row));
    expect(out.length).toBe(fewestOutOfOrder(times));
    expect([...kept].sort((a, b) => a - b)).toEqual(kept);
  }
  expect(rowsOutOfOrder([0, 10, 200, null, 30, 40])).toEqual([2]);
});

test('a drift is told from the tail of order 3, whose later half has 0.44 of the slope of the earlier', () => {
  const left = (s: number): number => (1 + 2 * s) ** -0.5; // integrated law of order 3
  const onset = 1e6;
  const change = (from: number, to: number): number => left(from * onset) - left(to * onset);
  expect(change(2, 3) / change(1, 2)).toBeCloseTo(0.443, 3);
});

test.each(['12,5', ' 3.1 ', '1,234', '1e-3', '−4', '3.1 mL', '0.45 AU', '20 °C', '0:04:30', '12:30', "'7"])(
  'isNumberAsText: "%s" is a number to a person',
  (text) => expect([isNumberAsText(text), isCensored(text)]).toEqual([true, false]),
);

test.each(['<0.01', '> 3', '≤0,5', 'n.d.', 'ND', '<LOD', 'below detection'])(
  'isCensored: "%s" lies beyond a limit',
  (text) => expect([isNumberAsText(text), isCensored(text)]).toEqual([false, true]),
);

test.each(['n/a', 'A (420 nm)', 't / s', 'run 3', '-', 'bubble at 3'])('"%s" is only words', (text) =>
  expect([isNumberAsText(text), isCensored(text)]).toEqual([false, false]),
);

describe('too few readings: the methods themselves agree on what they need', () => {
  const series = (count: number) => {
    const times = Array.from({ length: count }, (_, i) => i);
    return pairReadings(
      times,
      times.map((t) => 2 ** -t + 0.01 * ((t * 7) % 3)),
    );
  };
  const works =
    (method: (count: number) => unknown) =>
    (count: number): boolean => {
      try {
        const result = method(count);
        return result !== null && result !== undefined;
      } catch {
        return false;
      }
    };
  const methods: Readonly<Record<string, (count: number) => unknown>> = {
    'an average rate': (count) => averageRate(series(count), 0, 1),
    'a tangent': (count) => tangentRate(series(count), 0),
    'the uncertainty of a tangent': (count) => tangentRate(series(count), 0).standardUncertainty,
    'the uncertainty of a rate coefficient': (count) =>
      fitRateLaw(series(count), { order: 1 }).standardUncertainties.rateCoefficient,
    'the uncertainty of a rate coefficient with a free end': (count) =>
      fitRateLaw(series(count), { order: 1, endpoint: 'free' }).standardUncertainties.rateCoefficient,
    'weighing the orders': (count) => compareOrders(series(count), {}).rows[2].weight,
    'weighing the orders with a free end': (count) =>
      compareOrders(series(count), { endpoint: 'free' }).rows[2].weight,
  };

  test.each([1, 2, 3, 4, 5])('%i different times', (count) => {
    const { times, values } = series(count);
    const found = findings({ times: [...times], values: [...values] }).find(
      ({ kind }) => kind === 'too few',
    )!;
    const said = Object.keys(methods).filter((method) =>
      new RegExp(`(^|, | and )${method} needs`).test(found.meaning),
    );
    expect(said).toEqual(Object.keys(methods).filter((method) => !works(methods[method])(count)));
  });

  test('six are enough for all', () => {
    expect(Object.values(methods).every((method) => works(method)(6))).toBe(true);
  });
});
