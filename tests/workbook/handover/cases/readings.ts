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
};
