/** Rates of a run. */
import { column } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

export const rate: Cases = {
  'Average rate': {
    typed: {
      ...run,
      D1: 30,
      D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1)',
      D3: '=PACE.BETWEEN(A2:A9,B2:B9,90,180,-2)',
    },
    becomes: 'live',
    changed: { B3: 15, B4: null, D1: 50 },
  },
  'Average rate, unsorted with replicates': {
    typed: {
      ...column('A1', [20, 0, 10, 10, 30]),
      ...column('B1', [5, 9, 7.1, 6.9, 4]),
      D1: 25,
      D2: '=PACE.BETWEEN(A1:A5,B1:B5,0,D1)',
    },
    becomes: 'live',
    changed: { A5: 26, B4: 'lost' },
  },
  'Average rate, beyond the run': {
    typed: { ...run, D1: 30, D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1)' },
    becomes: 'live',
    changed: { D1: 241 },
    then: 'error',
  },
  'Average rate, an error among the readings': {
    typed: { ...run, D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,60)' },
    becomes: 'live',
    changed: { B9: '=1/0' },
    then: 'error',
  },
  Tangent: {
    typed: {
      ...run,
      D1: 60,
      D2: '=PACE.TANGENT(A2:A9,B2:B9,D1,5)',
      D3: '=PACE.TANGENT(A2:A9,B2:B9,D1,5,2,-1,TRUE)',
      D4: '=PACE.TANGENT(A2:A9,B2:B9,240,3,2,,TRUE)',
      D5: '=PACE.TANGENT(A2:A9,B2:B9,0,4,1)',
    },
    becomes: 'live',
    changed: { B4: 27, B6: null, D1: 70 },
  },
  'Tangent, window chosen from the data': {
    typed: { ...run, D2: '=PACE.TANGENT(A2:A9,B2:B9,60)' },
    becomes: 'frozen',
    changed: { A9: 250 },
  },
  'Rates along a run': {
    typed: { ...run, D2: '=PACE.ALONG(A2:A9,B2:B9,5)', F2: '=PACE.ALONG(A2:A9,B2:B9,5,2,,TRUE)' },
    becomes: 'live',
    changed: { B4: 27, A9: 230 },
  },
  'Rates along a row': {
    typed: {
      ...Object.fromEntries(
        ['A', 'B', 'C', 'D', 'E'].flatMap((name, n) => [
          [`${name}1`, 10 * n],
          [`${name}2`, [9, 7, 5.5, 4.6, 4.1][n]],
        ]),
      ),
      A4: '=PACE.ALONG(A1:E1,A2:E2,3,1)',
    },
    becomes: 'live',
    changed: { C2: 5.7 },
  },
};
