/** Columns with one fault in their cells, or too few of them. */
import type { RawCell } from '../../../../../src/series/check/rawRun';
import { replaced, tens } from '../../../../support/invented';
import { clean, type Fault } from './fault';

export const cells: readonly Fault[] = [
  {
    name: 'an error cell',
    kind: 'error',
    places: [6],
    says: /^one pair shows an error: #DIV\/0!$/,
    values: replaced(clean, [6, { error: '#DIV/0!' }]),
  },
  {
    name: 'an error among the times',
    kind: 'error',
    places: [2],
    says: /#REF!/,
    times: replaced<RawCell>(tens, [2, { error: '#REF!' }]),
  },
  {
    name: 'a reading typed with its unit',
    kind: 'number as text',
    places: [5],
    says: /"0\.45 AU"/,
    values: replaced(clean, [5, { text: '0.45 AU' }]),
  },
  {
    name: 'text that could mean two numbers',
    kind: 'number as text',
    places: [5],
    says: /"1,234"/,
    values: replaced(clean, [5, { text: '1,234' }]),
  },
  {
    name: 'clock text among the times',
    kind: 'number as text',
    places: [3],
    says: /"0:00:30"/,
    times: replaced<RawCell>(tens, [3, { text: '0:00:30' }]),
  },
  {
    name: 'a number kept as text',
    kind: 'number read from text',
    places: [3],
    says: /^one pair holds a number stored as text: "0,567"$/,
    values: replaced(clean, [3, { text: '0,567', readAs: 0.567 }]),
  },
  {
    name: 'readings below the limit',
    kind: 'censored',
    places: [18, 19],
    says: /^2 readings lie beyond .*"<0\.1"$/,
    values: replaced(clean, [18, { text: '<0.1' }], [19, { text: '<0.1' }]),
  },
  {
    name: 'a reading not detected',
    kind: 'censored',
    places: [19],
    says: /"n\.d\."/,
    values: replaced(clean, [19, { text: 'n.d.' }]),
  },
  {
    name: 'a blank reading',
    kind: 'gap',
    places: [7],
    says: /^one gap: no reading at time 70$/,
    values: clean.map((cell, row) => (row === 7 ? null : cell)),
  },
  {
    name: 'a word for a reading',
    kind: 'gap',
    places: [6, 7],
    says: /^2 gaps: no reading at times 60 and 70 \("n\/a"\)$/,
    values: replaced(clean, [6, { text: 'n/a' }], [7, { text: 'n/a' }]),
  },
  {
    name: 'a blank time',
    kind: 'gap',
    places: [7],
    says: /no time for the reading 0\.3528$/,
    times: tens.map((time, row) => (row === 7 ? null : time)),
    values: replaced(clean, [7, 0.3528]),
  },
  {
    name: 'five readings',
    kind: 'too few',
    places: [],
    says: /^only 5 different times$/,
    times: [0, 45, 90, 135, 180],
    values: [0.8, 0.476, 0.283, 0.168, 0.1],
  },
  {
    name: 'no pair at all',
    kind: 'no pairs',
    places: [],
    says: /^no time and reading/,
    times: [null, null],
    values: [null, null],
  },
];
