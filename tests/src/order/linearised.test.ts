import published from '../../reference/published-runs.json';
import { fitRateLaw } from '../../../src/order/fit';
import { startRate, straightLineFit } from '../../../src/order/linearised';
import { pairReadings } from '../../../src/series/series';
import { relative } from '../../support/compare';
import { simulatedRun } from '../../support/simulatedRun';

const run = ({ times, values }: { times: number[]; values: number[] }) => pairReadings(times, values);

describe.each(published.cases)('$what', (c) => {
  test.each(c.straightLineR2)(
    'straightLineFit of order %d: R² as SciPy has it, %d, to 1e-12',
    (order, r2) => {
      const series = run(c);
      expect(relative(straightLineFit(series.times, series.values, 0, order)!, r2)).toBeLessThan(1e-12);
    },
  );
});

/** 1 − SSE/SST about the least-squares line, by the two-pass textbook sums. */
function plainR2(x: readonly number[], y: readonly number[]): number {
  const mx = x.reduce((a, b) => a + b) / x.length;
  const my = y.reduce((a, b) => a + b) / y.length;
  const slope =
    x.reduce((sum, xi, i) => sum + (xi - mx) * (y[i] - my), 0) /
    x.reduce((sum, xi) => sum + (xi - mx) ** 2, 0);
  const sse = y.reduce((sum, yi, i) => sum + (yi - my - slope * (x[i] - mx)) ** 2, 0);
  return 1 - sse / y.reduce((sum, yi) => sum + (yi - my) ** 2, 0);
}

test('straightLineFit measures from the endpoint, above or below it, and passes over readings beyond it', () => {
  const times = Float64Array.of(0, 1, 2, 3, 4);
  const rising = Float64Array.of(1, 4, 6, 7, 9); // distances from 8: 7, 4, 2, 1 and one beyond
  const expected = plainR2([0, 1, 2, 3], [7, 4, 2, 1].map(Math.log));
  expect(straightLineFit(times, rising, 8, 1)).toBeCloseTo(expected, 12);
  expect(
    straightLineFit(
      times,
      rising.map((v) => 16 - v),
      8,
      1,
    ),
  ).toBeCloseTo(expected, 12);
});

test('straightLineFit keeps its digits where times are dates, counted in days since 1900', () => {
  const minutes = [0, 1, 2, 3, 4].map((minute) => 46357 + minute / 1440);
  const readings = [1, 0.62, 0.35, 0.22, 0.14];
  const dated = straightLineFit(Float64Array.from(minutes), Float64Array.from(readings), 0, 1)!;
  expect(dated).toBeCloseTo(plainR2([0, 1, 2, 3, 4], readings.map(Math.log)), 7);
});

test('straightLineFit has nothing to say with fewer than three readings clear of the end', () => {
  expect(straightLineFit(Float64Array.of(0, 1, 2), Float64Array.of(3, 1, -1), 0, 1)).toBeNull();
  expect(straightLineFit(Float64Array.of(0, 0, 0), Float64Array.of(3, 2, 1), 0, 1)).toBeNull();
  expect(straightLineFit(Float64Array.of(0, 1, 2), Float64Array.of(2, 2, 2), 0, 1)).toBeNull();
});

test.each([0, 0.5, 1, 1.5, 2, 3])(
  'startRate of a clean run of order %d is its κ, and a silent guess elsewhere',
  (order) => {
    const clean = run(simulatedRun({ order, halfLives: 2, readings: 9, noise: 0, seed: 1 }));
    const { problem } = fitRateLaw(clean, { order }).search.fit;
    expect(startRate(problem, order)).toBeCloseTo(0, 9); // κ = k c₀ⁿ⁻¹ = 1
    expect(startRate({ ...problem, offset: true }, order)).toBeUndefined();
    expect(startRate({ ...problem, shape: 'converted' }, order)).toBeUndefined();
    // a run that rises away from its end has no such guess
    expect(startRate({ ...problem, values: problem.values.map((v, i) => v + 3 * i) }, order)).toBeUndefined();
  },
);
