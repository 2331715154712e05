/** How often 95 % limits hold the truth. */
import type { Estimate } from '../../src/estimate';
import { fitRateLaw } from '../../src/order/fit';
import { halfLifeEstimate, orderEstimate, rateCoefficientEstimate } from '../../src/order/profile';
import { averageRate } from '../../src/rate/average';
import { startRateOf } from '../../src/rate/start';
import { tangentRate } from '../../src/rate/tangent';
import { pairReadings, type Series } from '../../src/series/series';
import { simulatedRun, type Simulation } from '../support/simulatedRun';
import { percent, table } from './table';

interface Trial {
  readonly what: string;
  readonly settings: Omit<Simulation, 'seed'>;
  readonly truth: number;
  readonly estimate: (series: Series) => Estimate;
}

const run = (
  order: number,
  halfLives: number,
  readings: number,
  noise: number,
  endpoint = 0,
): Omit<Simulation, 'seed'> => ({
  order,
  halfLives,
  readings,
  noise,
  endpoint,
});

const trials: readonly Trial[] = [
  {
    what: 'k, order 1, end 0; 10 readings, 2 half lives, 2 %',
    settings: run(1, 2, 10, 0.02),
    truth: 1,
    estimate: (s) => rateCoefficientEstimate(fitRateLaw(s, { order: 1 })),
  },
  {
    what: 'k, order 1, free end; 12 readings, 3 half lives, 2 %',
    settings: run(1, 3, 12, 0.02, 0.2),
    truth: 1,
    estimate: (s) => rateCoefficientEstimate(fitRateLaw(s, { order: 1, endpoint: 'free' })),
  },
  {
    what: 'k, order 2, end 0; 12 readings, 3 half lives, 3 %',
    settings: run(2, 3, 12, 0.03),
    truth: 1,
    estimate: (s) => rateCoefficientEstimate(fitRateLaw(s, { order: 2 })),
  },
  {
    what: 'half life, order 2, end 0; 8 readings, 2 half lives, 3 %',
    settings: run(2, 2, 8, 0.03),
    truth: 1,
    estimate: (s) => halfLifeEstimate(fitRateLaw(s, { order: 2 })),
  },
  {
    what: 'half life, order 1, free end; 12 readings, 2 half lives, 2 %',
    settings: run(1, 2, 12, 0.02, 0.2),
    truth: Math.LN2,
    estimate: (s) => halfLifeEstimate(fitRateLaw(s, { order: 1, endpoint: 'free' })),
  },
  {
    what: 'order, end 0; 20 readings, 3 half lives of order 1, 1 %',
    settings: run(1, 3, 20, 0.01),
    truth: 1,
    estimate: (s) => orderEstimate(fitRateLaw(s, { order: 'free' })),
  },
  {
    what: 'tangent at a third of order 1, 7 of 41 readings, 1 %',
    settings: run(1, 2, 41, 0.01),
    truth: Math.exp(-0.4620981203732969),
    estimate: (s) => tangentRate(s, 0.4620981203732969, { points: 7 }),
  },
  {
    what: 'tangent at a third of order 1, window chosen, 41 readings, 1 %',
    settings: run(1, 2, 41, 0.01),
    truth: Math.exp(-0.4620981203732969),
    estimate: (s) => tangentRate(s, 0.4620981203732969),
  },
  {
    what: 'tangent at a third of order 2, window chosen, 31 readings, 1 %',
    settings: run(2, 2, 31, 0.01),
    truth: 0.25,
    estimate: (s) => tangentRate(s, 1),
  },
  {
    what: 'initial rate, order 1, 41 readings, 3 half lives, 0.5 %',
    settings: run(1, 3, 41, 0.005),
    truth: 1,
    estimate: (s) => startRateOf(s),
  },
  {
    what: 'average rate over the first half, order 1, 21 readings, 1 %',
    settings: run(1, 2, 21, 0.01),
    truth: (1 - Math.SQRT1_2 * Math.SQRT1_2) / Math.LN2,
    estimate: (s) => averageRate(s, 0, Math.LN2),
  },
];

function covered(
  { settings, truth, estimate }: Trial,
  runs: number,
  seed: number,
): { held: number; none: number } {
  let held = 0;
  let none = 0;
  for (let i = 0; i < runs; i++) {
    const { times, values } = simulatedRun({ ...settings, seed: seed + i * 7919 });
    const { lower, upper } = estimate(pairReadings(times, values));
    if (lower === null || upper === null) none++;
    if ((lower ?? -Infinity) <= truth && truth <= (upper ?? Infinity)) held++;
  }
  return { held, none };
}

export function coverageTable(runs: number, seed: number): string {
  const rows = trials.map((trial) => {
    const { held, none } = covered(trial, runs, seed);
    return [trial.what, percent(held / runs), percent(none / runs)];
  });
  return [
    `${runs} runs a row, normal scatter as a share of c₀. A side on which the data set no limit counts as holding.`,
    '',
    table(['estimate and run', '95 % limits hold the truth', 'open on a side'], rows),
  ].join('\n');
}
