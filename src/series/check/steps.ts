import { shown } from '../../errors';
import type { Series } from '../series';
import type { Finding } from './finding';
import { bendBeyondScatter, expectedBeyond, type Expectation } from './neighbours';
import { limitFor, scatterOf } from './scatter';
import { counted, listed, roughly } from './words';

export interface Step {
  /** Rows of the readings on either side. */
  readonly places: readonly [number, number];
  readonly values: readonly [number, number];
  /** By how much the course after lies above the course before. */
  readonly height: number;
}

/** Two readings on either side of a step differ by more, in standard deviations, whatever their scatter. */
const leastJump = 1.5;

/** On each side, for the course there to be drawn. */
const readingsBeside = 4;

/**
 * Places where the course breaks off and goes on at another height.
 *
 * Rule: the readings before a gap and those after it, each drawn on through the gap, disagree at both of
 * its ends, in the same sense, beyond the scatter ({@link limitFor}) and one and a half times what the bend leaves
 * open. A mere kink is none: there the two courses meet. The largest counts; then each part is looked
 * through on its own.
 */
export function stepsIn(series: Series): Step[] {
  const count = series.times.length;
  if (count < 2 * readingsBeside) return [];
  const scatter = scatterOf(series);
  const limit = limitFor(count);
  const found: Step[] = [];
  const parts: [number, number][] = [[0, count]];
  for (let part = parts.pop(); part; part = parts.pop()) {
    const [first, end] = part;
    let largest = { next: 0, deviations: limit, height: 0 };
    for (let next = first + readingsBeside; next <= end - readingsBeside; next++) {
      // most gaps of a long run are passed over at once
      if (Math.abs(series.values[next] - series.values[next - 1]) < leastJump * scatter) continue;
      const break_ = breakBefore(series, { first, next, end, scatter });
      if (break_.deviations > largest.deviations) largest = { next, ...break_ };
    }
    if (largest.next === 0) continue;
    found.push(stepBefore(series, largest.next, largest.height));
    parts.push([first, largest.next], [largest.next, end]);
  }
  return found.sort((a, b) => a.places[0] - b.places[0]);
}

const stepBefore = ({ places, values }: Series, next: number, height: number): Step => ({
  places: [places[next - 1], places[next]],
  values: [values[next - 1], values[next]],
  height,
});

interface Gap {
  readonly first: number;
  /** The first reading after the gap. */
  readonly next: number;
  readonly end: number;
  readonly scatter: number;
}

function breakBefore(
  series: Series,
  { first, next, end, scatter }: Gap,
): { deviations: number; height: number } {
  const { times } = series;
  let least = { deviations: Infinity, height: 0 };
  let sense = 0;
  if (times[next] === times[next - 1]) return { deviations: 0, height: 0 };
  const bend = (side: Expectation): number => Math.abs(bendBeyondScatter(side, scatter));
  for (const at of [times[next - 1], times[next]]) {
    const before = expectedBeyond(series, at, first, next);
    const after = expectedBeyond(series, at, next, end);
    if (!before || !after) return { deviations: 0, height: 0 };
    const height = after.value - before.value;
    if (sense !== 0 && Math.sign(height) !== sense) return { deviations: 0, height: 0 };
    sense = Math.sign(height);
    const clear = Math.abs(height) - 1.5 * (bend(before) + bend(after));
    const local = Math.max(scatter, before.scatter ?? 0, after.scatter ?? 0);
    const deviations = Math.max(0, clear) / (local * Math.sqrt(before.variance + after.variance));
    if (deviations < least.deviations) least = { deviations, height };
  }
  return least;
}

export function stepFinding(steps: readonly Step[]): Finding | null {
  if (steps.length === 0) return null;
  const said = steps.map(
    ({ values: [before, after], height }) =>
      `${shown(before)} to ${shown(after)} (a step of ${roughly(height)})`,
  );
  return {
    kind: 'step',
    places: [...new Set(steps.flatMap(({ places }) => places))],
    finding: `the readings jump ${counted(steps.length, 'time', 'times').replace('one time', 'once')} from one smooth course to another: ${listed(said)}`,
    meaning:
      'the apparatus was disturbed (a shift, a leak, a bubble, a new zero), or the reaction changed faster than it was read: a tangent across the jump is wrong, and so is a fit over both parts',
    advice: 'work out each part by itself, or correct one part by the step if its cause is known',
  };
}
