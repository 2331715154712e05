/** Clean runs, invented: laws written out here, not taken from the code under test. */
import { findings } from '../../../../src/series/check/findings';
import { normal, printed, tens, uniform } from '../../../support/invented';

/** Shares left, for s = 0 to 1 over the run: each followed for two and a half half lives or more. */
const laws = {
  'order 0': (s: number) => 1 - 0.85 * s,
  'order ½': (s: number) => (1 - 0.65 * s) ** 2,
  'order 1': (s: number) => Math.exp(-2.4 * s),
  'order 2': (s: number) => 1 / (1 + 7 * s),
  'rising, order 1': (s: number) => 1 - Math.exp(-2.4 * s),
} as const;

type Law = (s: number) => number;
const named = Object.entries(laws) as [string, Law][];

const spacings: Readonly<Record<string, (i: number, count: number) => number>> = {
  even: (i, count) => i / (count - 1),
  widening: (i, count) => (20 ** (i / (count - 1)) - 1) / 19,
};

describe.each(named)('%s', (_, law) => {
  test.each(Object.keys(spacings))(
    'without scatter, %s spacing, 8 to 100 readings: nothing is found',
    (spacing) => {
      for (const count of [8, 10, 13, 20, 40, 100]) {
        const times = Array.from({ length: count }, (_, i) => 600 * spacings[spacing](i, count));
        expect(findings({ times, values: times.map((time) => 3 * law(time / 600)) })).toEqual([]);
      }
    },
  );

  test('as an instrument prints it, with scatter of 0.5 %: nothing is found', () => {
    for (const seed of [1, 2, 3, 4, 5]) {
      const deviate = normal(seed);
      const values = tens.map((time) => printed(law(time / 190) + 0.005 * deviate()));
      expect(findings({ times: tens, values })).toEqual([]);
    }
  });

  test('a change of units changes nothing', () => {
    const deviate = normal(11);
    const values = tens.map((time) => law(time / 190) + 0.005 * deviate());
    const kinds = (timeUnit: number, valueUnit: number): string[] =>
      findings({ times: tens.map((t) => t * timeUnit), values: values.map((y) => y * valueUnit) }).map(
        ({ kind }) => kind,
      );
    expect(kinds(1 / 86400, 1e-7)).toEqual(kinds(1, 1));
    expect(kinds(3600, 1e5)).toEqual(kinds(1, 1));
  });
});

test('headings, units and blank rows at the end are no findings', () => {
  const times = [{ text: 't / s' }, ...tens, null, null];
  const values = [{ text: 'A' }, ...tens.map((time) => printed(0.8 * 2 ** (-time / 60))), null, null];
  expect(findings({ times, values })).toEqual([]);
});

test('a rising run that starts at 0 and a falling one that ends there hold no odd zero', () => {
  const rising = tens.map((time) => printed(40 * (1 - 2 ** (-time / 60)), 2));
  expect(findings({ times: tens, values: rising })).toEqual([]);
  const falling = tens.map((time) => printed(Math.max(0, 1 - time / 190), 4));
  expect(falling.at(-1)).toBe(0);
  expect(findings({ times: tens, values: falling })).toEqual([]);
});

test('false alarms: of 500 clean runs with normal scatter, seeds 1 to 500, at most 2 % show an outlier, a step or an odd zero', () => {
  const alarms = { outlier: 0, step: 0, zero: 0, 'time slip': 0 };
  for (let seed = 1; seed <= 500; seed++) {
    const [next, deviate] = [uniform(seed), normal(seed + 1000)];
    const law = named[Math.floor(next() * named.length)][1];
    const count = 8 + Math.floor(next() * 53);
    const scatter = [0.002, 0.01, 0.03][seed % 3];
    const isRelative = seed % 2 === 0;
    const times = Array.from({ length: count }, (_, i) =>
      spacings[seed % 5 === 0 ? 'widening' : 'even'](i, count),
    );
    const values = times.map(
      (time) =>
        law(time) * (isRelative ? 1 + scatter * deviate() : 1) + (isRelative ? 0 : scatter * deviate()),
    );
    for (const { kind } of findings({ times, values }))
      if (kind in alarms) alarms[kind as keyof typeof alarms]++;
  }
  expect(alarms.outlier).toBeLessThanOrEqual(10);
  expect(alarms.step + alarms.zero + alarms['time slip']).toBeLessThanOrEqual(2);
});

test('power: an outlier of 15 standard deviations is found in 9 of 10 runs of 20 readings, and hardly another with it', () => {
  let [found, others] = [0, 0];
  for (let seed = 1; seed <= 200; seed++) {
    const [next, deviate] = [uniform(seed), normal(seed + 1000)];
    const odd = Math.floor(next() * 20);
    const values = tens.map(
      (time, row) => Math.exp(-time / 80) + 0.005 * (deviate() + (row === odd ? 15 : 0)),
    );
    const places = findings({ times: tens, values }).flatMap(({ kind, places }) =>
      kind === 'outlier' ? places : [],
    );
    if (places.includes(odd)) found++;
    others += places.filter((place) => place !== odd).length;
  }
  expect(found).toBeGreaterThanOrEqual(180);
  expect(others).toBeLessThanOrEqual(4);
});
