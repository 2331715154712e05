/** A range of readings as a function sees it: numbers, gaps and error cells, in the shape they came in. */
import { InvalidInput } from '../src/errors';
import { CellError, type CellRange, type CellResult, type CellValue } from './cell';

export interface Column {
  readonly rows: number;
  readonly columns: number;
  /** Row by row; `null` where the cell holds no number. */
  readonly numbers: readonly (number | null)[];
  /** Error cells by their place in `numbers`. */
  readonly errors: ReadonlyMap<number, CellError>;
}

export function readColumn(cells: CellRange): Column {
  const flat = cells.flat();
  const errors = new Map<number, CellError>();
  const numbers = flat.map((cell, place) => {
    if (cell instanceof CellError) errors.set(place, cell);
    return typeof cell === 'number' && Number.isFinite(cell) ? cell : null;
  });
  return { rows: cells.length, columns: cells[0]?.length ?? 0, numbers, errors };
}

/** A run is one column or one row; a block is a mistake in the selection. @throws InvalidInput */
export function requireLine(column: Column, name: string): void {
  if (column.rows > 1 && column.columns > 1) {
    throw new InvalidInput(
      `${name} must be one column or one row: got ${column.rows} rows of ${column.columns} cells`,
    );
  }
}

/**
 * Applies a conversion to every number and answers in the shape given: a gap stays empty, an error
 * cell keeps its own error. Text "" stands for empty, since a formula cannot answer a blank cell.
 */
export function convertColumn(
  column: Column,
  convert: (value: number, place: number) => CellValue,
): CellResult {
  const converted = column.numbers.map(
    (value, place) => column.errors.get(place) ?? (value === null ? '' : convert(value, place)),
  );
  return inRows(converted, column.rows, column.columns);
}

/**
 * As {@link convertColumn}, where each reading's answer is a row of cells: under each other for a column of
 * readings, beside each other, in columns, for a row of them.
 */
export function convertToRows(
  column: Column,
  convert: (value: number, place: number) => readonly CellValue[],
): CellResult {
  const found = column.numbers.map((value, place) => (value === null ? null : convert(value, place)));
  const width = found.find((cells) => cells !== null)?.length ?? 1;
  const lines = found.map(
    (cells, place) => cells ?? new Array<CellValue>(width).fill(column.errors.get(place) ?? ''),
  );
  return linesBeside(column, lines);
}

/** Lines that belong to the cells of one column or row, set beside it: lines down a column, or turned beside a row. */
export function linesBeside(
  { rows, columns }: Pick<Column, 'rows' | 'columns'>,
  lines: readonly (readonly CellValue[])[],
): CellValue[][] {
  const isRow = rows === 1 && columns > 1;
  return isRow ? lines[0].map((_, cell) => lines.map((line) => line[cell])) : lines.map((line) => [...line]);
}

function inRows(flat: readonly CellValue[], rows: number, columns: number): CellValue[][] {
  return Array.from({ length: rows }, (_, row) => flat.slice(row * columns, (row + 1) * columns));
}
