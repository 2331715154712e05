/** The readings nearest to any time, on the sheet "Workings": with which of them a window of so many begins. */
import { timeRounding, turningTime } from '../../src/rate/localPolynomial';
import { tangentWindow, type TangentWindow } from '../../src/rate/tangent';
import type { Series } from '../../src/series/series';
import type { CellValue } from '../cell';
import type { Column } from '../column';
import { seriesOf } from '../run';
import type { Given } from './given';
import { isNumberText } from './phrase';
import { PolynomialAt } from './polynomialAt';
import type { SortedRun } from './sortedRun';
import { numberText } from './text';
import { workingFormula, type Table, type WorkingCell, type WorkingFormula } from './workings';

/** Rows of the table. */
const [wanted, used, headings, firstRow] = [0, 1, 2, 3];

/** The window that the data choose on the day of the copy; without scatter where the run has none to judge by. */
export function windowOfTheDay(given: Given): TangentWindow {
  const [times, values] = [given.today<Column>('times'), given.today<Column>('values')];
  return tangentWindow(seriesOf(times, values), { degree: given.constant('degree').value });
}

export class Windows {
  /** For titles of what rests on them. */
  readonly name: string;
  readonly holds: readonly string[];
  /** That there are readings enough for them. */
  readonly fits: readonly string[];
  private readonly table: Table;

  constructor(
    given: Given,
    readonly run: SortedRun,
  ) {
    const width = given.has('points') ? asGiven(given) : asChosen(given);
    this.name = `windows of ${width.name}: ${run.name}`;
    this.table = given.workings.table(`Where to begin, ${this.name}`, (own) => {
      const { today } = run;
      const points = width.points();
      const pointsToday = isFixed(points) ? points : points.today;
      // a number that is known lets each line name the one reading that it waits for
      const ahead = (n: number): string | undefined =>
        isFixed(points) ? timeOf(run, n + points - 1) : `INDEX(${run.times},${own.cell(used, 0)}+${n})`;
      return [
        ...head(own, run, points),
        [workingFormula(run.time(0), today?.times[0])],
        ...Array.from({ length: run.size - 1 }, (_, n) =>
          beginning(run.time(n), ahead(n + 1), today && beginningToday(today, pointsToday, n + 1)),
        ),
      ];
    });
    this.holds = width.holds;
    this.fits = [
      ...(given.has('points') ? [`${this.table.cell(wanted, 0)}<=${run.count}`] : []),
      `${this.points}>${given.constant('degree').value}`,
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
  /** How many readings: as on the day of the copy, or as a cell says. */
  readonly points: () => number | WorkingFormula;
  readonly holds: readonly string[];
}

const isFixed = (points: number | WorkingFormula): points is number => typeof points === 'number';

function asGiven(given: Given): Width {
  const [{ holds }, text] = [given.number('points'), given.numberFromWorkings('points')];
  if (isNumberText(text)) return { name: `${text} readings`, points: () => Number(text), holds };
  const today = given.argument('points')?.cells?.[0][0];
  return { name: `as many readings as ${text} says`, points: () => workingFormula(text, today), holds };
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

const timeOf = ({ size, time }: SortedRun, n: number): string | undefined => (n < size ? time(n) : undefined);

/** From when on the window without this reading and with the one ahead is nearer; nothing where none is ahead. */
function beginning(left: string, ahead: string | undefined, today?: CellValue): WorkingCell[] {
  if (ahead === undefined) return [];
  const turning = `(${left}+${ahead})/2+${numberText(timeRounding)}*(ABS(${left})+ABS(${ahead}))`;
  return [workingFormula(`IF(ISNUMBER(${ahead}),${turning},"")`, today)];
}

/** Nothing where the number of readings is not known. */
function beginningToday({ times }: Series, points: CellValue | undefined, n: number): CellValue | undefined {
  // any other number of readings is refused, whatever stands here
  if (typeof points !== 'number' || !Number.isInteger(points) || points < 1) return undefined;
  return n + points > times.length ? '' : turningTime(times[n - 1], times[n + points - 1]);
}
