import { InvalidInput } from '../../src/errors';
import { successiveHalfLives } from '../../src/order/halvings';
import { endpoint } from '../commonParameters';
import { sayHalvings } from '../builtIn/course';
import { defineFunction } from '../define';
import { seriesOf } from '../run';
import { runParameters } from './lawParameters';

export default defineFunction({
  name: 'HALVINGS',
  family: 'order',
  summary: 'Successive half lives, read off the data without a fit.',
  equations: {
    lines: ['t = t₁ + (t₂ − t₁) · ln(a₁/a)/ln(a₁/a₂)'],
    where: {
      t: 'time at which the distance from the end is a',
      a: 'half, a quarter, an eighth … of the first distance',
      't₁': 'time of the reading before',
      't₂': 'time of the reading after',
      'a₁': 'distance from the end at the reading before',
      'a₂': 'distance from the end at the reading after',
    },
  },
  method:
    'The times that each halving of the distance from the end took, first to last. Between two readings the distance is taken to fall exponentially. Alike: order 1. Each half the one before: order 0. Each twice the one before: order 2.',
  uncertainty:
    'None is given: each half life rests on the two readings beside it, so the later ones, where little is left, scatter most.',
  parameters: { ...runParameters, endpoint: endpoint() },
  result: { unit: 'of the times', shape: 'column' },
  example: { formula: '=PACE.HALVINGS({0;10;20;30},{8;4;2;1})', equals: [[10], [10], [10]] },
  refusals: [
    { formula: '=PACE.HALVINGS({0;10;20},{8;7;6})', mend: 'Follow the run until at least half is gone.' },
    {
      formula: '=PACE.HALVINGS({0;10;20},{8;4;2},"free")',
      mend: 'Give the endpoint as a number: here nothing is fitted.',
    },
    { formula: '=PACE.HALVINGS({0;10;20},{0;4;6})', mend: 'Give the reading at infinite time as endpoint.' },
  ],
  seeAlso: ['HALFLIFE', 'ORDERS'],
  reference: 'doi:10.1351/goldbook.H02716',
  run({ times, values, endpoint }) {
    if (endpoint === 'free') {
      throw new InvalidInput('endpoint must be a number here: to fit it would presume an order');
    }
    return successiveHalfLives(seriesOf(times, values), endpoint).map((halfLife) => [halfLife]);
  },
  builtIn: sayHalvings,
});
