/** Elapsed time from clock times that a workbook holds as days, said in built-in functions. */
import { convertUnit } from '../../src/units';
import { eachReading, placed } from './eachReading';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { numberText } from './text';

export function sayClock(given: Given): Said {
  const times = given.quantityReadings('times');
  const unit = given.word('unit');
  const seconds = convertUnit(1, unit.value, 's', 'unit');
  const inUnit = (days: string): string =>
    `ROUND(${days}*86400,6)${seconds === 1 ? '' : `/${numberText(seconds)}`}`;
  const notBefore0 = times.none('<', '0');
  if (!given.has('start')) {
    // from 366 days on, a number is a date
    return eachReading(times, [...notBefore0, ...times.none('>=', '366'), ...unit.holds], inUnit);
  }
  if (!given.isWord('start', 'first')) throw new NotSaid('start is not "first"');
  if (times.rows > 1 && times.columns > 1) throw new NotSaid('times are a block');
  const count = times.rows * times.columns;
  const [first, all] = [times.first, times.whole];
  const steps = count > 1 ? `${times.without('first')}-${times.without('last')}` : '0';
  const holds = [
    ...notBefore0,
    ...times.none('>=', '1'),
    ...unit.holds,
    `COUNT(${all})=${count}`,
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
