/** A run as small as a stamp: its shape and no more. */
import { svg } from '../h';
import { pointsOf, type Run, type Table } from '../runs';
import { linearScale } from '../../functions/drawing/scale';

export const stamp = { width: 64, height: 32 };
const margin = 3;

/** The path of its readings, to be drawn as often as needed. */
export function miniaturePath(table: Table, run: Run): string {
  const points = pointsOf(table, run);
  const range = (values: readonly number[]): [number, number] => [
    values.reduce((a, b) => Math.min(a, b), Infinity),
    values.reduce((a, b) => Math.max(a, b), -Infinity),
  ];
  const x = linearScale(range(points.map(({ time }) => time)), [margin, stamp.width - margin]);
  const y = linearScale(range(points.map(({ value }) => value)), [stamp.height - margin, margin]);
  const short = (value: number): string => value.toFixed(1);
  return points.map(({ time, value }) => `M${short(x.place(time))} ${short(y.place(value))}h0`).join('');
}

/** For the eye alone: the name stands beside it. */
export const miniature = (path: string): SVGElement =>
  svg(
    'svg',
    { viewBox: `0 0 ${stamp.width} ${stamp.height}`, class: 'stamp', 'aria-hidden': 'true' },
    svg('path', { class: 'readings', d: path }),
  );
