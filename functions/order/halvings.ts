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
  method:
    'The times that each halving of the distance from the end took, first to last, read between two readings as if the distance fell exponentially there. Alike: order 1. Each half the one before: order 0. Each twice the one before: order 2.',
  parameters: { ...runParameters, endpoint: endpoint() },
  result: { unit: 'of the times', shape: 'column' },
  example: { formula: '=PACE.HALVINGS({0;10;20;30},{8;4;2;1})', equals: [[10], [10], [10]] },
  reference: 'doi:10.1351/goldbook.H02716',
  run({ times, values, endpoint }) {
    if (endpoint === 'free') {
      throw new InvalidInput('endpoint must be a number here: to fit it would presume an order');
    }
    return successiveHalfLives(seriesOf(times, values), endpoint).map((halfLife) => [halfLife]);
  },
  builtIn: sayHalvings,
});
