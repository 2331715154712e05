/** A workbook's bytes with every formula calculated anew. */
import type { CalculatedBook } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { patchWorkbook } from '../xlsx/patch';
import { readWorkbook } from '../xlsx/read';

export interface Recalculated {
  readonly bytes: Uint8Array;
  readonly formulas: number;
  /** Cells that show an error as a result, in reading order. */
  readonly errors: CalculatedBook['errors'];
}

/** @throws NotAWorkbook for bytes that are no whole .xlsx workbook */
export async function recalculate(bytes: Uint8Array): Promise<Recalculated> {
  const book = readWorkbook(bytes);
  const calculated = await calculate(book);
  return {
    bytes: patchWorkbook(bytes, book, calculated),
    formulas: book.sheets.reduce(
      (sum, { cells }) => sum + cells.filter(({ formula }) => formula !== undefined).length,
      0,
    ),
    errors: calculated.errors,
  };
}
