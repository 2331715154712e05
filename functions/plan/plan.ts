import { InvalidInput } from '../../src/errors';
import { planAgainst } from '../../src/plan/rival';
import { planForCoefficient, type PlannedRun } from '../../src/plan/sampling';
import type { CellValue } from '../cell';
import { defineFunction } from '../define';
import { number, optional, text } from '../parameters';

export default defineFunction({
  name: 'PLAN',
  family: 'mechanism',
  summary: 'When to take readings so that a rate coefficient, or the order, comes out as surely as it can.',
  method:
    'For k: the times that make its variance smallest by Fisher’s information, c₀ fitted as well (known with one reading) and the end 0; beside them the standard uncertainty to expect. For a rival order: the times at which its best curve misses the true one most (T-optimality), and the chance that a test at the 5 % level rules it out. No reading later than six half lives. A time that comes twice asks for two readings. The plan is as good as the k it starts from.',
  parameters: {
    order: number({ help: 'n in −dc/dt = kcⁿ, as believed' }),
    coefficient: number({ help: 'rate coefficient, as believed', unit: 'initial^(1−n) per time', above: 0 }),
    initial: number({ help: 'concentration or reading at the start', unit: 'any', above: 0 }),
    noise: number({ help: 'standard deviation of one reading', unit: 'of initial', above: 0 }),
    samples: number({ help: 'how many readings', atLeast: 1, atMost: 200, whole: true }),
    goal: optional(
      text({ help: '"coefficient", or an order to be told from', orNumber: true }),
      'coefficient',
      'the rate coefficient',
    ),
  },
  result: { unit: 'time of the coefficient', shape: 'table' },
  // the best single time for a first order with known start is 1/k, where e·noise/c₀ is the share of k
  example: {
    formula: '=PACE.PLAN(1,0.1,1,0.01,1)',
    equals: [['time'], [10, 0.002718281828459045]],
    within: 1e-7,
  },
  reference:
    'doi:10.1093/biomet/62.1.57; Atkinson, Donev and Tobias, Optimum Experimental Designs (2007), 17',
  isLong: true,
  run({ order, coefficient, initial, noise, samples, goal }) {
    const run = { order, rateCoefficient: coefficient, initial, noise, samples };
    if (typeof goal === 'number') return againstRival(run, goal);
    if (goal.toLowerCase() !== 'coefficient') {
      throw new InvalidInput(`goal must be "coefficient" or another order: got the text "${goal}"`);
    }
    const { times, standardUncertainty } = planForCoefficient(run);
    return withAnswer('standard uncertainty to expect', times, standardUncertainty);
  },
});

function againstRival(run: PlannedRun, rival: number): CellValue[][] {
  const { times, power } = planAgainst(run, rival);
  return withAnswer(`chance to rule out order ${rival}`, times, power);
}

const withAnswer = (heading: string, times: readonly number[], answer: number): CellValue[][] => [
  ['time', heading],
  ...times.map((time, i) => [time, i === 0 ? answer : '']),
];
