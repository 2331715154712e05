import { ratesAlong } from '../../src/rate/tangent';
import { detail } from '../commonParameters';
import { sayAlong } from '../builtIn/tangent';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column } from '../parameters';
import { standardRow } from '../results';
import { besideTimes, seriesOf } from '../run';
import { tangentEquations, tangentMethod, tangentParameters } from './tangentParameters';

export default defineFunction({
  name: 'ALONG',
  family: 'rate',
  summary: 'The rate of reaction at every reading of a run, in one spill beside it.',
  equations: tangentEquations,
  method: `${tangentMethod} A row of times gives the rates in a row; a gap stays empty.`,
  uncertainty: uncertaintyOf.tangent,
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'readings, amounts or concentrations, one a time' }),
    ...tangentParameters,
    detail: detail(),
  },
  result: { unit: 'reading per time', shape: 'column' },
  // the slopes of t²
  example: { formula: '=PACE.ALONG({0;1;2;3;4},{0;1;4;9;16},5)', equals: [[0], [2], [4], [6], [8]] },
  refusals: [
    {
      formula: '=PACE.ALONG({0;1;2},{0;1;4},5)',
      mend: 'Ask for no more readings than there are, or leave points out.',
    },
    {
      formula: '=PACE.ALONG({0;1;2;3},{0;1;4;9},2)',
      mend: 'Give more points, or degree 1 for a straight line.',
    },
  ],
  seeAlso: ['TANGENT', 'START'],
  reference: 'doi:10.1021/ac60214a047; doi:10.1351/goldbook.R05156',
  isLong: { fromCells: 4000 },
  run({ times, values, points, degree, coefficient, detail }) {
    const series = seriesOf(times, values);
    const rates = ratesAlong(series, { points, degree, stoichiometricNumber: coefficient });
    return besideTimes(
      times,
      series,
      rates.map((rate) => (detail ? standardRow(rate) : [rate.value])),
    );
  },
  builtIn: sayAlong,
});
