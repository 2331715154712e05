import { dots, line, type Place } from '../../drawing/frame';
import { dyeFading } from '../../demo/runs';
import { columnOf, numberOf, numbersOf, pointsOf, rowsOf, times, values } from './answers';
import { curveOf, note, panel, panelFrame, stretch } from './panel';
import type { Panel, Picture } from './picture';

const run = pointsOf(dyeFading);
/** Absorbance when all dye is gone. */
const end = 0.006;
const shown = [0.5, 1, 2];
const classes = ['curve', 'rate-line', 'curve beyond'];
/** Where along the curve its name stands. */
const labelAt = [16, 26, 38];
const names = ['½', '1', '2'];

export const halfLife = numberOf('HALFLIFE', times(run), values(run), 1, end);

/** The verdict of PACE.ORDERS on each order that is shown. */
export const verdictsAfter = (until: number): string[] => {
  const part = run.filter(({ x }) => x <= until);
  const rows = rowsOf('ORDERS', times(part), values(part), end);
  return shown.map((order) => String(rows.find(([first]) => first === order)![8]));
};

function fitted(part: readonly Place[], order: number, until: number): Place[] {
  const at = curveOf(0, until, () => 0).map(({ x }) => x);
  const heights = numbersOf('CURVE', times(part), values(part), order, columnOf(at), end);
  return at.map((x, i) => ({ x, y: heights[i] }));
}

function panelUntil(heading: string, until: number): Panel {
  const part = run.filter(({ x }) => x <= until);
  const frame = panelFrame([0, 120], [0, 0.9]);
  const curves = shown.map((order) => fitted(part, order, 120));
  const later = run.filter(({ x }) => x > until);
  return panel(
    {
      heading,
      frame,
      x: 't / min',
      y: 'A',
      says: `curves of order ½, 1 and 2 fitted to ${part.length} readings; ${verdictsAfter(until)
        .map((verdict, i) => `order ${names[i]}: ${verdict}`)
        .join('; ')}`,
    },
    ...(later.length > 0 ? [stretch(frame, 0, until)] : []),
    ...curves.map((curve, i) => line(frame, curve, classes[i])),
    dots(frame, later, 'readings later'),
    dots(frame, part, 'readings window'),
    ...curves.map((curve, i) =>
      note(frame, curve[labelAt[i]], `order ${names[i]}`, {
        by: i === 0 ? [-8, 10] : [4, -6],
        anchor: i === 0 ? 'end' : 'start',
      }),
    ),
  );
}

export function orderVerdict(): Picture {
  const [early, late] = [13, 120];
  const says = (until: number): string =>
    verdictsAfter(until)
      .map((verdict, i) => `order ${names[i]}: “${verdict}”`)
      .join('; ');
  return {
    name: 'order-verdict',
    title: 'What a verdict on the order means',
    functions: ['ORDERS', 'ORDER', 'COEFFICIENT'],
    caption: `Fitted to the first ${early} min alone (shaded, ${(early / halfLife).toFixed(1)} half lives), the three laws run through the readings side by side; only later readings part them. PACE.ORDERS says after ${early} min: ${says(early)}. After all ${late} min: ${says(late)}.`,
    panels: [
      panelUntil(`Fitted to the first ${early} min`, early),
      panelUntil('Fitted to the whole run', late),
    ],
  };
}
