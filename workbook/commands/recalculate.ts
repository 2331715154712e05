/** A workbook's bytes with every formula calculated anew. */
import type { CalculatedBook } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { patchWorkbook } from '../xlsx/patch';
import { readWorkbook } from '../xlsx/read';

export interface Recalculated {
  readonly bytes: Uint8Array;
  readonly formulas: number;
  /** Formulas that need another workbook or add-in, or dates from 1904, and keep what the file last showed. */
  readonly kept: number;
  /** Cells that show an error as a result, in reading order. */
  readonly errors: CalculatedBook['errors'];
}

/** @throws NotAWorkbook for bytes that are no whole .xlsx workbook */
export async function recalculate(bytes: Uint8Array): Promise<Recalculated> {
  const book = readWorkbook(bytes);
  const calculated = await calculate(book);
  const cells = book.sheets.flatMap((sheet) => sheet.cells);
  return {
    bytes: patchWorkbook(bytes, book, calculated),
    formulas: cells.filter(({ formula }) => formula !== undefined).length,
    kept: cells.filter(({ outsideFormula }) => outsideFormula !== undefined).length,
    errors: calculated.errors,
  };
}
