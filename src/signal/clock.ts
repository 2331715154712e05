/** From what a clock showed to the time a run has taken. */
import { InvalidInput, shown } from '../errors';
import type { TimeReading } from './timeText';

/** Finer than a date can hold in a cell, and finer than anyone times by hand. */
const resolution = 1e-6; // s

/** Left out: as a stopwatch shows it; `first`: since the first reading; a reading: since then. */
export type ClockStart = undefined | 'first' | TimeReading;

/**
 * Seconds that have passed at each reading. Clock readings without a date may pass midnight: a step back by
 * more than half a day starts the next one.
 *
 * @param readings in the order in which they were taken; `null` for a gap
 * @returns s, to a microsecond; negative before the start
 * @throws InvalidInput for negative times, or dates among times without
 * @example elapsedSeconds([{ days: 0.998, kind: 'clock' }, { days: 0.002, kind: 'clock' }], 'first') // [0, 345.6]
 */
export function elapsedSeconds(
  readings: readonly (TimeReading | null)[],
  start: ClockStart,
): (number | null)[] {
  readings.forEach((reading, place) => requireTime(reading, place));
  if (start === undefined) return readings.map((reading, place) => reading && asStopwatch(reading, place));
  const from = start === 'first' ? readings.find((reading) => reading !== null) : start;
  if (!from) return readings.map(() => null);
  requireOneKind(readings, from);
  const days = sinceMidnight(from, readings)
    ? unwrapped(readings, from.days)
    : readings.map((r) => r && r.days);
  const origin = fromSameDay(from, readings);
  return days.map((day) => (day === null ? null : rounded((day - origin) * 86400)));
}

const rounded = (seconds: number): number => Math.round(seconds / resolution) / (1 / resolution);

function requireTime(reading: TimeReading | null, place: number): void {
  if (reading && reading.days < 0) {
    throw new InvalidInput(`times must be 0 or more: row ${place + 1} (${shown(reading.days)})`);
  }
}

function asStopwatch({ days, kind }: TimeReading, place: number): number {
  if (kind === 'date') {
    throw new InvalidInput(
      `times with a date need a start, "first" or a clock time: row ${place + 1} (${shown(days)}) holds a date`,
    );
  }
  return rounded(days * 86400);
}

const isDate = ({ kind }: TimeReading): boolean => kind === 'date';

/** A clock time may start readings with dates (of the first one's day), but not the other way round. */
function requireOneKind(readings: readonly (TimeReading | null)[], from: TimeReading): void {
  const first = readings.find((reading) => reading !== null);
  if (!first) return;
  const odd = readings.findIndex((reading) => reading !== null && isDate(reading) !== isDate(first));
  if (odd >= 0) {
    throw new InvalidInput(`times must all have a date or none: row ${odd + 1} differs from the first`);
  }
  if (isDate(from) && !isDate(first)) {
    throw new InvalidInput('start must be a clock time, as the times are: it has a date');
  }
}

/** Whether midnight may lie between the readings: clock readings, all within one day's figures. */
const sinceMidnight = (from: TimeReading, readings: readonly (TimeReading | null)[]): boolean =>
  from.kind === 'clock' &&
  from.days < 1 &&
  readings.every((reading) => reading === null || (reading.kind === 'clock' && reading.days < 1));

function unwrapped(readings: readonly (TimeReading | null)[], start: number): (number | null)[] {
  let midnights = 0;
  let before = start;
  return readings.map((reading) => {
    if (reading === null) return null;
    const step = reading.days - before;
    if (step < -0.5) midnights++;
    else if (step > 0.5 && midnights > 0) midnights--; // out of order, from before midnight
    before = reading.days;
    return reading.days + midnights;
  });
}

function fromSameDay(from: TimeReading, readings: readonly (TimeReading | null)[]): number {
  const first = readings.find((reading) => reading !== null);
  return first && isDate(first) && !isDate(from) ? Math.floor(first.days) + from.days : from.days;
}
