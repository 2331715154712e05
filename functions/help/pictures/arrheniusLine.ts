import { dots, line, type Place } from '../../drawing/frame';
import { peroxideKept } from '../../demo/runs';
import { plainNumber, valueWithUncertainty } from '../../format';
import { columnOf, estimateOf, numberOf, pointsOf, times, values } from './answers';
import { band, curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

const temperatures = [40, 50, 60, 70];
const zero = 273.15;
const inverse = (celsius: number): number => 1000 / (celsius + zero);

export const coefficients = (): number[] =>
  temperatures.map((_, run) => {
    const points = pointsOf(peroxideKept, run + 1);
    return numberOf('COEFFICIENT', times(points), values(points), 1);
  });

export const predicted = (
  ks: readonly number[],
  celsius: number,
): { value: number; lower: number; upper: number } =>
  estimateOf('COEFFICIENTAT', columnOf(temperatures), columnOf(ks), celsius, undefined, true);

export function arrheniusLine(): Picture {
  const ks = coefficients();
  const energy = estimateOf('ARRHENIUS', columnOf(temperatures), columnOf(ks), undefined, true);
  const points: Place[] = temperatures.map((celsius, i) => ({ x: inverse(celsius), y: Math.log(ks[i]) }));
  const along = curveOf(inverse(70), inverse(5), (x) => x, 32).map(({ x }) => ({
    x,
    ...predicted(ks, 1000 / x - zero),
  }));
  const edge = (what: 'value' | 'lower' | 'upper'): Place[] =>
    along.map((one) => ({ x: one.x, y: Math.log(one[what]) }));
  const frame = panelFrame(
    [inverse(70), inverse(5)],
    [...edge('lower'), ...edge('upper')].map(({ y }) => y),
  );
  const asked = [25, 5].map((celsius) => ({ celsius, x: inverse(celsius), ...predicted(ks, celsius) }));
  const middle = points.reduce((sum, { x }) => sum + x, 0) / points.length;
  const wide = ({ lower, upper }: { lower: number; upper: number }): number => upper / lower;
  const near = panelFrame([0, 75], [1, Math.max(...along.map(wide))]);
  const widths = curveOf(5, 75, (celsius) => wide(predicted(ks, celsius)), 35);
  const best = 1000 / middle - zero;
  return {
    name: 'arrhenius-line',
    title: 'Surest in the middle, least sure far away',
    functions: ['ARRHENIUS', 'COEFFICIENTAT', 'EYRING', 'TIMETO'],
    caption: `Peroxide kept at 40 to 70 °C: ln k on a straight line against 1/T, Ea = ${valueWithUncertainty(energy.value, energy.uncertainty)} kJ/mol. Its 95 % limits lie too close to be seen beside it. The second drawing shows how close: they are nearest at the middle of the measured temperatures, near ${Math.round(best)} °C, where slope and height of the line do not disturb each other, and part on both sides; at 5 °C, beyond all of them, the upper limit is ${plainNumber(wide(asked[1]), 3)} times the lower, and no statistics tell whether the line still holds there.`,
    panels: [
      panel(
        {
          heading: 'Line through four temperatures',
          frame,
          x: '1000 K / T',
          y: 'ln(k d)',
          says: `four temperatures with the line through them, extended to 5 °C; ${asked.map(({ celsius, value, lower, upper }) => `at ${celsius} °C k is ${plainNumber(value, 2)} per day, from ${plainNumber(lower, 2)} to ${plainNumber(upper, 2)}`).join('; ')}`,
        },
        band(frame, edge('lower'), edge('upper')),
        line(
          frame,
          edge('value').filter(({ x }) => x >= points[0].x),
          'curve beyond',
        ),
        line(
          frame,
          [points[3], points[0]].map(({ x }) =>
            edge('value').reduce((a, b) => (Math.abs(b.x - x) < Math.abs(a.x - x) ? b : a)),
          ),
          'rate-line',
        ),
        dots(frame, points, 'readings window'),
        dots(
          frame,
          asked.map(({ x, value }) => ({ x, y: Math.log(value) })),
          'touch',
        ),
        ...points.map((point, i) => note(frame, point, `${temperatures[i]} °C`, { by: [6, -6] })),
        ...asked.map(({ celsius, x, value }) =>
          note(frame, { x, y: Math.log(value) }, `${celsius} °C`, { anchor: 'end', by: [-7, 12] }),
        ),
      ),
      panel(
        {
          heading: 'How far apart the limits of k lie',
          frame: near,
          x: 'temperature / °C',
          y: 'upper / lower limit',
          says: `least near ${Math.round(best)} °C, ${plainNumber(wide(asked[1]), 3)} at 5 °C`,
        },
        line(near, widths, 'rate-line'),
        dots(
          near,
          temperatures.map((x) => ({ x, y: wide(predicted(ks, x)) })),
          'readings window',
        ),
        dots(
          near,
          asked.map(({ celsius: x, lower, upper }) => ({ x, y: upper / lower })),
          'touch',
        ),
      ),
    ],
  };
}
