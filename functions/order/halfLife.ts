import { halfLifeEstimate } from '../../src/order/profile';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { standardRow } from '../results';
import {
  fitKnownLaw,
  knownLawTable,
  knownLawParameters,
  lawLines,
  lawMethod,
  lawQuantities,
} from './lawParameters';

export default defineFunction({
  name: 'HALFLIFE',
  family: 'order',
  summary: 'Half life of a run whose order is known, counted from its first reading.',
  equations: {
    lines: [...lawLines, 't½ = (2^(n − 1) − 1)/[(n − 1)κ]', 't½ = (ln 2)/κ'],
    where: { ...lawQuantities, 't½': 'half life; the second equation at order 1' },
  },
  method: `${lawMethod} The half life is the time in which the distance from the end halves, counted from the first reading; at order 1 it is the same wherever one begins.`,
  uncertainty: uncertaintyOf.profile,
  parameters: knownLawParameters,
  result: { unit: 'of the times', shape: 'one value' },
  example: { formula: '=PACE.HALFLIFE({0;10;20;30},{8;4;2;1},1)', equals: 10 },
  refusals: [
    {
      formula: '=PACE.HALFLIFE({0;10;20;30},{0;4;6;7},1)',
      mend: 'Give the reading at infinite time as endpoint, or "free" to have it fitted.',
    },
    {
      formula: '=PACE.HALFLIFE({0;10},{8;4},1,"free")',
      mend: 'Take more readings. Each number that is fitted needs one.',
    },
    {
      formula: '=PACE.HALFLIFE({0;10;20;30},{8;8;8;8},1)',
      mend: 'Nothing happens in this column: check that it is the right one.',
    },
  ],
  seeAlso: ['HALVINGS', 'COEFFICIENT', 'TIMETO'],
  reference: 'doi:10.1351/goldbook.H02716; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  run(given) {
    const fit = fitKnownLaw(given);
    return given.detail ? [standardRow(halfLifeEstimate(fit))] : fit.halfLife;
  },
  fits: knownLawTable,
});
