import { rateCoefficientEstimate } from '../../src/order/profile';
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
  name: 'COEFFICIENT',
  family: 'order',
  summary: 'Rate coefficient k of a run whose order is known.',
  equations: {
    lines: [...lawLines, 'k = κ|y₀ − y∞|^(1 − n)'],
    where: { ...lawQuantities, k: 'rate coefficient' },
  },
  method: `${lawMethod} k belongs to the distance from the end, so its unit is that of the readings to the power 1 − n, per time: PACE.UNIT writes it.`,
  uncertainty: uncertaintyOf.profile,
  parameters: knownLawParameters,
  result: { unit: 'reading^(1−n) per time', shape: 'one value' },
  // halved every 10: k = ln 2/10
  example: { formula: '=PACE.COEFFICIENT({0;10;20;30},{8;4;2;1},1)', equals: 0.06931471805599453 },
  refusals: [
    {
      formula: '=PACE.COEFFICIENT({0;10;20;30},{0;4;6;7},1)',
      mend: 'Give the reading at infinite time as endpoint, or "free" to have it fitted.',
    },
    {
      formula: '=PACE.COEFFICIENT({0;10},{8;4},1,"free")',
      mend: 'Take more readings. Each number that is fitted needs one.',
    },
    {
      formula: '=PACE.COEFFICIENT({0;10;20;30},{8;8;8;8},1)',
      mend: 'Nothing happens in this column: check that it is the right one.',
    },
    {
      formula: '=PACE.COEFFICIENT({0;1;2;3},{8;7.9;7.8;7.7},1,"free")',
      mend: 'Follow the reaction for longer, or give the endpoint if it is known.',
    },
    {
      formula: '=PACE.COEFFICIENT({0;10;20;30},{8;4;2;0},1,,"relative")',
      mend: 'Give each reading its own standard uncertainty: a share of 0 is none.',
    },
  ],
  seeAlso: ['ORDERS', 'HALFLIFE', 'UNIT', 'CURVE', 'ARRHENIUS'],
  reference: 'doi:10.1351/goldbook.O04322; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  run(given) {
    const fit = fitKnownLaw(given);
    return given.detail ? [standardRow(rateCoefficientEstimate(fit))] : fit.rateCoefficient;
  },
  fits: knownLawTable,
});
