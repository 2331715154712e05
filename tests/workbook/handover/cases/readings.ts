/** Readings that need a law or standards, and clock times. */
import { column } from '../../engine/book';
import type { Cases } from './case';

export const readings: Cases = {
  Acidity: {
    typed: {
      ...column('A1', [3, 2.5, null, 11]),
      B1: '0.1 mol/L',
      C1: '=PACE.ACIDITY(A1:A4)',
      D1: '=PACE.ACIDITY(A1:A4,B1,25,"OH")',
      E1: '=PACE.ACIDITY(A1:A4,,"30 degC","OH")',
    },
    becomes: 'live',
    changed: { A3: 4.2, B1: '0.2 mol/L' },
  },
  'Acidity at a temperature in a cell': {
    typed: {
      ...column('A1', [7, 2.5, null, 11]),
      B1: 30,
      B2: '21.5 degC',
      B3: 0.05,
      C1: '=PACE.ACIDITY(A1:A4,,B1,"OH")',
      D1: '=PACE.ACIDITY(A1:A4,B3,B2)',
      E1: '=PACE.ACIDITY(A1:A4,B3,B1,"OH")',
    },
    becomes: 'live',
    changed: { A3: 4.2, B1: 61, B2: '5.5 degC', B3: 0.1 },
  },
  'Acidity where water freezes': {
    typed: { A1: 7, B1: 5, C1: '=PACE.ACIDITY(A1,0.1,B1)' },
    becomes: 'live',
    changed: { B1: -5 },
    then: 'error',
  },
  'Acidity, out of bounds': {
    typed: { ...column('A1', [3, 2.5]), C1: '=PACE.ACIDITY(A1:A2)' },
    becomes: 'live',
    changed: { A2: 17 },
    then: 'error',
  },
  Unit: {
    typed: { A1: 2, A2: 'mmol/L', C1: '=PACE.UNIT(A1,A2,"min")', C2: '=PACE.UNIT(1.5)' },
    becomes: 'live',
    changed: { A1: 1 },
  },
  Standards: {
    typed: {
      ...column('A1', [0, 2, 4, null, 8]),
      ...column('B1', [0.11, 0.49, 0.92, 1.3, 1.69]),
      ...column('C1', [0.3, 0.7, 'n/a', 1.75]),
      E1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4)',
      F1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4,,,3,TRUE)',
      K1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4,,TRUE,,TRUE)',
    },
    becomes: 'live',
    changed: { A4: 6, B2: 0.5, C2: 0.8 },
  },
  'Standards with uncertainties': {
    typed: {
      ...column('A1', [0, 2, 4, null, 8, 8]),
      ...column('B1', [0.11, 0.49, 0.92, 1.3, 1.69, 1.69]),
      ...column('C1', [0.01, 0.012, 0.015, 'n/a', 0.03, 0.04]),
      ...column('D1', [0.3, 0.7, 'n/a', 1.75, 0.05, 1.69]),
      E1: '=PACE.STANDARDS(A1:A6,B1:B6,D1:D6,C1:C6)',
      F1: '=PACE.STANDARDS(A1:A6,B1:B6,D1:D6,C1:C6,,3,TRUE)',
      K1: '=PACE.STANDARDS(A1:A6,B1:B6,D1:D6,C1:C6,TRUE,,TRUE)',
      P1: '=PACE.STANDARDS(A1:A6,B1:B6,D1:D6,"relative",,2,TRUE)',
      U1: '=PACE.STANDARDS({0;2;4},{0.1;0.5;0.92},0.7,{0.01;0.02;0.02},,,TRUE)',
    },
    becomes: 'live',
    changed: { A4: 6, C4: 0.02, B2: 0.5, C3: 0.02, D2: 0.8, D3: 1.2 },
  },
  'Standards side by side': {
    typed: {
      A1: 0,
      B1: 2,
      C1: 4,
      A2: 0.1,
      B2: 0.5,
      C2: 0.92,
      A3: 0.01,
      B3: 0.02,
      C3: 0.02,
      A4: 0.3,
      B4: 0.7,
      E1: '=PACE.STANDARDS(A1:C1,A2:C2,A4:B4,A3:C3,,,TRUE)',
    },
    becomes: 'live',
    changed: { C3: 0.05, B4: 0.8 },
  },
  'Standards, an uncertainty of 0': {
    typed: {
      ...column('A1', [0, 2, 4]),
      ...column('B1', [0.1, 0.5, 0.92]),
      ...column('C1', [0.01, 0.02, 0.02]),
      E1: '=PACE.STANDARDS(A1:A3,B1:B3,0.7,C1:C3)',
    },
    becomes: 'live',
    changed: { C2: 0 },
    then: 'error',
  },
  'Standards, a reading beyond them': {
    typed: {
      ...column('A1', [0, 2, 4]),
      ...column('B1', [0.1, 0.5, 0.9]),
      C1: 0.7,
      E1: '=PACE.STANDARDS(A1:A3,B1:B3,C1)',
    },
    becomes: 'live',
    changed: { C1: 1.2 },
    then: 'error',
  },
  'Clock times': {
    typed: {
      ...column('A1', [0.9985, 0.9999, 0.0012, 0.004]),
      C1: '=PACE.CLOCK(A1:A4,"min","first")',
      D1: '=PACE.CLOCK(A1:A4)',
    },
    becomes: 'live',
    changed: { A3: 0.0015, A4: 0.0051 },
  },
  'Clock times as text': {
    typed: {
      ...column('A1', ['23:58:30', '23:59:15.5', null, '0:04:30', 0.0042]),
      ...column('B1', ['0:00', '5:30', 'n/a', '101:30']),
      ...column('C1', ['00:30.5', '1:30,25', '02:45.0']),
      E1: '=PACE.CLOCK(A1:A2,"min","first")',
      F1: '=PACE.CLOCK(A1:A5)',
      G1: '=PACE.CLOCK(B1:B4,"h")',
      H1: '=PACE.CLOCK(C1:C3,"s","first")',
      I1: '=PACE.CLOCK(A4:A5,"s","first")',
      J1: '=PACE.CLOCK({"23:58:30";"0:04:30"},"min","first")',
    },
    becomes: 'live',
    changed: { A2: '0:01:10', A3: 0.003, A5: 0.005, B2: '6:07', B4: 0.25, C2: '1:31.125' },
  },
  'Durations as text': {
    typed: {
      ...column('A1', ['30 s', '4 min 30 s', null, '1 h 2.5 min', '1 h 4 min 10 s']),
      ...column('B1', ['4min30s', '0.1 h', '250 ms', ' 26 h ']),
      C1: '=PACE.CLOCK(A1:A5)',
      D1: '=PACE.CLOCK(A1:A5,"min","first")',
      E1: '=PACE.CLOCK(B1:B4,"h","first")',
    },
    becomes: 'live',
    changed: { A1: '45.5 s', A2: '5  min  7,25 s', A4: '1 h 31 min', B1: '12min5s', B3: '300 ms' },
  },
  'Times as text side by side': {
    typed: { A1: '0:30', B1: '1:10', C1: '2 min', A3: '=PACE.CLOCK(A1:C1)' },
    becomes: 'live',
    changed: { B1: '1:20', C1: '3.5 min' },
  },
  'Clock text, another form': {
    typed: { ...column('A1', ['5:30.0', '6:30.5']), C1: '=PACE.CLOCK(A1:A2)' },
    becomes: 'live',
    changed: { A2: 'half past 6:30.5' },
    then: 'error',
  },
  'Clock text, 75 minutes': {
    typed: { ...column('A1', ['4:15:00', '4:45:00']), C1: '=PACE.CLOCK(A1:A2,"min","first")' },
    becomes: 'live',
    changed: { A2: '4:75:00' },
    then: 'error',
  },
  'Clock text, no time': {
    typed: { ...column('A1', ['4:15:00', null]), C1: '=PACE.CLOCK(A1:A2)' },
    becomes: 'live',
    changed: { A2: '12 drops' },
    then: 'error',
  },
  'Clock times with am and pm': {
    typed: {
      ...column('A1', ['11:15 am', '1:15 pm', null, '1:15:30.5 PM']),
      ...column('B1', ['11:58p.m.', '12:03a.m.']),
      C1: '=PACE.CLOCK(A1:A2,"min","first")',
      D1: '=PACE.CLOCK(A1:A4)',
      E1: '=PACE.CLOCK(B1:B2,"s","first")',
    },
    becomes: 'live',
    changed: { A1: '12:20 am', A2: '2:25 am', A4: '12:00:01 AM', B1: '11:59p.m.' },
  },
  'Clock times with pm, 13 hours': {
    typed: { ...column('A1', ['11:15 am', '1:15 pm']), C1: '=PACE.CLOCK(A1:A2,"min")' },
    becomes: 'live',
    changed: { A2: '13:15 pm' },
    then: 'error',
  },
  'Clock times that lose their pm': {
    typed: { ...column('A1', ['11:15 am', '1:15 pm']), C1: '=PACE.CLOCK(A1:A2,"min")' },
    becomes: 'live',
    // the function itself could read this; a copy keeps to the form of its day
    changed: { A2: '13:15' },
    then: 'error',
  },
  'Times with primes': {
    typed: {
      ...column('A1', ['5\'30"', "6' 15.5''", '7′', '8′ 20″', "9'05", '12 min']),
      C1: '=PACE.CLOCK(A1:A6)',
      D1: '=PACE.CLOCK(A1:A6,"min","first")',
    },
    becomes: 'live',
    changed: { A1: '4\'02.25"', A2: "6' 16''", A3: '75′', A5: "10'45" },
  },
  'Times with primes, three figures': {
    typed: { ...column('A1', ['5\'30"', '6\'15"']), C1: '=PACE.CLOCK(A1:A2)' },
    becomes: 'live',
    changed: { A2: '6\'150"' },
    then: 'error',
  },
  'Times with a date': {
    typed: {
      ...column('A1', ['2026-02-28 23:50', '2026-03-01T00:10:30.5Z', null, '2026-03-02', 46084.25]),
      ...column('B1', ['2026-03-02 11:15 am', '2026-03-02 1:15 pm']),
      D1: '=PACE.CLOCK(A1:A5,"h","first")',
      E1: '=PACE.CLOCK(B1:B2,"min","first")',
    },
    becomes: 'live',
    changed: { A1: '2024-02-29 00:00', A2: '2026-03-01T01:10:30Z', A5: 46085.5, B2: '2026-03-03 12:15 am' },
  },
  'Times with a date that is none': {
    typed: {
      ...column('A1', ['2026-02-28 23:50', '2026-03-01 00:10']),
      C1: '=PACE.CLOCK(A1:A2,"h","first")',
    },
    becomes: 'live',
    changed: { A2: '2026-02-29 00:10' },
    then: 'error',
  },
  'Times of which one loses its date': {
    typed: {
      ...column('A1', ['2026-02-28 23:50', '2026-03-01 00:10']),
      C1: '=PACE.CLOCK(A1:A2,"h","first")',
    },
    becomes: 'live',
    changed: { A2: 0.5 },
    then: 'error',
  },
  'Dates and long clock times as numbers': {
    typed: {
      ...column('A1', [46083.5, 46083.75, null, 46085.125]),
      ...column('B1', [0.5, 1.25, 3.0625]),
      D1: '=PACE.CLOCK(A1:A4,"h","first")',
      E1: '=PACE.CLOCK(B1:B3,"h","first")',
    },
    becomes: 'live',
    changed: { A2: 46084, A3: 46084.5, B1: 0.25 },
  },
  'Times in words that no formula reads': {
    typed: { ...column('A1', ['1 h, 5 min', '1 h, 15 min']), C1: '=PACE.CLOCK(A1:A2,"min","first")' },
    becomes: 'frozen',
    changed: { A2: '1 h, 16 min' },
  },
};
