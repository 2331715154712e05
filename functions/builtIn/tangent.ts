/** Tangents to a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { PooledTangents } from './pooledTangents';
import { oneValue, type Said } from './said';
import { SortedRun } from './sortedRun';
import { where } from './text';
import { Windows, windowOfTheDay } from './windows';

/** What all tangents of a run have in common. */
class Tangents {
  private readonly holds: readonly string[];
  readonly run: SortedRun;
  readonly hasDetail: boolean;
  /** Where the window was chosen from the data, with its limits from the scatter of the whole run. */
  readonly pooled?: PooledTangents;
  private readonly windows: Windows;
  private readonly degree: number;
  private readonly nu: string;

  constructor(given: Given) {
    const [run, degree, detail] = [new SortedRun(given), given.constant('degree'), given.flag('detail')];
    const [windows, nu] = [new Windows(given, run), run.stoichiometricNumber(given)];
    this.run = run;
    this.windows = windows;
    this.degree = degree.value;
    this.nu = nu.text;
    this.hasDetail = detail.value;
    this.holds = [
      ...run.holds,
      `${run.different}>1`,
      ...windows.holds,
      ...holdsOf(nu),
      ...degree.holds,
      ...detail.holds,
    ];
    if (detail.value && !given.has('points') && windowOfTheDay(given).scatter)
      this.pooled = new PooledTangents(given, windows, degree.value, nu.text);
  }

  /** What a cell says, where there are times enough for a tangent, and readings enough for its window. */
  where(others: readonly string[], text: string): string {
    const { run, windows, degree, pooled } = this;
    const fits = [...windows.fits, ...(pooled?.fits ?? [])];
    return where([...this.holds, ...others], `IF(${run.different}>${degree},${where(fits, text)},NA())`);
  }

  /** The rate at a time, and with detail the rest of the standard row, from the scatter in the window. */
  row(at: string): string[] {
    const { windows, degree, nu, hasDetail } = this;
    const fit = windows.polynomial(at, degree);
    const value = `${fit.slope}/${nu}`;
    if (!hasDetail) return [value];
    return standardRowTexts({
      value,
      uncertainty: `${fit.slopeUncertainty}/ABS(${nu})`,
      degreesOfFreedom: `(${windows.points}-${degree + 1})`,
    });
  }
}

const ofTheDay = (given: Given): Pick<Said, 'ofTheDay'> =>
  given.has('points')
    ? {}
    : { ofTheDay: given.ofTheDay('the number of readings that a tangent rests on', 'times', 'values') };

export function sayTangent(given: Given): Said {
  const [tangents, time] = [new Tangents(given), given.number('time')];
  const { run, pooled } = tangents;
  const row = pooled?.rowAt(given.numberFromWorkings('time')) ?? tangents.row(time.text);
  const say = (column: number): string =>
    tangents.where(holdsOf(time), `IF(${run.within(time.text)},${row[column]},NA())`);
  return {
    ...(tangents.hasDetail ? { cell: (_, column) => say(column) } : oneValue(say(0))),
    ...ofTheDay(given),
  };
}

export function sayAlong(given: Given): Said {
  const [times, values] = [given.column('times'), given.column('values')];
  const tangents = new Tangents(given);
  const { pooled } = tangents;
  const isRow = times.rows === 1 && times.columns > 1;
  return {
    cell(row, column) {
      const [n, part] = isRow ? [column, row] : [row, column];
      const place: [number, number] = isRow ? [0, n] : [n, 0];
      const [time, value] = [times.element(...place), values.element(...place)];
      const cells = pooled?.rowAlong(time) ?? tangents.row(time);
      return tangents.where([], `IF(ISNUMBER(${time})*ISNUMBER(${value}),${cells[part]},"")`);
    },
    ...ofTheDay(given),
  };
}
