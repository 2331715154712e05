import { heightAt } from '../../src/order/curve';
import { sayCurve } from '../builtIn/law';
import { convertColumn } from '../column';
import { defineFunction } from '../define';
import { number, optional, readings } from '../parameters';
import { seriesOf } from '../run';
import {
  fitKnownLaw,
  knownLaw,
  knownLawTable,
  lawEquations,
  lawMethod,
  lawParameters,
  runParameters,
} from './lawParameters';

export default defineFunction({
  name: 'CURVE',
  family: 'order',
  summary: 'The fitted rate law as a curve, at the run’s own times or at others.',
  equations: lawEquations,
  method: `${lawMethod} Beyond the last reading the curve predicts, and the further the less surely; before the first it is not followed.`,
  uncertainty:
    'None is given with the curve. That of the coefficient behind it: PACE.COEFFICIENT with detail TRUE.',
  parameters: {
    ...runParameters,
    order: number({ help: 'n in −dc/dt = kcⁿ, need not be whole' }),
    attimes: optional(
      readings({ help: 'where the curve is wanted', unit: 'of the times' }),
      undefined,
      'the times',
    ),
    ...lawParameters,
  },
  result: { unit: 'of the readings', shape: 'as given' },
  example: { formula: '=PACE.CURVE({0;10;20;30},{8;4;2;1},1,{20;40})', equals: [[2], [0.5]] },
  refusals: [
    {
      formula: '=PACE.CURVE({0;10;20;30},{0;4;6;7},1)',
      mend: 'Give the reading at infinite time as endpoint, or "free" to have it fitted.',
    },
    { formula: '=PACE.CURVE({0;10;20;30},{8;4;2;1},1,-5)', mend: 'Ask for the first time or later.' },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS'],
  reference: 'doi:10.1351/goldbook.O04322',
  run({ attimes, ...given }) {
    const [fit, series] = [fitKnownLaw(given), seriesOf(given.times, given.values)];
    return convertColumn(attimes ?? given.times, (time) => heightAt(fit, series, time));
  },
  fits: knownLawTable,
  builtIn: (given) => sayCurve(knownLaw, given),
});
