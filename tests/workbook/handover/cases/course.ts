/** What is read off a run as a whole, and orders from initial rates. */
import { column } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

export const course: Cases = {
  'Initial rate': {
    typed: {
      ...run,
      D2: '=PACE.START(A2:A9,B2:B9)',
      D3: '=PACE.START(A2:A9,B2:B9,0.9,,TRUE)',
      D4: '=PACE.START(A2:A9,B2:B9,1,2)',
    },
    becomes: 'live',
    changed: { B3: 15, A9: 250 },
  },
  'Initial rate, unsorted with gaps': {
    typed: {
      ...column('A1', [40, 0, 5, 5, null, 10, 20, 15, 30, 60]),
      ...column('B1', [2.2, 9, 7.4, 7.6, 5, 6.2, 4.2, 5.1, 3.1, 1.2]),
      D1: 0.35,
      D2: '=PACE.START(A1:A10,B1:B10,,,TRUE)',
      D3: '=PACE.START(A1:A10,B1:B10,D1,-2,TRUE)',
      D4: '=PACE.START(A1:A5,B1:B5,1,,TRUE)',
    },
    becomes: 'live',
    changed: { A5: 12, B6: 'lost', D1: 0.6 },
  },
  'Initial rate of two times': {
    typed: { ...run, D2: '=PACE.START(A2:A4,B2:B4)' },
    becomes: 'live',
    changed: { A4: null },
    then: 'error',
  },
  'Normalised time, unsorted with gaps': {
    typed: {
      ...column('A1', [20, 0, 10, 10, 30, null, 25]),
      ...column('B1', [5, 9, 7.1, 6.9, 4, 3, 'lost']),
      D1: 0.7,
      E1: '=PACE.NORMALTIME(A1:A7,B1:B7,D1)',
    },
    becomes: 'live',
    changed: { A6: 26, B4: null, D1: 0 },
  },
  'Half lives read off, unsorted': {
    typed: {
      ...column('A1', [45, 10, 20, 20, 32, 0, 60]),
      ...column('B1', [0.4, 4.1, 2.3, 2.1, 1.1, 8, null]),
      D1: '=PACE.HALVINGS(A1:A7,B1:B7)',
    },
    becomes: 'live',
    changed: { B2: 4.3, B3: null, A7: 70, B7: 0.3 },
  },
  'Normalised time': {
    typed: {
      ...run,
      E1: 1.5,
      D2: '=PACE.NORMALTIME(A2:A9,B2:B9,E1)',
      F2: '=PACE.NORMALTIME(A2:A9,B2:B9,0)',
    },
    becomes: 'live',
    changed: { B5: 36, E1: 0.5 },
  },
  'Normalised time that cannot be': {
    typed: { ...run, B2: 1, E1: 1.5, D2: '=PACE.NORMALTIME(A2:A9,B2:B9,E1)' },
    becomes: 'live',
    changed: { B3: -1 },
    then: 'error',
  },
  'Half lives read off': {
    typed: {
      ...column('A1', [0, 10, 20, 32, 45]),
      ...column('B1', [8, 4.1, 2.2, 1.1, 0.4]),
      D1: '=PACE.HALVINGS(A1:A5,B1:B5)',
      E1: '=PACE.HALVINGS(A1:A5,B1:B5,0.3)',
    },
    becomes: 'live',
    changed: { B2: 4.3, A5: 44 },
  },
  'Half lives of a run that passes its end': {
    typed: {
      ...column('A1', [0, 10, 20, 30, 40]),
      ...column('B1', [8, 4.1, 2.2, -0.1, 0.2]),
      D1: '=PACE.HALVINGS(A1:A5,B1:B5)',
    },
    becomes: 'live',
    changed: { B3: 2.1 },
  },
  Exponents: {
    typed: {
      ...column('A1', [0.003, 0.0047, 0.0067, null, 0.011]),
      ...column('B1', [0.1, 0.1, 0.15, 0.2, 0.2]),
      ...column('C1', [0.1, 0.15, 0.1, 0.1, 0.08]),
      E1: '=PACE.EXPONENTS(A1:A5,B1:C5)',
      E3: '=PACE.EXPONENTS(A1:A5,B1:C5,TRUE)',
      E8: '=PACE.EXPONENTS(A1:A5,B1:B5,TRUE)',
    },
    becomes: 'live',
    changed: { A2: 0.0049, A4: 0.012 },
  },
  'Exponents, reactants always changed together': {
    typed: {
      ...column('A1', [0.003, 0.0047, 0.0067, 0.011]),
      ...column('B1', [0.1, 0.1, 0.2, 0.2]),
      ...column('C1', [0.1, 0.15, 0.2, 0.3]),
      E1: '=PACE.EXPONENTS(A1:A4,B1:C4)',
    },
    becomes: 'live',
    changed: { C1: 0.2, C2: 0.2, C3: 0.4, C4: 0.4 },
    then: 'error',
  },
};
