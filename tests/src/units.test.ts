import { InvalidInput } from '../../src/errors';
import { convertQuantity, convertUnit, isUnit, parseQuantity } from '../../src/units';
import { relative } from '../support/compare';

// NIST SP 811 (2008), appendix B.8: an exact factor in full, a rounded one as the product that defines it
test.each([
  ['atm', 'Pa', 101325],
  ['bar', 'Pa', 1e5],
  ['mbar', 'Pa', 100],
  ['hPa', 'Pa', 100],
  ['torr', 'Pa', 101325 / 760],
  ['mmHg', 'Pa', 133.322387415], // 13.5951 g/cm³ × 9.80665 m/s² × 1 mm
  ['inHg', 'Pa', 3386.388640341], // 25.4 of them
  ['mmH2O', 'Pa', 9.80665],
  ['psi', 'Pa', (0.45359237 * 9.80665) / 0.0254 ** 2],
  ['L', 'm^3', 1e-3],
  ['mL', 'L', 1e-3],
  ['uL', 'mL', 1e-3],
  ['cm^3', 'mL', 1],
  ['dm^3', 'L', 1],
  ['in', 'm', 0.0254],
  ['inch', 'cm', 2.54],
  ['ft', 'm', 0.3048],
  ['lb', 'kg', 0.45359237],
  ['oz', 'g', 28.349523125],
  ['cal', 'J', 4.184],
  ['kcal', 'kJ', 4.184],
  ['min', 's', 60],
  ['h', 'min', 60],
  ['d', 'h', 24],
  ['M', 'mol/L', 1],
  ['mM', 'mol/L', 1e-3],
  ['mol/L', 'mol/m^3', 1000],
  ['kJ/mol', 'J/mol', 1000],
])('1 %s = %s × its definition', (from, to, factor) => {
  expect(relative(convertUnit(1, from, to, 'value'), factor)).toBeLessThan(1e-15 * 4);
  expect(relative(convertUnit(factor, to, from, 'value'), 1)).toBeLessThan(1e-15 * 4);
});

// ITS-90: t/°C = T/K − 273.15; NIST SP 811, B.9: T/K = (t/°F + 459.67)/1.8
test.each([
  ['degC', 22, 295.15],
  ['degC', -273.15, 0],
  ['degF', 32, 273.15],
  ['degF', 212, 373.15],
  ['degF', -40, 233.15],
  ['K', 300, 300],
])('%s: %d is %d K', (unit, value, kelvin) => {
  expect(convertUnit(value, unit, 'K', 'temperature')).toBeCloseTo(kelvin, 12);
  expect(convertUnit(kelvin, 'K', unit, 'temperature')).toBeCloseTo(value, 11);
});

test.each([
  ['22 °C', 'K', 295.15],
  ['22°C', 'K', 295.15],
  ['22 ℃', 'K', 295.15],
  ['22 C', 'K', 295.15],
  ['72 °F', 'degC', 200 / 9],
  ['−5 °C', 'degC', -5],
  ['-5 degC', 'K', 268.15],
  ['295 k', 'K', 295],
  ['752 mmHg', 'kPa', 0.752 * 133.322387415],
  ['752 mm Hg', 'kPa', 0.752 * 133.322387415],
  ['760 Torr', 'kPa', 101.325],
  ['1013.25 mbar', 'kPa', 101.325],
  ['1 Atm', 'kPa', 101.325],
  ['101.3 kpa', 'kPa', 101.3],
  ['0.25 L', 'mL', 250],
  ['250 ml', 'L', 0.25],
  ['250 ML', 'L', 0.25],
  ['48,6 cm3', 'mL', 48.6],
  ['48.6 cm³', 'mL', 48.6],
  ['48.6 cc', 'mL', 48.6],
  ['1 dm³', 'mL', 1000],
  ['5 µL', 'mL', 0.005],
  ['2.5e-3 M', 'mol/L', 0.0025],
  ['30 1/min', 's^-1', 0.5],
  ['2.5 µM', 'mol/L', 2.5e-6],
  ['.5 mol/dm3', 'mol/L', 0.5],
  ['  7 mL ', 'mL', 7],
  ['7', 'mL', 7],
  ['+7.', 'mL', 7],
  ['1E3 mL', 'L', 1],
])('parseQuantity("%s") in %s is %d', (text, unit, expected) => {
  expect(relative(parseQuantity(text, unit, 'value'), expected)).toBeLessThan(1e-14);
});

test.each<[string, () => number, string]>([
  [
    'pressure as volume',
    () => parseQuantity('752 mmHg', 'mL', 'volume'),
    'volume must be in a unit like mL: 752 mmHg measures something else',
  ],
  [
    'mass as temperature',
    () => convertUnit(3, 'g', 'K', 'temperature'),
    'temperature must be in a unit like K: 3 g measures something else',
  ],
  [
    'an unknown unit',
    () => parseQuantity('3 blob', 'mL', 'volume'),
    'volume must carry a unit that is known: got "blob"',
  ],
  [
    'two numbers',
    () => parseQuantity('3 4 mL', 'mL', 'volume'),
    'volume must carry a unit that is known: got "4 mL"',
  ],
  [
    'a number inside the unit',
    () => parseQuantity('1.000,5 mL', 'mL', 'volume'),
    'volume must carry a unit that is known: got ",5 mL"',
  ],
  [
    'a name every object has',
    () => parseQuantity('3 constructor', 'mL', 'volume'),
    'volume must carry a unit that is known: got "constructor"',
  ],
  [
    'a unit alone',
    () => parseQuantity('mL', 'mL', 'volume'),
    'volume must be a number with a unit, such as "1 mL": got "mL"',
  ],
  [
    'nothing',
    () => parseQuantity('', 'mL', 'volume'),
    'volume must be a number with a unit, such as "1 mL": got ""',
  ],
  [
    'below absolute zero',
    () => parseQuantity('-300 degC', 'K', 'temperature'),
    'temperature must not be below absolute zero: got -300 degC',
  ],
  [
    'below it in its own unit',
    () => parseQuantity('-1 K', 'K', 'temperature'),
    'temperature must not be below absolute zero: got -1 K',
  ],
  [
    'below it in Fahrenheit',
    () => convertUnit(-460, '°F', 'degC', 'temperature'),
    'temperature must not be below absolute zero: got -460 °F',
  ],
])('refuses %s in words', (_, call, message) => expect(call).toThrow(new InvalidInput(message)));

test('convertQuantity goes there and back, and leaves a number of the same unit alone', () => {
  expect(convertQuantity(0.1 + 0.2, 'mL', 'mL')).toBe(0.1 + 0.2);
  for (const [from, to] of [
    ['degC', 'K'],
    ['torr', 'kPa'],
    ['mol/L', 'mmol/L'],
  ]) {
    expect(convertQuantity(convertQuantity(37.1, from, to), to, from)).toBeCloseTo(37.1, 12);
  }
});

test('isUnit knows a unit from a word', () => {
  for (const unit of ['mL', '°C', 'mmHg', 'mol/L', 'M', 'd']) expect(isUnit(unit)).toBe(true);
  for (const word of ['blob', 'toString', '', '000 mL']) expect(isUnit(word)).toBe(false);
});
