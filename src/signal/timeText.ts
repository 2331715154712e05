/** A moment or a duration as people write it. */
import { InvalidInput } from '../errors';
import { convertUnit } from '../units';

/** In days, as a workbook counts. */
export interface TimeReading {
  readonly days: number;
  /** A duration never passes midnight; a clock reading may; a date says its day itself. */
  readonly kind: 'duration' | 'clock' | 'date';
}

/** From here on a number of days is a date: durations of a year are not timed in hours. */
const firstDate = 366;

/** Days from 1899-12-30, which a workbook counts from, to 1970-01-01. */
const daysBefore1970 = 25569;

/**
 * A number as a workbook holds a time: days, or days since 1899-12-30.
 *
 * @example timeFromNumber(0.5).days // 0.5
 */
export const timeFromNumber = (days: number): TimeReading => ({
  days,
  kind: days >= firstDate ? 'date' : 'clock',
});

const clock = /^(\d+):(\d{1,2})(?::(\d{1,2}(?:[.,]\d+)?))?\s*([ap])?\.?(?:m\.?)?$/i;
const minutesClock = /^(\d+):(\d{1,2}[.,]\d+)$/;
const primes = /^(\d+)\s*['′]\s*(?:(\d{1,2}(?:[.,]\d+)?)\s*(?:"|″|'')?)?$/;
const isoDate = /^(\d{4})-(\d{2})-(\d{2})(?:[T ]+(.+?)Z?)?$/;
const part = /\s*([+]?\d+(?:[.,]\d+)?)\s*([a-zµ]+)\.?,?/iy;

/**
 * Reads a time written out: `0:04:30`, `10:15 pm`, `4:30.5` (minutes), `4 min 30 s`, `4'30"`, `2026-03-02 10:15`.
 * Two numbers with one colon are hours and minutes, as a workbook itself reads them.
 *
 * @returns `undefined` for words without a figure, which stand for a missing time
 * @throws InvalidInput for figures that are no time
 * @example timeFromText('4 min 30 s').days // 0.003125
 */
export function timeFromText(text: string): TimeReading | undefined {
  const trimmed = text.trim();
  if (!/\d/.test(trimmed)) return undefined;
  const reading =
    fromDate(trimmed) ??
    fromMinutesClock(trimmed) ??
    fromClock(trimmed) ??
    fromPrimes(trimmed) ??
    fromParts(trimmed);
  if (reading === undefined) {
    throw new InvalidInput(`times must be like 0:04:30, "4 min 30 s" or 2026-03-02 10:15: got "${text}"`);
  }
  return reading;
}

const decimal = (text: string): number => Number(text.replace(',', '.'));
const inDays = (hours: number, minutes: number, seconds: number): number =>
  (hours * 3600 + minutes * 60 + seconds) / 86400;

function fromMinutesClock(text: string): TimeReading | undefined {
  const match = minutesClock.exec(text);
  return match ? { days: inDays(0, Number(match[1]), decimal(match[2])), kind: 'clock' } : undefined;
}

function fromClock(text: string): TimeReading | undefined {
  const match = clock.exec(text);
  if (!match) return undefined;
  const [, hours, minutes, seconds = '0', half] = match;
  const hour = half === undefined ? Number(hours) : halfDayHour(Number(hours), half, text);
  if (Number(minutes) >= 60 || decimal(seconds) >= 60) {
    throw new InvalidInput(`times must have minutes and seconds below 60: got "${text}"`);
  }
  return { days: inDays(hour, Number(minutes), decimal(seconds)), kind: 'clock' };
}

function halfDayHour(hours: number, half: string, text: string): number {
  if (hours < 1 || hours > 12)
    throw new InvalidInput(`times with am or pm must have hours from 1 to 12: got "${text}"`);
  return (hours % 12) + (half.toLowerCase() === 'p' ? 12 : 0);
}

function fromPrimes(text: string): TimeReading | undefined {
  const match = primes.exec(text);
  return match
    ? { days: inDays(0, Number(match[1]), decimal(match[2] ?? '0')), kind: 'duration' }
    : undefined;
}

function fromDate(text: string): TimeReading | undefined {
  const match = isoDate.exec(text);
  if (!match) return undefined;
  const [, year, month, day, rest] = match;
  const moment = Date.UTC(Number(year), Number(month) - 1, Number(day));
  const isReal = new Date(moment).toISOString().startsWith(`${year}-${month}-${day}`);
  const time = rest === undefined ? { days: 0 } : fromClock(rest);
  if (!isReal || time === undefined || time.days >= 1) {
    throw new InvalidInput(`times with a date must be like 2026-03-02 10:15: got "${text}"`);
  }
  return { days: moment / 86400000 + daysBefore1970 + time.days, kind: 'date' };
}

/** `1 h 4 min 30 s`: numbers with units, largest first or not. */
function fromParts(text: string): TimeReading | undefined {
  let seconds = 0;
  part.lastIndex = 0;
  while (part.lastIndex < text.length) {
    const match = part.exec(text);
    if (!match) return undefined;
    seconds += convertUnit(decimal(match[1]), match[2], 's', 'times');
    if (/^\s*$/.test(text.slice(part.lastIndex))) break;
  }
  return { days: seconds / 86400, kind: 'duration' };
}
