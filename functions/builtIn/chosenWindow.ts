/**
 * Tangents in a window that the data chose: the number of readings stands as it was on the day of the copy, and
 * the rest is live on the sheet "Workings", since the scatter of a run asks for a polynomial at each of its readings.
 */
import { pairReadings } from '../../src/series/series';
import { tangentWindow, type TangentWindow } from '../../src/rate/tangent';
import type { Column } from '../column';
import { studentFactorText } from './estimate';
import type { Given } from './given';
import { PolynomialAt } from './polynomialAt';
import { SortedRun } from './sortedRun';
import type { Table, WorkingCell } from './workings';

/** Rows of the table along the run. */
const [chosen, used, variance, freedom, factor, headings, firstRow] = [0, 1, 2, 3, 4, 5, 6];
/** And its columns, the time first. */
const [before, missed, left, slopes] = [1, 2, 3, 4];

/** The window that the data choose on the day of the copy; without scatter where the run has none to judge by. */
export function windowOfTheDay(given: Given): TangentWindow {
  const [times, values] = [given.today<Column>('times'), given.today<Column>('values')];
  return tangentWindow(pairReadings(times.numbers, values.numbers), {
    degree: given.constant('degree').value,
  });
}

export class ChosenWindow {
  readonly holds: readonly string[];
  private readonly degree: number;
  private readonly run: SortedRun;
  private readonly along: Table;

  constructor(
    private readonly given: Given,
    points: number,
  ) {
    const degree = given.constant('degree');
    const run = new SortedRun(given);
    this.degree = degree.value;
    this.run = run;
    this.along = given.workings.table(`Tangents of degree ${degree.value}: ${run.name}`, (own) => [
      ...this.head(points, own),
      ...this.rows(own),
    ]);
    this.holds = [
      ...run.pairs.holds,
      ...run.stoichiometricNumber.holds,
      ...degree.holds,
      `${this.along.cell(used, 0)}>${this.degree + 1}`,
    ];
  }

  private head(points: number, own: Table): WorkingCell[][] {
    const { run, degree } = this;
    const column = (n: number): string => own.range(firstRow, n, run.size);
    const rows: WorkingCell[][] = [];
    rows[chosen] = [points, 'readings in a window, as chosen on the day of the copy'];
    rows[used] = [{ formula: `MIN(${own.cell(chosen, 0)},${run.count})` }, 'readings used'];
    rows[variance] = [
      { formula: `SUMSQ(${column(missed)})/${own.cell(freedom, 0)}` },
      'variance of a single reading, pooled over the run',
    ];
    rows[freedom] = [{ formula: `SUM(${column(left)})` }, 'degrees of freedom'];
    rows[factor] = [{ formula: studentFactorText(own.cell(freedom, 0)) }, 'Student’s factor for 95 %'];
    rows[headings] = [
      'time',
      'readings before window',
      `missed by degree ${degree + 1}`,
      'freedom left',
      ...slopeHeadings(degree),
    ].map((heading) => ({ heading }));
    return rows;
  }

  private rows(own: Table): WorkingCell[][] {
    const { run, degree } = this;
    return Array.from({ length: run.size }, (_, n): WorkingCell[] => {
      const time = run.time(n);
      const fit = new PolynomialAt(run, own.cell(used, 0), own.cell(firstRow + n, before), time, degree);
      const known = (formula: string): WorkingCell => ({ formula: `IF(ISNUMBER(${time}),${formula},"")` });
      return [
        known(time),
        known(fit.first),
        known(`${run.value(n)}-${fit.finerHeight(fit.readings)}`),
        // what the polynomial has there when this reading is 1 and all others are 0
        known(`1-${fit.finerHeight(fit.only(String(n + 1)))}`),
        ...fit.slopes.map(known),
      ];
    });
  }

  /** The standard row at the time that was given. */
  rowAt(): string[] {
    const { run, along, degree, given } = this;
    const at = given.numberFromWorkings('time');
    const table = given.workings.table(`Tangent of degree ${degree} at ${at}: ${run.name}`, (own) => {
      const fit = new PolynomialAt(run, along.cell(used, 0), own.cell(1, 0), at, degree);
      return [
        ['readings before window', ...slopeHeadings(degree)].map((heading) => ({ heading })),
        [fit.first, ...fit.slopes].map((formula) => ({ formula })),
      ];
    });
    return this.row([1, 2, 3].map((column) => table.cell(1, column)));
  }

  /** The standard row at the time of a reading. */
  rowAlong(time: string): string[] {
    const { run, along } = this;
    const place = `MATCH(${time},${run.times},0)`;
    return this.row([0, 1, 2].map((n) => `INDEX(${along.range(firstRow, slopes + n, run.size)},${place})`));
  }

  /** The uncertainty and the limits are those of one degree more, which is nearly free of bias. */
  private row([slope, finer, spread]: readonly string[]): string[] {
    const { run, along } = this;
    const nu = run.stoichiometricNumber.text;
    const value = `${slope}/${nu}`;
    const uncertainty = `SQRT(${along.cell(variance, 0)}*${spread})/ABS(${nu})`;
    const reach = `${along.cell(factor, 0)}*${uncertainty}`;
    return [
      value,
      uncertainty,
      `MIN(${value},${finer}/${nu}-${reach})`,
      `MAX(${value},${finer}/${nu}+${reach})`,
      along.cell(freedom, 0),
    ];
  }
}

const slopeHeadings = (degree: number): string[] => [
  `slope, degree ${degree}`,
  `slope, degree ${degree + 1}`,
  'its variance factor',
];
