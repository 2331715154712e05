/**
 * The line that belongs to a rate: the chord of an average, the tangent with the readings it rests on.
 * Only for the eye: the number comes from the cell function.
 */
import { emptyLocalFit, fitLocalPolynomial, nearestWindow } from '../../src/rate/localPolynomial';
import { defaultWindow } from '../../src/rate/window';
import { pairReadings, type Series } from '../../src/series/series';
import { typedArgument } from '../calls/argument';
import type { RateChoice } from '../choices';

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Overlay {
  /** The straight line whose slope is the rate. */
  readonly line: readonly Point[];
  /** Where it meets the run. */
  readonly marks: readonly Point[];
  /** The fitted curve, and the readings it rests on. */
  readonly curve: readonly Point[];
  readonly window: readonly Point[];
}

const nothing: Overlay = { line: [], marks: [], curve: [], window: [] };

/** `undefined` where left out, NaN where it is no number. */
function typedNumber(typed: string): number | undefined {
  const { value } = typedArgument(typed);
  return value === undefined || typeof value === 'number' ? value : NaN;
}

/** @returns nothing to draw where the fields are not yet filled, or the run does not carry the line */
export function overlayFor(points: readonly { time: number; value: number }[], rate: RateChoice): Overlay {
  try {
    const series = pairReadings(
      points.map(({ time }) => time),
      points.map(({ value }) => value),
    );
    if (rate.kind === 'average') return chord(series, typedNumber(rate.from), typedNumber(rate.to));
    return rate.kind === 'tangent' ? tangent(series, rate) : nothing;
  } catch {
    return nothing; // the function says why, beside the field
  }
}

function chord(series: Series, from: number | undefined, to: number | undefined): Overlay {
  if (from === undefined || to === undefined || from === to) return nothing;
  const ends = [from, to].map((x) => ({ x, y: heightAt(series, x) }));
  if (ends.some(({ y }) => Number.isNaN(y))) return nothing;
  return { ...nothing, line: ends, marks: ends };
}

/** Straight between the readings on either side; replicates count with their mean. */
function heightAt({ times, values }: Series, x: number): number {
  const meanAt = (time: number): number => {
    const same = values.filter((_, place) => times[place] === time);
    return same.reduce((sum, value) => sum + value, 0) / same.length;
  };
  const right = times.findIndex((time) => time >= x);
  if (right < 0 || x < times[0]) return NaN;
  if (times[right] === x) return meanAt(x);
  const [before, after] = [times[right - 1], times[right]];
  return meanAt(before) + ((meanAt(after) - meanAt(before)) * (x - before)) / (after - before);
}

const curveSteps = 24;

function tangent(series: Series, rate: RateChoice): Overlay {
  const { times, values } = series;
  const at = typedNumber(rate.time);
  const degree = typedNumber(rate.degree) ?? 2;
  const count = typedNumber(rate.points) ?? defaultWindow(series, degree);
  const fits =
    Number.isInteger(degree) &&
    degree >= 1 &&
    Number.isInteger(count) &&
    count > degree &&
    count <= times.length;
  if (at === undefined || !fits || at < times[0] || at > times[times.length - 1]) return nothing;
  const first = nearestWindow(times, count, at);
  const heightOf = (x: number): Point => ({
    x,
    y: fitLocalPolynomial(times, values, first, count, degree, x, emptyLocalFit()).value,
  });
  const { value, slope } = fitLocalPolynomial(times, values, first, count, degree, at, emptyLocalFit());
  const reach =
    Math.max(times[first + count - 1] - times[first], (times[times.length - 1] - times[0]) / 3) * 0.75;
  const ends = [at - reach, at + reach].map((x) => ({ x, y: value + slope * (x - at) }));
  const span = times[first + count - 1] - times[first];
  return {
    line: ends,
    marks: [{ x: at, y: value }],
    curve: Array.from({ length: curveSteps + 1 }, (_, i) => heightOf(times[first] + (span * i) / curveSteps)),
    window: Array.from({ length: count }, (_, i) => ({ x: times[first + i], y: values[first + i] })),
  };
}
