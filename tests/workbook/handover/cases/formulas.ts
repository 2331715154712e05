/** Calls within other formulas, and those that no built-in function can say. */
import { column } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

export const formulas: Cases = {
  'Within other formulas': {
    typed: {
      ...column('A1', [0, 0.004, 0.008]),
      C1: '=SUM(PACE.REMAINING(A1:A3,0.02))*2',
      D1: '=PACE.CONVERSION(PACE.REMAINING(A1:A3,0.02),0.02,0)',
      E1: '=100*PACE.REMAINING(A1:A3,0.02)',
    },
    becomes: 'live',
    changed: { A3: 0.009 },
  },
  'It’s another sheet': {
    typed: {
      C1: "=PACE.CONVERSION('Conversion, gaps and text'!A1:A6,'Conversion, gaps and text'!B1,-8)",
    },
    becomes: 'live',
    changed: {},
  },
  'A fit': {
    typed: { ...run, D2: '=PACE.COEFFICIENT(A2:A9,B2:B9,1,"free",,TRUE)' },
    becomes: 'frozen',
    changed: { B5: 36.5 },
  },
  'A fit that is given text': {
    typed: { ...run, D1: 'free', D2: '=PACE.HALFLIFE(A2:A9,B2:B9,1,D1)' },
    becomes: 'frozen',
    changed: { D1: 'fres' },
  },
};
