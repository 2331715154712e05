import { remainingReactant } from '../../src/signal/remaining';
import { convertColumn } from '../column';
import { sayRemaining } from '../builtIn/linear';
import { defineFunction } from '../define';
import { number, optional, readings } from '../parameters';

export default defineFunction({
  name: 'REMAINING',
  family: 'reading',
  summary: 'Reactant left, from the product formed so far.',
  method:
    'c = c₀ − ratio × formed, both in one unit. Slightly negative results are left as they are, since readings scatter; more than 5 % below 0, the start or the ratio cannot be right (common practice).',
  parameters: {
    formed: readings({ help: 'product formed, one or many', unit: 'of initial' }),
    initial: number({ help: 'reactant at the start', unit: 'of formed', above: 0 }),
    ratio: optional(number({ help: 'reactant used per product formed', above: 0 }), 1),
  },
  result: { unit: 'of initial', shape: 'as given' },
  example: { formula: '=PACE.REMAINING({0;0.004;0.008},0.02,2)', equals: [[0.02], [0.012], [0.004]] },
  reference: 'doi:10.1351/goldbook.S06025',
  run: ({ formed, initial, ratio }) =>
    convertColumn(formed, (amount) => remainingReactant(amount, initial, ratio)),
  builtIn: sayRemaining,
});
