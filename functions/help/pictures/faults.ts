import { dots, type Place } from '../../drawing/frame';
import { dyeFading } from '../../demo/runs';
import { findings } from '../../../src/series/check/findings';
import { pointsOf, xs, ys } from './answers';
import { panel, panelFrame } from './panel';
import type { Panel, Picture } from './picture';

const run = pointsOf(dyeFading);

/** Later by so many minutes; before that nothing happens. */
const late = 16;
const sound = (x: number): number => {
  const after = run.findIndex((point) => point.x >= x);
  const [a, b] = [run[Math.max(0, after - 1)], run[after]];
  return a === b || b.x === a.x ? b.y : a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x);
};

/** The sound run of the demo, and then with one thing gone wrong. */
export const faults: readonly (readonly Place[])[] = [
  run,
  run.map(({ x, y }) => ({ x, y: x === 35 ? y + 0.09 : y })),
  run.filter(({ x }) => x <= 13 || x >= 60),
  Array.from({ length: 22 }, (_, i) => i * 6).map((x, i) => ({
    x,
    y: Number((x < late ? run[0].y + 0.002 * (i % 2) : sound(Math.min(120, x - late))).toFixed(3)),
  })),
  [
    ...run.map(({ x, y }) => ({ x, y: y + 0.12 })),
    ...[0.001, -0.001, 0, 0.001, 0, -0.001, 0.001, 0].map((off, i) => ({ x: 130 + 10 * i, y: 0.126 + off })),
  ],
  run.map(({ x, y }) => ({ x, y: x > 40 ? y + 0.08 : y })),
];

/** What PACE.CHECK says first, and the readings it means. */
export function findingIn(points: readonly Place[]): { words: string; places: readonly number[] } {
  const [first] = findings({ times: xs(points), values: ys(points) });
  return first ? { words: first.finding, places: first.places } : { words: 'nothing found', places: [] };
}

function faultPanel(points: readonly Place[]): Panel {
  const { words, places } = findingIn(points);
  const frame = panelFrame(xs(points), [0, ...ys(points)]);
  return panel(
    {
      heading: words,
      frame,
      x: 't / min',
      y: 'A',
      says: `${points.length} readings, ${places.length} of them meant`,
    },
    dots(frame, points, 'readings'),
    dots(
      frame,
      points.filter((_, place) => places.includes(place)),
      'touch',
    ),
  );
}

export const faultsPicture = (): Picture => ({
  name: 'faults',
  title: 'What PACE.CHECK finds in a run',
  functions: ['CHECK', 'SURVEY'],
  caption:
    'The fading dye of the demo, sound at first, then with one thing gone wrong at a time. Above each stands what PACE.CHECK says first; the readings it means are marked.',
  panels: faults.map(faultPanel),
});
