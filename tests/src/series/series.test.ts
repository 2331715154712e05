import { InvalidInput, NotDetermined } from '../../../src/errors';
import {
  averageReplicates,
  pairReadings,
  requireDistinctTimes,
  stoichiometricNumberFor,
  trend,
} from '../../../src/series/series';
import { shuffled } from '../../support/random';

test('pairReadings skips pairs with a gap on either side and remembers where the others stood', () => {
  const { times, values, places, distinctTimes } = pairReadings([0, 10, null, 30, 40], [5, null, 3, 2, 1]);
  expect([...times]).toEqual([0, 30, 40]);
  expect([...values]).toEqual([5, 2, 1]);
  expect([...places]).toEqual([0, 3, 4]);
  expect(distinctTimes).toBe(3);
});

test('pairReadings puts any order of rows into order of time, replicates as they came', () => {
  const { times, values, places, distinctTimes } = pairReadings([20, 0, 20, 10], [1, 2, 3, 4]);
  expect([...times]).toEqual([0, 10, 20, 20]);
  expect([...values]).toEqual([2, 4, 1, 3]);
  expect([...places]).toEqual([1, 3, 0, 2]);
  expect(distinctTimes).toBe(3);

  const rows = shuffled(
    Array.from({ length: 200 }, (_, i) => i - 50),
    3,
  );
  const sorted = pairReadings(
    rows,
    rows.map((t) => 2 * t),
  );
  expect([...sorted.times]).toEqual([...rows].sort((a, b) => a - b));
  expect([...sorted.values]).toEqual([...sorted.times].map((t) => 2 * t));
});

test('averageReplicates: each time once, with mean and count', () => {
  const averaged = averageReplicates(pairReadings([5, 0, 5, 5, 9], [1, 7, 2, 6, -1]));
  expect([...averaged.times]).toEqual([0, 5, 9]);
  expect([...averaged.values]).toEqual([7, 3, -1]);
  expect([...averaged.counts]).toEqual([1, 3, 1]);
});

test('trend is the sign of the slope through all points, whatever the ends say', () => {
  expect(trend(pairReadings([0, 1, 2, 3], [10, 6, 3, 1]))).toBe(-1);
  expect(trend(pairReadings([0, 1, 2, 3, 4], [0, -9, 3, 6, -1]))).toBe(1); // slope 13/10
  expect(trend(pairReadings([0, 1, 2], [1, 5, 1]))).toBe(0);
  // far from 0, where a sum of products would lose the slope
  expect(trend(pairReadings([1e9, 1e9 + 1, 1e9 + 2], [1e8, 1e8 - 1e-6, 1e8 - 2e-6]))).toBe(-1);
});

test('stoichiometricNumberFor: as given, else by the trend', () => {
  const falling = pairReadings([0, 1, 2], [3, 2, 1]);
  const level = pairReadings([0, 1], [2, 2]);
  expect(stoichiometricNumberFor(falling)).toBe(-1);
  expect(stoichiometricNumberFor(level)).toBe(1);
  expect(stoichiometricNumberFor(falling, 2)).toBe(2);
  expect(() => stoichiometricNumberFor(falling, 0)).toThrow(InvalidInput);
});

test.each<[string, () => unknown, InvalidInput | NotDetermined]>([
  [
    'different lengths',
    () => pairReadings([1, 2, 3], [1, 2]),
    new InvalidInput('times and values must be of one length: got 3 times and 2 values'),
  ],
  [
    'nothing but gaps',
    () => pairReadings([1, null], [null, 4]),
    new InvalidInput('times and values must hold numbers: no time and reading make a pair'),
  ],
  [
    'one pair',
    () => requireDistinctTimes(pairReadings([1], [1]), 2, 'a fit'),
    new InvalidInput('times must differ: only one pair was given'),
  ],
  [
    'one time',
    () => requireDistinctTimes(pairReadings([60, 60, 60], [1, 2, 3]), 2, 'a fit'),
    new InvalidInput('times must differ: all 3 are 60'),
  ],
  [
    'too few times',
    () => requireDistinctTimes(pairReadings([0, 60, 60], [1, 2, 3]), 3, 'a tangent of degree 2'),
    new NotDetermined('a tangent of degree 2 needs 3 different times: got 2'),
  ],
])('refuses %s in words', (_, call, error) => {
  expect(call).toThrow(error.constructor as new () => Error);
  expect(call).toThrow(error);
});
