import { tangentRate } from '../../src/rate/tangent';
import { detail } from '../commonParameters';
import { sayTangent } from '../builtIn/rate';
import { defineFunction } from '../define';
import { column, number } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';
import { tangentMethod, tangentParameters } from './tangentParameters';

export default defineFunction({
  name: 'TANGENT',
  family: 'rate',
  summary: 'Rate of reaction at one time: the slope of the tangent to the run.',
  method: tangentMethod,
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'readings, amounts or concentrations, one a time' }),
    time: number({ help: 'where the rate is wanted, within the run', unit: 'of the times' }),
    ...tangentParameters,
    detail: detail(),
  },
  result: { unit: 'reading per time', shape: 'one value' },
  // the slope of t² at t = 2
  example: { formula: '=PACE.TANGENT({0;1;2;3;4},{0;1;4;9;16},2,5)', equals: 4 },
  reference: 'doi:10.1021/ac60214a047; doi:10.1351/goldbook.R05156',
  run: ({ times, values, time, points, degree, coefficient, detail }) =>
    estimateResult(
      tangentRate(seriesOf(times, values), time, { points, degree, stoichiometricNumber: coefficient }),
      detail,
    ),
  builtIn: sayTangent,
});
