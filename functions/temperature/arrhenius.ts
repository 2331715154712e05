import { fitArrhenius } from '../../src/temperature/arrhenius';
import { detail } from '../commonParameters';
import { sayArrhenius } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import {
  coefficientUncertainties,
  measuredOf,
  measuredParameters,
  weightsInWords,
} from './measuredParameters';

export default defineFunction({
  name: 'ARRHENIUS',
  family: 'temperature',
  summary: 'Activation energy, kJ/mol, from rate coefficients at several temperatures.',
  method: `ln k = ln A − Ea/RT, a straight line against 1/T, T in kelvin. ${weightsInWords} Limits are Student’s. The second row of detail is ln A, for A in the unit of the coefficients. Two temperatures give a value and no uncertainty.`,
  parameters: { ...measuredParameters, uncertainties: coefficientUncertainties, detail: detail() },
  result: { unit: 'kJ/mol', shape: 'one value' },
  // twice as fast 10 °C warmer: R ln 2/(1/298.15 − 1/308.15)
  example: { formula: '=PACE.ARRHENIUS({25;35},{1;2})', equals: 52.94886216572007 },
  reference: 'doi:10.1351/goldbook.A00446; doi:10.1351/goldbook.A00102',
  run(given) {
    const { activationEnergy, logFactor } = fitArrhenius(measuredOf(given));
    return given.detail ? [standardRow(activationEnergy), standardRow(logFactor)] : activationEnergy.value;
  },
  builtIn: sayArrhenius,
});
