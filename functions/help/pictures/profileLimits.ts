import { dots, line } from '../../drawing/frame';
import { dyeFading } from '../../demo/runs';
import { plainNumber } from '../../format';
import { fitRateLaw } from '../../../src/order/fit';
import { halfLifeEstimate } from '../../../src/order/profile';
import { studentQuantile } from '../../../src/numerics/studentT';
import { pairReadings } from '../../../src/series/series';
import { pointsOf, xs, ys } from './answers';
import { curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

/** min, at which the run was stopped, so early that its end is hardly known. */
const stopped = 13;
const run = pointsOf(dyeFading).filter(({ x }) => x <= stopped);

/** The half life with its limits of both kinds, and how far the sum of squares lies above its least. */
export function profile() {
  const fit = fitRateLaw(pairReadings(xs(run), ys(run)), { order: 1, endpoint: 'free' });
  const { value, standardUncertainty, lower, upper, degreesOfFreedom } = halfLifeEstimate(fit);
  const t = studentQuantile(0.975, degreesOfFreedom);
  const least = fit.residualSumOfSquares;
  return {
    value,
    limits: [lower!, upper!] as const,
    symmetric: [value - t * standardUncertainty!, value + t * standardUncertainty!] as const,
    /** S at the limits over its least: 1 + F/ν, and F with 1 and ν is t². */
    threshold: 1 + t ** 2 / degreesOfFreedom,
    squaresAt: (halfLife: number) =>
      fit.search.fit.at(Math.log(Math.LN2 / halfLife), 1).residualSumOfSquares / least,
    parabolaAt: (halfLife: number) => 1 + ((halfLife - value) / standardUncertainty!) ** 2 / degreesOfFreedom,
  };
}

export function profileLimits(): Picture {
  const { value, limits, symmetric, threshold, squaresAt, parabolaAt } = profile();
  const frame = panelFrame([0, 70], [1, 1 + 1.5 * (threshold - 1)]);
  const isInside = ({ y }: { y: number }): boolean => y <= frame.y.to;
  const crossings = (xs: readonly number[]) => xs.map((x) => ({ x, y: threshold }));
  const minutes = (time: number): string => plainNumber(time, 3);
  const [low, high] = limits.map(minutes);
  const [evenLow, evenHigh] = symmetric.map(minutes);
  return {
    name: 'profile-limits',
    title: 'Why limits need not lie evenly',
    functions: ['HALFLIFE', 'COEFFICIENT', 'ORDER', 'FITCOURSE'],
    caption: `The dye run stopped at ${stopped} min, its end fitted as well: the sum of squared residuals S for each half life, with everything else at its best. The 95 % limits stand where S meets the broken line: ${low} and ${high} min about ${minutes(value)} min. Limits laid evenly, by the parabola of the same curvature (thin), would be ${evenLow} and ${evenHigh} min: they would rule out long half lives that fit well, and allow short ones that do not.`,
    panels: [
      panel(
        {
          heading: 'S over its least, for each half life',
          frame,
          x: 'half life / min',
          y: 'S / least S',
          says: `the curve meets the line at ${low} and ${high} min, the parabola at ${evenLow} and ${evenHigh} min`,
        },
        line(frame, crossings([frame.x.from, frame.x.to]), 'curve beyond'),
        line(frame, curveOf(0, 70, parabolaAt, 140).filter(isInside), 'curve'),
        line(frame, curveOf(5, 70, squaresAt, 130).filter(isInside), 'rate-line'),
        ...limits.map((x) =>
          line(
            frame,
            [
              { x, y: frame.y.from },
              { x, y: threshold },
            ],
            'drop',
          ),
        ),
        dots(frame, crossings(symmetric), 'readings window'),
        dots(frame, crossings(limits), 'touch'),
        dots(frame, [{ x: value, y: 1 }], 'touch'),
        note(frame, { x: limits[1], y: threshold }, `${high} min`, { by: [2, -8], anchor: 'middle' }),
        note(frame, { x: limits[0], y: threshold }, `${low} min`, { by: [8, 14] }),
      ),
    ],
  };
}
