/** How often the verdict on the order is right, undecided and wrong. */
import { compareOrders, simpleOrders } from '../../src/order/orders';
import { pairReadings } from '../../src/series/series';
import { simulatedRun } from '../support/simulatedRun';
import { percent, table } from './table';

const halfLives = [1, 2, 3, 4];
const noises = [0.003, 0.01, 0.03];
const readings = 20;

interface Count {
  right: number;
  undecided: number;
  wrong: number;
}

/** The order that the verdict calls best, or none. */
function decided(run: { times: number[]; values: number[] }): number | null {
  const { rows } = compareOrders(pairReadings(run.times, run.values), {});
  return rows.find(({ verdict }) => verdict.startsWith('fits best'))?.order ?? null;
}

function count(order: number, followed: number, noise: number, runs: number, seed: number): Count {
  const found: Count = { right: 0, undecided: 0, wrong: 0 };
  for (let run = 0; run < runs; run++) {
    const best = decided(
      simulatedRun({ order, halfLives: followed, readings, noise, seed: seed + run * 7919 }),
    );
    found[best === null ? 'undecided' : best === order ? 'right' : 'wrong']++;
  }
  return found;
}

export function verdictTable(runs: number, seed: number): string {
  const rows: (string | number)[][] = [];
  let worst = 0;
  for (const order of simpleOrders) {
    for (const noise of noises) {
      const cells = halfLives.map((followed) => {
        const { right, undecided, wrong } = count(order, followed, noise, runs, seed);
        worst = Math.max(worst, wrong / runs);
        return `${percent(right / runs)} / ${percent(undecided / runs)} / ${percent(wrong / runs)}`;
      });
      rows.push([order, percent(noise), ...cells]);
    }
  }
  const heads = [
    'order',
    'noise',
    ...halfLives.map((followed) => `${followed} half li${followed === 1 ? 'fe' : 'ves'}`),
  ];
  return [
    `${runs} runs a cell of ${readings} evenly spaced readings, end known to be 0, normal scatter as a share of c₀. Right / undecided / wrong with confidence, where the verdict says “fits best”. The worst cell is wrong in ${percent(worst)}.`,
    '',
    table(heads, rows),
  ].join('\n');
}
