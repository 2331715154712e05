/** Columns whose course has one thing to it. */
import { fading, printed, tens, wobble, wobbling } from '../../../../support/invented';
import { type Fault } from './fault';

export const course: readonly Fault[] = [
  {
    name: 'a warming flask',
    kind: 'induction',
    says: /^the rate rises at first: .* next to nothing of that at time [678]0$/,
    values: wobbling((time) => 0.8 * Math.exp(-((time / 90) ** 2.2))),
  },
  {
    name: 'gas that comes late',
    kind: 'induction',
    says: /^the rate rises at first/,
    values: wobbling((time) => 40 * (1 - Math.exp(-((time / 90) ** 2.2))), tens, 40, 2),
  },
  {
    name: 'a run that ends on a level',
    kind: 'plateau',
    says: /they stay at 0\.20\d*$/,
    values: wobbling((time) => 0.2 + 0.6 * 2 ** (-time / 18), tens, 0.4),
  },
  {
    name: 'a run that is used up',
    kind: 'plateau',
    says: /no longer change/,
    values: wobbling((time) => 0.8 * 2 ** (-time / 18), tens, 0.4),
  },
  {
    name: 'a rising run that ends',
    kind: 'plateau',
    says: /they stay at 39\.\d+$/,
    values: wobbling((time) => 40 * (1 - 2 ** (-time / 18)), tens, 40, 2),
  },
  {
    name: 'a lamp that drifts back',
    kind: 'drift',
    says: /creep back in a straight line, by 0\.000(29|3)\d* per/,
    values: wobbling((time) => 0.2 + 0.6 * 2 ** (-time / 10) + 0.0003 * time, tens, 0.4),
  },
  {
    name: 'water that evaporates',
    kind: 'drift',
    says: /creep on in a straight line, by -0\.000[45]\d* per/,
    values: wobbling((time) => 0.3 + 0.6 * 2 ** (-time / 6) - 0.0005 * time, tens, 0.4),
  },
  {
    name: 'a balance that shows too little',
    kind: 'resolution',
    says: /^the readings change in steps of 0\.1, and the whole change is only 7 steps/,
    values: tens.map((time) => printed(fading(time), 1)),
  },
  {
    name: 'nothing that happens',
    kind: 'level',
    places: [],
    says: /^the readings do not change beyond their scatter: they stay at 0\.5$/,
    values: wobbling(() => 0.5),
  },
  {
    name: 'one reading all along',
    kind: 'level',
    places: [],
    says: /^all 20 readings are 0\.5$/,
    values: wobble.map(() => 0.5),
  },
  {
    name: 'an intermediate',
    kind: 'turn',
    places: [3],
    says: /^the readings rise until time 30 .* and then fall/,
    values: wobbling((time) => 5 * (Math.exp(-time / 90) - Math.exp(-time / 20)), tens, 2),
  },
  {
    name: 'a flask on a balance that loses gas',
    kind: 'end',
    places: [],
    says: /^the readings went from 201\.6\d* to 200\.0\d* and seem to level off near 200(\.0\d?)?, not at 0$/,
    values: wobbling((time) => 200 + 1.6 * 2 ** (-time / 40), tens, 1),
  },
  {
    name: 'less than a half life',
    kind: 'conversion',
    places: [],
    says: /42\.\d % of the way to 0 \(0\.[78]\d* half lives\)$/,
    times: tens.map((time) => time / 4),
    values: wobbling(
      fading,
      tens.map((time) => time / 4),
      0.2,
    ),
  },
  {
    name: 'the first 5 %',
    kind: 'conversion',
    places: [],
    says: /5\.\d+ % of the way to 0/,
    times: tens.map((time) => time / 40),
    values: wobbling(
      fading,
      tens.map((time) => time / 40),
      0.02,
      5,
    ),
  },
  {
    name: 'gas still coming',
    kind: 'conversion',
    places: [],
    says: /if they follow first order \(1\.[3-8]\d* half lives\)$/,
    times: tens.map((time) => time / 2),
    values: wobbling(
      (time) => 40 * (1 - 2 ** (-time / 60)),
      tens.map((time) => time / 2),
      40,
      2,
    ),
  },
  {
    name: 'gas without an end',
    kind: 'conversion',
    places: [],
    says: /show no sign of an end$/,
    values: wobbling((time) => 0.1 * time, tens, 20, 2),
  },
];
