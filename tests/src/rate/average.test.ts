import { InvalidInput, NotDetermined } from '../../../src/errors';
import { averageRate, readingScatter } from '../../../src/rate/average';
import { averageReplicates, pairReadings, type Series } from '../../../src/series/series';
import { mean, standardDeviation } from '../../support/compare';
import { normal } from '../../support/random';

const line = pairReadings([0, 1, 4, 10], [30, 28, 22, 10]); // 30 − 2t

test.each([
  [0, 10],
  [1, 4],
  [0.3, 7.9],
  [9, 2],
])('averageRate from %d to %d is exact on a straight line', (from, to) => {
  expect(averageRate(line, from, to, 1).value).toBeCloseTo(-2, 14);
  expect(averageRate(line, from, to).value).toBeCloseTo(2, 14);
  expect(averageRate(line, from, to, -2).value).toBeCloseTo(1, 14);
  expect(averageRate(line, from, to).standardUncertainty).toBeCloseTo(0, 14);
});

test('averageRate interpolates between readings and averages replicates, by hand', () => {
  const run = pairReadings([0, 10, 10, 20], [0, 4, 6, 20]); // means 0, 5, 20
  expect(averageRate(run, 0, 10).value).toBeCloseTo(0.5, 14);
  expect(averageRate(run, 5, 15).value).toBeCloseTo(1, 14); // (12.5 − 2.5)/10
  expect(averageRate(run, 10, 12).value).toBeCloseTo(1.5, 14);
});

test('averageRate: reversing the sign of the coefficient reverses the rate, and only that', () => {
  const run = pairReadings([0, 2, 3, 7, 9], [1, 3, 3.5, 8, 8.5]);
  const formed = averageRate(run, 1, 8, 1);
  const used = averageRate(run, 1, 8, -1);
  expect(used.value).toBe(-formed.value);
  expect(used.standardUncertainty).toBe(formed.standardUncertainty);
  expect([used.lower, used.upper]).toEqual([-formed.upper!, -formed.lower!]);
});

test('averageRate has no uncertainty with two times, and says so with nulls', () => {
  expect(averageRate(pairReadings([0, 10], [5, 3]), 0, 10)).toEqual({
    value: 0.2,
    standardUncertainty: null,
    lower: null,
    upper: null,
    degreesOfFreedom: 0,
  });
});

/** Straight line of slope 0.05 with noise of 0.3; replicates at the end, uneven spacing in the middle. */
const times = [0, 10, 20, 30, 40, 50, 65, 80, 90, 100, 110, 120, 120];
const noisy = (seed: number): Series => {
  const deviate = normal(seed);
  return pairReadings(
    times,
    times.map((t) => 2 + 0.05 * t + 0.3 * deviate()),
  );
};

test('averageRate: stated uncertainty, limits and degrees of freedom hold over 4000 simulated runs', () => {
  const estimates = Array.from({ length: 4000 }, (_, i) => averageRate(noisy(i + 1), 14, 120));
  const spread = standardDeviation(estimates.map(({ value }) => value));
  const variances = estimates.map(({ standardUncertainty }) => standardUncertainty! ** 2);
  expect(mean(estimates.map(({ value }) => value))).toBeCloseTo(0.05, 4);
  // y(14) takes 0.6 and 0.4 of two readings, y(120) half of each replicate: 0.36 + 0.16 + 0.25 + 0.25 readings' variances
  expect(Math.abs(mean(variances) / ((1.02 * 0.3 ** 2) / 106 ** 2) - 1)).toBeLessThan(0.03);
  // 4000 runs tell a variance to 2.2 %
  expect(Math.abs(mean(variances) / spread ** 2 - 1)).toBeLessThan(0.07);
  // a variance with ν degrees of freedom scatters by √(2/ν) of itself
  const freedom = 2 / (standardDeviation(variances) / mean(variances)) ** 2;
  expect(Math.abs(estimates[0].degreesOfFreedom / freedom - 1)).toBeLessThan(0.15);
  const held = estimates.filter(({ lower, upper }) => lower! <= 0.05 && 0.05 <= upper!).length / 4000;
  expect(held).toBeGreaterThan(0.935);
  expect(held).toBeLessThan(0.965);
});

test('readingScatter: 0.51 degrees of freedom a reading where spacing is even, by the correlations 2/3 and 1/6', () => {
  const even = (count: number) => {
    const t = Array.from({ length: count }, (_, i) => i);
    return readingScatter(
      averageReplicates(
        pairReadings(
          t,
          t.map((x) => x * x),
        ),
      ),
    );
  };
  // 1/(1 + 2(4/9 + 1/36)) = 18/35 of a long run
  expect(even(2002).degreesOfFreedom / 2000).toBeCloseTo(18 / 35, 3);
  // each reading of t² lies 1 below the line through its neighbours, whose scatter is √1.5 of a reading's
  expect(even(50).deviation).toBeCloseTo(1 / Math.sqrt(1.5), 12);
});

test.each<[string, () => unknown, InvalidInput | NotDetermined]>([
  [
    'an empty interval',
    () => averageRate(line, 4, 4),
    new InvalidInput('from and to must differ: both are 4'),
  ],
  ['no number', () => averageRate(line, NaN, 4), new InvalidInput('from must be a finite number: got NaN')],
  [
    'before the run',
    () => averageRate(line, -1, 4),
    new NotDetermined('from must lie within the run, 0 to 10: got -1'),
  ],
  [
    'after the run',
    () => averageRate(line, 0, 10.5),
    new NotDetermined('to must lie within the run, 0 to 10: got 10.5'),
  ],
  [
    'a single time',
    () => averageRate(pairReadings([3, 3], [1, 2]), 3, 4),
    new InvalidInput('times must differ: all 2 are 3'),
  ],
  [
    'a species that takes no part',
    () => averageRate(line, 0, 4, 0),
    new InvalidInput('stoichiometric number must not be 0: a species that takes no part has no rate'),
  ],
])('averageRate refuses %s in words', (_, call, error) => {
  expect(call).toThrow(error.constructor as new () => Error);
  expect(call).toThrow(error);
});
