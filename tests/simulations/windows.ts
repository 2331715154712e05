/** The tangent's default window beside fixed ones. */
import { ratesAlong, type TangentOptions } from '../../src/rate/tangent';
import { pairReadings } from '../../src/series/series';
import { simulatedRun } from '../support/simulatedRun';
import { table } from './table';

const fixed = [5, 7, 11];
const orders = [0.5, 1, 2];
const counts = [15, 31, 61];
const noises = [0.001, 0.01, 0.03];

/** −dc/dt at c₀ = 1, k = 1. */
const rateAt: Readonly<Record<number, (t: number) => number>> = {
  0.5: (t) => Math.max(0, 1 - t / 2),
  1: (t) => Math.exp(-t),
  2: (t) => 1 / (1 + t) ** 2,
};

/** Root-mean-square error of the rates at all readings' times, as a share of the initial rate. */
function error(
  order: number,
  readings: number,
  noise: number,
  runs: number,
  seed: number,
  options: TangentOptions,
): number {
  let squares = 0;
  for (let run = 0; run < runs; run++) {
    const { times, values } = simulatedRun({ order, halfLives: 3, readings, noise, seed: seed + run * 7919 });
    const series = pairReadings(times, values);
    ratesAlong(series, options).forEach(
      ({ value }, i) => (squares += (value - rateAt[order](times[i])) ** 2),
    );
  }
  return Math.sqrt(squares / (runs * readings));
}

export function windowTable(runs: number, seed: number): string {
  const sums = { chosen: 0, ...Object.fromEntries(fixed.map((points) => [points, 0])) } as Record<
    string,
    number
  >;
  const rows: (string | number)[][] = [];
  for (const order of orders) {
    for (const readings of counts) {
      for (const noise of noises) {
        const chosen = error(order, readings, noise, runs, seed, {});
        const others = fixed.map((points) => error(order, readings, noise, runs, seed, { points }));
        sums.chosen += Math.log(chosen);
        others.forEach((other, i) => (sums[fixed[i]] += Math.log(other)));
        rows.push([
          order,
          readings,
          `${100 * noise} %`,
          ...[chosen, ...others].map((e) => `${(100 * e).toFixed(2)} %`),
        ]);
      }
    }
  }
  const geometric = (key: string | number): string =>
    `${(100 * Math.exp(sums[key] / rows.length)).toFixed(2)} %`;
  rows.push(['geometric mean', '', '', geometric('chosen'), ...fixed.map(geometric)]);
  return [
    `${runs} runs a row over three half lives, end 0. Root-mean-square error of the rates at all readings, as a share of the initial rate.`,
    '',
    table(
      ['order', 'readings', 'noise', 'window chosen', ...fixed.map((points) => `${points} readings`)],
      rows,
    ),
  ].join('\n');
}
