import { InvalidInput } from '../../../src/errors';
import { eventRate } from '../../../src/rate/event';

test('eventRate: change over time over ν, by hand', () => {
  expect(eventRate(40)).toBe(0.025);
  expect(eventRate(40, 0.002)).toBeCloseTo(5e-5, 18);
  expect(eventRate(40, -0.002)).toBeCloseTo(5e-5, 18);
  expect(eventRate(40, -0.002, -2)).toBeCloseTo(2.5e-5, 18);
  expect(eventRate(40, -0.002, 1)).toBeCloseTo(-5e-5, 18);
});

test.each<[string, () => number, string]>([
  ['no time', () => eventRate(0), 'time must be above 0: got 0'],
  ['a time before the start', () => eventRate(-3), 'time must be above 0: got -3'],
  ['no change', () => eventRate(3, 0), 'change must not be 0: nothing happened'],
  ['an endless change', () => eventRate(3, Infinity), 'change must be a finite number: got Infinity'],
  [
    'a bystander',
    () => eventRate(3, 1, 0),
    'stoichiometric number must not be 0: a species that takes no part has no rate',
  ],
])('eventRate refuses %s', (_, call, message) => expect(call).toThrow(new InvalidInput(message)));
