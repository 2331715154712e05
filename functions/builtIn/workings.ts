/**
 * The sheet "Workings" of a copy: what a formula needs and no single cell can work out, such as a run in the order
 * of its times, or the numbers of a fit.
 */
import type { Area } from '../address';
import type { CellValue } from '../cell';

export interface WorkingFormula {
  /** As it is typed, without `=`. */
  readonly formula: string;
  /** What it comes to on the day of the copy, where that is known without working it out. */
  readonly today?: CellValue;
}

export type WorkingCell = CellValue | { readonly heading: string } | WorkingFormula;

export const workingFormula = (formula: string, today?: CellValue): WorkingFormula =>
  today === undefined ? { formula } : { formula, today };

export const headingRow = (...words: readonly string[]): { readonly heading: string }[] =>
  words.map((heading) => ({ heading }));

/** A table on that sheet, which formulas anywhere can name: rows and columns count from its own first cell. */
export interface Table {
  cell(row: number, column: number): string;
  range(row: number, column: number, rows: number): string;
  /** From its first cell on. */
  area(rows: number, columns: number): Area;
}

export interface Workings {
  /** Of the formula that asks: a reference without a sheet means this one. */
  readonly sheet: string;
  /**
   * @param title what stands above it; who asks again by the same title is shown the same table
   * @param rows its cells, told where it lies itself; tables that it rests on are asked for before
   */
  table(title: string, rows: (own: Table) => readonly (readonly WorkingCell[])[]): Table;
}
