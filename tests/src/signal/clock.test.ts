import { elapsedSeconds } from '../../../src/signal/clock';
import { timeFromNumber, timeFromText } from '../../../src/signal/timeText';

const texts = (...written: string[]) => written.map((text) => timeFromText(text) ?? null);
const numbers = (...days: number[]) => days.map(timeFromNumber);

// what a workbook makes of the same text, from its own rules for typed times
test.each([
  ['0:04:30', 270],
  ['4:30', 16200],
  ['4:30.5', 270.5],
  ['36:00:00', 129600],
  ['12:00 am', 0],
  ['12:00 pm', 43200],
  ['10:15:30 PM', 80130],
  ['4 min 30 s', 270],
  ['1 h 5 min', 3900],
  ['1,5 min', 90],
  ['90s', 90],
  ['2 d', 172800],
  ['4\'30"', 270],
  ['4′ 30″', 270],
])('"%s" is %d s', (text, seconds) => {
  expect(elapsedSeconds(texts(text), undefined)).toEqual([seconds]);
});

test('a date is what a workbook counts from 1899-12-30: 2026-03-02 is day 46083', () => {
  // day 44927 is 2023-01-01 (ISO/IEC 29500-1, 18.17.4.1, 1900 date base), and 1156 days lie between
  expect(timeFromText('2023-01-01')?.days).toBe(44927);
  expect(timeFromText('2026-03-02 06:00')?.days).toBe(46083.25);
  expect(timeFromText('2026-03-02T06:00:00Z')?.days).toBe(46083.25);
});

test('words without a figure are a gap', () => {
  expect(timeFromText('missed')).toBeUndefined();
  expect(timeFromText('n/a')).toBeUndefined();
});

test.each([
  ['4:75:00', 'times must have minutes and seconds below 60: got "4:75:00"'],
  ['13:10 pm', 'times with am or pm must have hours from 1 to 12: got "13:10 pm"'],
  ['2026-02-30 10:15', 'times with a date must be like 2026-03-02 10:15: got "2026-02-30 10:15"'],
  ['10-15', 'times must be like 0:04:30, "4 min 30 s" or 2026-03-02 10:15: got "10-15"'],
  ['5 kg', 'times must be in a unit like s: 5 kg measures something else'],
])('"%s" is refused', (text, words) => {
  expect(() => timeFromText(text)).toThrow(words);
});

test('a stopwatch is taken as it shows, sorted or not', () => {
  expect(elapsedSeconds(numbers(30 / 86400, 10 / 86400), undefined)).toEqual([30, 10]);
});

test('midnight between two clock readings', () => {
  expect(elapsedSeconds(texts('23:58:00', '23:59:30', '0:01:00', '0:04:00'), 'first')).toEqual([
    0, 90, 180, 360,
  ]);
  expect(elapsedSeconds(texts('0:01:00', '0:04:00'), timeFromText('23:58:00'))).toEqual([180, 360]);
});

test('a reading noted late, from before midnight, stays before it', () => {
  expect(elapsedSeconds(texts('23:58:00', '0:01:00', '23:59:00', '0:02:00'), 'first')).toEqual([
    0, 180, 60, 240,
  ]);
});

test('a run of durations beyond a day does not wrap', () => {
  expect(elapsedSeconds(numbers(0.4, 0.9, 1.4), 'first')).toEqual([0, 43200, 86400]);
  expect(elapsedSeconds(texts('20 h', '2 h'), 'first')).toEqual([0, -64800]);
});

test('dates count through midnight by themselves, to a microsecond', () => {
  const day = 46083;
  const times = numbers(day + 86399 / 86400, day + 1 + 5 / 86400);
  expect(elapsedSeconds(times, 'first')).toEqual([0, 6]);
  expect(elapsedSeconds(times, timeFromText('23:59:00'))).toEqual([59, 65]);
});

test('gaps stay gaps', () => {
  expect(elapsedSeconds([null, ...texts('0:01:00'), null, ...texts('0:02:00')], 'first')).toEqual([
    null,
    0,
    null,
    60,
  ]);
  expect(elapsedSeconds([null], 'first')).toEqual([null]);
});

test('what a clock refuses, in words', () => {
  expect(() => elapsedSeconds(numbers(0.1, -0.1), undefined)).toThrow(
    'times must be 0 or more: row 2 (-0.1)',
  );
  expect(() => elapsedSeconds(numbers(46083.42), undefined)).toThrow(
    'times with a date need a start, "first" or a clock time: row 1 (46083.4) holds a date',
  );
  expect(() => elapsedSeconds(numbers(46083.42, 0.43), 'first')).toThrow(
    'times must all have a date or none: row 2 differs from the first',
  );
  expect(() => elapsedSeconds(numbers(0.42), timeFromNumber(46083.4))).toThrow(
    'start must be a clock time, as the times are: it has a date',
  );
});
