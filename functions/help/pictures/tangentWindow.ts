import { dots, line, type Place } from '../../drawing/frame';
import { fizzByBurette } from '../../demo/runs';
import { plainNumber, valueWithUncertainty } from '../../format';
import { fitRateLaw } from '../../../src/order/fit';
import { pairReadings } from '../../../src/series/series';
import { emptyLocalFit, fitLocalPolynomial, nearestWindow } from '../../../src/rate/localPolynomial';
import { defaultWindow } from '../../../src/rate/window';
import { estimateOf, pointsOf, times, values, xs, ys } from './answers';
import { bar, curveOf, note, panel, panelFrame, withinFrame } from './panel';
import type { Panel, Picture } from './picture';

/** s, at which the tangent is drawn. */
const at = 60;
const degree = 2;
const run = pointsOf(fizzByBurette);
const series = pairReadings(xs(run), ys(run));

export const tangentAt = (
  points: number,
): { value: number; uncertainty: number; lower: number; upper: number } =>
  estimateOf('TANGENT', times(run), values(run), at, points, degree, undefined, true);

function windowPanel(heading: string, points: number): Panel {
  const frame = panelFrame(xs(run), [0, ...ys(run)]);
  const first = nearestWindow(series.times, points, at);
  const height = (x: number): number =>
    fitLocalPolynomial(series.times, series.values, first, points, degree, x, emptyLocalFit()).value;
  const window = run.slice(first, first + points);
  const rate = tangentAt(points);
  const touch: Place = { x: at, y: height(at) };
  const inWords = `${plainNumber(rate.value, 3)} mL/s`;
  return panel(
    {
      heading,
      frame,
      x: 't / s',
      y: 'V / mL',
      says: `the parabola through ${points} readings has the slope ${inWords} at ${at} s`,
    },
    dots(frame, run, 'readings'),
    dots(frame, window, 'readings window'),
    line(frame, curveOf(window[0].x, window[points - 1].x, height), 'curve'),
    line(frame, withinFrame(frame, touch, rate.value, 60), 'rate-line'),
    dots(frame, [touch], 'touch'),
    note(frame, touch, inWords, { by: [14, 14] }),
  );
}

function widthPanel(): Panel {
  const widths = [4, 5, 6, 7, 8, 9, 11, 13, 15, 17, 20].map((points) => ({ points, ...tangentAt(points) }));
  const frame = panelFrame(
    [2, ...widths.map(({ points }) => points)],
    widths.flatMap(({ lower, upper }) => [Math.max(lower, 0.3), Math.min(upper, 0.5)]),
  );
  const seen = widths.map(({ points, value, lower, upper }) => ({
    x: points,
    y: value,
    limits: [Math.max(lower, frame.y.from), Math.min(upper, frame.y.to)] as const,
  }));
  return panel(
    {
      heading: 'Rate at 60 s against the width',
      frame,
      x: 'readings in the window',
      y: 'r / (mL/s)',
      says: widths
        .map(
          ({ points, value, uncertainty }) =>
            `${points} readings ${valueWithUncertainty(value, uncertainty)}`,
        )
        .join(', '),
    },
    line(
      frame,
      [frame.x.from, frame.x.to].map((x) => ({ x, y: rateByLaw() })),
      'curve beyond',
    ),
    ...seen.map(({ x, limits }) => bar(frame, x, limits)),
    dots(frame, seen, 'touch'),
  );
}

export const chosenWidth = defaultWindow(series, degree);

/** The rate at that time by the law of order 1 fitted to the whole run, which the run follows: k(y∞ − y). */
export function rateByLaw(): number {
  const { rateCoefficient, endpoint, start } = fitRateLaw(series, { order: 1, endpoint: 'free' });
  return rateCoefficient * (endpoint - start) * Math.exp(-rateCoefficient * at);
}

/** Too many: the parabola cannot follow the bend any more. */
const tooMany = 13;

export function tangentWindow(): Picture {
  const { value, lower, upper } = tangentAt(tooMany);
  const inWords = (rate: number): string => plainNumber(rate, 3);
  return {
    name: 'tangent-window',
    title: 'What a tangent rests on, and what its width does',
    functions: ['TANGENT', 'ALONG'],
    caption: `A tangent is the slope of a parabola through the nearest readings (marked). With few of them it follows every scatter, and its limits are wide. With ${tooMany} it cannot follow the bend: it gives ${inWords(value)} mL/s with limits from ${inWords(lower)} to ${inWords(upper)}, which know nothing of that; the law fitted to the whole run says ${inWords(rateByLaw())} (broken line). Left to itself, PACE.TANGENT takes the number with the smallest expected error, here ${chosenWidth}.`,
    panels: [
      windowPanel('4 readings', 4),
      windowPanel(`${chosenWidth} readings, as chosen`, chosenWidth),
      windowPanel(`${tooMany} readings`, tooMany),
      widthPanel(),
    ],
  };
}
