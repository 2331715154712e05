/** A run on the sheet "Workings": in the order of its times and without gaps, whatever its columns hold. */
import type { Series } from '../../src/series/series';
import type { CellValue } from '../cell';
import type { Given } from './given';
import { mostPairs, Pairs, requireAtMost } from './pairs';
import type { Phrase } from './phrase';
import { where } from './text';
import { headingRow, workingFormula, type Table, type WorkingCell } from './workings';

/**
 * Recalculated from nothing, 5,000 readings with a tangent at each took LibreOffice 3 s and Gnumeric 14 s of processor
 * time, 2,000 took them 2 s each; the copy is a file of 1 MB.
 */
const longestRun = 5000;

/**
 * Half lives and normalised times of 2,000 readings together took LibreOffice 5 s and Gnumeric 4 s, those of 5,000 took
 * LibreOffice 26 s.
 */
const mostSearched = 2000;

/** Rows of the table. */
const [readings, way, different, misplaced, headings, firstRow] = [0, 1, 2, 3, 4, 5];
/** And its columns. */
const [number, asItStands, inOrder, place, reading] = [0, 1, 2, 3, 4];

export class SortedRun {
  /** For titles of what rests on it. */
  readonly name: string;
  /** Readings that there is room for. */
  readonly size: number;
  private readonly pairs: Pairs;
  private readonly table: Table;

  constructor(given: Given, x = 'times', y = 'values') {
    const pairs = Pairs.of(given.fromWorkings(), x, y, longestRun);
    this.pairs = Pairs.of(given, x, y, longestRun);
    this.size = pairs.size;
    this.name = `${pairs.y} over ${pairs.x}`;
    this.table = given.workings.table(`Run: ${this.name}, in the order of time, without gaps`, (own) => [
      ...head(pairs, own),
      ...lines(pairs, own),
    ]);
  }

  /** In order, on the day of the copy; nothing where that is not known. */
  get today(): Series | undefined {
    return this.pairs.today;
  }

  /** An error among the readings makes it one, and all that rests on it. */
  get count(): string {
    return this.table.cell(readings, 0);
  }

  /** That there are any; an error among them is the answer itself. */
  get holds(): string[] {
    return [`${this.count}>0`];
  }

  /** How many different times there are. */
  get different(): string {
    return this.table.cell(different, 0);
  }

  /** The times in order, with empty text below the last. */
  get times(): string {
    return this.column(inOrder);
  }

  get values(): string {
    return this.column(reading);
  }

  /** 1, 2, 3 … beside them. */
  get numbers(): string {
    return this.column(number);
  }

  /** That a time lies within the run. */
  within(at: string): string {
    return `AND(${at}>=${this.time(0)},${at}<=INDEX(${this.times},${this.count}))`;
  }

  time = (n: number): string => this.table.cell(firstRow + n, inOrder);
  value = (n: number): string => this.table.cell(firstRow + n, reading);

  /** In a table with a line for each reading: empty below the last. */
  known = (n: number, formula: string): string => `IF(ISNUMBER(${this.time(n)}),${formula},"")`;

  /** 1 where the run rises or is level, −1 where it falls. */
  get direction(): string {
    return this.table.cell(way, 0);
  }

  /** As given, or by the trend. */
  stoichiometricNumber(given: Given): Phrase {
    if (given.has('coefficient')) return this.pairs.stoichiometricNumber(given);
    return { text: this.direction, holds: [] };
  }

  /** For a table whose lines each work through the whole run, or only search it. @throws NotSaid */
  requireShort(isSearched = false): void {
    requireAtMost(isSearched ? mostSearched : mostPairs, this.size);
  }

  private column(n: number): string {
    return this.table.range(firstRow, n, this.size);
  }
}

function head(pairs: Pairs, own: Table): WorkingCell[][] {
  const rows: WorkingCell[][] = [];
  rows[readings] = [{ formula: where([`${pairs.doubt}=0`], pairs.count) }, 'readings'];
  rows[way] = [{ formula: pairs.trend() }, '1 where they rise, -1 where they fall'];
  rows[different] = [{ formula: differentTimes(own, pairs.size) }, 'different times'];
  rows[misplaced] = [{ formula: outOfPlace(own, pairs.size) }, 'of them behind a gap or a later time'];
  rows[headings] = headingRow('number', 'time as it stands', 'time in order', 'its place', 'reading');
  return rows;
}

function outOfPlace(own: Table, size: number): string {
  if (size === 1) return '0';
  const [before, here] = [0, 1].map((from) => own.range(firstRow + from, asItStands, size - 1));
  return `SUM(IF(ISNUMBER(${here}),IF(ISNUMBER(${before}),IF(${here}<${before},1,0),1),0))`;
}

function differentTimes(own: Table, size: number): string {
  const first = `MIN(1,${own.cell(readings, 0)})`;
  if (size === 1) return first;
  const [before, here] = [0, 1].map((from) => own.range(firstRow + from, inOrder, size - 1));
  return `${first}+SUM(IF(ISNUMBER(${here}),IF(${here}>${before},1,0),0))`;
}

function lines(pairs: Pairs, own: Table): WorkingCell[][] {
  const today = valuesToday(pairs);
  return Array.from({ length: pairs.size }, (_, n) => [
    n + 1,
    ...line(pairs, own, n).map((formula, column) => workingFormula(formula, today?.[column][n])),
  ]);
}

/** Column by column; empty below the last reading. */
function valuesToday({ today, size }: Pairs): CellValue[][] | undefined {
  if (!today) return undefined;
  const standing = new Array<CellValue>(size).fill('');
  today.places.forEach((place, n) => (standing[place] = today.times[n]));
  const each = (of: (n: number) => number): CellValue[] =>
    Array.from({ length: size }, (_, n) => (n < today.times.length ? of(n) : ''));
  return [
    standing,
    each((n) => today.times[n]),
    each((n) => today.places[n] + 1),
    each((n) => today.values[n]),
  ];
}

/** A run that is in order already, as most are, is only copied: no cell then looks through the others. */
function line(pairs: Pairs, own: Table, n: number): string[] {
  const { x, isPair } = pairs.element(n);
  const here = (column: number): string => own.cell(firstRow + n, column);
  const before = (column: number): string => own.cell(firstRow + n - 1, column);
  const standing = own.range(firstRow, asItStands, pairs.size);
  const isOrdered = `${own.cell(misplaced, 0)}=0`;
  const known = (formula: string): string => `IF(${own.cell(readings, 0)}<${here(number)},"",${formula})`;
  const first = `MATCH(${here(inOrder)},${standing},0)`;
  const next = `INDEX(${standing},${before(place)}+1):INDEX(${standing},${pairs.size})`;
  // equal times stay in their order
  const found =
    n === 0
      ? first
      : `IF(${here(inOrder)}=${before(inOrder)},${before(place)}+MATCH(${here(inOrder)},${next},0),${first})`;
  return [
    `IF(${isPair},${x},"")`,
    known(`IF(${isOrdered},${x},SMALL(${standing},${here(number)}))`),
    known(`IF(${isOrdered},${here(number)},${found})`),
    known(pairs.standingAt(pairs.y, here(place))),
  ];
}
