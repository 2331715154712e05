import { InvalidInput, NotDetermined } from '../../../src/errors';
import { halfLife } from '../../../src/order/halfLife';
import { shareConverted } from '../../../src/order/law';
import { timeToConversion } from '../../../src/temperature/timeTo';
import { relative } from '../../support/compare';

const orders = [-1, 0, 0.5, 1 - 1e-9, 1, 1 + 1e-9, 1.5, 2, 3, 7];
const fractions = [1e-9, 0.01, 0.2, 0.5, 0.9, 0.999];

describe.each(orders)('order %d', (order) => {
  test.each(fractions)(
    'after the time to %d that fraction is converted, by the integrated law',
    (fraction) => {
      const [coefficient, initial] = [0.037, 0.42];
      const time = timeToConversion({ fraction, coefficient, order, initial });
      const reduced = coefficient * initial ** (order - 1) * time;
      expect(relative(shareConverted(reduced, order), fraction)).toBeLessThan(1e-11);
    },
  );

  test('half is the half life', () => {
    const time = timeToConversion({ fraction: 0.5, coefficient: 0.037, order, initial: 0.42 });
    expect(relative(time, halfLife(0.037, order, 0.42))).toBeLessThan(1e-14);
  });
});

// the textbook laws of orders 0, 1 and 2, written out (Atkins, Physical Chemistry, 12th ed., table 17B.3)
test.each([
  [0, (x: number, k: number, c: number) => (x * c) / k],
  [1, (x: number, k: number) => -Math.log(1 - x) / k],
  [2, (x: number, k: number, c: number) => x / (1 - x) / (k * c)],
])('order %d as tables print it', (order, printed) => {
  const time = timeToConversion({ fraction: 0.8, coefficient: 0.0092, order, initial: 0.2 });
  expect(relative(time, printed(0.8, 0.0092, 0.2))).toBeLessThan(1e-14);
});

// OpenStax Chemistry 2e, 12.4, answers as printed
test.each([
  [{ fraction: 0.5, coefficient: 0.138, order: 1 }, 5.02],
  [{ fraction: 0.5, coefficient: 0.0576, order: 2, initial: 0.2 }, 86.8],
])('timeToConversion(%j) meets %d in print', (conversion, printed) => {
  expect(Number(timeToConversion(conversion).toPrecision(3))).toBe(printed);
});

test('below order 1 the end comes in finite time', () => {
  const end = 0.42 ** 0.5 / (0.5 * 0.037);
  const nearly = timeToConversion({ fraction: 1 - 1e-12, coefficient: 0.037, order: 0.5, initial: 0.42 });
  expect(nearly).toBeLessThan(end);
  expect(relative(nearly, end)).toBeLessThan(2e-6);
});

test('no step at order 1', () => {
  const at = (order: number): number =>
    timeToConversion({ fraction: 0.9, coefficient: 0.01, order, initial: 1 });
  expect(relative(at(1 + 1e-12), at(1))).toBeLessThan(1e-11);
  expect(relative(at(1 - 1e-12), at(1))).toBeLessThan(1e-11);
});

test('what it refuses, in words', () => {
  const good = { fraction: 0.5, coefficient: 1, order: 2, initial: 1 };
  const refusal = (change: object) => () => timeToConversion({ ...good, ...change });
  expect(refusal({ fraction: 1 })).toThrow(new InvalidInput('fraction must be above 0 and below 1: got 1'));
  expect(refusal({ fraction: 0 })).toThrow('fraction must be above 0 and below 1: got 0');
  expect(refusal({ coefficient: 0 })).toThrow('coefficient must be above 0: got 0');
  expect(refusal({ order: NaN })).toThrow('order must be a finite number: got NaN');
  expect(refusal({ initial: undefined })).toThrow(
    new InvalidInput('initial is needed for every order but 1: the order is 2'),
  );
  expect(refusal({ initial: -1 })).toThrow('initial must be above 0: got -1');
  expect(refusal({ order: 400, initial: 0.001 })).toThrow(NotDetermined);
});
