/**
 * The scatter of single readings about tangents one degree finer, pooled over the run (src/rate/scatter.ts, with its
 * source), on the sheet "Workings".
 */
import { studentFactorText } from './estimate';
import type { Given } from './given';
import { headingRow, type Table, type WorkingCell } from './workings';
import type { Windows } from './windows';

/** Rows of the table. */
const [variance, freedom, factor, headings, firstRow] = [0, 1, 2, 3, 4];
/** And its columns. */
const [begins, missed, left] = [0, 1, 2];

export class TangentScatter {
  private readonly table: Table;

  /** @param degree of the finer polynomials */
  constructor(given: Given, windows: Windows, degree: number) {
    const { run } = windows;
    run.requireShort();
    this.table = given.workings.table(`Scatter about degree ${degree}, ${windows.name}`, (own) => [
      ...head(own, run.size),
      ...Array.from({ length: run.size }, (_, n) => line(own, windows, degree, n)),
    ]);
  }

  /** For the window of a reading, counted from 0. */
  begins = (n: number): string => this.table.cell(firstRow + n, begins);

  get variance(): string {
    return this.table.cell(variance, 0);
  }

  get degreesOfFreedom(): string {
    return this.table.cell(freedom, 0);
  }

  get studentFactor(): string {
    return this.table.cell(factor, 0);
  }
}

function head(own: Table, size: number): WorkingCell[][] {
  const column = (n: number): string => own.range(firstRow, n, size);
  const rows: WorkingCell[][] = [];
  rows[variance] = [
    { formula: `SUMSQ(${column(missed)})/${own.cell(freedom, 0)}` },
    'variance of a single reading, pooled over the run',
  ];
  rows[freedom] = [{ formula: `SUM(${column(left)})` }, 'degrees of freedom'];
  rows[factor] = [{ formula: studentFactorText(own.cell(freedom, 0)) }, 'Student’s factor for 95 %'];
  rows[headings] = headingRow('window begins with', 'missed by', 'freedom left');
  return rows;
}

function line(own: Table, windows: Windows, degree: number, n: number): WorkingCell[] {
  const [time, value] = [windows.run.time(n), windows.run.value(n)];
  const fit = windows.polynomial(time, degree, own.cell(firstRow + n, begins));
  return [windows.first(time), `${value}-${fit.height}`, `1-${fit.heightVariance}`].map((formula) => ({
    formula: `IF(ISNUMBER(${time}),${formula},"")`,
  }));
}
