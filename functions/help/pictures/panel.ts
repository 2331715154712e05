/** Panels with marks that the pane's plots do not have: words beside a point, bands, bars of uncertainty. */
import { frameFor, label, line, plot, type Frame, type Place } from '../../drawing/frame';
import { shape, type Shape } from '../../drawing/shape';
import { panelSize, type Panel } from './picture';

export const panelFrame = (xs: readonly number[], ys: readonly number[]): Frame =>
  frameFor(xs, ys, panelSize.height, panelSize.width);

export interface Drawn {
  readonly heading: string;
  readonly frame: Frame;
  readonly x: string;
  readonly y: string;
  readonly says: string;
}

export const panel = ({ heading, frame, x, y, says }: Drawn, ...marks: readonly Shape[]): Panel => ({
  heading,
  drawn: plot(frame, { x, y }, `${heading}: ${says}`, ...marks),
});

export type Anchor = 'start' | 'middle' | 'end';

/** Words beside a point. @param by pixels to the right and down */
export const note = (
  { x, y }: Frame,
  at: Place,
  text: string,
  {
    anchor = 'start',
    by = [0, 0],
    className = 'note',
  }: { anchor?: Anchor; by?: readonly [number, number]; className?: string } = {},
): Shape => label(text, x.place(at.x) + by[0], y.place(at.y) + by[1], anchor, className);

/** What lies between two curves, given from left to right. */
export function band(frame: Frame, lower: readonly Place[], upper: readonly Place[]): Shape {
  const { d } = line(frame, [...lower, ...[...upper].reverse()], '').attributes;
  return shape('path', { class: 'band', d: `${d}Z` });
}

/** A stretch of the x axis, from top to bottom. */
export const stretch = (frame: Frame, from: number, to: number): Shape =>
  band(
    frame,
    [from, to].map((x) => ({ x, y: frame.y.from })),
    [from, to].map((x) => ({ x, y: frame.y.to })),
  );

/** An upright bar with short feet at both ends. */
export function bar({ x, y }: Frame, at: number, [low, high]: readonly [number, number]): Shape {
  const [place, from, to] = [x.place(at), y.place(low), y.place(high)].map(
    (value) => Math.round(value * 10) / 10,
  );
  const foot = (height: number): string => `M${place - 3} ${height}h6`;
  return shape('path', { class: 'bar', d: `M${place} ${from}V${to}${foot(from)}${foot(to)}` });
}

/** A curve, from so many points that it looks smooth. */
export const curveOf = (from: number, to: number, height: (x: number) => number, steps = 48): Place[] =>
  Array.from({ length: steps + 1 }, (_, i) => {
    const x = from + ((to - from) * i) / steps;
    return { x, y: height(x) };
  });

/** The part of a straight line that lies within the frame. */
export function withinFrame({ x, y }: Frame, at: Place, slope: number, reach: number): Place[] {
  const limits = [x.from, x.to].map((end) => end - at.x);
  const heights = slope === 0 ? [-Infinity, Infinity] : [(y.from - at.y) / slope, (y.to - at.y) / slope];
  const low = Math.max(-reach, limits[0], Math.min(...heights));
  const high = Math.min(reach, limits[1], Math.max(...heights));
  return [low, high].map((step) => ({ x: at.x + step, y: at.y + slope * step }));
}
