/** The scatter of single readings without a model of the run (src/rate/average.ts, with its source), on "Workings". */
import { studentFactorText } from './estimate';
import type { Given } from './given';
import type { SortedRun } from './sortedRun';
import type { Table, WorkingCell } from './workings';

/** Rows of the table. */
const [inner, deviation, freedom, factor, headings, firstRow] = [0, 1, 2, 3, 4, 5];

export class SingleScatter {
  private readonly table: Table;

  constructor(
    given: Given,
    private readonly run: SortedRun,
  ) {
    this.table = given.workings.table(`Scatter of single readings: ${run.name}`, (own) => [
      ...head(own, run.size),
      ...Array.from({ length: run.size }, (_, n) => row(run, own, n)),
    ]);
  }

  get deviation(): string {
    return this.table.cell(deviation, 0);
  }

  get degreesOfFreedom(): string {
    return this.table.cell(freedom, 0);
  }

  get studentFactor(): string {
    return this.table.cell(factor, 0);
  }

  /** y(to) − y(from), and its variance in units of a reading's own: two cells, worked out from the means beside them. */
  change(given: Given): { readonly value: string; readonly spread: string } {
    const { table, run } = this;
    const [from, to] = [given.numberFromWorkings('from'), given.numberFromWorkings('to')];
    const [times, means, counts] = [0, 1, 2].map((column) => table.range(firstRow, column, run.size));
    const weights = `(${shares(times, to)}-(${shares(times, from)}))`;
    const each = (text: string): string => `SUM(IF(ISNUMBER(${times}),${text},0))`;
    const title = `From ${from} to ${to}: ${run.name}`;
    const own = given.workings.table(title, () => [
      ['change', 'its variance factor'].map((heading) => ({ heading })),
      [each(`${weights}*${means}`), each(`${weights}^2/${counts}`)].map((formula) => ({ formula })),
    ]);
    return { value: own.cell(1, 0), spread: own.cell(1, 1) };
  }
}

/** What each time counts for in y at a time between: a straight line joins the readings beside it. */
function shares(times: string, at: string): string {
  const before = `MAX(IF(ISNUMBER(${times}),IF(${times}<=${at},${times},""),""))`;
  const after = `MIN(IF(ISNUMBER(${times}),IF(${times}>=${at},${times},""),""))`;
  const right = `IF(${after}=${before},0,(${at}-${before})/(${after}-${before}))`;
  return `IF(${times}=${before},1-${right},0)+IF(${times}=${after},${right},0)`;
}

function head(own: Table, size: number): WorkingCell[][] {
  const [m, all] = [own.cell(inner, 0), own.range(firstRow, 4, size)];
  // neighbouring pseudo-residuals share readings
  const overlap = `2*((${m}-1)*4/9+MAX(0,${m}-2)/36)/${m}`;
  const rows: WorkingCell[][] = [];
  rows[inner] = [{ formula: `COUNT(${all})` }, 'times with a neighbour on either side'];
  rows[deviation] = [
    { formula: `IF(${m}>0,SQRT(SUM(${all})/${m}),0)` },
    'standard deviation of a single reading',
  ];
  rows[freedom] = [{ formula: `IF(${m}>0,${m}/(1+${overlap}),0)` }, 'degrees of freedom'];
  rows[factor] = [
    { formula: `IF(${m}>0,${studentFactorText(own.cell(freedom, 0))},0)` },
    'Student’s factor for 95 %',
  ];
  rows[headings] = ['time', 'mean reading', 'readings', 'share of the later', 'scatter squared'].map(
    (heading) => ({ heading }),
  );
  return rows;
}

function row(run: SortedRun, own: Table, n: number): WorkingCell[] {
  const at = (column: number, step = 0): string => own.cell(firstRow + n + step, column);
  const known = (formula: string): WorkingCell => ({ formula: `IF(ISNUMBER(${at(0)}),${formula},"")` });
  const { times, values } = run;
  const next = `IF(MAX(${times})>${at(0, -1)},MIN(IF(ISNUMBER(${times}),IF(${times}>${at(0, -1)},${times},""),"")),"")`;
  const cells: WorkingCell[] = [
    { formula: n === 0 ? run.time(0) : `IF(ISNUMBER(${at(0, -1)}),${next},"")` },
    known(`SUMIF(${times},${at(0)},${values})/COUNTIF(${times},${at(0)})`),
    known(`COUNTIF(${times},${at(0)})`),
  ];
  if (n === 0 || n === run.size - 1) return cells;
  const between = (formula: string): WorkingCell => ({ formula: `IF(ISNUMBER(${at(0, 1)}),${formula},"")` });
  const right = at(3);
  return [
    ...cells,
    between(`(${at(0)}-${at(0, -1)})/(${at(0, 1)}-${at(0, -1)})`),
    between(
      `((1-${right})*${at(1, -1)}+${right}*${at(1, 1)}-${at(1)})^2/((1-${right})^2/${at(2, -1)}+${right}^2/${at(2, 1)}+1/${at(2)})`,
    ),
  ];
}
