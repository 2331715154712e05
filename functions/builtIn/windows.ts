/** The readings nearest to any time, on the sheet "Workings": with which of them a window of so many begins. */
import { timeRounding } from '../../src/rate/localPolynomial';
import { tangentWindow, type TangentWindow } from '../../src/rate/tangent';
import { pairReadings } from '../../src/series/series';
import type { Column } from '../column';
import type { Given } from './given';
import { isNumberText } from './phrase';
import { PolynomialAt } from './polynomialAt';
import type { SortedRun } from './sortedRun';
import { numberText } from './text';
import type { Table, WorkingCell } from './workings';

/** Rows of the table. */
const [wanted, used, headings, firstRow] = [0, 1, 2, 3];

/** The window that the data choose on the day of the copy; without scatter where the run has none to judge by. */
export function windowOfTheDay(given: Given): TangentWindow {
  const [times, values] = [given.today<Column>('times'), given.today<Column>('values')];
  return tangentWindow(pairReadings(times.numbers, values.numbers), {
    degree: given.constant('degree').value,
  });
}

export class Windows {
  /** For titles of what rests on them. */
  readonly name: string;
  readonly holds: readonly string[];
  private readonly table: Table;

  constructor(
    given: Given,
    readonly run: SortedRun,
  ) {
    const width = given.has('points') ? asGiven(given) : asChosen(given);
    this.name = `windows of ${width.name}: ${run.name}`;
    this.table = given.workings.table(`Where to begin, ${this.name}`, (own) => [
      ...head(own, run, width.points()),
      ...Array.from({ length: run.size }, (_, n) => [{ formula: beginning(run, own, n) }]),
    ]);
    const enough = `${this.points}>${given.constant('degree').value}`;
    this.holds = [
      ...width.holds,
      ...(given.has('points') ? [`${this.table.cell(wanted, 0)}<=${run.count}`] : []),
      enough,
    ];
  }

  /** How many readings a window holds. */
  get points(): string {
    return this.table.cell(used, 0);
  }

  /** The number of the first reading in the window of a time. */
  first(at: string): string {
    return `MATCH(${at},${this.table.range(firstRow, 0, this.run.size)},1)`;
  }

  /** @param first where that number stands already */
  polynomial(at: string, degree: number, first = this.first(at)): PolynomialAt {
    const { run, points } = this;
    const of = (range: string): string => `INDEX(${range},${first}):INDEX(${range},${first}+${points}-1)`;
    return new PolynomialAt(of(run.times), of(run.values), at, degree);
  }
}

interface Width {
  readonly name: string;
  readonly points: () => WorkingCell;
  readonly holds: readonly string[];
}

function asGiven(given: Given): Width {
  const [{ holds }, points] = [given.number('points'), given.numberFromWorkings('points')];
  return isNumberText(points)
    ? { name: `${points} readings`, points: () => Number(points), holds }
    : { name: `as many readings as ${points} says`, points: () => ({ formula: points }), holds };
}

function asChosen(given: Given): Width {
  const { value, holds } = given.constant('degree');
  return {
    name: `as many readings as chosen for degree ${value} on the day of the copy`,
    points: () => windowOfTheDay(given).points,
    holds,
  };
}

function head(own: Table, { count }: SortedRun, points: WorkingCell): WorkingCell[][] {
  const rows: WorkingCell[][] = [];
  rows[wanted] = [points, 'readings in a window'];
  rows[used] = [{ formula: `MIN(${own.cell(wanted, 0)},${count})` }, 'readings used'];
  rows[headings] = [{ heading: 'from when on a window begins with the reading of this line' }];
  return rows;
}

/** The first window serves from the beginning, each of the others from when it is nearer than the one before. */
function beginning({ count, times, time }: SortedRun, own: Table, n: number): string {
  if (n === 0) return time(0);
  const last = `${own.cell(used, 0)}+${n}`;
  const [left, ahead] = [time(n - 1), `INDEX(${times},${last})`];
  const turning = `(${left}+${ahead})/2+${numberText(timeRounding)}*(ABS(${left})+ABS(${ahead}))`;
  return `IF(${last}>${count},"",${turning})`;
}
