import conversions from '../../reference/conversions.json';
import density from '../../reference/water-density.json';
import vapour from '../../reference/water-vapour.json';
import { InvalidInput } from '../../../src/errors';
import { dryGasPressure, gasAmount } from '../../../src/signal/gasVolume';
import { saturationPressure, waterDensity } from '../../../src/signal/water';
import { relative } from '../../support/compare';

const kelvin = (celsius: number): number => celsius + 273.15;
const given = (id: string) => conversions.cases.find((c) => c.id === id)!;

test.each(['wet-22C', 'wet-5C'])('gasAmount of gas over water, %s: amount and pressures to 1e-12', (id) => {
  const { given: run, expected } = given(id);
  const conditions = { temperature: kelvin(run.t_C!), pressure: run.p_Pa!, saturation: 1, head: 0 };
  expect(relative(saturationPressure(conditions.temperature), expected.pWater_Pa!)).toBeLessThan(1e-12);
  expect(relative(dryGasPressure(conditions), expected.pDry_Pa!)).toBeLessThan(1e-12);
  expect(relative(gasAmount(run.V_m3!, conditions), expected.n_mol!)).toBeLessThan(1e-12);
});

test('gasAmount of a dry gas to 1e-12', () => {
  const { given: run, expected } = given('dry-gas');
  const amount = gasAmount(run.V_m3!, { temperature: run.T_K!, pressure: run.p_Pa!, saturation: 0, head: 0 });
  expect(relative(amount, expected.n_mol!)).toBeLessThan(1e-12);
});

test('gasAmount: molar volumes of an ideal gas (CODATA 2022: 22.710 954 64… and 22.413 969 54… L/mol)', () => {
  const at = (pressure: number): number =>
    gasAmount(1, { temperature: 273.15, pressure, saturation: 0, head: 0 });
  expect(1000 / at(100000)).toBeCloseTo(22.71095464, 7);
  expect(1000 / at(101325)).toBeCloseTo(22.41396954, 7);
});

test('gasAmount: a water column takes off ρgh, a column below the trough adds it', () => {
  const conditions = { temperature: kelvin(20), pressure: 100000, saturation: 0, head: 0.1 };
  // 998.207 kg/m³ × 9.80665 m/s² × 0.1 m, density by IAPWS-95
  expect(relative(100000 - dryGasPressure(conditions), 978.907)).toBeLessThan(1e-5);
  expect(relative(dryGasPressure({ ...conditions, head: -0.1 }) - 100000, 978.907)).toBeLessThan(1e-5);
});

test('gasAmount is linear in volume and in the saturation, and 0 for no gas', () => {
  const conditions = { temperature: 298.15, pressure: 101325, saturation: 0.4, head: 0.05 };
  expect(gasAmount(0, conditions)).toBe(0);
  expect(gasAmount(3e-5, conditions)).toBeCloseTo(3 * gasAmount(1e-5, conditions), 15);
  const dry = dryGasPressure({ ...conditions, saturation: 0 });
  const wet = dryGasPressure({ ...conditions, saturation: 1 });
  expect(dryGasPressure(conditions)).toBeCloseTo(0.6 * dry + 0.4 * wet, 9);
});

test.each(vapour.cases)(
  'saturationPressure at $celsius °C: SR1-86 to 1e-12, two other formulations to 1e-4',
  (c) => {
    const pressure = saturationPressure(kelvin(c.celsius));
    expect(relative(pressure, c.sr1_86)).toBeLessThan(1e-12);
    expect(relative(pressure, c.if97)).toBeLessThan(1e-4);
    if (c.iapws95 !== null) expect(relative(pressure, c.iapws95)).toBeLessThan(1e-4);
  },
);

test('saturationPressure meets the printed fixed points of water', () => {
  const { triplePoint, boilingPoint, criticalPoint } = vapour;
  expect(saturationPressure(triplePoint.kelvin)).toBeCloseTo(triplePoint.pascal, 3);
  expect(relative(saturationPressure(boilingPoint.kelvin), boilingPoint.pascal)).toBeLessThan(1e-6);
  expect(saturationPressure(criticalPoint.kelvin)).toBe(criticalPoint.pascal);
});

test.each(density.cases)(
  'waterDensity at $celsius °C: IAPWS-95 and the CIPM formula to 1 part in 10⁵',
  ({ celsius, iapws95, cipm }) => {
    expect(relative(waterDensity(kelvin(celsius)), iapws95)).toBeLessThan(1e-5);
    expect(relative(waterDensity(kelvin(celsius)), cipm)).toBeLessThan(1e-5);
  },
);

const usual = { temperature: 295, pressure: 100000, saturation: 1, head: 0 };

test('waterDensity refuses ice and steam, saying the range', () => {
  expect(() => waterDensity(268.15)).toThrow(
    /^temperature must be from 0 to \d+ degC for .*water: got -5 degC$/,
  );
  expect(() => waterDensity(423.15)).toThrow(
    /^temperature must be from 0 to \d+ degC for .*water: got 150 degC$/,
  );
});

test.each<[string, () => number, string]>([
  ['a negative volume', () => gasAmount(-3e-7, usual), 'volume must be 0 or more: got -3e-7'],
  ['absolute zero', () => gasAmount(1, { ...usual, temperature: 0 }), 'temperature must be above 0: got 0'],
  ['no pressure', () => gasAmount(1, { ...usual, pressure: NaN }), 'pressure must be above 0: got NaN'],
  [
    'percent for a fraction',
    () => gasAmount(1, { ...usual, saturation: 100 }),
    'wet must be from 0 (dry) to 1 (saturated): got 100',
  ],
  [
    'less than the vapour',
    () => gasAmount(1, { ...usual, temperature: 373.15 }),
    'pressure must be above that of the water vapour and column: 100 kPa is not above 101.418 kPa',
  ],
  [
    'ice',
    () => saturationPressure(263.15),
    'temperature must be from 0 to 373.946 degC for water vapour: got -10 degC',
  ],
  [
    'above the critical point',
    () => saturationPressure(700),
    'temperature must be from 0 to 373.946 degC for water vapour: got 426.85 degC',
  ],
  ['no number', () => saturationPressure(NaN), 'temperature must be a finite number: got NaN'],
  ['an endless column', () => waterDensity(Infinity), 'temperature must be a finite number: got Infinity'],
])('refuses %s in words', (_, call, message) => {
  expect(call).toThrow(InvalidInput);
  expect(call).toThrow(new InvalidInput(message));
});

test('dryGasPressure of argon over water, as printed: 750 torr at 26 °C leave 725 torr', () => {
  // OpenStax, Chemistry 2e, 9.3
  const torr = 101325 / 760;
  const dry = dryGasPressure({ temperature: kelvin(26), pressure: 750 * torr, saturation: 1, head: 0 });
  expect(dry / torr).toBeCloseTo(725, 0);
  expect(Math.abs(dry / torr - 724.8)).toBeLessThan(0.05);
});
