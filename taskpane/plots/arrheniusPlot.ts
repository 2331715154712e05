/** ln k against 1/T: a straight line where one law holds at all temperatures. */
import type { Heading } from '../headers';
import { dots, frameFor, line, plot, type Place } from './frame';

export interface ArrheniusPlot {
  readonly points: readonly Place[];
  readonly line: readonly Place[];
  readonly mark: readonly Place[];
}

export function arrheniusPlot({ points, line: fit, mark }: ArrheniusPlot, coefficient: Heading): SVGElement {
  const all = [...points, ...fit];
  const frame = frameFor(
    all.map(({ x }) => x),
    all.map(({ y }) => y),
  );
  const xs = points.map(({ x }) => x);
  const isOutside = mark.some(({ x }) => x < Math.min(...xs) || x > Math.max(...xs));
  const y = coefficient.unit ? `ln(k / ${coefficient.unit})` : 'ln k';
  const asked =
    mark.length === 0 ? '' : `; the temperature asked for lies ${isOutside ? 'outside' : 'among'} them`;
  return plot(
    frame,
    { x: '1000 K / T', y },
    `${y} against 1000 K / T: ${points.length} temperatures with the line through them${asked}`,
    line(frame, fit, 'curve beyond'),
    line(frame, withinOf(points, fit), 'rate-line'),
    dots(frame, points, 'readings'),
    dots(frame, mark, 'touch'),
  );
}

/** The part of the line that the measured points carry. */
function withinOf(points: readonly Place[], [a, b]: readonly Place[]): Place[] {
  if (!a || !b || a.x === b.x) return [];
  const xs = points.map(({ x }) => x);
  return [Math.min(...xs), Math.max(...xs)].map((x) => ({
    x,
    y: a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x),
  }));
}
