/**
 * Our words beside an error in a cell. They ride on the engine's error value through nested calls, and
 * are noted here where a formula's result is put into its cells: so a caught error (IFERROR) leaves no
 * words behind, and a spilled one keeps its words in the very cell that shows it.
 */
import type { Nullable } from '@univerjs/core';
import { FormulaRuntimeService, type BaseValueObject, type ErrorValueObject } from '@univerjs/engine-formula';

interface Entry {
  readonly code: string;
  readonly words: string;
}

interface Sheet {
  readonly cells: Map<string, Entry>;
  /** Which cells a formula's last result put words into. */
  readonly byFormula: Map<string, string[]>;
}

/** By workbook, then sheet. */
const books = new Map<string, Map<string, Sheet>>();

const cellKey = (row: number, column: number): string => `${row},${column}`;

/**
 * @param shown the error that the cell shows now
 * @returns our words for it; `undefined` for an error that is not ours
 */
export function messageAt(
  unitId: string,
  sheetId: string,
  row: number,
  column: number,
  shown: string,
): string | undefined {
  const entry = books.get(unitId)?.get(sheetId)?.cells.get(cellKey(row, column));
  return entry?.code === shown ? entry.words : undefined;
}

/** For a workbook that is closed. */
export function forgetMessages(unitId: string): void {
  books.delete(unitId);
}

type Result = Parameters<FormulaRuntimeService['setRuntimeData']>[0];

let listening = false;

/** From here on, words are noted. Calling it again changes nothing. */
export function noteMessages(): void {
  if (listening) return;
  listening = true;
  const put = FormulaRuntimeService.prototype.setRuntimeData;
  FormulaRuntimeService.prototype.setRuntimeData = function (
    this: FormulaRuntimeService,
    result: Result,
  ): void {
    put.call(this, result);
    note(this, result);
  };
}

function note(runtime: FormulaRuntimeService, result: Result): void {
  const { currentUnitId, currentSubUnitId, currentRow, currentColumn } = runtime;
  const sheet = sheetOf(currentUnitId, currentSubUnitId);
  const formula = cellKey(currentRow, currentColumn);
  sheet.byFormula.get(formula)?.forEach((cell) => sheet.cells.delete(cell));
  sheet.byFormula.delete(formula);
  sheet.cells.delete(formula);
  const found = messagesIn(result);
  if (found.length === 0) return;
  const filled = found.map(({ row, column, code, words }) => {
    const cell = cellKey(currentRow + row, currentColumn + column);
    sheet.cells.set(cell, { code, words });
    return cell;
  });
  sheet.byFormula.set(formula, filled);
}

function sheetOf(unitId: string, sheetId: string): Sheet {
  const book = books.get(unitId) ?? new Map<string, Sheet>();
  const sheet = book.get(sheetId) ?? {
    cells: new Map<string, Entry>(),
    byFormula: new Map<string, string[]>(),
  };
  books.set(unitId, book.set(sheetId, sheet));
  return sheet;
}

interface Found extends Entry {
  readonly row: number;
  readonly column: number;
}

/** References are left out: what they point to has words of its own, if any. */
function messagesIn(result: Result): Found[] {
  const found: Found[] = [];
  const look = (value: Nullable<BaseValueObject>, row: number, column: number): void => {
    if (!value?.isError()) return;
    const error = value as ErrorValueObject;
    const words = error.getErrorContent();
    if (words !== '') found.push({ row, column, code: error.getErrorType(), words });
  };
  if (result.isReferenceObject()) return found;
  const value = result as Exclude<Result, { getRangeData(): unknown }>;
  if (!value.isArray()) look(value, 0, 0);
  else
    value.getArrayValue().forEach((cells, row) => cells.forEach((cell, column) => look(cell, row, column)));
  return found;
}
