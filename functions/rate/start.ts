import { startRateOf } from '../../src/rate/start';
import { detail, stoichiometricNumber } from '../commonParameters';
import { sayStart } from '../builtIn/rate';
import { defineFunction } from '../define';
import { column, number, optional } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';

export default defineFunction({
  name: 'START',
  family: 'rate',
  summary: 'Initial rate of reaction: the slope at the first time.',
  method:
    'r = (1/ν) dy/dt at the first time of the parabola, by least squares, through the early readings: those before the run has gone through a share of its whole change, and at least five. Where a run bends sharply at first, give a smaller share or read more often.',
  parameters: {
    times: column({ help: 'times of the run', unit: 'time' }),
    values: column({ help: 'readings, amounts or concentrations, one a time' }),
    share: optional(
      number({ help: 'of the whole change, up to which readings count', above: 0, atMost: 1 }),
      0.2,
    ),
    coefficient: stoichiometricNumber(),
    detail: detail(),
  },
  result: { unit: 'reading per time', shape: 'one value' },
  // the slope of 10 t − t² at t = 0
  example: { formula: '=PACE.START({0;1;2;3;4;5},{0;9;16;21;24;25})', equals: 10 },
  reference: 'doi:10.1351/goldbook.R05156',
  run: ({ times, values, share, coefficient, detail }) =>
    estimateResult(
      startRateOf(seriesOf(times, values), { share, stoichiometricNumber: coefficient }),
      detail,
    ),
  builtIn: sayStart,
});
