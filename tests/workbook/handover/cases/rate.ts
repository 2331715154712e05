/** Rates of a run. */
import { column, type Typed } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

/** Invented: so many times in A, readings in B. */
const longRun = (count: number): Typed => ({
  ...column(
    'A1',
    Array.from({ length: count }, (_, n) => n * 0.5),
  ),
  ...column(
    'B1',
    Array.from({ length: count }, (_, n) => 40 * 0.995 ** n + 0.1 * Math.sin(13 * n)),
  ),
});

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
  'Average rate with its limits': {
    typed: {
      ...run,
      D1: 30,
      D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1,,TRUE)',
      D3: '=PACE.BETWEEN(A2:A9,B2:B9,95,110,-2,TRUE)',
      ...column('A11', [20, 0, 10, 10, null, 30, 55, 40]),
      ...column('B11', [5, 9, 7.1, 6.9, 4, 3.7, 2.6, 3.3]),
      D11: '=PACE.BETWEEN(A11:A18,B11:B18,5,D1,,TRUE)',
      D12: '=PACE.BETWEEN(A11:A12,B11:B12,5,15,,TRUE)',
    },
    becomes: 'live',
    changed: { B3: 15, B4: null, D1: 50, A15: 12 },
  },
  'Average rate, order and ties later': {
    typed: {
      ...run,
      D1: 30,
      D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1)',
      D3: '=PACE.BETWEEN(A2:A9,B2:B9,D1+60,D1*8,2)',
      D4: '=PACE.BETWEEN(A2:A9,B2:B9,D1+10,D1,,TRUE)',
    },
    becomes: 'live',
    changed: { A3: 95, A4: 90, A5: 240, B2: 3, B8: null, D1: 25 },
  },
  'Average rate of a long run': {
    typed: {
      D1: 100.3,
      D2: '=PACE.BETWEEN(A1:A1200,B1:B1200,0,D1)',
      D3: '=PACE.BETWEEN(A1:A1200,B1:B1200,D1*2,599.5)',
      ...longRun(1200),
    },
    becomes: 'live',
    changed: { B201: null, A202: 100.5, A204: 100.5, A230: 90.25, A231: 90.25, A1190: 700, D1: 100.4 },
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
  'Tangent, window chosen from data': {
    typed: {
      ...run,
      D1: 70,
      D2: '=PACE.TANGENT(A2:A9,B2:B9,60)',
      D3: '=PACE.TANGENT(A2:A9,B2:B9,D1,,,-2,TRUE)',
      D4: '=PACE.TANGENT(A2:A9,B2:B9,0,,1,,TRUE)',
      D5: '=PACE.TANGENT(A2:A9,B2:B9,D1+25,,,-2,TRUE)',
      D6: '=PACE.ALONG(A2:A9,B2:B9)',
      F6: '=PACE.ALONG(A2:A9,B2:B9,,,,TRUE)',
    },
    becomes: 'live',
    changed: { B4: 28.1, A9: 250, D1: 65 },
  },
  'Tangent, window chosen, gaps': {
    typed: {
      ...column('A1', [90, 10, 20, null, 20, 30, 40, 55, 60, 70, 80, 0]),
      ...column('B1', [3.1, 9.2, 8.1, 7.7, 8.2, 7.1, 6.3, 5.4, 4.9, 4.2, 'lost', 10.1]),
      D1: '=PACE.ALONG(A1:A12,B1:B12,,,,TRUE)',
      J1: '=PACE.TANGENT(A1:A12,B1:B12,0.5,,,,TRUE)',
    },
    becomes: 'live',
    changed: { B6: 7.15, B11: 'gone' },
  },
  'Tangent, window chosen, late': {
    typed: {
      ...column('A1', [86400, 90000, 93600, 97200, 100800, 104400, 108000, 111600, 115200, 118800]),
      ...column('B1', [0.0201, 0.0182, 0.0166, 0.0149, 0.0137, 0.0122, 0.0113, 0.0101, 0.0093, 0.0083]),
      D1: '=PACE.ALONG(A1:A10,B1:B10,,,,TRUE)',
      J1: '=PACE.TANGENT(A1:A10,B1:B10,100000,,3,,TRUE)',
    },
    becomes: 'live',
    changed: { B3: 0.01661 },
  },
  'Tangent, window chosen, a row of few': {
    typed: {
      ...Object.fromEntries(
        ['A', 'B', 'C', 'D'].flatMap((name, n) => [
          [`${name}1`, 0.1 * n],
          [`${name}2`, [9, 7, 5.5, 4.6][n]],
        ]),
      ),
      A4: '=PACE.ALONG(A1:D1,A2:D2,,,,TRUE)',
    },
    becomes: 'live',
    changed: { C2: 5.7 },
  },
  'Rates along a run': {
    typed: { ...run, D2: '=PACE.ALONG(A2:A9,B2:B9,5)', F2: '=PACE.ALONG(A2:A9,B2:B9,5,2,,TRUE)' },
    becomes: 'live',
    changed: { B4: 27, A9: 230 },
  },
  'Rates, order and gaps later': {
    typed: {
      ...run,
      D1: 5,
      D2: '=PACE.TANGENT(A2:A9,B2:B9,65,D1)',
      D3: '=PACE.TANGENT(A2:A9,B2:B9,40,4,1,-2,TRUE)',
      D4: '=PACE.START(A2:A9,B2:B9,0.5,,TRUE)',
      D6: '=PACE.ALONG(A2:A9,B2:B9,D1)',
    },
    becomes: 'live',
    changed: { A3: 95, A4: 60, B8: null, D1: 4 },
  },
  'Rates, inputs worked out within': {
    typed: {
      ...run,
      D1: 2,
      D2: '=PACE.TANGENT(A2:A9,B2:B9,65,D1*2)',
      D3: '=PACE.TANGENT(A2:A9,B2:B9,D1*35,MAX($D$1:D1)+2,2,,TRUE)',
      D4: '=PACE.BETWEEN(A2:A9,B2:B9,D1,D1*45,,TRUE)',
      D5: '=PACE.START(A2:A9,B2:B9,D1/5,,TRUE)',
      K2: '=PACE.ALONG(A2:A9,B2:B9,D1+2)',
    },
    becomes: 'live',
    changed: { A3: 95, B4: 27, D1: 3 },
  },
  'Rates, points by their place': {
    typed: { ...run, D5: '=PACE.TANGENT(A2:A9,B2:B9,65,ROW())' },
    becomes: 'frozen',
    changed: { B4: 27 },
  },
  'Rates of a long run': {
    typed: {
      ...longRun(700),
      D1: 21,
      D2: '=PACE.TANGENT(A1:A700,B1:B700,100.3,D1)',
      D3: '=PACE.TANGENT(A1:A700,B1:B700,100,31,2,,TRUE)',
      D4: '=PACE.START(A1:A700,B1:B700,,,TRUE)',
      E7: '=PACE.HALVINGS(A1:A700,B1:B700,-0.2)',
      L1: '=PACE.NORMALTIME(A1:A700,B1:B700,1.5)',
      J1: '=PACE.ALONG(A1:A700,B1:B700,15)',
    },
    becomes: 'live',
    changed: { B150: null, A230: 90.25, A231: 90.25, D1: 20 },
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
