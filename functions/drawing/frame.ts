/** The axes of a small plot, with their names and units. */
import { axisNumbers } from '../format';
import { linearScale, roundRange, ticks, type Scale } from './scale';
import { shape, type Shape } from './shape';

export const size = { width: 300, height: 188 };
const margin = { left: 46, right: 10, top: 20, bottom: 36 };
/** A smaller plot has room for fewer ticks. */
const roomPerTick = { x: 60, y: 45 };

export interface Frame {
  readonly x: Scale;
  readonly y: Scale;
  readonly width: number;
  readonly height: number;
}

/** A point of a drawing, in the units of its axes. */
export interface Place {
  readonly x: number;
  readonly y: number;
}

const ticksAcross = (width: number): number => Math.floor(width / roomPerTick.x);
const ticksUp = (height: number): number => Math.floor(height / roomPerTick.y);

export function frameFor(
  xs: readonly number[],
  ys: readonly number[],
  height = size.height,
  width = size.width,
): Frame {
  return {
    x: linearScale(roundRange(xs, ticksAcross(width)), [margin.left, width - margin.right]),
    y: linearScale(roundRange(ys, ticksUp(height)), [height - margin.bottom, margin.top]),
    width,
    height,
  };
}

/** A drawing with axes; `summary` is what someone hears who cannot see it. */
export function plot(
  { x, y, width, height }: Frame,
  names: { readonly x: string; readonly y: string },
  summary: string,
  ...marks: readonly Shape[]
): Shape {
  const bottom = y.place(y.from);
  const end = width - margin.right;
  const [across, up] = [ticks(x.from, x.to, ticksAcross(width)), ticks(y.from, y.to, ticksUp(height))];
  const [acrossIn, upIn] = [axisNumbers(across), axisNumbers(up)];
  return shape(
    'svg',
    { viewBox: `0 0 ${width} ${height}`, class: 'plot', role: 'img', 'aria-label': summary },
    ...up.flatMap((value, place) => {
      const height = short(y.place(value));
      return [
        shape('line', { class: 'grid', x1: margin.left, x2: end, y1: height, y2: height }),
        label(upIn.numbers[place], margin.left - 6, y.place(value) + 4, 'end'),
      ];
    }),
    ...across.flatMap((value, place) => {
      const at = short(x.place(value));
      return [
        shape('line', { class: 'tick', x1: at, x2: at, y1: bottom, y2: bottom + 4 }),
        label(acrossIn.numbers[place], x.place(value), bottom + 15, 'middle'),
      ];
    }),
    shape('path', { class: 'axis', d: `M${margin.left} ${margin.top}V${bottom}H${end}` }),
    label(`${names.y} ${upIn.times}`.trim(), 4, 11, 'start', 'name'),
    label(`${names.x} ${acrossIn.times}`.trim(), end, height - 5, 'end', 'name'),
    ...marks,
  );
}

export function label(text: string, x: number, y: number, anchor: string, className = 'number'): Shape {
  return shape('text', { x: short(x), y: short(y), 'text-anchor': anchor, class: className }, text);
}

/** Dots as one path of strokes without length: ten thousand cost no more than one element. */
export function dots({ x, y }: Frame, points: readonly Place[], className: string): Shape {
  const places = points.map((point) => `M${short(x.place(point.x))} ${short(y.place(point.y))}h0`);
  return shape('path', { class: className, d: places.join('') });
}

export function line({ x, y }: Frame, points: readonly Place[], className: string): Shape {
  const places = points.map((point) => `${short(x.place(point.x))} ${short(y.place(point.y))}`);
  return shape('path', { class: className, d: places.length > 0 ? `M${places.join('L')}` : '' });
}

const short = (value: number): string => String(Math.round(value * 10) / 10);
