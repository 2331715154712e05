import { timeToConversion } from '../../src/temperature/timeTo';
import { sayTimeTo } from '../builtIn/temperature';
import { defineFunction } from '../define';
import { number, optional } from '../parameters';
import { shelfLifeCaution } from './cautions';

export default defineFunction({
  name: 'TIMETO',
  family: 'temperature',
  summary: 'Time until a given fraction of the reactant is converted.',
  equations: {
    lines: ['t = [(1 − x)^(1 − n) − 1]/[(n − 1)kc₀^(n − 1)]', 't = −ln(1 − x)/k'],
    where: {
      t: 'time',
      x: 'fraction converted',
      n: 'order',
      k: 'rate coefficient',
      'c₀': 'initial, the concentration at the start',
    },
  },
  method:
    'The second equation is that of order 1. Below order 1 the reactant is used up in a finite time. The reactant is taken to vanish in the end, by the one law all the way.',
  uncertainty:
    'None is given. Ask once with the lower and once with the upper limit of the coefficient: the two times are the limits.',
  parameters: {
    fraction: number({ help: 'fraction converted', above: 0, below: 1 }),
    coefficient: number({
      help: 'rate coefficient k in −d[A]/dt = k[A]ⁿ',
      unit: '(mol/L)^(1−n)/s',
      above: 0,
    }),
    order: number({ help: 'n, need not be whole' }),
    initial: optional(
      number({ help: '[A]₀, in the concentration unit of the coefficient', unit: 'mol/L', above: 0 }),
      undefined,
      'not needed at order 1',
    ),
  },
  result: { unit: 's, or the time unit of coefficient', shape: 'one value' },
  // ln 2/k
  example: { formula: '=PACE.TIMETO(0.5,3.21E-5,1)', equals: 21593.37011090172 },
  refusals: [
    {
      formula: '=PACE.TIMETO(0.5,0.02,2)',
      mend: 'Give the concentration at the start: at this order the time depends on it.',
    },
  ],
  seeAlso: ['COEFFICIENTAT', 'HALFLIFE', 'CONVERSION'],
  reference: 'doi:10.1351/goldbook.H02716; doi:10.1351/goldbook.O04322',
  caution: shelfLifeCaution,
  run: (conversion) => timeToConversion(conversion),
  builtIn: sayTimeTo,
});
