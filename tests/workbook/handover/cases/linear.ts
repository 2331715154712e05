/** Readings linear in concentration, with whatever else a column can hold. */
import { column } from '../../engine/book';
import type { Cases } from './case';

export const linear: Cases = {
  'Conversion, gaps and text': {
    typed: {
      ...column('A1', [32, null, 16, 'n/a', '=1/0', 0.5]),
      B1: 32,
      B2: -8,
      C1: '=PACE.CONVERSION(A1:A6,B1,B2)',
    },
    becomes: 'live',
    changed: { A1: 31, A2: 20, B2: -7.5 },
  },
  'Conversion of a truth value': {
    typed: { ...column('A1', [32, true]), C1: '=PACE.CONVERSION(A1:A2,32,0)' },
    becomes: 'frozen',
    unwatched: true,
    changed: {},
  },
  'Numbers written as text': {
    typed: { ...column('A1', [32, '16,5']), C1: '=PACE.CONVERSION(A1:A2,32,0)' },
    becomes: 'frozen',
    changed: { A1: 33 },
  },
  'Conversion, end equals start': {
    typed: { ...column('A1', [32, 16]), B1: 32, B2: -8, C1: '=PACE.CONVERSION(A1:A2,B1,B2)' },
    becomes: 'live',
    changed: { B2: 32 },
    then: 'error',
  },
  'A block, beside it another': {
    typed: {
      A1: 1,
      B1: 2,
      A2: 3,
      B2: 4,
      D1: '=PACE.CONVERSION(A1:B2,0,8)',
      A5: '=PACE.CONVERSION(D1:E2,1,0)',
    },
    becomes: 'live',
    changed: { B1: 5 },
  },
  Remaining: {
    typed: { ...column('A1', [0, 0.004, 0.008]), B1: 0.02, B2: 2, C1: '=PACE.REMAINING(A1:A3,B1,B2)' },
    becomes: 'live',
    changed: { A3: 0.009, B1: 0.03 },
  },
  'Remaining, too much formed': {
    typed: { ...column('A1', [0, 0.004]), B1: 0.02, C1: '=PACE.REMAINING(A1:A2,B1)' },
    becomes: 'live',
    changed: { A2: 0.022 },
    then: 'error',
  },
  Titre: {
    typed: { ...column('A1', [12.4, 8.2]), B1: '0.02 mol/L', B2: 10, C1: '=PACE.TITRE(A1:A2,B1,B2,2.5)' },
    becomes: 'live',
    changed: { A1: 12.6, B1: '0.0205 mol/L' },
  },
  'Titre, negative volume': {
    typed: { ...column('A1', [12.4, 8.2]), C1: '=PACE.TITRE(A1:A2,"20 mmol/L","5 mL")' },
    becomes: 'live',
    changed: { A2: -0.1 },
    then: 'error',
  },
  'Total pressure': {
    typed: { ...column('A1', [46.4, 55.1]), B1: 46.4, B2: 1.5, C1: '=PACE.TOTALPRESSURE(A1:A2,B1,B2)' },
    becomes: 'live',
    changed: { A2: 60, B2: 1.4 },
  },
  'Total pressure, gas lost': {
    typed: { ...column('A1', [46.4, 40]), B1: -0.5, C1: '=PACE.TOTALPRESSURE(A1:A2,46.4,B1)' },
    becomes: 'live',
    changed: { A2: 20 },
    then: 'error',
  },
  'Absorbance, path and blank': {
    typed: { ...column('A1', [0.512, 0.3]), B1: 2455, B2: '5 mm', C1: '=PACE.ABSORBANCE(A1:A2,B1,B2,0.012)' },
    becomes: 'live',
    changed: { A1: 0.6, B2: '10 mm' },
  },
  'Absorbance of two': {
    typed: {
      ...column('A1', [0.512, 0.3]),
      B1: 2455,
      B2: 310,
      C1: '=PACE.ABSORBANCE(A1:A2,B1,1,0,B2,"0.4 mmol/L")',
    },
    becomes: 'live',
    changed: { B2: 400 },
  },
  Conductivity: {
    typed: {
      ...column('A1', [2.5, 1.7, 0.9]),
      ...column('B1', [24.6, 25.1, 25.8]),
      C1: '=PACE.CONDUCTIVITY(A1:A3,2.5,0.9,0.01,B1:B3,1.9)',
      D1: '=PACE.CONDUCTIVITY(A1:A3,2.5,0.9,0.01)',
    },
    becomes: 'live',
    changed: { A2: 1.6, B3: 27 },
  },
  'Timed events': {
    typed: {
      ...column('A1', [40, 25, null]),
      B1: -0.002,
      C1: '=PACE.EVENT(A1:A3)',
      D1: '=PACE.EVENT(A1:A3,B1)',
      E1: '=PACE.EVENT(A1,B1,-2)*1000',
    },
    becomes: 'live',
    changed: { A3: 31, B1: -0.0025 },
  },
};
