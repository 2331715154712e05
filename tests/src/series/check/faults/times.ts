/** Columns with one fault in their times. */
import { fading, replaced, tens, wobbling } from '../../../../support/invented';
import { clean, read, type Fault } from './fault';

const later = (from: number, by: number): number[] => tens.map((time) => (time >= from ? time + by : time));

export const times: readonly Fault[] = [
  {
    name: 'midnight between clock times',
    kind: 'midnight',
    places: [8],
    says: /23:58 is followed by 0:08/,
    times: tens.map((time) => (0.95 + time / 1440) % 1),
  },
  {
    name: 'a figure lost from a time',
    kind: 'time slip',
    places: [7],
    says: /^one time is out of order, .*: time 7$/,
    times: replaced(tens, [7, 7]),
  },
  {
    name: 'a figure too many in a time',
    kind: 'time slip',
    places: [7],
    says: /: time 170$/,
    times: replaced(tens, [7, 170]),
  },
  {
    name: 'two rows in each other’s place',
    kind: 'unsorted',
    says: /^one time is out of order: /,
    times: replaced(tens, [7, 80], [8, 70]),
    values: replaced(clean, [7, read(8)], [8, read(7)]),
  },
  {
    name: 'a run written backwards',
    kind: 'unsorted',
    places: [],
    says: /^the times run backwards/,
    times: [...tens].reverse(),
    values: [...clean].reverse(),
  },
  {
    name: 'duplicate readings',
    kind: 'replicates',
    says: /^10 times have more than one reading: times 0, 20, 40, 60, 80 and 5 more$/,
    times: tens.map((time) => time - (time % 20)),
    values: wobbling((time) => fading(time - (time % 20))),
  },
  {
    name: 'a lunch break',
    kind: 'hole',
    places: [4, 5],
    says: /^no reading for a long while: time 40 to 90 \(2\d(\.\d)? % of the whole change\)$/,
    times: later(50, 40),
    values: wobbling(fading, later(50, 40)),
  },
];
