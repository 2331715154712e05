/** What a cell can hold, as every function sees it, whatever workbook the cell sits in. */

/** The error values of a spreadsheet cell (ISO/IEC 29500-1, 18.18.11, and those added since). */
export type ErrorCode =
  '#N/A' | '#VALUE!' | '#REF!' | '#DIV/0!' | '#NUM!' | '#NAME?' | '#NULL!' | '#CALC!' | '#SPILL!' | '#BUSY!';

/** An error in a cell, with the words a user reads beside it where the host shows them. */
export class CellError {
  constructor(
    readonly code: ErrorCode,
    readonly message = '',
  ) {}
}

/** `null` is a blank cell. */
export type CellValue = number | string | boolean | null | CellError;

/** Rows of cells; a single cell is a range of one by one. */
export type CellRange = readonly (readonly CellValue[])[];

/** What a function answers: one value, or rows that spill. */
export type CellResult = CellValue | CellRange;

export const isRange = (value: unknown): value is CellRange => Array.isArray(value);

/** Any argument as rows of cells; `undefined` when the argument was left out. */
export function asRange(argument: CellResult | undefined): CellRange | undefined {
  if (argument === undefined || argument === null) return undefined;
  return isRange(argument) ? argument : [[argument]];
}

/** A cell as a message shows it. */
export function shownCell(cell: CellValue): string {
  if (cell === null || cell === '') return 'a blank cell';
  if (cell instanceof CellError) return cell.code;
  if (typeof cell === 'string') return `the text "${cell.length > 24 ? `${cell.slice(0, 24)}…` : cell}"`;
  return String(cell).toUpperCase();
}
