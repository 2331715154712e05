import { fitArrhenius } from '../../src/temperature/arrhenius';
import { detail } from '../commonParameters';
import { sayArrhenius } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { standardRow } from '../results';
import {
  arrheniusEquations,
  coefficientUncertainties,
  measuredOf,
  measuredParameters,
  weightsInWords,
} from './measuredParameters';

export default defineFunction({
  name: 'ARRHENIUS',
  family: 'temperature',
  summary: 'Activation energy, kJ/mol, from rate coefficients at several temperatures.',
  equations: arrheniusEquations,
  method: `A straight line against 1/T. ${weightsInWords} The second row of detail is ln A, for A in the unit of the coefficients. Two temperatures give a value and no uncertainty.`,
  uncertainty: uncertaintyOf.line,
  parameters: { ...measuredParameters, uncertainties: coefficientUncertainties, detail: detail() },
  result: { unit: 'kJ/mol', shape: 'one value' },
  // twice as fast 10 °C warmer: R ln 2/(1/298.15 − 1/308.15)
  example: { formula: '=PACE.ARRHENIUS({25;35},{1;2})', equals: 52.94886216572007 },
  refusals: [
    {
      formula: '=PACE.ARRHENIUS({298.15;308.15},{1;2})',
      mend: 'Give °C, or write the unit in each cell: "298.15 K".',
    },
    { formula: '=PACE.ARRHENIUS({25;25},{1;1.1})', mend: 'Measure at another temperature as well.' },
    {
      formula: '=PACE.ARRHENIUS({25;35},{1;-2})',
      mend: 'A rate coefficient is above 0: give it without a sign.',
    },
  ],
  seeAlso: ['COEFFICIENTAT', 'EYRING', 'MEANTEMP', 'COEFFICIENT'],
  reference: 'doi:10.1351/goldbook.A00446; doi:10.1351/goldbook.A00102',
  run(given) {
    const { activationEnergy, logFactor } = fitArrhenius(measuredOf(given));
    return given.detail ? [standardRow(activationEnergy), standardRow(logFactor)] : activationEnergy.value;
  },
  builtIn: sayArrhenius,
});
