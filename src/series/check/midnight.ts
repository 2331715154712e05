import { shown } from '../../errors';
import type { Finding } from './finding';
import { numbersIn, type RawRun } from './rawRun';

export interface Rollover {
  /** The row before which midnight passed. */
  readonly place: number;
  /** The time of the row before it. */
  readonly before: number;
  readonly after: number;
}

/**
 * Midnight in a column of clock times. A sheet keeps 23:59 as 0.9993 of a day and 0:01 as 0.0007.
 *
 * Rule: all times are fractions of a day, and once, and only once, the time falls back by more than half
 * a day, so that with a day added the rows stand in order and span less than a day.
 */
export function rolloverIn(times: readonly (number | null)[]): Rollover | null {
  const rows = times.flatMap((time, place) => (time === null ? [] : [{ time, place }]));
  if (rows.length < 3 || !rows.every(({ time }) => time >= 0 && time < 1)) return null;
  const falls = rows.flatMap((_, i) => (i > 0 && rows[i].time < rows[i - 1].time ? [i] : []));
  if (falls.length !== 1) return null;
  const [at] = falls;
  const [before, after] = [rows[at - 1].time, rows[at].time];
  const spansLess = rows[rows.length - 1].time < rows[0].time;
  return before - after > 0.5 && spansLess ? { place: rows[at].place, before, after } : null;
}

/** Times after midnight moved to the next day, so that the rest of a check sees the run as it was. */
export function unrolled(times: readonly (number | null)[]): (number | null)[] {
  const rollover = rolloverIn(times);
  if (!rollover) return [...times];
  return times.map((time, place) => (time !== null && place >= rollover.place ? time + 1 : time));
}

const asClock = (day: number): string => {
  const minutes = Math.floor(day * 1440 + 1e-6);
  return `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, '0')}`;
};

export function midnight(run: RawRun): Finding | null {
  const rollover = rolloverIn(numbersIn(run.times));
  if (!rollover) return null;
  const { place, before, after } = rollover;
  return {
    kind: 'midnight',
    places: [place],
    finding: `the clock passes midnight: ${asClock(before)} is followed by ${asClock(after)} (${shown(before)}, then ${shown(after)} of a day)`,
    meaning: 'the readings after midnight count as the earliest of the run, and every rate comes out wrong',
    advice:
      'add 1 to the times after midnight, or have PACE.CLOCK turn the clock times into time since the start',
  };
}
