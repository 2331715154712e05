import { dots, line } from '../../drawing/frame';
import { dyeFading, fizzByBalance } from '../../demo/runs';
import { plainNumber } from '../../format';
import { columnOf, numbersOf, pointsOf, times, values, xs, ys } from './answers';
import { note, panel, panelFrame } from './panel';
import type { Panel, Picture } from './picture';
import type { Place } from '../../drawing/frame';

/** Absorbance, and g, when all has reacted. */
const dyeGone = 0.006;

/** What is left on the balance's run: hydrogencarbonate, mol. */
const left = (): Place[] => {
  const lost = numbersOf('MASSLOSS', columnOf(fizzByBalance), 'CO2', undefined, 0.01, '31 degC');
  const remaining = numbersOf('REMAINING', columnOf(lost), 0.062);
  return remaining.map((y, i) => ({ x: 15 * i, y }));
};

export const halvings = (run: readonly Place[], end: number): number[] =>
  numbersOf('HALVINGS', times(run), values(run), end);

function halvingPanel(
  heading: string,
  run: readonly Place[],
  end: number,
  [x, y]: readonly [string, string],
): Panel {
  const lives = halvings(run, end);
  const frame = panelFrame(xs(run), [0, ...ys(run)]);
  const reached = lives.map((_, i) => run[0].x + lives.slice(0, i + 1).reduce((sum, life) => sum + life, 0));
  const levels = reached.map((_, i) => end + (run[0].y - end) / 2 ** (i + 1));
  const unit = x.split(' / ')[1];
  return panel(
    {
      heading,
      frame,
      x,
      y,
      says: `successive half lives ${lives.map((life) => plainNumber(life, 3)).join(', ')} ${unit}`,
    },
    ...reached.map((time, i) =>
      line(
        frame,
        [
          { x: run[0].x, y: levels[i] },
          { x: time, y: levels[i] },
          { x: time, y: 0 },
        ],
        'drop',
      ),
    ),
    dots(frame, run, 'readings'),
    dots(
      frame,
      reached.map((time, i) => ({ x: time, y: levels[i] })),
      'touch',
    ),
    ...lives
      .slice(0, 3)
      .map((life, i) =>
        note(frame, { x: reached[i], y: levels[i] }, `${plainNumber(life, 3)} ${unit}`, { by: [8, -4] }),
      ),
  );
}

export function halfLives(): Picture {
  const dye = pointsOf(dyeFading);
  return {
    name: 'half-lives',
    title: 'Half lives, read off',
    functions: ['HALVINGS', 'HALFLIFE', 'ORDER'],
    caption:
      'Each halving of the distance from the end, and how long it took. The dye takes about as long each time, which is order 1. The fizz on the balance takes about twice as long each time, which is order 2. The last ones, where little is left, scatter most.',
    panels: [
      halvingPanel('Dye: alike', dye, dyeGone, ['t / min', 'A']),
      halvingPanel('Fizz on the balance: doubling', left(), 0, ['t / s', 'n left / mol']),
    ],
  };
}
