/** A run with its replicates averaged, on the sheet "Workings": each time once. */
import type { Given } from './given';
import type { SortedRun } from './sortedRun';
import { headingRow, type Table, type WorkingCell } from './workings';

export class Means {
  private readonly table: Table;

  constructor(
    given: Given,
    readonly run: SortedRun,
  ) {
    run.requireShort();
    this.table = given.workings.table(`Means at each time: ${run.name}`, (own) => [
      headingRow('time', 'mean reading', 'readings'),
      ...Array.from({ length: run.size }, (_, n) => row(run, own, n + 1)),
    ]);
  }

  /** Times, means and how many readings each has, with empty text below the last. */
  get columns(): [times: string, means: string, counts: string] {
    const column = (n: number): string => this.table.range(1, n, this.run.size);
    return [column(0), column(1), column(2)];
  }

  time = (n: number): string => this.table.cell(1 + n, 0);
  mean = (n: number): string => this.table.cell(1 + n, 1);
  count = (n: number): string => this.table.cell(1 + n, 2);
}

function row({ times, values, time }: SortedRun, own: Table, r: number): WorkingCell[] {
  const [here, before] = [own.cell(r, 0), own.cell(r - 1, 0)];
  const next = `MIN(IF(ISNUMBER(${times}),IF(${times}>${before},${times},""),""))`;
  const known = (formula: string): WorkingCell => ({ formula: `IF(ISNUMBER(${here}),${formula},"")` });
  return [
    {
      formula: r === 1 ? time(0) : `IF(ISNUMBER(${before}),IF(MAX(${times})>${before},${next},""),"")`,
    },
    known(`SUMIF(${times},${here},${values})/COUNTIF(${times},${here})`),
    known(`COUNTIF(${times},${here})`),
  ];
}
