import { dots, line } from '../../drawing/frame';
import { plainNumber } from '../../format';
import { shareLeft } from '../../../src/order/law';
import { varianceOfLogCoefficient } from '../../../src/plan/sampling';
import { rowsOf } from './answers';
import { curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

/** What is believed before the run: order 1, per minute, mmol/L, mmol/L, and how many readings can be afforded. */
export const believed = { order: 1, k: 0.06, initial: 0.1, noise: 0.002, samples: 6 };

export function plannedTimes(): { times: number[]; uncertainty: number } {
  const { order, k, initial, noise, samples } = believed;
  const [, ...rows] = rowsOf('PLAN', order, k, initial, noise, samples);
  return { times: rows.map(([time]) => Number(time)), uncertainty: Number(rows[0][1]) };
}

/** Standard uncertainty of k to expect of readings at some times. */
export const uncertaintyAt = (times: readonly number[]): number => {
  const { order, k, initial, noise } = believed;
  const reduced = times.map((time) => time * k * initial ** (order - 1));
  return (k * noise * Math.sqrt(varianceOfLogCoefficient(reduced, order))) / initial;
};

const count = (readings: number): string => (readings === 1 ? 'one reading' : `${readings} readings`);

export function samplingPlan(): Picture {
  const { order, k, initial, samples } = believed;
  const { times, uncertainty } = plannedTimes();
  const longest = 60;
  const spread = (until: number): number[] =>
    Array.from({ length: samples }, (_, i) => (i * until) / (samples - 1));
  const height = (x: number): number => initial * shareLeft(k * x, order);
  const frame = panelFrame([0, longest], [0, initial]);
  const on = (list: readonly number[]) => list.map((x) => ({ x, y: height(x) }));
  const [first, last] = [times[0], times[samples - 1]];
  const early = times.filter((time) => time === first);
  const moved = curveOf(4, longest, (end) =>
    uncertaintyAt([...early, ...times.slice(early.length).map(() => end)]),
  );
  const which = panelFrame([0, longest], [0, ...moved.map(({ y }) => y)]);
  const [before, after] = [count(early.length), count(samples - early.length)];
  const share = (u: number): string => `${plainNumber((100 * u) / k, 2)} %`;
  const when = `${plainNumber(last, 3)} min`;
  return {
    name: 'sampling-plan',
    title: 'When to take six readings',
    functions: ['PLAN'],
    caption: `For a first order with k near ${k} min⁻¹ and six readings, PACE.PLAN asks for ${before} at the start and ${after} at ${when}: k then comes out to ${share(uncertainty)}. Six readings spread evenly over an hour (grey) give ${share(uncertaintyAt(spread(longest)))}, six in the first ten minutes ${share(uncertaintyAt(spread(10)))}. A plan for k alone shows nothing of the order: keep a few readings between.`,
    panels: [
      panel(
        {
          heading: 'Where the readings go',
          frame,
          x: 't / min',
          y: 'c / (mmol/L)',
          says: `${before} at the start and ${after} at ${when}; evenly spread ones for comparison`,
        },
        line(frame, curveOf(0, longest, height), 'curve'),
        dots(frame, on(spread(longest)), 'readings'),
        dots(frame, on(times), 'touch'),
        note(frame, on([first])[0], before, { by: [10, 4] }),
        note(frame, on([last])[0], after, { by: [8, -6] }),
      ),
      panel(
        {
          heading: 'u(k), were the later ones moved',
          frame: which,
          x: 't of the later readings / min',
          y: 'u(k) / min⁻¹',
          says: `least, ${plainNumber(uncertainty, 2)}, at ${when}`,
        },
        line(which, moved, 'rate-line'),
        dots(which, [{ x: last, y: uncertainty }], 'touch'),
      ),
    ],
  };
}
