import { sayCourse } from '../builtIn/closedCourse';
import type { CellValue } from '../cell';
import { linesBeside } from '../column';
import { defineFunction } from '../define';
import {
  courseAt,
  filled,
  schemeEquations,
  schemeMethod,
  schemeParameters,
  speciesAt,
  stepAt,
} from './schemeParameters';

export default defineFunction({
  name: 'COURSE',
  family: 'mechanism',
  summary: 'Concentration of every species of a written mechanism over time, a column each.',
  equations: schemeEquations,
  method: `${schemeMethod} Where the equations have a closed form (first-order steps of one reactant, A <-> B, A -> B -> C, one step of second order), that is used instead. Columns stand in the order in which the scheme first names the species; a row of times is answered in rows. Times may stand in any order.`,
  uncertainty:
    'None is given: the course follows exactly from the coefficients you give. Numbers of the integration are good to about eight digits.',
  parameters: schemeParameters,
  result: { unit: 'as initial', shape: 'table' },
  // two steps at k = 0.12 and 0.035: A = e^(−0.12 t), B = 0.12/(0.035 − 0.12) (e^(−0.12 t) − e^(−0.035 t))
  example: {
    formula: '=PACE.COURSE("A -> B -> C",{0.12;0.035},{1;0;0},{0;10;40})',
    equals: [
      [1, 0, 0],
      [0.30119421191220214, 0.5696384157268395, 0.12916737236095832],
      [0.00822974704902003, 0.33651842384835734, 0.6552518291026226],
    ],
    within: 1e-8,
  },
  refusals: [
    {
      formula: '=PACE.COURSE("A - B",1,{1;0},{0;1})',
      mend: 'Write an arrow -> or <-> with a space on each side of every plus.',
    },
    {
      formula: '=PACE.COURSE("A -> B -> C",0.12,{1;0;0},{0;10})',
      mend: 'Give a coefficient for each step in its order; two for a step with <->.',
    },
    {
      formula: '=PACE.COURSE("A -> B",0.12,{1},{0;10})',
      mend: 'Give every species its concentration at time 0, 0 where there is none.',
    },
  ],
  seeAlso: ['FITCOURSE', 'CURVE', 'PLAN'],
  reference: 'doi:10.1007/s10543-023-00967-x; doi:10.1351/goldbook.O04322',
  isLong: true,
  run({ scheme, coefficients, initial, times }, tell) {
    const rates = filled(coefficients, 'coefficients', stepAt(scheme));
    const start = filled(initial, 'initial', speciesAt(scheme));
    const gap = scheme.species.map((): CellValue => '');
    const course = courseAt(scheme, rates, start, times, tell);
    return linesBeside(
      times,
      course.map((row) => (row ? [...row] : gap)),
    );
  },
  builtIn: sayCourse,
});
