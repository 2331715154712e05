/** Elapsed time from clock times, held as days or written as text, said in built-in functions. */
import { convertUnit } from '../../src/units';
import { eachReading, placed } from './eachReading';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { numberText } from './text';
import { hasTimeTexts, timeTexts } from './timeTexts';
import type { Readings } from './readings';

export function sayClock(given: Given): Said {
  if (!hasTimeTexts(given)) return elapsed(given, given.readings('times', true), [], true);
  const { days, holds, areClocks, isRow } = timeTexts(given);
  const { cell, whole } = elapsed(given, days, holds, areClocks);
  // the sheet "Workings" has them one below the other
  return isRow ? { cell: (_, column) => cell!(column, 0) } : { cell, whole };
}

/** From here on a number of days is a date. */
const firstDate = '366';

/** @param areClocks where no time is a duration */
function elapsed(given: Given, times: Readings, alike: readonly string[], areClocks: boolean): Said {
  const unit = given.word('unit');
  const seconds = convertUnit(1, unit.value, 's', 'unit');
  const inUnit = (days: string): string =>
    `ROUND(${days}*86400,6)${seconds === 1 ? '' : `/${numberText(seconds)}`}`;
  const always = [...alike, ...times.none('<', '0'), ...unit.holds];
  const noDates = times.none('>=', firstDate);
  if (!given.has('start')) return eachReading(times, [...always, ...noDates], inUnit);
  if (!given.isWord('start', 'first')) throw new NotSaid('start is not "first"');
  if (times.rows > 1 && times.columns > 1) throw new NotSaid('times are a block');
  const { first, today } = times;
  const areDates = today.length > 0 && today.every((time) => time >= Number(firstDate));
  if (!areDates && areClocks && today.every((time) => time < 1)) return pastMidnight(times, always, inUnit);
  // clock times of a day and more pass no midnight, as long as there are any
  const isLong = areClocks ? times.none('>=', '1').map((none) => `NOT(${none})`) : [];
  const kind = areDates ? times.none('<', firstDate) : [...noDates, ...isLong];
  return eachReading(times, [...always, ...kind, ...first.holds], (time) =>
    inUnit(`(${time}-${first.text})`),
  );
}

/** A step back by more than half a day starts the next one. */
function pastMidnight(times: Readings, always: readonly string[], inUnit: (days: string) => string): Said {
  const { first } = times;
  const count = times.rows * times.columns;
  const steps = count > 1 ? `${times.without('first')}-${times.without('last')}` : '0';
  const holds = [
    ...always,
    ...times.none('>=', '1'),
    `COUNT(${times.whole})=${count}`,
    // out of order about midnight
    `SUM(IF(${steps}>0.5,1,0))=0`,
  ];
  return eachReading(times, holds, (time, place) => {
    const { row, column } = placed(place);
    const n = row + column;
    if (n === 0) return inUnit(`(${time}-${first.text})`);
    const sofar = `${times.stretch(1, n)}-${times.stretch(0, n - 1)}`;
    return inUnit(`(${time}+SUM(IF(${sofar}<-0.5,1,0))-${first.text})`);
  });
}
