import { remainingReactant } from '../../src/signal/remaining';
import { convertColumn } from '../column';
import { sayRemaining } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, optional, readings } from '../parameters';

export default defineFunction({
  name: 'REMAINING',
  family: 'reading',
  summary: 'Reactant left, from the product formed so far.',
  equations: {
    lines: ['c = c₀ − zc_f'],
    where: {
      c: 'reactant left',
      'c₀': 'reactant at the start',
      z: 'ratio, reactant used for each product formed',
      c_f: 'product formed',
    },
  },
  method:
    'Both are in one unit. Results slightly below 0 are left as they are, since readings scatter; more than 5 % below 0, the start or the ratio cannot be right (common practice).',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    formed: readings({ help: 'product formed, one or many', unit: 'of initial' }),
    initial: number({ help: 'reactant at the start', unit: 'of formed', above: 0 }),
    ratio: optional(number({ help: 'reactant used per product formed', above: 0 }), 1),
  },
  result: { unit: 'of initial', shape: 'as given' },
  example: { formula: '=PACE.REMAINING({0;0.004;0.008},0.02,2)', equals: [[0.02], [0.012], [0.004]] },
  refusals: [
    {
      formula: '=PACE.REMAINING({0;0.03},0.02)',
      mend: 'Check initial and ratio, and that both columns are in one unit.',
    },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS', 'MASSLOSS', 'GASVOLUME'],
  reference: 'doi:10.1351/goldbook.S06025',
  run: ({ formed, initial, ratio }) =>
    convertColumn(formed, (amount) => remainingReactant(amount, initial, ratio)),
  builtIn: sayRemaining,
});
