import reference from '../../reference/temperature.json';
import { gasConstant } from '../../../src/constants';
import { InvalidInput, NotDetermined } from '../../../src/errors';
import type { Estimate } from '../../../src/estimate';
import { fitArrhenius } from '../../../src/temperature/arrhenius';
import { heightEstimate } from '../../../src/temperature/centredLine';
import { fitEyring, gibbsEnergyAt } from '../../../src/temperature/eyring';
import type { MeasuredCoefficients } from '../../../src/temperature/measured';
import type { Scatter } from '../../../src/temperature/overTemperature';
import { relative } from '../../support/compare';

const measured = (
  temperatures: readonly number[],
  coefficients: readonly number[],
  uncertainties?: readonly number[],
): MeasuredCoefficients => ({
  temperatures: Float64Array.from(temperatures),
  coefficients: Float64Array.from(coefficients),
  ...(uncertainties && { uncertainties: Float64Array.from(uncertainties) }),
});

interface Expected {
  readonly value: number;
  readonly u: number;
  readonly ci: readonly number[] | null;
}

function expectEstimate(found: Estimate, { value, u, ci }: Expected, scale = 1): void {
  expect(relative(found.value, value * scale)).toBeLessThan(1e-9);
  expect(relative(found.standardUncertainty!, u * scale)).toBeLessThan(1e-9);
  if (ci === null) return;
  expect(relative(found.lower!, ci[0] * scale)).toBeLessThan(1e-9);
  expect(relative(found.upper!, ci[1] * scale)).toBeLessThan(1e-9);
}

describe.each(reference.cases)('$id', (published) => {
  const { T, k, relativeSD, law, df } = published;
  const scatter = published.scatter as Scatter;
  const given = measured(
    T,
    k,
    relativeSD?.map((share, i) => share * k[i]),
  );
  const fit = law === 'arrhenius' ? fitArrhenius(given, scatter) : fitEyring(given, scatter);
  const energy = 'enthalpy' in fit ? fit.enthalpy : fit.activationEnergy;
  const intercept = 'enthalpy' in fit ? fit.entropy : fit.logFactor;

  test('energy and intercept, their standard uncertainties and limits to 1e-9', () => {
    expectEstimate(energy, { value: published.energy, u: published.u_energy, ci: published.ci_energy }, 1e-3);
    expectEstimate(intercept, {
      value: published.intercept,
      u: published.u_intercept,
      ci: published.ci_intercept,
    });
    expect(energy.degreesOfFreedom).toBe(df);
  });

  test('the line at other temperatures to 1e-9', () => {
    for (const { T: temperature, fit: value, u, ci } of published.predict) {
      expectEstimate(heightEstimate(fit.line, 1 / temperature), { value, u, ci });
    }
  });

  const { profile_energy: profile } = published;
  if (profile) {
    test('its limits of the energy are near those of the profile likelihood', () => {
      const reach = 1000 * (energy.upper! - energy.value);
      expect(Math.abs(1000 * energy.lower! - profile[0])).toBeLessThan(0.1 * reach);
      expect(Math.abs(1000 * energy.upper! - profile[1])).toBeLessThan(0.1 * reach);
    });
  }

  if ('enthalpy' in fit && published.gibbs298 !== undefined) {
    test('Gibbs energy of activation at 298.15 K to 1e-9', () => {
      const gibbs = gibbsEnergyAt(fit, 298.15);
      expectEstimate(gibbs, { value: published.gibbs298!, u: published.u_gibbs298!, ci: null }, 1e-3);
    });
  }
});

// OpenStax Chemistry 2e, 12.5: printed to two digits, from 1/T rounded to three
test('fitArrhenius meets the activation energies in print', () => {
  const n2o5 = fitArrhenius(measured([650, 700], [1.66, 7.39])).activationEnergy;
  expect(Number(n2o5.value.toPrecision(2))).toBe(110);
  const hi = fitArrhenius(measured([555, 575, 645, 700, 781], [3.52e-7, 1.22e-6, 8.59e-5, 0.00116, 0.0395]));
  expect(Math.abs(hi.activationEnergy.value / 180 - 1)).toBeLessThan(0.04);
});

const temperatures = [278.15, 288.15, 298.15, 313.15, 333.15];
const arrheniusAt = (energy: number, factor: number) => (temperature: number) =>
  factor * Math.exp((-energy * 1000) / (gasConstant * temperature));

test('both laws give back what made the coefficients', () => {
  const { activationEnergy, logFactor } = fitArrhenius(
    measured(temperatures, temperatures.map(arrheniusAt(78.5, 2.4e11))),
  );
  expect(activationEnergy.value).toBeCloseTo(78.5, 10);
  expect(logFactor.value).toBeCloseTo(Math.log(2.4e11), 10);
  expect(activationEnergy.standardUncertainty!).toBeLessThan(1e-10);
});

test('Ea = ΔH‡ + RT near the mean temperature', () => {
  const given = measured(temperatures, [0.012, 0.041, 0.118, 0.62, 4.1]);
  const { activationEnergy, line } = fitArrhenius(given);
  const difference = activationEnergy.value - fitEyring(given).enthalpy.value;
  // ln T is no straight line against 1/T: over 55 K its mean slope is T within 2 %
  expect(relative(difference, gasConstant / line.centre / 1000)).toBeLessThan(0.02);
});

test('a change of the unit of k moves ln A and nothing else', () => {
  const k = [0.012, 0.041, 0.118, 0.62, 4.1];
  const perSecond = fitArrhenius(measured(temperatures, k));
  const perMinute = fitArrhenius(
    measured(
      temperatures,
      k.map((value) => 60 * value),
    ),
  );
  expect(perMinute.activationEnergy.value).toBeCloseTo(perSecond.activationEnergy.value, 10);
  expect(perMinute.activationEnergy.standardUncertainty!).toBeCloseTo(
    perSecond.activationEnergy.standardUncertainty!,
    10,
  );
  expect(perMinute.logFactor.value - perSecond.logFactor.value).toBeCloseTo(Math.log(60), 10);
});

test('a coefficient measured twice counts as one of uncertainty 1/√2', () => {
  const twice = fitArrhenius(measured([280, 300, 300, 320], [1, 5.2, 5.2, 19]));
  const weighted = fitArrhenius(measured([280, 300, 320], [1, 5.2, 19], [1, 5.2 * Math.SQRT1_2, 19]));
  expect(weighted.activationEnergy.value).toBeCloseTo(twice.activationEnergy.value, 10);
  expect(weighted.logFactor.value).toBeCloseTo(twice.logFactor.value, 10);
});

test.each(['logarithms', 'coefficients'] as const)(
  '%s: two temperatures give a value and no uncertainty',
  (scatter) => {
    const { activationEnergy } = fitArrhenius(measured([298.15, 308.15], [1, 2]), scatter);
    expect(activationEnergy.value).toBeCloseTo(52.9488621657, 9);
    expect(activationEnergy).toMatchObject({
      standardUncertainty: null,
      lower: null,
      upper: null,
      degreesOfFreedom: 0,
    });
  },
);

test('what a fit over temperature refuses, in words', () => {
  const energy =
    (...given: Parameters<typeof measured>) =>
    () =>
      fitArrhenius(measured(...given));
  expect(energy([300], [1])).toThrow(
    new NotDetermined('an activation energy needs coefficients at two temperatures: got 1'),
  );
  expect(energy([300, 300], [1, 2])).toThrow(
    new InvalidInput('temperatures must differ: all 2 are 300 K, 26.85 degC'),
  );
  expect(energy([300, 310], [1, -2])).toThrow(
    new InvalidInput('coefficients must be above 0: number 2 is -2'),
  );
  expect(energy([0, 310], [1, 2])).toThrow(new InvalidInput('temperatures must be above 0: number 1 is 0'));
  expect(energy([300, 310], [1, 2], [0.1, 0])).toThrow('uncertainties must be above 0: number 2 is 0');
  expect(energy([300, 310], [1])).toThrow('coefficients must be as many as temperatures: got 1 for 2');
  expect(energy([300, 310], [1, 2], [1])).toThrow(
    'uncertainties must be as many as temperatures: got 1 for 2',
  );
  expect(() => fitEyring(measured([300], [1]))).toThrow(
    'an enthalpy of activation needs coefficients at two',
  );
});
