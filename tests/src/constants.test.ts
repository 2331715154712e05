/** Constants against CODATA 2022 as SciPy 1.17.1 tabulates it (scipy.constants), and the SI's definitions. */
import * as constants from '../../src/constants';
import { convertUnit } from '../../src/units';

test.each([
  ['gasConstant', 8.31446261815324],
  ['avogadroConstant', 6.02214076e23],
  ['planckConstant', 6.62607015e-34],
  ['boltzmannConstant', 1.380649e-23],
  ['elementaryCharge', 1.602176634e-19],
  ['standardAtmosphere', 101325],
  ['celsiusZero', 273.15],
] as const)('%s is %d', (name, value) => {
  expect(constants[name]).toBe(value);
});

test('the gas constant is Avogadro’s times Boltzmann’s', () => {
  const { avogadroConstant, boltzmannConstant, gasConstant } = constants;
  expect((avogadroConstant * boltzmannConstant) / gasConstant).toBeCloseTo(1, 14);
});

test('the vacuum permittivity lies within the uncertainty of 8.854 187 8188(14) × 10⁻¹² F/m', () => {
  expect(Math.abs(constants.vacuumPermittivity - 8.8541878188e-12)).toBeLessThan(1.4e-21);
});

test('units that are defined by constants: torr and the thermochemical calorie', () => {
  expect(convertUnit(760, 'torr', 'Pa', 'pressure')).toBeCloseTo(101325, 9);
  expect(convertUnit(1, 'cal', 'J', 'energy')).toBeCloseTo(4.184, 14);
});
