import { fractionConverted } from '../../src/signal/linear';
import { convertColumn } from '../column';
import { sayConversion } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, readings } from '../parameters';

export default defineFunction({
  name: 'CONVERSION',
  family: 'reading',
  summary: 'Fraction converted, from any reading that is linear in concentration.',
  equations: {
    lines: ['x = (r₀ − r)/(r₀ − r∞)'],
    where: {
      x: 'fraction converted',
      r: 'reading',
      'r₀': 'start',
      'r∞': 'end',
    },
  },
  method:
    'For any reading that is linear in concentration: rotation, absorbance, conductivity, volume, refractive index. Readings that scatter may come out slightly below 0 or above 1.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    readings: readings({ help: 'one or many', unit: 'any' }),
    start: number({ help: 'reading before the reaction', unit: 'of the readings' }),
    end: number({ help: 'reading when all has reacted', unit: 'of the readings' }),
  },
  result: { unit: '1', shape: 'as given' },
  example: { formula: '=PACE.CONVERSION({32;16;0},32,-8)', equals: [[0], [0.4], [0.8]] },
  refusals: [
    {
      formula: '=PACE.CONVERSION({32;16},32,32)',
      mend: 'Give the readings before and after the whole reaction; they must differ.',
    },
  ],
  seeAlso: ['REMAINING', 'COEFFICIENT', 'TIMETO'],
  reference: 'doi:10.1351/goldbook.E02229',
  run: ({ readings, start, end }) =>
    convertColumn(readings, (reading) => fractionConverted(reading, start, end)),
  builtIn: sayConversion,
});
