/** Courses of written mechanisms: live where they have a closed form. */
import { column, row } from '../../engine/book';
import type { Cases } from './case';

const times = column('A1', [0, 0.00002, 4, null, 2.5, 90]);

export const mechanisms: Cases = {
  'Courses of simple schemes': {
    typed: {
      ...times,
      ...column('B1', [0.12, 0.035, 0.02]),
      ...column('C1', [1, 0.25, 0.1, 0]),
      D1: 'A -> B -> C',
      D2: 'A ->',
      E1: '=PACE.COURSE(D1,B1:B2,C1:C3,A1:A6)',
      I1: '=PACE.COURSE(D2,B1,C1,A1:A6)',
      J1: '=PACE.COURSE("A -> 2 B; A -> C; A -> D",B1:B3,C1:C4,A1:A6)',
      N1: '=PACE.COURSE("A <-> B",B1:B2,C1:C2,A1:A6)',
      P1: '=PACE.COURSE("2 A -> B",B1,C1:C2,A1:A6)',
      R1: '=PACE.COURSE("A + B -> 2 C + D",{0.7},C1:C4,A1:A6)',
      V1: '=PACE.COURSE("A -> 2 B; B -> C",{3;0.04},{1;0;0.5},{0;2;9})',
    },
    becomes: 'live',
    changed: { A3: 7, A4: 12, B1: 0.3, B2: 0.3, C2: 1, C3: 0.02 },
  },
  'Course in rows': {
    typed: {
      ...row('A1', [0, 5, 10, 400]),
      A2: 'X -> Y',
      A3: 'Y -> Z',
      ...row('B2', [0.03, 0.03000001]),
      ...row('B3', [2, 0, 0]),
      A5: '=PACE.COURSE(A2:A3,B2:C2,B3:D3,A1:D1)',
    },
    becomes: 'live',
    changed: { C1: 20, C2: 0.5, D3: 0.4 },
  },
  'Course of another scheme': {
    typed: { ...times, D1: 'A -> B', E1: '=PACE.COURSE(D1,0.1,{1;0},A1:A6)' },
    becomes: 'live',
    changed: { D1: 'A -> 2 B' },
    then: 'error',
  },
  'Course from less than nothing': {
    typed: { ...times, B1: 0.1, E1: '=PACE.COURSE("A -> B",B1,{1;0},A1:A6)' },
    becomes: 'live',
    changed: { B1: -0.1 },
    then: 'error',
  },
  'Course that is integrated': {
    typed: { ...times, B1: 0.1, E1: '=PACE.COURSE("A -> B; 2 B -> C",{0.1;0.3},{1;0;0},A1:A6)' },
    becomes: 'frozen',
    changed: { A3: 5 },
  },
};
