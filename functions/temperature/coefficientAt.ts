import { fitArrhenius } from '../../src/temperature/arrhenius';
import { predictCoefficient } from '../../src/temperature/predict';
import { detail } from '../commonParameters';
import { sayCoefficientAt } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { standardRow } from '../results';
import { shelfLifeCaution } from './cautions';
import {
  arrheniusEquations,
  coefficientUncertainties,
  measuredOf,
  measuredParameters,
  weightsInWords,
} from './measuredParameters';
import { requireNotKelvin, temperature } from './temperatures';

export default defineFunction({
  name: 'COEFFICIENTAT',
  family: 'temperature',
  summary: 'Rate coefficient at another temperature, by the Arrhenius line through those measured.',
  equations: arrheniusEquations,
  method: `A straight line against 1/T. ${weightsInWords} The row of detail ends with "extrapolated" where the temperature lies outside those measured: the limits then take for granted that the same law still holds there.`,
  uncertainty:
    'Student’s limits on ln k from the scatter about the line, carried to k. They belong to the line, not to one more run, and widen with the distance from the measured temperatures.',
  parameters: {
    ...measuredParameters,
    temperature: temperature({ help: 'at which k is asked for' }),
    uncertainties: coefficientUncertainties,
    detail: detail(),
  },
  result: { unit: 'of coefficients', shape: 'one value' },
  // at the harmonic mean of the two temperatures, the geometric mean of the two coefficients
  example: {
    formula: '=PACE.COEFFICIENTAT({25;35},{1;4},29.91753257463302)',
    equals: 2,
  },
  refusals: [
    {
      formula: '=PACE.COEFFICIENTAT({298.15;308.15},{1;2},30)',
      mend: 'Give °C, or write the unit in each cell: "298.15 K".',
    },
    { formula: '=PACE.COEFFICIENTAT({25;25},{1;1.1},30)', mend: 'Measure at another temperature as well.' },
  ],
  seeAlso: ['ARRHENIUS', 'TIMETO', 'MEANTEMP'],
  reference:
    'doi:10.1351/goldbook.A00446; Draper and Smith, Applied Regression Analysis, 3rd ed. (1998), 3.1',
  caution: shelfLifeCaution,
  run(given) {
    const fit = fitArrhenius(measuredOf(given));
    requireNotKelvin(given.temperature, fit.range, 'temperature');
    const predicted = predictCoefficient(fit, given.temperature.kelvin);
    if (!given.detail) return predicted.value;
    return [[...standardRow(predicted), predicted.isExtrapolated ? 'extrapolated' : '']];
  },
  builtIn: sayCoefficientAt,
});
