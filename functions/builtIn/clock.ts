/** Elapsed time from clock times, held as days or written as text, said in built-in functions. */
import { convertUnit } from '../../src/units';
import { eachReading, placed } from './eachReading';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { numberText } from './text';
import { hasTimeTexts, timeTexts } from './timeTexts';
import type { Readings } from './readings';

export function sayClock(given: Given): Said {
  if (!hasTimeTexts(given)) return elapsed(given, given.readings('times'), [], true);
  const { days, holds, areClocks, isRow } = timeTexts(given);
  const { cell, whole } = elapsed(given, days, holds, areClocks);
  // the sheet "Workings" has them one below the other
  return isRow ? { cell: (_, column) => cell!(column, 0) } : { cell, whole };
}

/** @param mayPassMidnight where no time is a duration */
function elapsed(given: Given, times: Readings, alike: readonly string[], mayPassMidnight: boolean): Said {
  const unit = given.word('unit');
  const seconds = convertUnit(1, unit.value, 's', 'unit');
  const inUnit = (days: string): string =>
    `ROUND(${days}*86400,6)${seconds === 1 ? '' : `/${numberText(seconds)}`}`;
  const always = [...alike, ...times.none('<', '0'), ...unit.holds];
  // from 366 days on, a number is a date
  const noDates = times.none('>=', '366');
  if (!given.has('start')) return eachReading(times, [...always, ...noDates], inUnit);
  if (!given.isWord('start', 'first')) throw new NotSaid('start is not "first"');
  if (times.rows > 1 && times.columns > 1) throw new NotSaid('times are a block');
  const first = times.first;
  if (!mayPassMidnight) {
    const since = (time: string): string => inUnit(`(${time}-${first.text})`);
    return eachReading(times, [...always, ...noDates, ...first.holds], since);
  }
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
