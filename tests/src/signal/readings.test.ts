/** Conversions of single readings, against the worked-out cases of readings.json. */
import readings from '../../reference/readings.json';
import { concentrationFromAbsorbance } from '../../../src/signal/absorbance';
import { activityCoefficient } from '../../../src/signal/activity';
import { gasFormed, pressureLeft } from '../../../src/signal/gasPressure';
import {
  concentrationFromConductivity,
  conductivityAt25,
  fractionConverted,
  titratedConcentration,
} from '../../../src/signal/linear';
import { relative } from '../../support/compare';

const given = (id: string) => readings.cases.find((c) => c.id === id)!;

test('gasFormed in a closed flask to 1e-12', () => {
  const { given: run, expected } = given('pressure-closed');
  const start = { pressure: 101325, temperature: run.T_K! };
  const now = { pressure: 101325 + run.dp_Pa!, temperature: run.T_K! };
  expect(relative(gasFormed(now, start, run.V_m3!), expected.n_mol!)).toBeLessThan(1e-12);
});

test('gasFormed: warming alone forms nothing', () => {
  const start = { pressure: 100000, temperature: 300 };
  expect(gasFormed({ pressure: 110000, temperature: 330 }, start, 1e-3)).toBeCloseTo(0, 15);
});

test('pressureLeft of N2O5 from the total pressure to 1e-12', () => {
  const { given: run, expected } = given('total-pressure-N2O5');
  run.pTotal_kPa!.forEach((total, i) => {
    const left = expected.left![i];
    expect(relative(pressureLeft(total, run.p0_kPa!, 1.5), left)).toBeLessThan(1e-12);
  });
});

test('pressureLeft refuses a gain of 0 and more used than there was', () => {
  expect(() => pressureLeft(50, 46.4, 0)).toThrow(
    'gain must not be 0: the total pressure would tell nothing',
  );
  expect(() => pressureLeft(100.3, 46.4, 0.5)).toThrow(
    'pressure left must not be more than 5 % below 0: a total of 100.3 from 46.4 with a gain of 0.5 leaves -61.4',
  );
});

test('activity takes a pH to a concentration to 1e-12', () => {
  const { given: run, expected } = given('pH');
  const gamma = activityCoefficient(1, run.I!, run.A!);
  expect(relative(gamma, expected.gammaDavies!)).toBeLessThan(1e-12);
  expect(relative(10 ** -run.pH! / gamma, expected.cH!)).toBeLessThan(1e-12);
});

test('concentrationFromConductivity of a saponification to 1e-12', () => {
  const { given: run, expected } = given('conductance-saponification');
  run.k_mS!.forEach((reading, i) => {
    const left = expected.left![i];
    expect(
      relative(concentrationFromConductivity(reading, run.k0_mS!, run.kInf_mS!, 0.01), left),
    ).toBeLessThan(1e-12);
  });
});

test('conductivityAt25: 2 % a degree, nothing at 25 °C, and a factor that stays positive', () => {
  expect(conductivityAt25(1.04, 27, 2)).toBeCloseTo(1, 14);
  expect(conductivityAt25(1.04, 25, 2)).toBe(1.04);
  expect(() => conductivityAt25(1, -30, 2)).toThrow(
    'temperature must be above -25 degC for 2 % per degC: got -30 degC',
  );
});

test('concentrationFromAbsorbance to 1e-12, and with a product that absorbs as well', () => {
  const { given: run, expected } = given('absorbance');
  const cell = { absorptivity: run.epsilon!, path: run.path_cm!, blank: run.blank! };
  expect(relative(concentrationFromAbsorbance(run.A!, cell), expected.c!)).toBeLessThan(1e-12);
  // a mixture built from its parts must come apart again
  const [reactant, product] = [3e-4, 2e-4];
  const absorbance = 0.01 + 0.5 * (1200 * reactant + 300 * product);
  const both = {
    absorptivity: 1200,
    path: 0.5,
    blank: 0.01,
    product: { absorptivity: 300, total: reactant + product },
  };
  expect(relative(concentrationFromAbsorbance(absorbance, both), reactant)).toBeLessThan(1e-12);
  const alike = { ...both, absorptivity: 300 };
  expect(() => concentrationFromAbsorbance(0.4, alike)).toThrow(
    'absorptivity of reactant and product must differ',
  );
});

test('titratedConcentration of iodine to 1e-12', () => {
  const { given: run, expected } = given('titre-thiosulfate');
  const found = titratedConcentration(run.V_mL!, run.c_titrant!, run.aliquot_mL!, 0.5);
  expect(relative(found, expected.cI2!)).toBeLessThan(1e-12);
});

test('fractionConverted of a rotation to 1e-12', () => {
  const { given: run, expected } = given('polarimeter');
  run.a!.forEach((rotation, i) => {
    const left = expected.left![i];
    expect(relative(1 - fractionConverted(rotation, run.a0!, run.aInf!), left)).toBeLessThan(1e-12);
  });
  expect(() => fractionConverted(1, 2.48, 2.48)).toThrow('end must differ from start: both are 2.48');
});
