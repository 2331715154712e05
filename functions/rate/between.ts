import { averageRate } from '../../src/rate/average';
import { detail, stoichiometricNumber } from '../commonParameters';
import { sayBetween } from '../builtIn/rate';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column, number } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';

export default defineFunction({
  name: 'BETWEEN',
  family: 'rate',
  summary: 'Average rate of reaction between two times.',
  equations: {
    lines: ['r = 1/ν · (y₂ − y₁)/(t₂ − t₁)'],
    where: {
      r: 'average rate of reaction',
      ν: 'coefficient, the stoichiometric number of the species',
      'y₁': 'reading at from',
      'y₂': 'reading at to',
      't₁': 'from',
      't₂': 'to',
    },
  },
  method:
    'Where no reading sits, y is read off the straight line between its neighbours; readings of one time are averaged. The scatter of single readings is taken from each reading and its two neighbours (Gasser et al. 1986) and carried through; the bend of the run between two readings is not counted.',
  uncertainty: uncertaintyOf.neighbours,
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'readings, amounts or concentrations, one a time' }),
    from: number({ help: 'first time, within the run', unit: 'of the times' }),
    to: number({ help: 'last time, within the run', unit: 'of the times' }),
    coefficient: stoichiometricNumber(),
    detail: detail(),
  },
  result: { unit: 'reading per time', shape: 'one value' },
  example: { formula: '=PACE.BETWEEN({0;10;20},{1;0.6;0.4},0,20)', equals: 0.03 },
  refusals: [
    {
      formula: '=PACE.BETWEEN({0;10;20},{1;0.6;0.4},0,30)',
      mend: 'Ask within the run. Beyond it nothing was measured.',
    },
    {
      formula: '=PACE.BETWEEN({0;10;20},{1;0.6;0.4},10,10)',
      mend: 'Give two different times, or ask PACE.TANGENT for the rate at one.',
    },
  ],
  seeAlso: ['TANGENT', 'START', 'ALONG'],
  reference: 'doi:10.1351/goldbook.R05156; doi:10.1093/biomet/73.3.625',
  run: ({ times, values, from, to, coefficient, detail }) =>
    estimateResult(averageRate(seriesOf(times, values), from, to, coefficient), detail),
  builtIn: sayBetween,
});
