/** A range of readings as a function sees it: numbers, gaps and error cells, in the shape they came in. */
import { InvalidInput, NotDetermined } from '../src/errors';
import { CellError, type CellRange, type CellResult, type CellValue } from './cell';

export interface Column {
  readonly rows: number;
  readonly columns: number;
  /** Row by row; `null` where the cell holds no number, not even as text. */
  readonly numbers: readonly (number | null)[];
  /** Error cells by their place in `numbers`. */
  readonly errors: ReadonlyMap<number, CellError>;
}

/** Many formulas of a sheet are given the same cells. */
const known = new WeakMap<CellRange, Column>();

/** @throws InvalidInput for a number written as text that could mean two things */
export function readColumn(cells: CellRange): Column {
  const column = known.get(cells) ?? columnOf(cells);
  known.set(cells, column);
  return column;
}

function columnOf(cells: CellRange): Column {
  const flat = cells.flat();
  const shape = { rows: cells.length, columns: cells[0]?.length ?? 0 };
  const errors = new Map<number, CellError>();
  const numbers = flat.map((cell, place) => {
    if (cell instanceof CellError) errors.set(place, cell);
    if (typeof cell === 'string') return numberInText(cell, () => placeInWords(place, shape));
    return typeof cell === 'number' && Number.isFinite(cell) ? cell : null;
  });
  return { ...shape, numbers, errors };
}

/**
 * Imported columns often hold numbers as text, with a point or a comma. To skip them would lose readings
 * unseen; only a comma before exactly three figures could mean two things.
 *
 * @returns null for any other text, which is a gap: `n/a`, `<0.01`, a heading
 * @throws InvalidInput where it could mean two things
 */
export function numberInText(text: string, place: () => string): number | null {
  const match = /^([+-]?)(\d*)(?:([.,])(\d+))?(e[+-]?\d+)?$/i.exec(text.trim().replace(/^[−–]/, '-'));
  if (!match || (match[2] === '' && match[4] === undefined)) return null;
  const [, sign, whole, separator, decimals, exponent = ''] = match;
  if (separator === ',' && decimals.length === 3 && exponent === '' && /^[1-9]\d{0,2}$/.test(whole)) {
    throw new InvalidInput(
      `a number written as text must be clear: ${place()} holds "${text}", ${whole}.${decimals} or ${whole}${decimals}`,
    );
  }
  return Number(`${sign}${whole || '0'}.${decimals ?? '0'}${exponent}`);
}

/** The first reading of a column and where it stands. @throws InvalidInput where there is none */
export function firstNumber(
  { numbers }: Column,
  name: string,
): { readonly value: number; readonly place: number } {
  const place = numbers.findIndex((value) => value !== null);
  if (place === -1) throw new InvalidInput(`${name} must hold numbers: none was found`);
  return { value: numbers[place]!, place };
}

/** A run is one column or one row; a block is a mistake in the selection. @throws InvalidInput */
export function requireLine(column: Column, name: string): void {
  if (column.rows > 1 && column.columns > 1) {
    throw new InvalidInput(
      `${name} must be one column or one row: got ${column.rows} rows of ${column.columns} cells`,
    );
  }
}

/** Where in its range a reading stands, as a person would count it. */
export function placeInWords(place: number, column: Pick<Column, 'rows' | 'columns'>): string {
  if (column.columns === 1) return `row ${place + 1}`;
  if (column.rows === 1) return `column ${place + 1}`;
  return `row ${Math.floor(place / column.columns) + 1}, column ${(place % column.columns) + 1}`;
}

/**
 * Applies a conversion to every number and answers in the shape given: a gap stays empty, an error
 * cell keeps its own error, and a reading that cannot tell gets its own `#N/A`. Text "" stands for empty,
 * since a formula cannot answer a blank cell.
 *
 * @throws InvalidInput of the conversion, with the reading's place
 */
export function convertColumn(
  column: Column,
  convert: (value: number, place: number) => CellValue,
): CellResult {
  return inRows(convertedEach(column, convert), column.rows, column.columns);
}

/** Nothing but text "" for a gap; the error of a cell, or of a reading that cannot tell, in its place. */
function convertedEach<T>(
  column: Column,
  convert: (value: number, place: number) => T,
): (T | CellError | '')[] {
  return column.numbers.map((value, place) => {
    const error = column.errors.get(place);
    if (error) return error;
    return value === null ? '' : convertOne(column, convert, value, place);
  });
}

function convertOne<T>(
  column: Column,
  convert: (value: number, place: number) => T,
  value: number,
  place: number,
): T | CellError {
  try {
    return convert(value, place);
  } catch (error) {
    if (error instanceof NotDetermined) return new CellError('#N/A', error.message);
    if (!(error instanceof InvalidInput) || column.numbers.length === 1) throw error;
    throw new InvalidInput(`${error.message}, in ${placeInWords(place, column)}`);
  }
}

/**
 * As {@link convertColumn}, where each reading's answer is a row of cells: under each other for a column of
 * readings, beside each other, in columns, for a row of them.
 */
export function convertToRows(
  column: Column,
  convert: (value: number, place: number) => readonly CellValue[],
): CellResult {
  const found = convertedEach(column, convert);
  const width = found.find(isLine)?.length ?? 1;
  const lines = found.map((cells) => (isLine(cells) ? cells : new Array<CellValue>(width).fill(cells)));
  return linesBeside(column, lines);
}

const isLine = (cells: CellValue | readonly CellValue[]): cells is readonly CellValue[] =>
  Array.isArray(cells);

/** Lines that belong to the cells of one column or row, set beside it: lines down a column, or turned beside a row. */
export function linesBeside(
  { rows, columns }: Pick<Column, 'rows' | 'columns'>,
  lines: readonly (readonly CellValue[])[],
): CellValue[][] {
  const isRow = rows === 1 && columns > 1;
  return isRow ? lines[0].map((_, cell) => lines.map((line) => line[cell])) : lines.map((line) => [...line]);
}

export function inRows(flat: readonly CellValue[], rows: number, columns: number): CellValue[][] {
  return Array.from({ length: rows }, (_, row) => flat.slice(row * columns, (row + 1) * columns));
}
