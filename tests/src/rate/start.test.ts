import localPolynomial from '../../reference/local-polynomial.json';
import { earlyReadings, startRateOf } from '../../../src/rate/start';
import { pairReadings } from '../../../src/series/series';
import { mean, relative } from '../../support/compare';
import { simulatedRun } from '../../support/simulatedRun';

interface OneSided {
  readonly id: string;
  readonly dataset: 'L1' | 'L2' | 'L3';
  readonly k: number;
  readonly slope: number[];
  readonly se: number[];
}

const oneSided = (localPolynomial.cases as unknown as OneSided[]).filter(({ id }) =>
  /-E_initial_k\d+_deg2/.test(id),
);

test.each(oneSided)(
  'startRateOf is the slope of the parabola through the first readings: $id',
  ({ dataset, k, slope, se }) => {
    const { t, y } = (localPolynomial.data as unknown as Record<string, { t: number[]; y: number[] }>)[
      dataset
    ];
    const found = startRateOf(pairReadings(t.slice(0, k), y.slice(0, k)), {
      share: 1,
      stoichiometricNumber: 1,
    });
    expect(relative(found.value, slope[0])).toBeLessThan(1e-10);
    expect(relative(found.standardUncertainty!, se[0])).toBeLessThan(1e-9);
  },
);

test('earlyReadings: up to a fifth of the change, five at least, replicates together', () => {
  const times = Array.from({ length: 41 }, (_, i) => i);
  const line = pairReadings(
    times,
    times.map((t) => 40 - t),
  );
  // to 20 % of the mean of the last three, 1: 39 × 0.2 = 7.8
  expect(earlyReadings(line, 0.2)).toBe(8);
  expect(earlyReadings(line, 0.01)).toBe(5);
  expect(earlyReadings(pairReadings([0, 0, 1, 1, 2, 2, 3], [9, 9, 5, 5, 2, 2, 1]), 0.2)).toBe(6);
});

test('startRateOf is near the true initial rate of many noisy runs, with limits that hold it', () => {
  const found = Array.from({ length: 200 }, (_, i) => {
    const { times, values } = simulatedRun({
      order: 1,
      halfLives: 3,
      readings: 41,
      noise: 0.005,
      seed: i + 1,
    });
    return startRateOf(pairReadings(times, values));
  });
  expect(Math.abs(mean(found.map(({ value }) => value)) - 1)).toBeLessThan(0.02);
  const held = found.filter(({ lower, upper }) => lower! <= 1 && 1 <= upper!).length;
  expect(held).toBeGreaterThan(180);
});

test('what startRateOf refuses, in words', () => {
  const series = pairReadings([0, 1, 2, 3], [4, 3, 2, 1]);
  expect(() => startRateOf(series, { share: 0 })).toThrow('share must be above 0 and not above 1: got 0');
  expect(() => startRateOf(series, { share: 1.2 })).toThrow('share must be above 0 and not above 1: got 1.2');
  expect(() => startRateOf(pairReadings([0, 1], [2, 1]))).toThrow(
    'an initial rate needs 3 different times: got 2',
  );
});
