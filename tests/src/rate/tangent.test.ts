import { InvalidInput, NotDetermined } from '../../../src/errors';
import { nearestWindow } from '../../../src/rate/localPolynomial';
import { ratesAlong, tangentRate } from '../../../src/rate/tangent';
import { defaultWindow } from '../../../src/rate/window';
import { pairReadings, type Series } from '../../../src/series/series';
import { mean } from '../../support/compare';
import { normal, shuffled } from '../../support/random';
import { simulatedRun } from '../../support/simulatedRun';

const uneven = [0, 1, 2.5, 3, 5, 8, 8, 9, 12, 13];

test.each([1, 2, 3, 4, 5])('tangentRate of degree %d is exact on a polynomial of that degree', (degree) => {
  const run = pairReadings(
    uneven,
    uneven.map((t) => 3 - t + 0.1 * t ** degree),
  );
  for (const time of [0, 2, 6.3, 13]) {
    const rate = tangentRate(run, time, { degree, points: degree + 3, stoichiometricNumber: 1 });
    expect(rate.value).toBeCloseTo(-1 + 0.1 * degree * time ** (degree - 1), degree > 3 ? 5 : 9);
  }
});

test('tangentRate: ν divides the rate and its uncertainty; its sign turns the rate round', () => {
  const { times, values } = simulatedRun({ order: 1, halfLives: 3, readings: 12, noise: 0.01, seed: 4 });
  const run = pairReadings(times, values);
  const own = tangentRate(run, 1, { stoichiometricNumber: 1 });
  const twice = tangentRate(run, 1, { stoichiometricNumber: -2 });
  expect(twice.value).toBeCloseTo(-own.value / 2, 15);
  expect(twice.standardUncertainty).toBeCloseTo(own.standardUncertainty! / 2, 15);
  expect(twice.upper).toBeCloseTo(-own.lower! / 2, 14);
});

test('rates scale with the units of time and reading, and do not mind the order of the rows', () => {
  const { times, values } = simulatedRun({ order: 2, halfLives: 3, readings: 15, noise: 0.02, seed: 9 });
  const rates = ratesAlong(pairReadings(times, values));
  const other = ratesAlong(
    pairReadings(
      times.map((t) => 60 * t),
      values.map((y) => 1000 * y),
    ),
  );
  const rows = shuffled(
    times.map((_, i) => i),
    5,
  );
  const mixed = ratesAlong(
    pairReadings(
      rows.map((i) => times[i]),
      rows.map((i) => values[i]),
    ),
  );
  rates.forEach(({ value, standardUncertainty }, i) => {
    expect((other[i].value / value) * 0.06).toBeCloseTo(1, 9);
    expect((other[i].standardUncertainty! / standardUncertainty!) * 0.06).toBeCloseTo(1, 9);
  });
  expect(mixed).toEqual(rates);
});

test('tangentRate has a rate and no uncertainty where as many points as coefficients leave no scatter', () => {
  const rate = tangentRate(pairReadings([0, 1, 2, 3], [9, 4, 1, 0]), 1, { points: 3 });
  expect(rate).toEqual({
    value: expect.closeTo(4, 12),
    standardUncertainty: null,
    lower: null,
    upper: null,
    degreesOfFreedom: 0,
  });
});

test('nearestWindow: the nearest readings, a tie to the earlier, one-sided at the ends', () => {
  const times = Float64Array.of(0, 1, 2, 3, 4, 10);
  expect(nearestWindow(times, 2, 1.5)).toBe(1);
  expect(nearestWindow(times, 2, 2)).toBe(1); // 1 and 3 are as near
  expect(nearestWindow(Float64Array.of(0.1, 0.2, 0.3), 2, 0.2)).toBe(0); // so are 0.1 and 0.3, whatever rounding says
  const clock = Float64Array.from({ length: 5 }, (_, n) => 46357 + (3600 * 9 + n) / 86400); // seconds after 9:00, as dates
  expect([1, 2, 3].map((n) => nearestWindow(clock, 2, clock[n]))).toEqual([0, 1, 2]);
  expect(nearestWindow(times, 3, 0)).toBe(0);
  expect(nearestWindow(times, 3, 10)).toBe(3);
  expect(nearestWindow(times, 3, 6.9)).toBe(3); // 4, 10 and 3 are 2.9, 3.1 and 3.9 away
});

const settings = [
  { order: 1, readings: 41, noise: 0.01, better: 5, worse: 1.5 },
  { order: 1, readings: 41, noise: 0.03, better: 10, worse: 1.7 },
  { order: 0.5, readings: 25, noise: 0.02, better: 10, worse: 2.5 },
  { order: 1, readings: 101, noise: 0.01, better: 20, worse: 1 },
  // wide windows, of which not all are tried
  { order: 1, readings: 801, noise: 0.01, better: 1000, worse: 1.2 },
  // bends hard at the start and hardly later, where one count for the whole run must be a compromise
  { order: 2, readings: 41, noise: 0.02, better: 0.5, worse: 2.2 },
];

/** Mean squared error of the rates over 12 runs, seeds 1 to 12; the exact rate is cⁿ, since k = 1. */
function squaredError(
  points: number | undefined,
  { order, readings, noise }: (typeof settings)[number],
): number {
  const exact = simulatedRun({ order, halfLives: 3, readings, noise: 0, seed: 0 }).values.map(
    (c) => c ** order,
  );
  const errors = Array.from({ length: 12 }, (_, run) => {
    const { times, values } = simulatedRun({ order, halfLives: 3, readings, noise, seed: run + 1 });
    return mean(
      ratesAlong(pairReadings(times, values), { points }).map(({ value }, i) => (value - exact[i]) ** 2),
    );
  });
  return mean(errors);
}

test.each(settings)(
  'defaultWindow, order $order, $readings readings, noise $noise: $better times better than 5 readings, within $worse of the best count',
  (setting) => {
    const chosen = squaredError(undefined, setting);
    const counts = [5, 7, 9, 11, 15, 21, 25, 101, 251, 401].filter((points) => points <= setting.readings);
    const fixed = counts.map((points) => squaredError(points, setting));
    expect(fixed[0] / chosen).toBeGreaterThan(setting.better);
    expect(chosen / Math.min(...fixed)).toBeLessThan(setting.worse);
  },
);

test('defaultWindow takes nearly all readings of a noisy parabola, and few of a clean wiggle', () => {
  const times = Array.from({ length: 40 }, (_, i) => i);
  const counts = Array.from({ length: 30 }, (_, run) => {
    const deviate = normal(run + 1);
    return defaultWindow(
      pairReadings(
        times,
        times.map((t) => 0.01 * t * t + deviate()),
      ),
      2,
    );
  });
  expect(mean(counts)).toBeGreaterThan(35);
  expect(
    defaultWindow(
      pairReadings(
        times,
        times.map((t) => Math.sin(t / 2)),
      ),
      2,
    ),
  ).toBeLessThanOrEqual(7);
});

test('defaultWindow copes with replicates, and with no more readings than it needs', () => {
  const replicates = Array.from({ length: 30 }, (_, i) => Math.floor(i / 3));
  const run: Series = pairReadings(
    replicates,
    replicates.map((t, i) => 5 - t + 0.1 * ((i * 7) % 3)),
  );
  expect(ratesAlong(run).every(({ value }) => Number.isFinite(value))).toBe(true);
  expect(defaultWindow(pairReadings([0, 1, 2, 3], [4, 3, 1, 1]), 2)).toBe(4);
});

const run = pairReadings([0, 1, 2, 3, 4], [5, 4, 3, 2, 1]);

test.each<[string, () => unknown, InvalidInput | NotDetermined]>([
  [
    'outside the run',
    () => tangentRate(run, 4.5),
    new NotDetermined('time must lie within the run, 0 to 4: got 4.5'),
  ],
  [
    'before it',
    () => tangentRate(run, -1),
    new NotDetermined('time must lie within the run, 0 to 4: got -1'),
  ],
  ['no time', () => tangentRate(run, NaN), new InvalidInput('time must be a finite number: got NaN')],
  [
    'a degree of 0',
    () => tangentRate(run, 1, { degree: 0 }),
    new InvalidInput('degree must be a whole number from 1 to 5: got 0'),
  ],
  [
    'half a degree',
    () => ratesAlong(run, { degree: 1.5 }),
    new InvalidInput('degree must be a whole number from 1 to 5: got 1.5'),
  ],
  [
    'too small a window',
    () => ratesAlong(run, { points: 2 }),
    new InvalidInput('points must be a whole number, 3 or more for degree 2: got 2'),
  ],
  [
    'too large a window',
    () => ratesAlong(run, { points: 6 }),
    new InvalidInput('points must not exceed the 5 readings there are: got 6'),
  ],
  [
    'too few times',
    () => ratesAlong(run, { degree: 5 }),
    new NotDetermined('a tangent of degree 5 needs 6 different times: got 5'),
  ],
  [
    'a window of replicates',
    () => tangentRate(pairReadings([0, 0, 0, 1, 2, 3], [1, 2, 3, 4, 5, 6]), 0, { points: 3 }),
    new InvalidInput('a polynomial of degree 2 needs 3 different times in its window: got 1'),
  ],
  [
    'a bystander',
    () => ratesAlong(run, { stoichiometricNumber: 0 }),
    new InvalidInput('stoichiometric number must not be 0: a species that takes no part has no rate'),
  ],
])('tangents refuse %s in words', (_, call, error) => {
  expect(call).toThrow(error.constructor as new () => Error);
  expect(call).toThrow(error);
});
