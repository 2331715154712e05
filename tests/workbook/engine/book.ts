/** Small workbooks for tests, typed as a person would: text that starts with = is a formula. */
import { cellName, columnIndex } from '../../../functions/address';
import type { CellValue } from '../../../functions/cell';
import type { BookModel, CellModel, DefinedName } from '../../../workbook/engine/engine';

export type Typed = Readonly<Record<string, CellValue>>;

/** `book({ Run: { A1: 2, B1: '=A1*3' } })`. */
export function book(sheets: Readonly<Record<string, Typed>>, names: readonly DefinedName[] = []): BookModel {
  return {
    sheets: Object.entries(sheets).map(([name, typed]) => ({
      name,
      cells: Object.entries(typed).map(([cell, content]) => cellModel(cell, content)),
    })),
    names,
  };
}

function cellModel(cell: string, content: CellValue): CellModel {
  const isFormula = typeof content === 'string' && content.startsWith('=');
  return {
    ...at(cell),
    value: isFormula ? null : content,
    ...(isFormula ? { formula: content.slice(1) } : {}),
  };
}

/** `B3` → row 2, column 1. */
export function at(cell: string): { row: number; column: number } {
  const [, column, row] = /^([A-Z]+)(\d+)$/.exec(cell)!;
  return { row: Number(row) - 1, column: columnIndex(column) };
}

/** A row of cells to the right: `row('A2', [1, 2])` is A2 and B2. */
export function row(first: string, values: readonly CellValue[]): Typed {
  const { row: own, column: start } = at(first);
  return Object.fromEntries(values.map((value, i) => [cellName(own, start + i), value]));
}

/** A column of cells downwards: `column('A2', [1, 2])` is A2 and A3. */
export function column(first: string, values: readonly CellValue[]): Typed {
  const { row } = at(first);
  const name = first.replace(/\d+/, '');
  return Object.fromEntries(values.map((value, i) => [`${name}${row + 1 + i}`, value]));
}
