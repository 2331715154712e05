import { NotDetermined } from '../../../src/errors';
import { fitArrhenius } from '../../../src/temperature/arrhenius';
import { predictCoefficient } from '../../../src/temperature/predict';
import { normal } from '../../support/random';

const temperatures = Float64Array.of(283.15, 293.15, 303.15, 313.15, 323.15, 333.15);

/** k of 90 kJ/mol that is 1 at 300 K; R by CODATA 2022. */
const trueCoefficient = (temperature: number): number =>
  Math.exp((90000 / 8.31446261815324) * (1 / 300 - 1 / temperature));

test('predictCoefficient: 95 % limits hold the truth in 95 of 100 simulated sets, within and beyond', () => {
  const deviate = normal(20261201);
  const rounds = 2000;
  const held = { 278.15: 0, 308.15: 0, 373.15: 0 };
  for (let round = 0; round < rounds; round++) {
    const coefficients = temperatures.map(
      (temperature) => trueCoefficient(temperature) * Math.exp(0.08 * deviate()),
    );
    const fit = fitArrhenius({ temperatures, coefficients });
    for (const at of [278.15, 308.15, 373.15] as const) {
      const { lower, upper } = predictCoefficient(fit, at);
      if (lower! < trueCoefficient(at) && trueCoefficient(at) < upper!) held[at]++;
    }
  }
  // three standard deviations of a count of 2000 at 0.95 are 0.0146 of it
  for (const count of Object.values(held)) expect(Math.abs(count / rounds - 0.95)).toBeLessThan(0.0146);
});

const scattered = {
  temperatures,
  coefficients: temperatures.map((temperature, i) => trueCoefficient(temperature) * (1 + 0.03 * (-1) ** i)),
};

test('limits widen away from the measured temperatures, and lie unevenly about k', () => {
  const fit = fitArrhenius(scattered);
  const width = (at: number): number => {
    const { lower, upper } = predictCoefficient(fit, at);
    return Math.log(upper! / lower!);
  };
  expect(width(277)).toBeGreaterThan(1.5 * width(307));
  expect(width(400)).toBeGreaterThan(width(360));
  const { lower, value, upper } = predictCoefficient(fit, 400);
  expect(upper! / value).toBeCloseTo(value / lower!, 12);
});

test.each([
  [283.15, false],
  [333.15, false],
  [10 + 273.15 + 1e-13, false],
  [283.1, true],
  [333.2, true],
])('at %d K: extrapolated %s', (temperature, isExtrapolated) => {
  expect(predictCoefficient(fitArrhenius(scattered), temperature).isExtrapolated).toBe(isExtrapolated);
});

test('at its own temperature a coefficient on the line comes back', () => {
  const onLine = { temperatures, coefficients: temperatures.map(trueCoefficient) };
  const found = predictCoefficient(fitArrhenius(onLine), 313.15).value;
  expect(Math.abs(found / trueCoefficient(313.15) - 1)).toBeLessThan(1e-12);
});

test('predictCoefficient refuses what no number holds, and a temperature that is none', () => {
  const fit = fitArrhenius(scattered);
  expect(() => predictCoefficient(fit, 5)).toThrow(NotDetermined);
  expect(() => predictCoefficient(fit, 5)).toThrow(
    /^rate coefficient must be a number that can be held: ln k is -2\d{3}/,
  );
  expect(() => predictCoefficient(fit, 0)).toThrow('temperature must be above 0: got 0');
});
