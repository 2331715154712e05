/** Over temperature. */
import { column } from '../../engine/book';
import type { Cases } from './case';

/** Invented: four temperatures, one of them twice, with standard uncertainties. */
const oven = {
  ...column('A1', [25, 25, 40, 50, 60]),
  ...column('B1', [3.2e-6, 3.4e-6, 2.1e-5, 7.4e-5, 2.2e-4]),
  ...column('C1', [1e-7, 1e-7, 9e-7, 3e-6, 1.2e-5]),
};

export const temperature: Cases = {
  Arrhenius: {
    typed: {
      ...oven,
      D1: '=PACE.ARRHENIUS(A1:A5,B1:B5)',
      D2: '=PACE.ARRHENIUS(A1:A5,B1:B5,C1:C5,TRUE)',
      D5: '=PACE.ARRHENIUS(A1:A2,B1:B2,,TRUE)',
    },
    becomes: 'live',
    changed: { A3: 41, B5: null },
  },
  'Arrhenius, a coefficient below 0': {
    typed: { ...oven, D1: '=PACE.ARRHENIUS(A1:A5,B1:B5)' },
    becomes: 'live',
    changed: { B2: -1 },
    then: 'error',
  },
  Eyring: {
    typed: {
      ...oven,
      D1: '=PACE.EYRING(A1:A5,B1:B5)',
      D2: '=PACE.EYRING(A1:A5,B1:B5,"relative",TRUE)',
    },
    becomes: 'live',
    changed: { A3: 41, B1: 3.3e-6 },
  },
  'k at another temperature': {
    typed: {
      ...oven,
      G1: 5,
      D1: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,G1)',
      D2: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,G1,C1:C5,TRUE)',
      D3: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,"308.15 K",,TRUE)',
    },
    becomes: 'live',
    changed: { B4: 9e-5, G1: 33 },
  },
  'Mean kinetic temperature': {
    typed: {
      ...column('A1', [20, 24.5, 31, null, 22]),
      ...column('B1', [0, 2, 5, 6, 12]),
      ...column('C1', [20, 24.5, 31, 28, 22]),
      D1: '=PACE.MEANTEMP(A1:A5)',
      D2: '=PACE.MEANTEMP(C1:C5,B1:B5,"70 kJ/mol")',
    },
    becomes: 'live',
    changed: { A2: 40, B4: 9, C3: 35 },
  },
  'Mean temperature of a log with gaps': {
    typed: {
      ...column('A1', [20, 24.5, 31, null, 22, 27, 25]),
      ...column('B1', [0, 9, 5, 6, 12, 12, null]),
      D1: '=PACE.MEANTEMP(A1:A7,B1:B7)',
    },
    becomes: 'live',
    changed: { A2: 'lost', B7: 14, B5: 11 },
  },
  'Mean temperature of a long log': {
    typed: {
      D1: '=PACE.MEANTEMP(B1:B1200,A1:A1200)',
      ...column(
        'A1',
        Array.from({ length: 1200 }, (_, n) => n * 0.5),
      ),
      ...column(
        'B1',
        Array.from({ length: 1200 }, (_, n) => 25 + 8 * Math.sin(n / 50)),
      ),
    },
    becomes: 'live',
    changed: { B1: null, B201: 60, A202: 100.5, A204: 100.5, A230: 90.25, A1190: 700, A1191: 700 },
  },
  'Time to a conversion': {
    typed: {
      A1: 0.5,
      A2: 3.21e-5,
      A3: 2,
      A4: 0.8,
      D1: '=PACE.TIMETO(A1,A2,1)',
      D2: '=PACE.TIMETO(A1,A2,A3,A4)',
      D3: '=PACE.TIMETO(A1,A2,1.0000001,A4)',
      D4: '=PACE.TIMETO(A1,A2,0.5,A4)/3600',
    },
    becomes: 'live',
    changed: { A1: 0.9, A3: 1 },
  },
  'Time to a conversion above 1': {
    typed: { A1: 0.5, D1: '=PACE.TIMETO(A1,0.1,1)' },
    becomes: 'live',
    changed: { A1: 1 },
    then: 'error',
  },
};
