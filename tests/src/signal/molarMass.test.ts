import reference from '../../reference/molar-masses.json';
import { InvalidInput } from '../../../src/errors';
import { atomicWeights } from '../../../src/signal/atomicWeights';
import { molarMass } from '../../../src/signal/molarMass';
import { relative } from '../../support/compare';

test('atomicWeights are IUPAC 2021, digit by digit', () => {
  expect(atomicWeights).toMatchObject(reference.weights);
  expect(Object.keys(reference.weights).length).toBeGreaterThan(60);
});

test.each(reference.cases)(
  'molarMass($formula) is the exact decimal sum',
  ({ formula, molarMass: expected }) => {
    expect(relative(molarMass(formula), expected)).toBeLessThan(1e-14);
  },
);

// decimal sums by hand of H 1.008, C 12.011, N 14.007, O 15.999, Na 22.98976928, S 32.06, Ca 40.078, Fe 55.845,
// Cu 63.546, K 39.0983, Cr 51.9961
test.each([
  ['Ca(OH)2', 74.092], // 40.078 + 2 × 17.007
  ['Na2S2O3·5H2O', 248.17153856], // 158.09653856 + 5 × 18.015
  ['Na2S2O3*5H2O', 248.17153856],
  ['Na2S2O3.5H2O', 248.17153856],
  ['2H2O', 36.03],
  ['(NH4)2Fe(SO4)2·6H2O', 392.125], // 2 × 18.039 + 55.845 + 2 × 96.056 + 6 × 18.015
  ['K3[Fe(CN)6]', 329.2479], // 117.2949 + 55.845 + 6 × 26.018
  ['[Cu(NH3)4]SO4·H2O', 245.741], // 63.546 + 4 × 17.031 + 96.056 + 18.015
  ['C₁₂H₂₂O₁₁', 342.297],
  [' CO2 ', 44.009],
])('molarMass(%s) = %d', (formula, expected) => expect(molarMass(formula)).toBeCloseTo(expected, 10));

test('molarMass tells cobalt from carbon monoxide, and nesting from repetition', () => {
  expect(molarMass('Co')).toBe(58.933194);
  expect(molarMass('CO')).toBeCloseTo(28.01, 10);
  expect(molarMass('((OH)2)3')).toBeCloseTo(molarMass('O6H6'), 10);
});

const rule = 'formula must be made of element symbols and counts: ';

test.each([
  ['', 'formula must not be empty'],
  ['  ', 'formula must not be empty'],
  ['CX2', `${rule}"X" has no standard atomic weight at character 2 of "CX2"`],
  ['Tc2O7', `${rule}"Tc" has no standard atomic weight at character 1 of "Tc2O7"`],
  ['co2', `${rule}"c" at character 1 of "co2"`],
  ['H2O!', `${rule}"!" at character 4 of "H2O!"`],
  ['Ca(OH', `${rule}a bracket is not closed at character 6 of "Ca(OH"`],
  ['CaOH)2', `${rule}")" without its opening bracket at character 5 of "CaOH)2"`],
  ['CO0', `${rule}a count of 0 at character 3 of "CO0"`],
  ['CuSO4·', `${rule}nothing at character 7 of "CuSO4·"`],
  ['CuSO4·5', `${rule}nothing at character 8 of "CuSO4·5"`],
  ['CuSO4·5Hx', `${rule}"Hx" has no standard atomic weight at character 8 of "CuSO4·5Hx"`],
  ['K3[Fe(CN)6)', `${rule}")" closes "[" at character 11 of "K3[Fe(CN)6)"`],
  ['C02', `${rule}a count that begins with 0 at character 2 of "C02"`],
  ['0H2O', `${rule}a count of 0 at character 1 of "0H2O"`],
])('molarMass("%s") says where it broke', (formula, message) => {
  expect(() => molarMass(formula)).toThrow(new InvalidInput(message));
});
