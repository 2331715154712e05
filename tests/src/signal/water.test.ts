/** Water as a solvent: what dissolves in it, how it splits, how ions feel each other. */
import activity from '../../reference/activity.json';
import henry from '../../reference/henry.json';
import ionProduct from '../../reference/water-ion-product.json';
import readings from '../../reference/readings.json';
import { ionFromPH, ionProductAt, waterIonProduct } from '../../../src/signal/acidity';
import { activityCoefficient, debyeHueckelSlope } from '../../../src/signal/activity';
import { waterDielectricConstant } from '../../../src/signal/dielectric';
import { dissolvedAmount, dissolvingGases, henryConstant } from '../../../src/signal/henry';
import { relative } from '../../support/compare';

const kelvin = (celsius: number): number => celsius + 273.15;

describe.each(henry.cases)('Henry’s law constant of $gas', ({ gas, printed, computed }) => {
  test('meets the verification values of IAPWS G7-04 to every digit printed', () => {
    for (const { kelvin: at, lnGPa } of printed) {
      expect(Math.abs(Math.log(henryConstant(gas, at) / 1e9) - lnGPa)).toBeLessThan(5.1e-5);
    }
  });

  test('agrees with another implementation to 1e-12, the solubility within the density', () => {
    for (const { celsius, pascal, solubility } of computed) {
      expect(relative(henryConstant(gas, kelvin(celsius)), pascal)).toBeLessThan(1e-12);
      // densities differ by 1 part in 10⁵, molar masses of water by 1 in 10⁵
      expect(relative(dissolvedAmount(1, gas, 1, kelvin(celsius)), solubility)).toBeLessThan(2e-5);
    }
  });
});

// IAPWS G7-04, Table 6 at 300 K and 400 K, recalled from memory
test.each([
  ['He', 2.6576, 2.166],
  ['Ne', 2.5134, 2.3512],
  ['Ar', 1.4061, 1.8079],
  ['Kr', 0.821, 1.4902],
  ['Xe', 0.2792, 1.143],
  ['H2', 1.9702, 1.8464],
  ['N2', 2.1716, 2.3509],
  ['O2', 1.5024, 1.8832],
  ['CO', 1.7652, 1.9939],
  ['CO2', -1.7508, -0.545],
  ['H2S', -2.8784, -1.7083],
  ['CH4', 1.4034, 1.7946],
  ['C2H6', 1.1418, 1.8495],
  ['SF6', 3.1445, 3.6919],
])('henryConstant of %s meets the guideline’s table', (gas, at300, at400) => {
  expect(Math.abs(Math.log(henryConstant(gas, 300) / 1e9) - at300)).toBeLessThan(5.1e-5);
  expect(Math.abs(Math.log(henryConstant(gas, 400) / 1e9) - at400)).toBeLessThan(5.1e-5);
});

test('every gas the guideline names is there; another is refused by name', () => {
  expect(dissolvingGases).toHaveLength(14);
  expect(() => henryConstant('Cl2', 300)).toThrow(/^gas must be one of He, Ne, .*: got "Cl2"$/);
  expect(() => henryConstant('toString', 300)).toThrow(/got "toString"$/);
});

test('dissolvedAmount: CO2 over 100 mL of water', () => {
  const { given, expected } = readings.cases.find(({ id }) => id === 'dissolved-CO2')!;
  const found = dissolvedAmount(given.pCO2_Pa!, 'CO2', given.Vliquid_L! / 1000, kelvin(given.t_C!));
  expect(relative(found, expected.nDissolved_mol!)).toBeLessThan(2e-5);
  expect(() => dissolvedAmount(1, 'CO2', 1, kelvin(101))).toThrow(
    'temperature must be from 0 to 100 degC for liquid water: got 101 degC',
  );
});

test('ionProductAt meets the verification value of IAPWS R11-24', () => {
  const { kelvin: at, density, pKw } = ionProduct.verification;
  expect(ionProductAt(at, density)).toBeCloseTo(pKw, 6);
});

test.each(ionProduct.cases)('pKw at $celsius °C', ({ celsius, density, pKw, textbook }) => {
  expect(ionProductAt(kelvin(celsius), density)).toBeCloseTo(pKw, 12);
  expect(Math.abs(waterIonProduct(kelvin(celsius)) - pKw)).toBeLessThan(1e-4); // the density's part
  if (textbook !== null) expect(Math.abs(waterIonProduct(kelvin(celsius)) - textbook)).toBeLessThan(0.02);
});

test.each(activity.cases)('dielectric constant and limiting slope at $celsius °C to 1e-5', (c) => {
  expect(relative(waterDielectricConstant(kelvin(c.celsius)), c.dielectricConstant)).toBeLessThan(1e-5);
  expect(relative(debyeHueckelSlope(kelvin(c.celsius)), c.slope)).toBeLessThan(1e-5);
});

test.each(activity.davies)('activity coefficient of charge $charge at $ionicStrength mol/L', (c) => {
  expect(relative(activityCoefficient(c.charge, c.ionicStrength, 0.509), c.gamma)).toBeLessThan(1e-12);
});

test('activityCoefficient: 1 without ions or charge, refused beyond 0.5 mol/L', () => {
  expect(activityCoefficient(1, 0, 0.509)).toBe(1);
  expect(activityCoefficient(0, 0.3, 0.509)).toBe(1);
  expect(() => activityCoefficient(1, 0.51, 0.509)).toThrow(
    'ionic strength must be from 0 to 0.5 mol/L: got 0.51 mol/L',
  );
});

test('ionFromPH: H⁺ times OH⁻ is the ion product, whatever the pH', () => {
  for (const pH of [2, 7, 11.3]) {
    const at = { temperature: kelvin(40) };
    const product = ionFromPH(pH, 'H', at) * ionFromPH(pH, 'OH', at);
    expect(relative(product, 10 ** -waterIonProduct(kelvin(40)))).toBeLessThan(1e-12);
  }
  expect(() => ionFromPH(20, 'H', { temperature: 298.15 })).toThrow('pH must be from -2 to 16: got 20');
});
