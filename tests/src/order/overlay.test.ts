/** Variable time normalisation: runs made up from integrated laws must fall on one curve at the true order. */
import { normalisedTimes } from '../../../src/order/normalisedTime';
import { overlayExponent, type OverlayRun } from '../../../src/order/overlay';
import { pairReadings } from '../../../src/series/series';
import { normal } from '../../support/random';
import { simulatedRun } from '../../support/simulatedRun';

/** A + … → P of the given order in A, from the initial concentration: c = c₀ φ(k c₀ⁿ⁻¹ t). */
function runFrom(initial: number, order: number, noise: number, seed: number): OverlayRun {
  const unit = simulatedRun({ order, halfLives: 2.5, readings: 16, noise: 0, seed });
  const deviate = normal(seed);
  const times = unit.times.map((time) => time * initial ** (1 - order));
  const left = unit.values.map((share) => initial * share);
  const product = left.map((c) => initial - c + noise * deviate());
  return { product: pairReadings(times, product), reactant: pairReadings(times, left) };
}

test('normalisedTimes: with exponent 0 time itself, with 1 the area under the concentration', () => {
  const series = pairReadings([3, 5, 9], [4, 2, 1]);
  expect([...normalisedTimes(series, 0)]).toEqual([0, 2, 6]);
  // trapezia: 2 × 3 and 4 × 1.5
  expect([...normalisedTimes(series, 1)]).toEqual([0, 6, 12]);
});

test('normalisedTimes on fine readings is the integral: ∫exp(−2t)dt', () => {
  const times = Array.from({ length: 2001 }, (_, i) => i / 1000);
  const series = pairReadings(
    times,
    times.map((t) => Math.exp(-t)),
  );
  expect(normalisedTimes(series, 2)[2000]).toBeCloseTo((1 - Math.exp(-4)) / 2, 6);
});

test.each([0.5, 1, 1.5, 2])('overlayExponent finds order %d from exact runs within 0.02', (order) => {
  const found = overlayExponent(runFrom(1, order, 0, 1), runFrom(0.6, order, 0, 2));
  expect(Math.abs(found.value - order)).toBeLessThan(0.02);
});

test('overlayExponent: 95 % limits hold the true order in about 95 of 100 noisy pairs, and u is of their size', () => {
  let held = 0;
  const errors: number[] = [];
  let uncertainty = 0;
  for (let seed = 1; seed <= 100; seed++) {
    const found = overlayExponent(runFrom(1, 1, 0.01, seed), runFrom(0.5, 1, 0.01, seed + 500));
    if (found.lower! <= 1 && 1 <= found.upper!) held++;
    errors.push(found.value - 1);
    uncertainty += found.standardUncertainty! / 100;
  }
  expect(held).toBeGreaterThanOrEqual(88);
  const spread = Math.sqrt(errors.reduce((sum, e) => sum + e * e, 0) / errors.length);
  expect(uncertainty / spread).toBeGreaterThan(0.7);
  expect(uncertainty / spread).toBeLessThan(1.4);
});

test('what overlay and normalised time refuse, in words', () => {
  const same = runFrom(1, 1, 0.01, 3);
  const again = runFrom(1, 1, 0.01, 4);
  expect(() => overlayExponent(same, again)).toThrow(/^the exponent cannot be told/);
  expect(() => normalisedTimes(pairReadings([0, 1, 2], [1, 0, 0.5]), -1)).toThrow(
    'values must be above 0 for the exponent -1: row 2 (0)',
  );
  expect(() => normalisedTimes(pairReadings([0, 1, 2], [1, -0.1, 0.5]), 0.5)).toThrow(
    'values must be 0 or more for the exponent 0.5: row 2 (-0.1)',
  );
  expect(() => normalisedTimes(pairReadings([0, 1], [1, 1]), NaN)).toThrow(
    'exponent must be a finite number: got NaN',
  );
});
