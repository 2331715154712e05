/** A fitted law over its readings, and what it leaves of each. */
import { plainNumber } from '../../functions/format';
import type { Heading } from '../headers';
import { dots, frameFor, line, plot, type Place } from './frame';

export interface FitPlot {
  readonly readings: readonly Place[];
  readonly curve: readonly Place[];
  readonly x: string;
  readonly y: string;
  /** For those who cannot see it: `rate coefficient 0.031 min⁻¹`. */
  readonly says: string;
}

export function fitPlot({ readings, curve, x, y, says }: FitPlot): SVGElement {
  const all = [...readings, ...curve];
  const frame = frameFor(
    all.map((point) => point.x),
    all.map((point) => point.y),
  );
  const summary = `${y} against ${x}: ${readings.length} readings${curve.length > 0 ? ' with the fit' : ''}; ${says}`;
  return plot(frame, { x, y }, summary, dots(frame, readings, 'readings'), line(frame, curve, 'rate-line'));
}

/** Low, since only pattern and size matter; stems make a run of one sign easy to see. */
const residualHeight = 104;

export function residualPlot(residuals: readonly Place[], time: Heading): SVGElement {
  const sizes = residuals.map(({ y }) => Math.abs(y));
  const largest = sizes.reduce((a, b) => Math.max(a, b), 0);
  const frame = frameFor(
    residuals.map(({ x }) => x),
    [-largest, largest],
    residualHeight,
  );
  const zero = [frame.x.from, frame.x.to].map((x) => ({ x, y: 0 }));
  const stems = residuals.map((point) => line(frame, [{ x: point.x, y: 0 }, point], 'stem'));
  const turns = residuals.filter(
    ({ y }, i) => i > 0 && Math.sign(y) !== Math.sign(residuals[i - 1].y),
  ).length;
  const summary = `reading minus fit against ${time.text}: largest ${plainNumber(largest, 2)}, ${turns} changes of sign among ${residuals.length}`;
  return plot(
    frame,
    { x: time.text, y: 'reading minus fit' },
    summary,
    line(frame, zero, 'zero'),
    ...stems,
    dots(frame, residuals, 'readings'),
  );
}
