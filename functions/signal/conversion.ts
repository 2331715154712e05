import { fractionConverted } from '../../src/signal/linear';
import { convertColumn } from '../column';
import { sayConversion } from '../builtIn/linear';
import { defineFunction } from '../define';
import { number, readings } from '../parameters';

export default defineFunction({
  name: 'CONVERSION',
  family: 'reading',
  summary: 'Fraction converted, from any reading that is linear in concentration.',
  method:
    'x = (r₀ − r)/(r₀ − r∞): rotation, absorbance, conductivity, volume, refractive index. Readings that scatter may come out below 0 or above 1.',
  parameters: {
    readings: readings({ help: 'one or many', unit: 'any' }),
    start: number({ help: 'reading before the reaction', unit: 'of the readings' }),
    end: number({ help: 'reading when all has reacted', unit: 'of the readings' }),
  },
  result: { unit: '1', shape: 'as given' },
  example: { formula: '=PACE.CONVERSION({32;16;0},32,-8)', equals: [[0], [0.4], [0.8]] },
  reference: 'doi:10.1351/goldbook.E02229',
  run: ({ readings, start, end }) =>
    convertColumn(readings, (reading) => fractionConverted(reading, start, end)),
  builtIn: sayConversion,
});
