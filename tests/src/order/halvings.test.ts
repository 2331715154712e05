import { successiveHalfLives } from '../../../src/order/halvings';
import { pairReadings } from '../../../src/series/series';
import { simulatedRun } from '../../support/simulatedRun';

const run = (order: number, readings: number) => {
  const { times, values } = simulatedRun({ order, halfLives: 3.2, readings, noise: 0, seed: 1 });
  return pairReadings(times, values);
};

test('successiveHalfLives of order 1 are exact between any two readings', () => {
  successiveHalfLives(run(1, 7)).forEach((halfLife) => expect(halfLife).toBeCloseTo(Math.LN2, 12));
});

// each half life is 2ⁿ⁻¹ times the one before (Atkins, de Paula and Keeler, Physical Chemistry, table 17B.3)
test.each([0, 0.5, 1.5, 2, 3])('successiveHalfLives of order %d grow by 2^(n − 1)', (order) => {
  const [first, second, third] = successiveHalfLives(run(order, 400));
  expect(second / first).toBeCloseTo(2 ** (order - 1), 2);
  expect(third / second).toBeCloseTo(2 ** (order - 1), 2);
});

test('a rising column towards its end has the half lives of the falling one', () => {
  const { times, values } = simulatedRun({ order: 2, halfLives: 3, readings: 20, noise: 0, seed: 1 });
  const falling = successiveHalfLives(pairReadings(times, values));
  const rising = successiveHalfLives(
    pairReadings(
      times,
      values.map((value) => 5 - value),
    ),
    5,
  );
  rising.forEach((halfLife, i) => expect(halfLife).toBeCloseTo(falling[i], 10));
});

test('a reading beyond the end is met by a straight line', () => {
  expect(successiveHalfLives(pairReadings([0, 1, 2], [1, 0.75, -0.25]))[0]).toBeCloseTo(1.25, 12);
});

test('a reading at or past the end ends the reckoning: no shower of tiny half lives', () => {
  expect(successiveHalfLives(pairReadings([0, 1, 2, 3, 4], [8, 4, 2, -0.1, 0.2]))).toHaveLength(3);
  expect(successiveHalfLives(pairReadings([0, 1, 2], [8, 4, 0]))).toHaveLength(2);
});

test('what successiveHalfLives refuses, in words', () => {
  expect(() => successiveHalfLives(pairReadings([0, 1, 2], [8, 7, 6]))).toThrow(
    'a half life needs a run down to half: 75 % is left at least',
  );
  expect(() => successiveHalfLives(pairReadings([0, 1, 2], [1, 2, 3]))).toThrow(
    'a rising column needs its end: give endpoint a number',
  );
  expect(() => successiveHalfLives(pairReadings([0, 1, 2], [3, 2, 1]), 3)).toThrow(
    'endpoint must differ from the first reading: both are 3',
  );
  expect(() => successiveHalfLives(pairReadings([1, 1], [3, 2]))).toThrow('times must differ');
});
