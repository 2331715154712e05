/** A range of readings in a formula: one by one, or as a whole. */
import type { Area } from '../address';
import { CellError, type CellRange, type CellValue } from '../cell';
import { numberInText } from '../column';
import type { Bounds } from '../parameters';
import { NotSaid, type Argument } from './said';
import { cellOf, fixedArea, numberText, valueText } from './text';
import { isNumberText, type Phrase } from './phrase';
import { isNumber } from './quantities';

interface First extends Phrase {
  readonly row: number;
  readonly column: number;
}

export class Readings {
  readonly rows: number;
  readonly columns: number;

  /** @throws NotSaid for numbers written as text, which built-in functions pass over */
  constructor(
    private readonly argument: Argument,
    name: string,
    private readonly bounds: Bounds = {},
    private readonly mayHaveUnits = false,
  ) {
    const { cells } = argument;
    this.rows = cells?.length ?? 1;
    this.columns = cells?.[0]?.length ?? 1;
    const odd = cells && oddIn(cells, name);
    if (odd) throw new NotSaid(`${name} holds ${odd}`);
  }

  /** The reading itself, which moves with a copied formula. */
  element(row: number, column: number): string {
    const { area, cells, text } = this.argument;
    if (area) return cellOf(area, row, column);
    if (cells) return valueText(cells[row][column]);
    throw new NotSaid(`${text} is worked out within the formula`);
  }

  /** The same, counted row by row. */
  at(place: number): string {
    return this.element(Math.floor(place / this.columns), place % this.columns);
  }

  /** The first number, and where it stands: it must stay the first. */
  get first(): First {
    const { area, cells } = this.argument;
    const place = cells?.flat().findIndex((cell) => typeof cell === 'number') ?? -1;
    if (place < 0) throw new NotSaid('no first reading can be named');
    const [row, column] = [Math.floor(place / this.columns), place % this.columns];
    if (!area) return { row, column, text: this.element(row, column), holds: [] };
    if (place > 0 && this.columns > 1 && this.rows > 1)
      throw new NotSaid('the first cell of the block is a gap');
    const one = { ...area, row: area.row + row, column: area.column + column, rows: 1, columns: 1 };
    const before = this.rows > 1 ? { ...area, rows: row } : { ...area, columns: column };
    const none = place > 0 ? [`COUNT(${fixedArea(before)})=0`] : [];
    return { row, column, text: fixedArea(one), holds: [...isNumber(fixedArea(one)), ...none] };
  }

  /** The numbers among them on the day of the copy. */
  get today(): number[] {
    return this.argument.cells?.flat().filter((cell) => typeof cell === 'number') ?? [];
  }

  /** All of them, where they stand. */
  get whole(): string {
    const { area, text } = this.argument;
    return area ? fixedArea(area) : text;
  }

  /**
   * Whether a text there is a number, which programs pass over and PACE reads: without point and comma, whose
   * meaning differs from country to country, or by its first figure where a unit may follow.
   */
  isNumberAsText(text: string): string {
    const plain = `SUBSTITUTE(SUBSTITUTE(${text},".",""),",","")`;
    return `ISNUMBER(VALUE(${this.mayHaveUnits ? `LEFT(TRIM(SUBSTITUTE(${plain},"-","")),1)` : plain}))`;
  }

  /** 0 where each is a number or a gap, and an error among them itself. */
  get doubt(): string {
    const all = this.whole;
    return `0*SUM(${all})+SUM(ISTEXT(${all})*${this.isNumberAsText(all)})`;
  }

  /** Where they lie. @throws NotSaid for readings that lie nowhere */
  requireArea(): Area {
    const { area, text } = this.argument;
    if (!area) throw new NotSaid(`${text} is written out in the formula`);
    return area;
  }

  /** Of a column or row: from one place up to another, both counted from 0. */
  stretch(from: number, to: number): string {
    const area = this.requireArea();
    return this.rows > 1
      ? fixedArea({ ...area, row: area.row + from, rows: to - from + 1 })
      : fixedArea({ ...area, column: area.column + from, columns: to - from + 1 });
  }

  /** One column of a block. */
  column(n: number): string {
    const area = this.requireArea();
    return fixedArea({ ...area, column: area.column + n, columns: 1 });
  }

  /** One row of a block. */
  row(n: number): string {
    const area = this.requireArea();
    return fixedArea({ ...area, row: area.row + n, rows: 1 });
  }

  /** All but the first or the last, for steps from one to the next. */
  without(end: 'first' | 'last'): string {
    const count = this.rows * this.columns;
    if (count < 2) throw new NotSaid('one reading has no steps');
    return end === 'first' ? this.stretch(1, count - 1) : this.stretch(0, count - 2);
  }

  /** On the day of the copy, one by one, with nothing for a gap; nothing at all where they are not known. */
  get numbers(): (number | null)[] | undefined {
    const cells = this.argument.cells?.flat();
    if (cells?.some((cell) => cell instanceof CellError)) return undefined;
    return cells?.map((cell) => (typeof cell === 'number' ? cell : null));
  }

  /** Whether single readings can be named. */
  get isPlaced(): boolean {
    return this.argument.area !== undefined || this.argument.cells !== undefined;
  }

  /** The conditions of the parameter's own bounds, for all readings at once: one outside makes the call an error. */
  get holds(): string[] {
    const { above, atLeast, below, atMost } = this.bounds;
    return [
      ...(above === undefined ? [] : this.none('<=', numberText(above))),
      ...(atLeast === undefined ? [] : this.none('<', numberText(atLeast))),
      ...(below === undefined ? [] : this.none('>=', numberText(below))),
      ...(atMost === undefined ? [] : this.none('>', numberText(atMost))),
    ];
  }

  /** That no number among the readings lies on the wrong side of a limit; text, gaps and errors do not count. */
  none(side: '<' | '<=' | '>' | '>=', limit: string): string[] {
    const { area, cells, text } = this.argument;
    // written out, they were judged on the day of the copy
    if (!area && cells && isConstant(limit)) return [];
    if (area) {
      const criterion = isNumberText(limit)
        ? `"${side}${limit.replace(/[()]/g, '')}"`
        : `"${side}"&(${limit})`;
      return [`COUNTIF(${fixedArea(area)},${criterion})=0`];
    }
    return [`SUM(IF(ISNUMBER(${text}),IF(${text}${side}${limit},1,0),0))=0`];
  }
}

/** Numbers and what is between them: nothing that a cell could change. */
const isConstant = (text: string): boolean => /^[\d.E+\-*/()]+$/.test(text);

/** Formulas filled down read the same cells. */
const known = new WeakMap<CellRange, string>();

/** What other programs could take for something else. @throws InvalidInput for a number as text that could mean two things */
function oddIn(cells: CellRange, name: string): string {
  const odd = known.get(cells) ?? findOdd(cells.flat(), name);
  known.set(cells, odd);
  return odd;
}

function findOdd(cells: readonly CellValue[], name: string): string {
  if (cells.some((cell) => typeof cell === 'string' && numberInText(cell, () => name) !== null))
    return 'numbers written as text';
  const isTruth = cells.some((cell) => typeof cell === 'boolean');
  return isTruth ? 'TRUE or FALSE, which some programs take for numbers' : '';
}
