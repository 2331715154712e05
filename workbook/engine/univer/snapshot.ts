/** A workbook as the engine wants to be given one. */
import {
  CellValueType,
  LocaleType,
  type ICellData,
  type IWorkbookData,
  type IWorksheetData,
} from '@univerjs/core';
import type { IDefinedNamesServiceParam } from '@univerjs/engine-formula';
import { CellError } from '../../../functions/cell';
import { isEmptyCell, type BookModel, type CellModel, type SheetModel } from '../engine';
import { withoutHash } from '../anchorText';

export const unitId = 'book';

export const sheetId = (place: number): string => `sheet${place + 1}`;

/** The size of a sheet in a file (ISO/IEC 29500-1): how far a result may spill, and what a whole column is. */
export const sheetSize = { rows: 1_048_576, columns: 16_384 } as const;

const everywhere = 'AllDefaultWorkbook';

export function workbookData(book: BookModel): IWorkbookData {
  return {
    id: unitId,
    name: unitId,
    appVersion: '',
    locale: LocaleType.EN_US,
    styles: {},
    sheetOrder: book.sheets.map((_, place) => sheetId(place)),
    sheets: Object.fromEntries(
      book.sheets.map((sheet, place) => [sheetId(place), worksheetData(sheet, place)]),
    ),
  };
}

export function definedNameEntries(book: BookModel): IDefinedNamesServiceParam[] {
  return book.names.map(({ name, refersTo, sheet }, place) => ({
    id: `name${place + 1}`,
    name,
    formulaOrRefString: refersTo,
    localSheetId: sheet === undefined ? everywhere : sheetId(book.sheets.findIndex((s) => s.name === sheet)),
  }));
}

function worksheetData(sheet: SheetModel, place: number): Partial<IWorksheetData> {
  const cellData: Record<number, Record<number, ICellData>> = {};
  for (const cell of sheet.cells)
    if (!isEmptyCell(cell)) (cellData[cell.row] ??= {})[cell.column] = engineCell(cell);
  return {
    id: sheetId(place),
    name: sheet.name,
    cellData,
    rowCount: sheetSize.rows,
    columnCount: sheetSize.columns,
  };
}

/** What a formula showed last is left out: it must not be mistaken for a result. */
export function engineCell({ formula, value }: Pick<CellModel, 'formula' | 'value'>): ICellData {
  if (formula !== undefined) return { f: `=${withoutHash(formula)}` };
  if (value === null) return {};
  if (value instanceof CellError) return { v: value.code, t: CellValueType.STRING };
  if (typeof value === 'boolean') return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: value, t: typeof value === 'number' ? CellValueType.NUMBER : CellValueType.STRING };
}
