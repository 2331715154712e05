/** Tangents to a run, said in built-in functions. */
import { nearerBy } from '../../src/rate/localPolynomial';
import { ChosenWindow, windowOfTheDay } from './chosenWindow';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { Pairs } from './pairs';
import { oneValue, type Said } from './said';
import { slopeRow } from './slope';
import { where } from './text';

/** A tangent in a window whose number of readings is known. */
class KnownWindow {
  readonly holds: readonly string[];
  private readonly nu: string;
  private readonly degree: number;

  /** @param points how many readings, as a formula has it */
  constructor(
    given: Given,
    private readonly pairs: Pairs,
    private readonly points: string,
    holds: readonly string[],
  ) {
    const degree = given.constant('degree');
    const nu = pairs.stoichiometricNumber(given);
    this.degree = degree.value;
    this.nu = nu.text;
    this.holds = [
      ...pairs.holds,
      ...holds,
      ...nu.holds,
      ...degree.holds,
      `${this.points}>${this.degree}`,
      `${this.points}<=${pairs.count}`,
    ];
  }

  /** The five cells of the standard row at a time. */
  row(at: string): string[] {
    const { pairs, points, degree, nu } = this;
    const inside = this.window(at);
    return slopeRow(pairs, { inside, points, at, degree, nu }).map(
      (cell) => `IF(SUM(${inside})=${points},${cell},#VALUE!)`,
    );
  }

  /** 1 for each of the nearest readings; of two as far off on either side the earlier. */
  private window(at: string): string {
    const { pairs, points } = this;
    const away = `ABS(${pairs.x}-${at})`;
    const reach = `SMALL(${pairs.some(away)},${points})`;
    const upTo = pairs.each(`IF(${nearerBy}*${away}<=${reach},1,0)`);
    const tied = `IF(SUM(${upTo})=${points},1,IF(${pairs.x}<${at},1,0))`;
    return pairs.each(`IF(${away}<${nearerBy}*${reach},1,IF(${nearerBy}*${away}>${reach},0,${tied}))`);
  }
}

/** How tangents of a run are drawn: the window as given, or as the data chose it on the day of the copy. */
function windowOf(given: Given, pairs: Pairs): KnownWindow | ChosenWindow {
  if (given.has('points')) {
    const points = given.number('points');
    return new KnownWindow(given, pairs, points.text, points.holds);
  }
  const { points, scatter } = windowOfTheDay(given);
  return scatter ? new ChosenWindow(given, points) : new KnownWindow(given, pairs, String(points), []);
}

const ofTheDay = (given: Given): Pick<Said, 'ofTheDay'> =>
  given.has('points')
    ? {}
    : { ofTheDay: given.ofTheDay('the number of readings that a tangent rests on', 'times', 'values') };

export function sayTangent(given: Given): Said {
  const pairs = Pairs.of(given, 'times', 'values');
  const [window, time, detail] = [windowOf(given, pairs), given.number('time'), given.flag('detail')];
  const row = window instanceof ChosenWindow ? window.rowAt() : window.row(time.text);
  const say = (column: number): string =>
    where(
      [...window.holds, ...holdsOf(time), ...detail.holds],
      `IF(${pairs.within(time.text)},${row[column]},NA())`,
    );
  return {
    ...(detail.value ? { cell: (_, column) => say(column) } : oneValue(say(0))),
    ...ofTheDay(given),
  };
}

export function sayAlong(given: Given): Said {
  const [times, values] = [given.quantityReadings('times'), given.quantityReadings('values')];
  const pairs = Pairs.of(given, 'times', 'values');
  const [window, detail] = [windowOf(given, pairs), given.flag('detail')];
  const isRow = times.rows === 1 && times.columns > 1;
  const rowOf = (time: string): string[] =>
    window instanceof ChosenWindow ? window.rowAlong(time) : window.row(time);
  return {
    cell(row, column) {
      const [n, part] = isRow ? [column, row] : [row, column];
      const place: [number, number] = isRow ? [0, n] : [n, 0];
      const [time, value] = [times.element(...place), values.element(...place)];
      const isPair = `ISNUMBER(${time})*ISNUMBER(${value})`;
      return where([...window.holds, ...detail.holds], `IF(${isPair},${rowOf(time)[part]},"")`);
    },
    ...ofTheDay(given),
  };
}
