/** A run with its replicates averaged, on the sheet "Workings": each time once. */
import { averageReplicates } from '../../src/series/series';
import type { CellValue } from '../cell';
import type { Given } from './given';
import type { SortedRun } from './sortedRun';
import { headingRow, workingFormula, type Table, type WorkingCell } from './workings';

/** Below the headings. */
const firstRow = 1;
/** Columns of the table. */
const [time, mean, count, soFar] = [0, 1, 2, 3];

export class Means {
  private readonly table: Table;

  constructor(
    given: Given,
    readonly run: SortedRun,
  ) {
    run.requireShort(true);
    this.table = given.workings.table(`Means at each time: ${run.name}`, (own) => [
      headingRow('time', 'mean reading', 'readings', 'readings so far'),
      ...lines(run, own),
    ]);
  }

  /** Times, means and how many readings each has, with empty text below the last. */
  get columns(): [times: string, means: string, counts: string] {
    const column = (n: number): string => this.table.range(firstRow, n, this.run.size);
    return [column(time), column(mean), column(count)];
  }

  time = (n: number): string => this.table.cell(firstRow + n, time);
  mean = (n: number): string => this.table.cell(firstRow + n, mean);
  count = (n: number): string => this.table.cell(firstRow + n, count);
}

function lines(run: SortedRun, own: Table): WorkingCell[][] {
  const today = valuesToday(run);
  return Array.from({ length: run.size }, (_, n) =>
    line(run, own, n).map((formula, column) => workingFormula(formula, today?.[column][n])),
  );
}

function line({ times, values, count: all, time: timeOf }: SortedRun, own: Table, n: number): string[] {
  const here = (column: number): string => own.cell(firstRow + n, column);
  const before = n === 0 ? '0' : own.cell(firstRow + n - 1, soFar);
  const known = (formula: string): string => `IF(ISNUMBER(${here(time)}),${formula},"")`;
  return [
    n === 0 ? timeOf(0) : `IF(ISNUMBER(${before}),IF(${before}<${all},SMALL(${times},${before}+1),""),"")`,
    known(`SUMIF(${times},${here(time)},${values})/${here(count)}`),
    known(`COUNTIF(${times},${here(time)})`),
    known(`${before}+${here(count)}`),
  ];
}

/** Column by column; empty below the last time. */
function valuesToday({ today, size }: SortedRun): CellValue[][] | undefined {
  if (!today) return undefined;
  const { times, values, counts } = averageReplicates(today);
  let readings = 0;
  const sums = Array.from(counts, (one) => (readings += one));
  return [times, values, counts, sums].map((known) => Array.from({ length: size }, (_, n) => known[n] ?? ''));
}
