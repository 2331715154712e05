/** The sheet "Workings" of a copy: its tables one below the other, each under its title. */
import { quotedSheet } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { fitsOtherwise, startsOtherwise } from '../../functions/builtIn/fitState';
import { fixedArea } from '../../functions/builtIn/text';
import type { Table, WorkingCell, Workings } from '../../functions/builtIn/workings';
import type { CalculatedBook, SheetModel } from '../engine/engine';
import type { NewSheet, SheetCell } from './newSheet';

type Rows = readonly (readonly WorkingCell[])[];

interface Placed {
  readonly title: string;
  /** Of its first cell, below the title. */
  readonly row: number;
  readonly rows: Rows;
  readonly own: Table;
}

const introduction: readonly SheetCell[][] = [
  [{ heading: 'Workings' }],
  [
    'What the formulas of this copy need and no single cell can work out. All of it is live, except for numbers.',
  ],
];

export class WorkingsSheet {
  private placed: readonly Placed[] = [];

  constructor(readonly name: string) {}

  get isEmpty(): boolean {
    return this.placed.length === 0;
  }

  /** As a formula on some sheet sees it. */
  seenFrom(sheet: string): Workings {
    return { sheet, table: (title, rows) => this.table(title, rows) };
  }

  /** Tables that the work adds are taken back where it fails. */
  attempt<T>(work: () => T): T {
    const before = this.placed;
    try {
      return work();
    } catch (error) {
      this.placed = before;
      throw error;
    }
  }

  private table(title: string, rows: (own: Table) => Rows): Table {
    const known = this.placed.find((table) => table.title === title);
    if (known) return known.own;
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
    this.placed = [
      ...this.placed,
      { title, row, rows: rows(own).map((line) => line.map((cell) => this.atHome(cell))), own },
    ];
    return own;
  }

  /** A formula of the sheet itself need not name it. */
  private atHome(cell: WorkingCell): WorkingCell {
    if (!isFormula(cell)) return cell;
    const own = new RegExp(`(?<![\\w.'])${quotedSheet(this.name)}!`, 'g');
    return { formula: cell.formula.replace(own, '') };
  }

  /** For the engine here to work out. */
  model(): SheetModel {
    return {
      name: this.name,
      cells: this.placed.flatMap(({ row, rows }) =>
        rows.flatMap((line, r) => line.map((cell, column) => ({ row: row + r, column, ...contentOf(cell) }))),
      ),
    };
  }

  /** What it came to. */
  values(calculated: CalculatedBook): SheetModel {
    const { name, cells } = this.model();
    return {
      name,
      cells: cells.map(({ row, column }) => ({ row, column, value: calculated.shown(name, row, column) })),
    };
  }

  /** For the file, each formula with what it came to. */
  sheet(calculated: CalculatedBook): NewSheet {
    const lines: SheetCell[][] = introduction.map((line) => [...line]);
    for (const { row, rows, title } of this.placed) {
      lines[row - 1] = [{ heading: title }];
      rows.forEach((line, r) => {
        lines[row + r] = line.map((cell, column) =>
          isFormula(cell) ? { ...cell, value: calculated.shown(this.name, row + r, column) } : cell,
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

const isFormula = (cell: WorkingCell): cell is { readonly formula: string } =>
  typeof cell === 'object' && cell !== null && 'formula' in cell;

function contentOf(cell: WorkingCell): { readonly value: CellValue; readonly formula?: string } {
  if (isFormula(cell)) return { value: null, formula: cell.formula };
  return { value: typeof cell === 'object' && cell !== null && 'heading' in cell ? cell.heading : cell };
}
