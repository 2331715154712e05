/** The axes of a small plot, with their names and units. */
import { axisNumbers } from '../format';
import { svg } from '../h';
import { linearScale, roundRange, ticks, type Scale } from './scale';

export const size = { width: 300, height: 188 };
const margin = { left: 46, right: 10, top: 20, bottom: 36 };
const tickCount = { x: 5, y: 4 };
/** A lower plot has room for fewer ticks. */
const heightPerTick = 45;

export interface Frame {
  readonly x: Scale;
  readonly y: Scale;
  readonly height: number;
}

/** A point of a drawing, in the units of its axes. */
export interface Place {
  readonly x: number;
  readonly y: number;
}

export function frameFor(xs: readonly number[], ys: readonly number[], height = size.height): Frame {
  return {
    x: linearScale(roundRange(xs, tickCount.x), [margin.left, size.width - margin.right]),
    y: linearScale(roundRange(ys, tickCountFor(height)), [height - margin.bottom, margin.top]),
    height,
  };
}

const tickCountFor = (height: number): number => Math.min(tickCount.y, Math.floor(height / heightPerTick));

/** A drawing with axes; `summary` is what someone hears who cannot see it. */
export function plot(
  { x, y, height }: Frame,
  names: { readonly x: string; readonly y: string },
  summary: string,
  ...marks: readonly SVGElement[]
): SVGElement {
  const bottom = y.place(y.from);
  const shape = {
    viewBox: `0 0 ${size.width} ${height}`,
    class: 'plot',
    role: 'img',
    'aria-label': summary,
  };
  const [across, up] = [ticks(x.from, x.to, tickCount.x), ticks(y.from, y.to, tickCountFor(height))];
  const [acrossIn, upIn] = [axisNumbers(across), axisNumbers(up)];
  return svg(
    'svg',
    shape,
    ...up.flatMap((value, place) => [
      svg('line', {
        class: 'grid',
        x1: margin.left,
        x2: size.width - margin.right,
        y1: y.place(value),
        y2: y.place(value),
      }),
      label(upIn.numbers[place], margin.left - 6, y.place(value) + 4, 'end'),
    ]),
    ...across.flatMap((value, place) => [
      svg('line', { class: 'tick', x1: x.place(value), x2: x.place(value), y1: bottom, y2: bottom + 4 }),
      label(acrossIn.numbers[place], x.place(value), bottom + 15, 'middle'),
    ]),
    svg('path', { class: 'axis', d: `M${margin.left} ${margin.top}V${bottom}H${size.width - margin.right}` }),
    label(`${names.y} ${upIn.times}`.trim(), 4, 11, 'start', 'name'),
    label(`${names.x} ${acrossIn.times}`.trim(), size.width - margin.right, height - 5, 'end', 'name'),
    ...marks,
  );
}

function label(text: string, x: number, y: number, anchor: string, className = 'number'): SVGElement {
  return svg('text', { x, y, 'text-anchor': anchor, class: className }, text);
}

/** Dots as one path of strokes without length: ten thousand cost no more than one element. */
export function dots({ x, y }: Frame, points: readonly Place[], className: string): SVGElement {
  const places = points.map((point) => `M${short(x.place(point.x))} ${short(y.place(point.y))}h0`);
  return svg('path', { class: className, d: places.join('') });
}

export function line({ x, y }: Frame, points: readonly Place[], className: string): SVGElement {
  const places = points.map((point) => `${short(x.place(point.x))} ${short(y.place(point.y))}`);
  return svg('path', { class: className, d: places.length > 0 ? `M${places.join('L')}` : '' });
}

const short = (value: number): string => String(Math.round(value * 10) / 10);
