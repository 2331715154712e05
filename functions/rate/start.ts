import { startRateOf } from '../../src/rate/start';
import { detail, stoichiometricNumber } from '../commonParameters';
import { sayStart } from '../builtIn/start';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column, number, optional } from '../parameters';
import { estimateResult } from '../results';
import { seriesOf } from '../run';

export default defineFunction({
  name: 'START',
  family: 'rate',
  summary: 'Initial rate of reaction: the slope at the first time.',
  equations: {
    lines: ['yᵢ = b₀ + b₁(tᵢ − t₁) + b₂(tᵢ − t₁)² + eᵢ', 'r = b₁/ν'],
    where: {
      yᵢ: 'an early reading',
      tᵢ: 'its time',
      't₁': 'the first time',
      'b₀': 'height of the parabola there',
      'b₁': 'slope of the parabola there',
      'b₂': 'bend of the parabola',
      eᵢ: 'scatter; the sum of its squares is made least',
      r: 'initial rate of reaction',
      ν: 'coefficient, the stoichiometric number of the species',
    },
  },
  method:
    'A parabola by least squares through the early readings: those before the run has gone through a share of its whole change, and at least five. Its slope at the first time is the initial rate. Where a run bends sharply at first, give a smaller share or read more often.',
  uncertainty: uncertaintyOf.line,
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
  refusals: [
    { formula: '=PACE.START({0;1},{0;9})', mend: 'Read at three times or more while little has reacted.' },
  ],
  seeAlso: ['EXPONENTS', 'TANGENT', 'EVENT'],
  reference: 'doi:10.1351/goldbook.R05156',
  run: ({ times, values, share, coefficient, detail }) =>
    estimateResult(
      startRateOf(seriesOf(times, values), { share, stoichiometricNumber: coefficient }),
      detail,
    ),
  builtIn: sayStart,
});
