import conversions from '../../reference/conversions.json';
import { InvalidInput, NotDetermined } from '../../../src/errors';
import {
  amountLost,
  amountLostEstimate,
  differenceUncertainty,
  massPerMole,
  requireVisibleLoss,
} from '../../../src/signal/massLoss';
import { molarMass } from '../../../src/signal/molarMass';
import { relative, standardDeviation } from '../../support/compare';
import { uniform } from '../../support/random';

test('amountLost of carbon dioxide to 1e-12', () => {
  const { given, expected } = conversions.cases.find(({ id }) => id === 'mass-loss-CO2')!;
  const amount = amountLost(given.m_g!, given.m0_g!, molarMass('CO2'));
  expect(relative(amount, expected.nCO2_mol!)).toBeLessThan(1e-12);
  expect(amountLost(5, 4, 44)).toBeLessThan(0);
});

test('massPerMole: saturated gas carries p*⁄(p − p*) moles of water a mole', () => {
  // p*(25 °C) = 3169.82 Pa (IAPWS SR1-86), M(H₂O) = 18.015: 44.009 + 18.015 × 3169.82 ⁄ (101325 − 3169.82)
  expect(massPerMole(44.009, { temperature: 298.15, pressure: 101325 })).toBeCloseTo(44.59077, 4);
  expect(massPerMole(44.009)).toBe(44.009);
});

test('differenceUncertainty is the standard deviation of a difference of two rounded readings', () => {
  // 20 000 pairs of masses at random against a display in steps of 0.01 g, seed 7: 1 % is two standard errors
  const next = uniform(7);
  const error = (): number => {
    const mass = 100 * next();
    return Math.round(mass * 100) / 100 - mass;
  };
  const differences = Array.from({ length: 20000 }, () => error() - error());
  expect(differenceUncertainty(0.01) / standardDeviation(differences)).toBeCloseTo(1, 1);
  expect(Math.abs(differenceUncertainty(0.01) / standardDeviation(differences) - 1)).toBeLessThan(0.015);
});

test('amountLostEstimate: d⁄√6 over the molar mass, normal limits at 1.959964 of it', () => {
  const { value, standardUncertainty, lower, upper, degreesOfFreedom } = amountLostEstimate(
    99.56,
    100,
    44,
    0.01,
  );
  expect(value).toBeCloseTo(0.01, 14);
  expect(standardUncertainty).toBeCloseTo(0.01 / Math.sqrt(6) / 44, 15);
  expect((upper! - value) / standardUncertainty!).toBeCloseTo(1.959963984540054, 8);
  expect(value - lower!).toBeCloseTo(upper! - value, 14);
  expect(degreesOfFreedom).toBe(Infinity);
});

test('requireVisibleLoss: 3.29 standard uncertainties are the least', () => {
  // 3.29 × 0.01 g ⁄ √6 = 0.013431 g (L. A. Currie, Pure Appl. Chem. 67 (1995) 1699: 2 × 1.645)
  expect(() => requireVisibleLoss(0.0135, 0.01)).not.toThrow();
  const unseen = (): void => requireVisibleLoss(0.0134, 0.01);
  expect(unseen).toThrow(NotDetermined);
  expect(unseen).toThrow(
    new NotDetermined(
      'mass loss must exceed 0.0134314 g to be seen with a readability of 0.01 g: the largest is 0.0134 g',
    ),
  );
});

test.each<[string, () => unknown, string]>([
  ['no molar mass', () => amountLost(1, 2, 0), 'molar mass must be above 0: got 0'],
  ['no mass', () => amountLost(NaN, 2, 44), 'mass must be a finite number: got NaN'],
  ['no start', () => amountLost(1, Infinity, 44), 'start must be a finite number: got Infinity'],
  ['a negative molar mass', () => massPerMole(-44), 'molar mass must be above 0: got -44'],
  ['no readability', () => differenceUncertainty(0), 'readability must be above 0: got 0'],
  [
    'boiling water',
    () => massPerMole(44, { temperature: 373.15, pressure: 95000 }),
    'pressure must be above that of saturated water vapour, 101.418 kPa: got 95 kPa',
  ],
])('refuses %s in words', (_, call, message) => expect(call).toThrow(new InvalidInput(message)));
