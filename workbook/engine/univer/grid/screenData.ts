/** A book as the grid on the screen wants to be given one: with looks, and sheets no larger than it draws well. */
import {
  BooleanNumber,
  WrapStrategy,
  type ICellData,
  type IStyleData,
  type IWorkbookData,
} from '@univerjs/core';
import type { BookModel, CellModel, SheetModel } from '../../engine';
import { definedNameEntries, engineCell, workbookData } from '../snapshot';

/** Room below and right of what is filled. */
const least = { rows: 1000, columns: 26 } as const;
const spare = { rows: 200, columns: 10 } as const;

/** The resource under which the sheets plugin keeps defined names. */
const namesResource = 'SHEET_DEFINED_NAME_PLUGIN';

/** @param id of its own for each opening, so that nothing of one book reaches the next */
export function screenData(book: BookModel, id: string): IWorkbookData {
  const data = workbookData(book);
  const names = Object.fromEntries(definedNameEntries(book).map((entry) => [entry.id, entry]));
  return {
    ...data,
    id,
    sheets: Object.fromEntries(
      data.sheetOrder.map((sheet, place) => [sheet, { ...data.sheets[sheet], ...looks(book.sheets[place]) }]),
    ),
    resources: [{ name: namesResource, data: JSON.stringify(names) }],
  };
}

function looks(sheet: SheetModel): IWorkbookData['sheets'][string] {
  const last = (of: 'row' | 'column'): number =>
    sheet.cells.reduce((most, cell) => Math.max(most, cell[of]), 0);
  const cellData: Record<number, Record<number, ICellData>> = {};
  for (const cell of sheet.cells) {
    const style = styleOf(cell);
    (cellData[cell.row] ??= {})[cell.column] = { ...engineCell(cell), ...(style && { s: style }) };
  }
  const widths = Object.entries(sheet.columnWidths ?? {});
  return {
    cellData,
    rowCount: Math.max(least.rows, last('row') + spare.rows),
    columnCount: Math.max(least.columns, last('column') + spare.columns),
    columnData: Object.fromEntries(widths.map(([column, width]) => [column, { w: pixels(width) }])),
  };
}

function styleOf({ numberFormat, bold, wrap }: CellModel): IStyleData | undefined {
  if (numberFormat === undefined && !bold && !wrap) return undefined;
  return {
    ...(numberFormat === undefined ? {} : { n: { pattern: numberFormat } }),
    ...(bold ? { bl: BooleanNumber.TRUE } : {}),
    ...(wrap ? { tb: WrapStrategy.WRAP } : {}),
  };
}

/** A file counts the width of a column in characters of its font: 7 pixels each, 5 between columns. */
const pixels = (characters: number): number => Math.round(characters * 7 + 5);
export const characters = (width: number): number => Math.max(0, (width - 5) / 7);
