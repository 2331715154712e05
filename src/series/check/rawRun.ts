/** A run as it stands in the sheet, before anything is skipped: what a check looks at. */

/** A number; `null` for a blank cell; else what stood there in place of a number. */
export type RawCell = number | null | RawText | RawError;

export interface RawText {
  readonly text: string;
  /** The number that estimates take it for; none where they skip or refuse it. */
  readonly readAs?: number;
}

export interface RawError {
  /** `#DIV/0!` and the like. */
  readonly error: string;
}

/** Two columns of one length, row beside row. */
export interface RawRun {
  readonly times: readonly RawCell[];
  readonly values: readonly RawCell[];
}

export const isText = (cell: RawCell): cell is RawText =>
  typeof cell === 'object' && cell !== null && 'text' in cell;

export const isError = (cell: RawCell): cell is RawError =>
  typeof cell === 'object' && cell !== null && 'error' in cell;

/** What estimates take a cell for: everything but a number is a gap. */
export const numberIn = (cell: RawCell): number | null =>
  typeof cell === 'number' ? cell : isText(cell) ? (cell.readAs ?? null) : null;

export const hasNumber = (cell: RawCell): boolean => numberIn(cell) !== null;

export const numbersIn = (cells: readonly RawCell[]): (number | null)[] => cells.map(numberIn);

/** The rows for which something holds, counted from 0. */
export function rowsWhere(run: RawRun, holds: (time: RawCell, value: RawCell) => boolean): number[] {
  const rows: number[] = [];
  run.times.forEach((time, row) => {
    if (holds(time, run.values[row])) rows.push(row);
  });
  return rows;
}
