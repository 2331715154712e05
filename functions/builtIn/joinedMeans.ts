/** A run read off at any time: straight lines join its means, which stand on the sheet "Workings" with their slopes. */
import { averageReplicates } from '../../src/series/series';
import type { CellValue } from '../cell';
import type { Given } from './given';
import { OneTime } from './oneTime';
import type { SortedRun } from './sortedRun';
import { headingRow, workingFormula, type Table, type WorkingCell } from './workings';

/** Below the headings. */
const firstRow = 1;
/** Columns of the table. */
const [mean, slope] = [0, 1];

export class JoinedMeans {
  private readonly table: Table;

  constructor(
    given: Given,
    private readonly run: SortedRun,
  ) {
    const oneTime = new OneTime(given, run);
    this.table = given.workings.table(`Means at the time of each reading: ${run.name}`, (own) => {
      const today = valuesToday(run);
      return [
        headingRow('mean of its time', 'slope to the next'),
        ...Array.from({ length: run.size }, (_, n): WorkingCell[] =>
          line(oneTime, own, n).map((formula, column) =>
            workingFormula(run.known(n, formula), today?.[column][n]),
          ),
        ),
      ];
    });
  }

  /** y at a time within the run. */
  at(time: string): string {
    const { table, run } = this;
    const of = (column: string): string => `INDEX(${column},MATCH(${time},${run.times},1))`;
    const [means, slopes] = [mean, slope].map((column) => of(table.range(firstRow, column, run.size)));
    return `(${means}+${slopes}*(${time}-${of(run.times)}))`;
  }
}

/** Level behind the last mean. */
function line({ run, first, last, count }: OneTime, own: Table, n: number): string[] {
  const { times, values, size } = run;
  const next = (column: string): string => `INDEX(${column},${last(n)}+1)`;
  const rise = `${next(own.range(firstRow, mean, size))}-${own.cell(firstRow + n, mean)}`;
  return [
    `IF(${first(n)}=${last(n)},${run.value(n)},SUMIF(${times},${run.time(n)},${values})/${count(n)})`,
    `IF(${last(n)}<${run.count},(${rise})/(${next(times)}-${run.time(n)}),0)`,
  ];
}

/** Column by column; empty below the last reading. */
function valuesToday({ today, size }: SortedRun): CellValue[][] | undefined {
  if (!today) return undefined;
  const { times, values, counts } = averageReplicates(today);
  const slopes = Array.from(times, (time, n) =>
    n === times.length - 1 ? 0 : (values[n + 1] - values[n]) / (times[n + 1] - time),
  );
  return [[...values], slopes].map((known) => {
    const each = known.flatMap((value, n) => new Array<number>(counts[n]).fill(value));
    return Array.from({ length: size }, (_, n) => each[n] ?? '');
  });
}
