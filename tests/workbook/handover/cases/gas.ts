/** Gas caught, kept or lost. */
import { column } from '../../engine/book';
import type { Cases } from './case';
import { run } from './run';

export const gas: Cases = {
  'Gas over water': {
    typed: {
      ...run,
      D1: '21.4 degC',
      D2: '100.6 kPa',
      D3: true,
      D4: '35 mm',
      E2: '=PACE.GASVOLUME(B2:B9,D1,D2,D3,"mL",D4)',
    },
    becomes: 'live',
    changed: { B9: 58, D1: '23 degC', D3: false },
  },
  'Gas, a temperature each': {
    typed: {
      ...column('A1', [10, 20]),
      ...column('B1', [21, 22.5]),
      C1: 99.5,
      D1: '=PACE.GASVOLUME(A1:A2,B1:B2,C1,0.9)',
    },
    becomes: 'live',
    changed: { B2: 24, C1: 101.2 },
  },
  'Gas, below freezing and wet': {
    typed: { A1: 10, B1: 20, D1: '=PACE.GASVOLUME(A1,B1,100,TRUE)' },
    becomes: 'live',
    changed: { B1: -3 },
    then: 'error',
  },
  'Gas pressure': {
    typed: {
      ...column('A1', [null, 101.3, 104.6]),
      ...column('B1', [25, 25, 25.4]),
      C1: '=PACE.GASPRESSURE(A1:A3,"135 mL",B1:B3)',
      D1: '=PACE.GASPRESSURE(A1:A3,135,25,760,"mmHg")',
    },
    becomes: 'live',
    changed: { A2: 100.9, B3: 26 },
  },
  Dissolved: {
    typed: { ...column('A1', [97, 80]), B1: 25, C1: '=PACE.DISSOLVED(A1:A2,"CO2",100,B1)' },
    becomes: 'live',
    changed: { A2: 60, B1: 18 },
  },
  'Mass loss': {
    typed: {
      ...column('A1', [187.352, 187.1, null, 186.9]),
      B1: 0.001,
      B2: '21 degC',
      C1: '=PACE.MASSLOSS(A1:A4,"CO2",,B1,B2)',
      D1: '=PACE.MASSLOSS(A1:A4,44.01,187.4,B1,,,TRUE)',
    },
    becomes: 'live',
    changed: { A1: 187.36, A4: 186.8, B2: '19.5 degC' },
  },
  'Mass loss that cannot be seen': {
    typed: { ...column('A1', [100, 99]), B1: 0.01, C1: '=PACE.MASSLOSS(A1:A2,"H2",,B1)' },
    becomes: 'live',
    changed: { B1: 2 },
    then: 'error',
  },
};
