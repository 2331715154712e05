/** Fits, which are frozen, and the curves of fitted laws. */
import { column, row } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

const fading = {
  ...column('A2', [0, 5, 10, 15, 20, 30, 40, 60]),
  ...column('B2', [0.82, 0.66, 0.55, 0.43, 0.37, 0.24, 0.17, 0.08]),
  ...column('C2', [0.01, 0.01, 0.01, 0.02, 0.01, 0.01, 0.02, 0.01]),
};

/** Two steps, of which the last product was not followed; one time is missing. */
const twoSteps = {
  ...column('A2', [0, 5, 10, 15, null, 30, 40, 60]),
  ...column('B2', [8, 4.9, 2.9, 1.8, 1.1, 0.45, 0.2, 0.05]),
  ...column('C2', [0, 2.8, 4, null, 4.2, 3.7, 3.1, 1.9]),
  F1: 'A -> B -> C',
  ...column('F2', [0.05, 0.05]),
};

export const fits: Cases = {
  'Fitted curve': {
    typed: {
      ...fading,
      ...column('E2', [0, 25, null, 90]),
      G1: 1.8,
      G2: '=PACE.CURVE(A2:A9,B2:B9,1)',
      H2: '=PACE.CURVE(A2:A9,B2:B9,G1,E2:E5,0.01)',
      I2: '=PACE.CURVE(A2:A9,B2:B9,0.5,E2:E5)',
      J2: '=PACE.CURVE(A2:A9,B2:B9,1.00002,E2:E5)',
      K2: '=PACE.CURVE(A2:A9,B2:B9,1,E2:E5,"free",C2:C9)',
    },
    becomes: 'live',
    changed: { E3: 27, E4: 12 },
    flagStaysDown: true,
  },
  'Fitted curve, before its run': {
    typed: { ...fading, E1: 3, D2: '=PACE.CURVE(A2:A9,B2:B9,1,E1)' },
    becomes: 'live',
    changed: { E1: -1 },
    flagStaysDown: true,
    then: 'error',
  },
  'Fits of one run': {
    typed: {
      ...run,
      D2: '=PACE.COEFFICIENT(A2:A9,B2:B9,1,60)',
      D3: '=PACE.HALFLIFE(A2:A9,B2:B9,1,60)',
      D4: '=PACE.ORDER(A2:A9,B2:B9,"free")',
      D5: '=1/PACE.COEFFICIENT(A2:A9,B2:B9,2,"free","relative")',
      F2: '=PACE.ORDERS(A2:A9,B2:B9,60)',
    },
    becomes: 'frozen',
    changed: { B5: 39 },
  },
  'Fit of a mechanism': {
    typed: {
      ...twoSteps,
      G2: '=PACE.FITCOURSE(F1,F2:F3,{8;0;0},A2:A9,B2:D9,TRUE)',
      G5: '=1/PACE.FITCOURSE("A ->",0.1,8,A2:A9,B2:B9)',
    },
    becomes: 'frozen',
    changed: { B5: 1.95 },
  },
  'Fit of a mechanism in rows': {
    typed: {
      ...row('A1', [0, 4, 9, 15, 24]),
      ...row('A2', [5, 3.5, 2.4, 1.8, 1.3]),
      ...row('A3', [0, 1.4, 2.7, 3.2, 3.6]),
      F4: 'X <-> Y',
      F5: 5,
      F6: 0,
      H4: '=PACE.FITCOURSE(F4,{0.1;0.1},F5:F6,A1:E1,A2:E3)',
    },
    becomes: 'frozen',
    changed: { F5: 5.2 },
  },
  'Overlay of two runs': {
    typed: {
      ...column('A1', [0, 1, 2, 3, 4]),
      ...column('B1', [0, 4, 6.1, 7, 7.5]),
      ...column('C1', [8, 4, 1.9, 1, 0.5]),
      ...column('D1', [0, 2, 2.9, 3.5, 3.8]),
      ...column('E1', [4, 2, 1.1, 0.5, 0.2]),
      G1: '=PACE.OVERLAYORDER(A1:A5,B1:B5,C1:C5,A1:A5,D1:D5,E1:E5)',
    },
    becomes: 'frozen',
    changed: { D3: 3 },
  },
  'Fits of several runs': {
    typed: {
      ...fading,
      ...column('D2', [9, 7.2, 6, 5.1, 4.4, 3.4, 2.9, null]),
      F2: '=PACE.SURVEY(A2:A9,B2:D9)',
    },
    becomes: 'frozen',
    changed: { D5: 5.6 },
  },
};
