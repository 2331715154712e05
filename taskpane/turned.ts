/** A table whose runs stand in rows is read turned: as though each row were a column. */
import { columnName, type Area } from '../functions/address';
import type { CellRange } from '../functions/cell';

/** Rows become columns; twice gives back what was given. */
export const turnedArea = <A extends Area>(area: A): A => ({
  ...area,
  row: area.column,
  column: area.row,
  rows: area.columns,
  columns: area.rows,
});

export const turnedCells = (cells: CellRange): CellRange =>
  (cells[0] ?? []).map((_, column) => cells.map((row) => row[column]));

/** The letter of a column, the number of a row: how the sheet calls what is read as a column. */
export const lineName = (column: number, isTurned: boolean): string =>
  isTurned ? String(column + 1) : columnName(column);

/** The number of a row, the letter of a column: how the sheet calls what is read as a row. */
export const placeName = (row: number, isTurned: boolean): string => lineName(row, !isTurned);

/** What a quantity without a heading is called. */
export const unnamed = (column: number, isTurned: boolean): string =>
  `${isTurned ? 'row' : 'column'} ${lineName(column, isTurned)}`;
