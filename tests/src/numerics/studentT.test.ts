import quantiles from '../../reference/quantiles.json';
import { studentQuantile, studentTail } from '../../../src/numerics/studentT';

test.each(quantiles.cases)(
  'studentQuantile($p, $df) meets fifty-digit arithmetic to 1e-12',
  ({ p, df, quantile }) => {
    expect(Math.abs(studentQuantile(p, df) / quantile - 1)).toBeLessThan(1e-12);
  },
);

test('studentQuantile(0.975, ∞) is the normal quantile (ISO 2854: 1.959964)', () => {
  expect(studentQuantile(0.975, Infinity)).toBeCloseTo(1.959963984540054, 12); // Abramowitz and Stegun, table 26.1
});

// mpmath 1.3.0 at 30 digits: √2 erfinv(2p − 1) of the given double p
test.each([
  [0.6, 0.25334710313579974132],
  [0.975, 1.9599639845400538556],
  [0.995, 2.5758293035489004539],
  [0.9999, 3.7190164854557083867],
])('studentQuantile(%d, ∞) is the normal quantile to 13 digits', (p, quantile) => {
  expect(Math.abs(studentQuantile(p, Infinity) / quantile - 1)).toBeLessThan(1e-13);
  expect(Math.abs(studentQuantile(1 - p, Infinity) / -quantile - 1)).toBeLessThan(1e-11);
});

test('studentTail: one degree of freedom is the Cauchy distribution', () => {
  for (const t of [0.1, 1, 12, 1e6]) {
    expect(studentTail(t, 1) / (Math.atan2(1, t) / Math.PI)).toBeCloseTo(1, 13);
  }
});

test('studentQuantile(1.2, 3) says the rule and the value', () => {
  expect(() => studentQuantile(1.2, 3)).toThrow('probability must be above 0 and below 1: got 1.2');
});
