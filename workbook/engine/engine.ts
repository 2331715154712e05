/** All that the product asks of a spreadsheet engine. One implementation, over Univer; nothing else imports it. */
import { CellError, type CellValue } from '../../functions/cell';
import type { TableModel } from './tables';

/** A sheet as it comes from a file or a demo: what was typed, before anything is calculated. */
export interface BookModel {
  readonly sheets: readonly SheetModel[];
  readonly names: readonly DefinedName[];
  /** Of a file that has some; formulas may refer to them. */
  readonly tables?: readonly TableModel[];
}

export interface DefinedName {
  readonly name: string;
  /** A formula without `=`: `'Gas run'!$B$2`. */
  readonly refersTo: string;
  /** The sheet whose own name it is; left out for one that holds everywhere. */
  readonly sheet?: string;
}

export interface SheetModel {
  readonly name: string;
  readonly cells: readonly CellModel[];
  /** Widths in characters, by column. */
  readonly columnWidths?: Readonly<Record<number, number>>;
}

/** Rows and columns count from 0. */
export interface CellModel {
  readonly row: number;
  readonly column: number;
  /** What the file last showed; for a formula it is not believed. */
  readonly value: CellValue;
  /** As typed, without `=`: `PACE.TANGENT(A2:A9,B2:B9,30)`. */
  readonly formula?: string;
  /**
   * One that needs what is not at hand (another workbook or add-in, a calendar from 1904): the value is what the
   * file last showed.
   */
  readonly outsideFormula?: string;
  readonly numberFormat?: string;
  readonly bold?: boolean;
  readonly wrap?: boolean;
}

/** Whether a cell has nothing but a look. */
export const isEmptyCell = ({ value, formula }: Pick<CellModel, 'value' | 'formula'>): boolean =>
  value === null && formula === undefined;

/** A formula's outcome after a calculation. */
export interface Calculated {
  readonly value: CellValue;
  /** The rows and columns a result covers, first cell included; 1 × 1 for a single value. */
  readonly spill: { readonly rows: number; readonly columns: number };
}

/** Whether a result takes more than its own cell, or would if there were room. */
export const isSpill = (outcome: Calculated | undefined): boolean =>
  outcome !== undefined &&
  (outcome.spill.rows > 1 ||
    outcome.spill.columns > 1 ||
    (outcome.value instanceof CellError && outcome.value.code === '#SPILL!'));

export interface CalculatedBook {
  /** The outcome of the formula in this cell; `undefined` where no formula stands. */
  formula(sheet: string, row: number, column: number): Calculated | undefined;
  /** What any cell shows: its own value, or what spilled into it. */
  shown(sheet: string, row: number, column: number): CellValue;
  /**
   * Cells that show an error as a result, in reading order, with our words where we have them. A cell that
   * a formula spilled into counts too, but for #N/A, which within a table is an answer.
   */
  readonly errors: readonly {
    readonly sheet: string;
    readonly row: number;
    readonly column: number;
    readonly error: CellError;
  }[];
}
