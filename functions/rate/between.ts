import { averageRate } from '../../src/rate/average';
import { detail, stoichiometricNumber } from '../commonParameters';
import { sayBetween } from '../builtIn/rate';
import { defineFunction } from '../define';
import { column, number } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';

export default defineFunction({
  name: 'BETWEEN',
  family: 'rate',
  summary: 'Average rate of reaction between two times.',
  method:
    'r = (1/ν)[y(to) − y(from)]/(to − from); where no reading sits, y is interpolated linearly, and replicates are averaged. The standard uncertainty carries the scatter of single readings, taken from each reading and its two neighbours (Gasser et al. 1986), through the interpolation; it knows nothing of the bend between two readings.',
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
  reference: 'doi:10.1351/goldbook.R05156; doi:10.1093/biomet/73.3.625',
  run: ({ times, values, from, to, coefficient, detail }) =>
    estimateResult(averageRate(seriesOf(times, values), from, to, coefficient), detail),
  builtIn: sayBetween,
});
