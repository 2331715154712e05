import { InvalidInput } from '../../../src/errors';
import { remainingReactant } from '../../../src/signal/remaining';

test('remainingReactant: c₀ − ratio × formed, by hand', () => {
  expect(remainingReactant(0, 0.02)).toBe(0.02);
  expect(remainingReactant(0.0075, 0.02)).toBeCloseTo(0.0125, 15);
  expect(remainingReactant(0.004, 0.02, 2)).toBeCloseTo(0.012, 15);
  expect(remainingReactant(-0.001, 0.02)).toBeCloseTo(0.021, 15);
});

test('remainingReactant leaves scatter below 0 as it is, up to 5 % of the start', () => {
  expect(remainingReactant(1.049, 1)).toBeCloseTo(-0.049, 14);
  expect(() => remainingReactant(1.051, 1)).toThrow(
    new InvalidInput('product formed × ratio must not exceed initial by more than 5 %: 1.051 × 1 is above 1'),
  );
});

test.each<[string, () => number, string]>([
  ['no start', () => remainingReactant(0, 0), 'initial must be above 0: got 0'],
  ['a negative ratio', () => remainingReactant(0, 1, -1), 'ratio must be above 0: got -1'],
  ['no number', () => remainingReactant(NaN, 1), 'formed must be a finite number: got NaN'],
])('remainingReactant refuses %s', (_, call, message) => expect(call).toThrow(new InvalidInput(message)));
