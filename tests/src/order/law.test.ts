import reference from '../../reference/integrated-law.json';
import { InvalidInput } from '../../../src/errors';
import { halfLife } from '../../../src/order/halfLife';
import {
  reducedHalfLife,
  reducedTimeTo,
  shareConverted,
  shareLeft,
  shareOrderSlope,
  shareSlope,
} from '../../../src/order/law';
import { relative } from '../../support/compare';

const near = (got: number, wanted: number, tolerance: number): void =>
  expect(relative(got, wanted)).toBeLessThan(tolerance);

test.each(reference.cases)(
  'share left at n = %d, s = %d, with its slopes, meets fifty-digit arithmetic',
  (n, s, left, converted, slope, orderSlope) => {
    // φ = exp(ln φ) loses as many digits as ln φ has before its point
    const digits = 1e-15 * Math.max(2, Math.abs(Math.log(left)));
    near(shareLeft(s, n), left, digits);
    near(shareConverted(s, n), converted, 1e-14);
    near(shareSlope(s, n, left), slope, 1e-14);
    near(shareOrderSlope(s, n, left), orderSlope, 1e-11);
  },
);

test.each(reference.times)('reduced times at n = %d: half at %d, an eighth at %d', (n, half, eighth) => {
  near(reducedHalfLife(n), half, 1e-14);
  near(reducedTimeTo(1 / 2, n), half, 1e-14);
  near(reducedTimeTo(1 / 8, n), eighth, 1e-14);
});

const orders = [-1, 0, 0.5, 0.999999, 1, 1.000001, 1.5, 2, 3, 6];

test.each(orders)('order %d: nothing has gone at the start, and half has gone after the half life', (n) => {
  expect(shareLeft(0, n)).toBe(1);
  expect(shareConverted(0, n)).toBe(0);
  near(shareLeft(reducedHalfLife(n), n), 0.5, 1e-14);
  for (const share of [0.9, 0.3, 0.01]) near(shareLeft(reducedTimeTo(share, n), n), share, 1e-13);
});

test.each([-1, 0, 0.5, 0.9])('below order 1 (n = %d) all is gone at s = 1/(1 − n), and stays so', (n) => {
  for (const s of [1 / (1 - n) + 1e-9, 5 / (1 - n), 1e9]) {
    expect(shareLeft(s, n)).toBe(0);
    expect(shareConverted(s, n)).toBe(1);
    expect(shareSlope(s, n, 0)).toBe(-0 + 0);
    expect(shareOrderSlope(s, n, 0)).toBe(0);
  }
});

test('the law is smooth through order 1: first differences are those of the slope', () => {
  for (const s of [0.1, 1, 6]) {
    for (const step of [1e-3, 1e-6, 1e-9]) {
      const difference = (shareLeft(s, 1 + step) - shareLeft(s, 1 - step)) / (2 * step);
      // −dφ/dn at n = 1 is −s² exp(−s)/2, from the second term of ln(1 + u)/u
      near(difference, (s * s * Math.exp(-s)) / 2, 1e-5 + 1e-15 / step);
    }
  }
});

// t½ as tables print it, for k = 0.02 and c₀ = 0.4: c₀/2k, (2 − √2)√c₀/k, ln 2/k, 2(√2 − 1)/(k√c₀), 1/(k c₀), 3/(2k c₀²)
test.each([
  [0, 10],
  [0.5, ((2 - Math.SQRT2) * Math.sqrt(0.4)) / 0.02],
  [1, Math.LN2 / 0.02],
  [1.5, (2 * (Math.SQRT2 - 1)) / (0.02 * Math.sqrt(0.4))],
  [2, 125],
  [3, 468.75],
])('halfLife of order %d is %d, as tables have it', (n, expected) =>
  near(halfLife(0.02, n, 0.4), expected, 1e-14),
);

test('halfLife: halving the start lengthens it by 2ⁿ⁻¹; doubling k halves it', () => {
  for (const n of orders) {
    near(halfLife(0.02, n, 0.2) / halfLife(0.02, n, 0.4), 2 ** (n - 1), 1e-13);
    near(halfLife(0.02, n, 0.4) / halfLife(0.04, n, 0.4), 2, 1e-14);
  }
});

test('halfLife is continuous through order 1 to the last digits', () => {
  for (const step of [1e-6, 1e-9, 1e-12, 1e-15]) {
    // relative slope at n = 1: ln 2/2 − ln c₀
    near(halfLife(3, 1 + step, 1) / halfLife(3, 1, 1), 1 + (step * Math.LN2) / 2, step ** 2 + 4e-16);
  }
});

test.each<[string, () => number, string]>([
  ['no coefficient', () => halfLife(0, 1, 1), 'rate coefficient must be above 0: got 0'],
  ['no start', () => halfLife(1, 1, -1), 'initial concentration must be above 0: got -1'],
  ['no order', () => halfLife(1, NaN, 1), 'order must be a finite number: got NaN'],
])('halfLife refuses %s', (_, call, message) => expect(call).toThrow(new InvalidInput(message)));
