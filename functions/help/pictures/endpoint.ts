import { dots, line } from '../../drawing/frame';
import { fizzByBurette } from '../../demo/runs';
import { plainNumber, valueWithUncertainty } from '../../format';
import { fitRateLaw } from '../../../src/order/fit';
import { pairReadings } from '../../../src/series/series';
import { columnOf, estimateOf, numbersOf, numberOf, pointsOf, times, values, xs, ys } from './answers';
import { curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

/** Until half the gas had come and a little more: a run that was stopped early, as many are. */
const run = pointsOf(fizzByBurette).filter(({ x }) => x <= 120);
const [low, high] = [52, 66];

export const coefficientFor = (end: number): number =>
  numberOf('COEFFICIENT', times(run), values(run), 1, end);

export function endpoint(): Picture {
  const free = estimateOf('COEFFICIENT', times(run), values(run), 1, 'free', undefined, true);
  const { endpoint: fitted } = fitRateLaw(pairReadings(xs(run), ys(run)), { order: 1, endpoint: 'free' });
  const ends = [54, 64];
  const data = panelFrame([0, 360], [0, 70]);
  const curves = ends.map((end) => {
    const at = curveOf(0, 360, () => 0).map(({ x }) => x);
    const heights = numbersOf('CURVE', times(run), values(run), 1, columnOf(at), end);
    return at.map((x, i) => ({ x, y: heights[i] }));
  });
  const course = curveOf(low, high, coefficientFor, 56);
  const frame = panelFrame([low, high], ys(course));
  const marks = ends.map((x) => ({ x, y: coefficientFor(x) }));
  const inWords = (k: number): string => `${plainNumber(k, 3)} s⁻¹`;
  return {
    name: 'endpoint',
    title: 'Why the end of a run matters',
    functions: ['COEFFICIENT', 'HALFLIFE', 'ORDERS', 'ORDER'],
    caption: `The same readings of a run stopped at 120 s, with two ends that someone might assume: ${ends[0]} mL gives k = ${inWords(marks[0].y)}, ${ends[1]} mL gives ${inWords(marks[1].y)}. Both curves look right at a glance, and every end gives some k. Follow the run to its end, or have the end fitted with "free": ${valueWithUncertainty(fitted, null)} mL and k = ${valueWithUncertainty(free.value, free.uncertainty)} s⁻¹, which says honestly how sure it is.`,
    panels: [
      panel(
        {
          heading: 'One run, two ends',
          frame: data,
          x: 't / s',
          y: 'V / mL',
          says: `readings up to 120 s with the curves that end at ${ends[0]} and ${ends[1]} mL`,
        },
        line(data, curves[0], 'curve'),
        line(data, curves[1], 'rate-line'),
        dots(data, run, 'readings'),
        ...ends.map((end, i) =>
          note(data, { x: 360, y: curves[i].at(-1)!.y }, `ends at ${end} mL`, {
            anchor: 'end',
            by: [0, i === 0 ? 16 : -7],
          }),
        ),
      ),
      panel(
        {
          heading: 'k against the end that is assumed',
          frame,
          x: 'end / mL',
          y: 'k / s⁻¹',
          says: `k falls from ${inWords(course[0].y)} to ${inWords(course.at(-1)!.y)}`,
        },
        line(frame, course, 'rate-line'),
        dots(frame, marks, 'readings window'),
        dots(frame, [{ x: fitted, y: free.value }], 'touch'),
        note(frame, { x: fitted, y: free.value }, 'fitted', { by: [8, -6] }),
      ),
    ],
  };
}
