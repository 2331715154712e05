import { tangentRate } from '../../src/rate/tangent';
import { detail } from '../commonParameters';
import { sayTangent } from '../builtIn/tangent';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column, number } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';
import { tangentEquations, tangentMethod, tangentParameters } from './tangentParameters';

export default defineFunction({
  name: 'TANGENT',
  family: 'rate',
  summary: 'Rate of reaction at one time: the slope of the tangent to the run.',
  equations: tangentEquations,
  method: tangentMethod,
  uncertainty: uncertaintyOf.tangent,
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
  refusals: [
    { formula: '=PACE.TANGENT({0;1;2;3;4},{0;1;4;9;16},5)', mend: 'Ask for a time within the run.' },
    {
      formula: '=PACE.TANGENT({0;1;2},{0;1;4},1,5)',
      mend: 'Ask for no more readings than there are, or leave points out.',
    },
    {
      formula: '=PACE.TANGENT({0;1;2;3},{0;1;4;9},1,2)',
      mend: 'Give more points, or degree 1 for a straight line.',
    },
    {
      formula: '=PACE.TANGENT({0;0;1;1},{0;0.1;1;1.1},1)',
      mend: 'Read at more times: readings of one time count as one place on the curve.',
    },
  ],
  seeAlso: ['ALONG', 'START', 'BETWEEN'],
  reference: 'doi:10.1021/ac60214a047; doi:10.1351/goldbook.R05156',
  isLong: { fromCells: 4000 },
  run: ({ times, values, time, points, degree, coefficient, detail }) =>
    estimateResult(
      tangentRate(seriesOf(times, values), time, { points, degree, stoichiometricNumber: coefficient }),
      detail,
    ),
  builtIn: sayTangent,
});
