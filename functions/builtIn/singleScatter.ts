/** The scatter of single readings without a model of the run (src/rate/average.ts, with its source), on "Workings". */
import { studentFactorText } from './estimate';
import type { Given } from './given';
import type { Means } from './means';
import { headingRow, type Table, type WorkingCell } from './workings';

/** Rows of the table. */
const [inner, deviation, freedom, factor, headings, firstRow] = [0, 1, 2, 3, 4, 5];

export class SingleScatter {
  private readonly table: Table;

  constructor(
    given: Given,
    private readonly means: Means,
  ) {
    const { run } = means;
    run.requireShort();
    this.table = given.workings.table(`Scatter of single readings: ${run.name}`, (own) => [
      ...head(own, run.size),
      ...Array.from({ length: run.size }, (_, n) => row(means, own, n)),
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

  /** y(to) − y(from), and its variance in units of a reading's own: two cells, worked out from the means beside it. */
  change(given: Given): { readonly value: string; readonly spread: string } {
    const [from, to] = [given.numberFromWorkings('from'), given.numberFromWorkings('to')];
    const [times, means, counts] = this.means.columns;
    const weights = `(${shares(times, to)}-(${shares(times, from)}))`;
    const each = (text: string): string => `SUM(IF(ISNUMBER(${times}),${text},0))`;
    const own = given.workings.table(`From ${from} to ${to}: ${this.means.run.name}`, () => [
      headingRow('change', 'its variance factor'),
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
  const [m, all] = [own.cell(inner, 0), own.range(firstRow, 1, size)];
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
  rows[headings] = headingRow('share of the later', 'scatter squared');
  return rows;
}

/** A mean against the straight line through its two neighbours; nothing of the first and the last. */
function row({ run, time, mean, count }: Means, own: Table, n: number): WorkingCell[] {
  if (n === 0 || n === run.size - 1) return [];
  const right = own.cell(firstRow + n, 0);
  const off = `(1-${right})*${mean(n - 1)}+${right}*${mean(n + 1)}-${mean(n)}`;
  const spread = `(1-${right})^2/${count(n - 1)}+${right}^2/${count(n + 1)}+1/${count(n)}`;
  return [`(${time(n)}-${time(n - 1)})/(${time(n + 1)}-${time(n - 1)})`, `(${off})^2/(${spread})`].map(
    (formula) => ({ formula: `IF(ISNUMBER(${time(n + 1)}),${formula},"")` }),
  );
}
