/** Columns in which single readings, or all from one on, are off. */
import type { RawCell } from '../../../../../src/series/check/rawRun';
import { printed, replaced } from '../../../../support/invented';
import { clean, read, type Fault } from './fault';

export const readings: readonly Fault[] = [
  {
    name: 'a cell left empty that counts as 0',
    kind: 'zero',
    places: [8],
    says: /^one reading is exactly 0 .*at time 80$/,
    values: replaced<RawCell>(clean, [8, 0]),
  },
  {
    name: 'zeros for the last readings',
    kind: 'zero',
    places: [18, 19],
    says: /^2 readings are exactly 0/,
    values: replaced<RawCell>(clean, [18, 0], [19, 0]),
  },
  {
    name: 'a 0 before a falling run',
    kind: 'zero',
    places: [0],
    says: /at time 0$/,
    values: replaced<RawCell>(clean, [0, 0]),
  },
  {
    name: 'a disturbed apparatus',
    kind: 'step',
    places: [8, 9],
    says: /a step of 0\.1\d/,
    values: clean.map((_, row) => printed(read(row) + (row > 8 ? 0.12 : 0))),
  },
  {
    name: 'one reading too high',
    kind: 'outlier',
    places: [8],
    says: /^one reading lies far off .* too high\)$/,
    values: replaced<RawCell>(clean, [8, printed(read(8) + 0.06)]),
  },
  {
    name: 'two readings off',
    kind: 'outlier',
    places: [8, 15],
    says: /too high\) and .* too low\)$/,
    values: replaced<RawCell>(clean, [8, printed(read(8) + 0.06)], [15, printed(read(15) - 0.05)]),
  },
  {
    name: 'a first reading too low',
    kind: 'outlier',
    places: [0],
    says: /too low/,
    values: replaced<RawCell>(clean, [0, 0.6]),
  },
  {
    name: 'a first reading with its point lost',
    kind: 'outlier',
    places: [0],
    says: /^one reading .* 8 \(7\.\d+ too high\)$/,
    values: replaced<RawCell>(clean, [0, 8]),
  },
  {
    name: 'a last reading too high',
    kind: 'outlier',
    places: [19],
    says: /too high/,
    values: replaced<RawCell>(clean, [19, 0.3]),
  },
];
