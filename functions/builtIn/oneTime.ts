/** Which readings of a run share their time, on the sheet "Workings": they stand together in its order. */
import { averageReplicates } from '../../src/series/series';
import type { CellValue } from '../cell';
import type { Given } from './given';
import type { SortedRun } from './sortedRun';
import { headingRow, workingFormula, type Table, type WorkingCell } from './workings';

/** Below the headings. */
const firstRow = 1;
/** Columns of the table. */
const [first, last] = [0, 1];

/** No line rests on the line before it: LibreOffice shows wrong numbers where many lines wait for each other. */
export class OneTime {
  private readonly table: Table;

  constructor(
    given: Given,
    readonly run: SortedRun,
  ) {
    this.table = given.workings.table(`Readings of one time: ${run.name}`, (own) => {
      const today = placesToday(run);
      return [
        headingRow('first of its time', 'last of its time'),
        ...Array.from({ length: run.size }, (_, n): WorkingCell[] =>
          line(run, own, n).map((formula, column) =>
            workingFormula(run.known(n, formula), today?.[column][n]),
          ),
        ),
      ];
    });
  }

  /** The numbers of the first and the last reading, from 1, at the time of the one counted from 0. */
  first = (n: number): string => this.table.cell(firstRow + n, first);
  last = (n: number): string => this.table.cell(firstRow + n, last);

  /** How many they are. */
  count = (n: number): string => `(${this.last(n)}-${this.first(n)}+1)`;
}

/** Only a time that a neighbour shares is looked for in the whole run. */
function line({ times, time, size }: SortedRun, own: Table, n: number): string[] {
  const itself = String(n + 1);
  const isShared = (neighbour: number): string => `${time(n)}=${time(neighbour)}`;
  return [
    n === 0 ? itself : `IF(${isShared(n - 1)},MATCH(${time(n)},${times},0),${itself})`,
    n === size - 1
      ? itself
      : `IF(${isShared(n + 1)},${own.cell(firstRow + n, first)}+COUNTIF(${times},${time(n)})-1,${itself})`,
  ];
}

/** Column by column; empty below the last reading. */
function placesToday({ today, size }: SortedRun): CellValue[][] | undefined {
  if (!today) return undefined;
  const { counts } = averageReplicates(today);
  let before = 0;
  const places = Array.from(counts).flatMap((count) => {
    const own = [before + 1, before + count];
    before += count;
    return Array.from({ length: count }, () => own);
  });
  return [first, last].map((end) => Array.from({ length: size }, (_, n) => places[n]?.[end] ?? ''));
}
