import { InvalidInput } from '../../src/errors';
import { planAgainst } from '../../src/plan/rival';
import type { Tell } from '../../src/progress';
import { planForCoefficient, type PlannedRun } from '../../src/plan/sampling';
import type { CellValue } from '../cell';
import { defineFunction } from '../define';
import { number, optional, text } from '../parameters';

export default defineFunction({
  name: 'PLAN',
  family: 'mechanism',
  summary: 'When to take readings so that a rate coefficient, or the order, comes out as surely as it can.',
  equations: {
    lines: ['F = ∑ᵢ gᵢgᵢᵀ/σ²', 'C = F⁻¹', 'u_k = √C_kk'],
    where: {
      F: 'Fisher’s information on ln k and c₀',
      gᵢ: 'sensitivity of the reading at a time to ln k and c₀',
      σ: 'noise',
      C: 'covariance of ln k and c₀ to expect',
      C_kk: 'its entry for ln k',
      u_k: 'relative standard uncertainty of k',
    },
  },
  method:
    'For k: the times that make its variance smallest by Fisher’s information, c₀ fitted as well (known with one reading) and the end 0; beside them the standard uncertainty to expect. For a rival order: the times at which its best curve misses the true one most (T-optimality), and the chance that a test at the 5 % level rules it out. No reading later than six half lives. A time that comes twice asks for two readings. The plan is as good as the k it starts from.',
  uncertainty: 'The one to expect is computed from the noise you give, before any reading is taken.',
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
  refusals: [
    { formula: '=PACE.PLAN(1,0.1,1,0.01,5,1)', mend: 'Give as goal another order than the one believed.' },
    { formula: '=PACE.PLAN(1,0.1,1,0.01,2,2)', mend: 'Plan three readings or more.' },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS', 'COURSE'],
  reference:
    'doi:10.1093/biomet/62.1.57; Atkinson, Donev and Tobias, Optimum Experimental Designs (2007), 17',
  isLong: true,
  run({ order, coefficient, initial, noise, samples, goal }, tell) {
    const run = { order, rateCoefficient: coefficient, initial, noise, samples };
    if (typeof goal === 'number') return againstRival(run, goal, tell);
    if (goal.toLowerCase() !== 'coefficient') {
      throw new InvalidInput(`goal must be "coefficient" or another order: got the text "${goal}"`);
    }
    const { times, standardUncertainty } = planForCoefficient(run);
    return withAnswer('standard uncertainty to expect', times, standardUncertainty);
  },
});

function againstRival(run: PlannedRun, rival: number, tell?: Tell): CellValue[][] {
  const { times, power } = planAgainst(run, rival, tell);
  return withAnswer(`chance to rule out order ${rival}`, times, power);
}

const withAnswer = (heading: string, times: readonly number[], answer: number): CellValue[][] => [
  ['time', heading],
  ...times.map((time, i) => [time, i === 0 ? answer : '']),
];
