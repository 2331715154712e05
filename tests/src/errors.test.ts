import {
  InvalidInput,
  inWords,
  NotDetermined,
  requireFinite,
  requireNotNegative,
  requirePositive,
  requireStoichiometricNumber,
  shown,
} from '../../src/errors';

test('the two kinds of refusal can be told apart and are errors', () => {
  expect(new InvalidInput('x')).toBeInstanceOf(Error);
  expect(new InvalidInput('x')).not.toBeInstanceOf(NotDetermined);
  expect(new NotDetermined('x')).not.toBeInstanceOf(InvalidInput);
  expect([new InvalidInput('x').name, new NotDetermined('x').name]).toEqual([
    'InvalidInput',
    'NotDetermined',
  ]);
});

test.each<[string, () => void, string]>([
  ['requireFinite', () => requireFinite({ from: 1, to: NaN }), 'to must be a finite number: got NaN'],
  [
    'requireFinite',
    () => requireFinite({ order: -Infinity }),
    'order must be a finite number: got -Infinity',
  ],
  [
    'requirePositive',
    () => requirePositive({ rateCoefficient: 0 }),
    'rate coefficient must be above 0: got 0',
  ],
  ['requirePositive', () => requirePositive({ time: Infinity }), 'time must be above 0: got Infinity'],
  ['requireNotNegative', () => requireNotNegative({ volume: -0.3 }), 'volume must be 0 or more: got -0.3'],
  ['requireNotNegative', () => requireNotNegative({ volume: NaN }), 'volume must be 0 or more: got NaN'],
  [
    'requireStoichiometricNumber',
    () => requireStoichiometricNumber(0),
    'stoichiometric number must not be 0: a species that takes no part has no rate',
  ],
  [
    'requireStoichiometricNumber',
    () => requireStoichiometricNumber(NaN),
    'stoichiometric number must be a finite number: got NaN',
  ],
])('%s says the rule and the value', (_, check, message) => expect(check).toThrow(new InvalidInput(message)));

test('the checks let pass what keeps the rule', () => {
  requireFinite({ a: -1e300, b: 0 });
  requirePositive({ a: 5e-324, b: 1e300 });
  requireNotNegative({ a: 0, b: 2 });
  requireStoichiometricNumber(-2);
});

test('inWords and shown read like a sentence', () => {
  expect(inWords('initialConcentration')).toBe('initial concentration');
  expect([shown(0.1 + 0.2), shown(1234567), shown(-0), shown(1e-9 / 3), shown(NaN)]).toEqual([
    '0.3',
    '1234570',
    '0',
    '3.33333e-10',
    'NaN',
  ]);
});
