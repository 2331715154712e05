/** A workbook's bytes with every formula calculated anew. */
import { cellName, quotedSheet } from '../../functions/address';
import type { CellError } from '../../functions/cell';
import { calculate } from '../engine/univer/headless';
import { patchWorkbook } from '../xlsx/patch';
import { readWorkbook } from '../xlsx/read';

export interface Recalculated {
  readonly bytes: Uint8Array;
  readonly formulas: number;
  /** Cells that show an error as a result, in reading order. */
  readonly errors: readonly { readonly cell: string; readonly error: CellError }[];
}

/** @throws NotAWorkbook for bytes that are no whole .xlsx workbook */
export async function recalculate(bytes: Uint8Array): Promise<Recalculated> {
  const book = readWorkbook(bytes);
  const calculated = await calculate(book);
  return {
    bytes: patchWorkbook(bytes, book, calculated),
    formulas: book.sheets.flatMap(({ cells }) => cells).filter(({ formula }) => formula !== undefined).length,
    errors: calculated.errors.map(({ sheet, row, column, error }) => ({
      cell: `${quotedSheet(sheet)}!${cellName(row, column)}`,
      error,
    })),
  };
}
