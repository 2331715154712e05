/**
 * How long the fits take, beside a peer in the same run.
 *
 * The peer is the straight line through ln c that people draw in a sheet, by a general-purpose library. Only
 * the ratios mean something from one machine to the next.
 */
import { SimpleLinearRegression } from 'ml-regression';
import { fitRateLaw } from '../../src/order/fit';
import { compareOrders } from '../../src/order/orders';
import { halfLifeEstimate } from '../../src/order/profile';
import { ratesAlong } from '../../src/rate/tangent';
import { pairReadings, type Series } from '../../src/series/series';

const runs = 200;
const points = 50;

export const series = Array.from({ length: runs }, (_, run) => firstOrderRun(run));

/** c = 3 + 40 exp(−kt) to the nearest hundredth, which scatters like readings of a display. */
function firstOrderRun(run: number): Series {
  const k = 0.02 * (1 + run / runs);
  const times = Array.from({ length: points }, (_, i) => i * 5);
  const values = times.map((time) => Math.round((3 + 40 * Math.exp(-k * time)) * 100) / 100);
  return pairReadings(times, values);
}

const jobs: readonly (readonly [string, (run: Series) => unknown])[] = [
  [
    'straight line through ln c',
    ({ times, values }) => new SimpleLinearRegression([...times], Array.from(values, Math.log)),
  ],
  ['rate coefficient, end given', (run) => fitRateLaw(run, { order: 1, endpoint: 3 })],
  ['rate coefficient, free end', (run) => fitRateLaw(run, { order: 1, endpoint: 'free' })],
  [
    'half life with its limits, free end',
    (run) => halfLifeEstimate(fitRateLaw(run, { order: 1, endpoint: 'free' })),
  ],
  ['order free, free end', (run) => fitRateLaw(run, { order: 'free', endpoint: 'free' })],
  ['table of orders, free end', (run) => compareOrders(run, { endpoint: 'free' })],
  ['rate column, window chosen', (run) => ratesAlong(run)],
];

/** The quickest of five rounds, which other work on the machine disturbs least. */
function secondsFor(job: (run: Series) => unknown): number {
  let best = Infinity;
  for (let round = 0; round < 5; round++) {
    const start = performance.now();
    for (const run of series) job(run);
    best = Math.min(best, (performance.now() - start) / 1000);
  }
  return best;
}

export function benchFits(): void {
  const peer = secondsFor(jobs[0][1]);
  console.log(`${runs} runs of ${points} readings each`);
  for (const [name, job] of jobs) {
    const seconds = secondsFor(job);
    const times = seconds / peer;
    console.log(
      `${name.padEnd(38)}${((seconds * 1e6) / runs).toFixed(0).padStart(7)} µs a run   ${times.toFixed(1).padStart(7)} × the straight line`,
    );
  }
}
