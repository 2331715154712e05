/** A run as it was read, with the line of the rate laid over it. */
import { plainNumber } from '../../functions/format';
import type { Heading } from '../headers';
import { headingOf, pointsOf, type Run, type Table } from '../runs';
import { dots, frameFor, line, plot, type Frame } from './frame';
import type { Overlay, Point } from './overlay';

export interface RunPlot {
  readonly points: readonly { readonly time: number; readonly value: number }[];
  readonly time: Heading;
  readonly reading: Heading;
  readonly overlay?: Overlay;
  /** What the line says, for the summary: `tangent at 30 s: 0.48 mL/s`. */
  readonly says?: string;
}

export function runPlot({ points, time, reading, overlay, says }: RunPlot): SVGElement {
  const readings = points.map((point) => ({ x: point.time, y: point.value }));
  const frame = frameFor(
    readings.map(({ x }) => x),
    readings.map(({ y }) => y),
  );
  const marks = [dots(frame, readings, 'readings')];
  if (overlay) {
    marks.push(
      dots(frame, overlay.window, 'readings window'),
      line(frame, overlay.curve, 'curve'),
      line(frame, clipped(overlay.line, frame), 'rate-line'),
      dots(frame, overlay.marks, 'touch'),
    );
  }
  const summary = `${summaryOf(readings, time, reading)}${says ? `; ${says}` : ''}`;
  return plot(frame, { x: time.text, y: reading.text }, summary, ...marks);
}

/** The run on its own, before a rate is chosen or where none can be given. */
export function plainPlot(table: Table, run: Run): SVGElement {
  return runPlot({
    points: pointsOf(table, run),
    time: headingOf(table, run.timeColumn),
    reading: headingOf(table, run.readingColumn),
  });
}

/** The whole column of rates, beside its readings' times. */
export function ratesPlot(rates: readonly Point[], time: Heading, unit: string): SVGElement {
  const frame = frameFor(
    rates.map(({ x }) => x),
    [0, ...rates.map(({ y }) => y)],
  );
  const summary = summaryOf(rates, time, { text: 'rate', unit });
  return plot(
    frame,
    { x: time.text, y: `rate (${unit})` },
    summary,
    line(frame, rates, 'rate-line'),
    dots(frame, rates, 'touch'),
  );
}

function summaryOf(points: readonly Point[], time: Heading, y: Pick<Heading, 'text' | 'unit'>): string {
  if (points.length === 0) return `${y.text} against ${time.text}: nothing to draw`;
  const among = (values: number[], unit: string): string => {
    const withUnit = unit && unit !== '1' ? ` ${unit}` : '';
    return `${plainNumber(values.reduce((a, b) => Math.min(a, b)))} to ${plainNumber(values.reduce((a, b) => Math.max(a, b)))}${withUnit}`;
  };
  const times = among(
    points.map((point) => point.x),
    time.unit,
  );
  return `${y.text} against ${time.text}: ${points.length} points, times ${times}, values ${among(
    points.map((point) => point.y),
    y.unit,
  )}`;
}

/** A straight line, cut where it leaves the axes. */
function clipped(ends: readonly Point[], { x, y }: Frame): Point[] {
  if (ends.length !== 2) return [];
  const [a, b] = ends;
  let [from, to] = [0, 1];
  const sides: [number, number, number, number][] = [
    [a.x, b.x - a.x, x.from, x.to],
    [a.y, b.y - a.y, y.from, y.to],
  ];
  for (const [start, change, low, high] of sides) {
    if (change === 0) continue;
    const [enter, leave] = [(low - start) / change, (high - start) / change].sort((p, q) => p - q);
    [from, to] = [Math.max(from, enter), Math.min(to, leave)];
  }
  if (from > to) return [];
  const at = (share: number): Point => ({ x: a.x + (b.x - a.x) * share, y: a.y + (b.y - a.y) * share });
  return [at(from), at(to)];
}
