import { isUnitOnly, nameOf, rateUnit, readHeading } from '../../taskpane/headers';

test.each([
  ['V / mL', 'volume', 'mL'],
  ['t (s)', 'time', 's'],
  ['time, min', 'time', 'min'],
  ['m/g', 'mass', 'g'],
  ['A', 'absorbance', '1'],
  ['Time [h]', 'time', 'h'],
  ['Elapsed time in s', 'time', 's'],
  ['Volume of gas (cm³)', 'volume', 'cm³'],
  ['p / kPa', 'pressure', 'kPa'],
  ['[dye] / (mol/L)', 'concentration', 'mol/L'],
  ['c (mol L⁻¹)', 'concentration', 'mol L⁻¹'],
  ['n / mmol', 'amount', 'mmol'],
  ['A620', 'absorbance', '1'],
  ['Absorbance / 1', 'absorbance', '1'],
  ['pH', 'pH', '1'],
  ['T / °C', 'temperature', '°C'],
  ['t', 'time', ''],
  ['mass', 'mass', ''],
  ['s', 'unknown', ''],
  ['Remarks', 'unknown', ''],
  ['mL', 'volume', 'mL'],
  ['half life / d', 'unknown', 'd'],
  ['k / d⁻¹', 'coefficient', 'd⁻¹'],
  ['rate coefficient, order 1 / min⁻¹', 'coefficient', 'min⁻¹'],
  ['T / K', 'temperature', 'K'],
  ['conversion', 'fraction', '1'],
  ['A, half the dose', 'absorbance', '1'],
  ['volume, first tablet', 'volume', ''],
])('readHeading(%j) is %s in %j', (text, quantity, unit) => {
  expect(readHeading(text)).toEqual({ text, quantity, unit });
});

test('readHeading ignores blanks around the words', () => {
  expect(readHeading('  V  /  mL ')).toMatchObject({ text: 'V  /  mL', quantity: 'volume', unit: 'mL' });
});

test('isUnitOnly tells a row of units from names', () => {
  expect(['mL', '(s)', 'kPa'].map(isUnitOnly)).toEqual([true, true, true]);
  expect(['V', 'time', 'Run 1'].map(isUnitOnly)).toEqual([false, false, false]);
});

test.each([
  ['V / mL', 't / s', 'mL/s'],
  ['[dye] / (mol/L)', 'time, min', '(mol/L)/min'],
  ['A', 't / s', '1/s'],
  ['V / mL', 't', 'mL per time unit'],
  ['Remarks', 't / s', 'reading unit per s'],
])('rateUnit of %j against %j is %j', (reading, time, unit) => {
  expect(rateUnit(readHeading(reading), readHeading(time))).toBe(unit);
});

test.each([
  ['A1 / mL', 'A1'],
  ['first tablet (mL)', 'first tablet'],
  ['A1', 'A1'],
  ['A, first tablet', 'A, first tablet'],
])('nameOf(%s): what tells a run from others is %s', (text, name) => {
  expect(nameOf(readHeading(text))).toBe(name);
});
