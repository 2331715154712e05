/** Fits, which are frozen, and the curves of fitted laws. */
import { column } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

const fading = {
  ...column('A2', [0, 5, 10, 15, 20, 30, 40, 60]),
  ...column('B2', [0.82, 0.66, 0.55, 0.43, 0.37, 0.24, 0.17, 0.08]),
  ...column('C2', [0.01, 0.01, 0.01, 0.02, 0.01, 0.01, 0.02, 0.01]),
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
