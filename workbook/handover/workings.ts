/** The sheet "Workings" of a copy: its tables one below the other, each under its title. */
import { quotedSheet } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { fitsOtherwise, startsOtherwise } from '../../functions/builtIn/fitState';
import { fixedArea } from '../../functions/builtIn/text';
import type { Table, WorkingCell, WorkingFormula, Workings } from '../../functions/builtIn/workings';
import type { CalculatedBook, CellModel, SheetModel } from '../engine/engine';
import { isSame } from './check';
import type { NewSheet, SheetCell } from './newSheet';

type Rows = readonly (readonly WorkingCell[])[];

interface Placed {
  readonly title: string;
  /** Of its first cell, below the title. */
  readonly row: number;
  readonly rows: Rows;
}

const introduction: readonly SheetCell[][] = [
  [{ heading: 'Workings' }],
  [
    'What the formulas of this copy need and no single cell can work out. All of it is live, except for numbers.',
  ],
];

export class WorkingsSheet {
  private readonly placed: Placed[] = [];
  private readonly byTitle = new Map<string, Table>();

  /** What names the sheet in a formula. */
  private readonly ownName: RegExp;

  constructor(readonly name: string) {
    this.ownName = new RegExp(`(?<![\\w.'])${quotedSheet(name)}!`, 'g');
  }

  get isEmpty(): boolean {
    return this.placed.length === 0;
  }

  /** As a formula on some sheet sees it. */
  seenFrom(sheet: string): Workings {
    return { sheet, table: (title, rows) => this.table(title, rows) };
  }

  /** Tables that the work adds are taken back where it fails. */
  attempt<T>(work: () => T): T {
    const before = this.placed.length;
    try {
      return work();
    } catch (error) {
      for (const { title } of this.placed.splice(before)) this.byTitle.delete(title);
      throw error;
    }
  }

  private table(title: string, rows: (own: Table) => Rows): Table {
    const known = this.byTitle.get(title);
    if (known) return known;
    const last = this.placed.at(-1);
    const row = last ? last.row + last.rows.length + 2 : introduction.length + 2;
    const area = { sheet: this.name, row, column: 0 };
    const range = (r: number, column: number, count: number): string =>
      fixedArea({ ...area, row: row + r, column, rows: count, columns: 1 });
    const own: Table = {
      range,
      cell: (r, column) => range(r, column, 1),
      area: (height, width) => ({ ...area, rows: height, columns: width }),
    };
    this.placed.push({ title, row, rows: rows(own).map((line) => line.map((cell) => this.atHome(cell))) });
    this.byTitle.set(title, own);
    return own;
  }

  /** A formula of the sheet itself need not name it. */
  private atHome(cell: WorkingCell): WorkingCell {
    return isFormula(cell) ? { ...cell, formula: cell.formula.replace(this.ownName, '') } : cell;
  }

  /**
   * By an engine, as part of the workbook. Where the values of a table's lines are known, a few of them are worked
   * out all the same; if one comes to something else, none is believed.
   */
  async workedOut(calculate: (sheet: SheetModel) => Promise<CalculatedBook>): Promise<CalculatedBook> {
    const calculated = await calculate(this.model(fewLines));
    const isAsKnown = this.placed.every(({ row, rows }) =>
      rows.every((line, r) =>
        line.every(
          (cell, column) =>
            !isKnown(cell) || isSame(cell.today, calculated.shown(this.name, row + r, column), 0),
        ),
      ),
    );
    return isAsKnown ? calculated : calculate(this.model(Infinity));
  }

  /** @param most lines of each table that are worked out although their values are known */
  private model(most: number): SheetModel {
    const cells = this.placed.flatMap(({ row, rows }) => {
      const chosen = linesToWorkOut(rows, most);
      return rows.flatMap((line, r) =>
        line.map((cell, column): CellModel => {
          const content = isKnown(cell) && !chosen.has(r) ? { value: cell.today } : contentOf(cell);
          return { row: row + r, column, ...content };
        }),
      );
    });
    return { name: this.name, cells };
  }

  /** What it came to. */
  values(calculated: CalculatedBook): SheetModel {
    const { name, placed } = this;
    const cells = placed.flatMap(({ row, rows }) =>
      rows.flatMap((line, r) =>
        line.map((_, column) => ({
          row: row + r,
          column,
          value: calculated.shown(name, row + r, column),
        })),
      ),
    );
    return { name, cells };
  }

  /** For the file, each formula with what it came to. */
  sheet(calculated: CalculatedBook): NewSheet {
    const lines: SheetCell[][] = introduction.map((line) => [...line]);
    for (const { row, rows, title } of this.placed) {
      lines[row - 1] = [{ heading: title }];
      rows.forEach((line, r) => {
        lines[row + r] = line.map((cell, column) =>
          isFormula(cell)
            ? { formula: cell.formula, value: calculated.shown(this.name, row + r, column) }
            : cell,
        );
      });
    }
    const rows = Array.from(lines, (line) => line ?? []);
    const widest = rows.reduce((most, line) => Math.max(most, line.length), 0);
    const columns = Array.from({ length: widest }, () => ({ width }));
    return { name: this.name, rows, columns, warnings };
  }
}

const warnings = [fitsOtherwise, startsOtherwise];

/** Enough for six digits with their exponent. */
const width = 13;

const isFormula = (cell: WorkingCell): cell is WorkingFormula =>
  typeof cell === 'object' && cell !== null && 'formula' in cell;

const isKnown = (cell: WorkingCell): cell is Required<WorkingFormula> =>
  isFormula(cell) && cell.today !== undefined;

/** Of a table whose values are known. */
const fewLines = 3;

/** Spread over all that are known, the first two and the last among them. */
function linesToWorkOut(rows: Rows, most: number): ReadonlySet<number> {
  const known = rows.flatMap((line, r) => (line.some(isKnown) ? [r] : []));
  const step = Math.max(1, Math.ceil(known.length / most));
  return new Set(known.filter((_, n) => n < 2 || n === known.length - 1 || n % step === 0));
}

function contentOf(cell: WorkingCell): { readonly value: CellValue; readonly formula?: string } {
  if (isFormula(cell)) return { value: null, formula: cell.formula };
  return { value: typeof cell === 'object' && cell !== null && 'heading' in cell ? cell.heading : cell };
}
