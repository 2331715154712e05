/** What the engine worked out, as the product sees it. */
import { CellValueType, type ICellData, type Nullable } from '@univerjs/core';
import { CellError, type CellValue } from '../../../functions/cell';
import type { BookModel, Calculated, CalculatedBook, CellModel, SheetModel } from '../engine';
import type { Settled } from './calculation';
import { circleKey } from './cycles';
import { sheetId, unitId } from './snapshot';
import { errorCode, isErrorText } from './values';
import { messageAt } from './words';

interface SheetOutcome {
  /** Where a formula stands, or has spilled to. */
  readonly results: ReadonlyMap<string, { readonly row: number; readonly column: number }>;
  readonly formulas: ReadonlyMap<string, Calculated>;
  /** Results and what results spilled. */
  readonly shown: ReadonlyMap<string, CellValue>;
  /** What was typed in a cell where no result shows. */
  typed(row: number, column: number): CellValue;
}

type CalculatedError = CalculatedBook['errors'][number];

const key = (row: number, column: number): string => `${row},${column}`;

export function readOutcome(book: BookModel, settled: Settled): CalculatedBook {
  const outcomes = new Map(
    book.sheets.map((sheet, place) => [sheet.name, sheetOutcome(sheet, sheetId(place), settled)]),
  );
  return {
    formula: (sheet, row, column) => outcomes.get(sheet)?.formulas.get(key(row, column)),
    shown(sheet, row, column) {
      const outcome = outcomes.get(sheet);
      return outcome?.shown.get(key(row, column)) ?? outcome?.typed(row, column) ?? null;
    },
    errors: book.sheets.flatMap((sheet) => errorsIn(sheet, outcomes.get(sheet.name)!)),
  };
}

function sheetOutcome(sheet: SheetModel, id: string, { result, circular }: Settled): SheetOutcome {
  const results = result.unitData[unitId]?.[id];
  const spilled = result.arrayFormulaCellData[unitId]?.[id];
  const ranges = result.arrayFormulaRange[unitId]?.[id];
  const formulas = new Map<string, Calculated>();
  const shown = new Map<string, CellValue>();
  const places = new Map<string, { row: number; column: number }>();

  for (const { row, column } of sheet.cells.filter(hasFormula)) {
    const range = ranges?.[row]?.[column];
    const circle = circular.get(circleKey(id, row, column));
    const first =
      circle === undefined
        ? cellValue(results?.getValue(row, column), id, row, column)
        : new CellError('#REF!', circle);
    const blocked = first instanceof CellError && (first.code === '#SPILL!' || circle !== undefined);
    const spill =
      range && !blocked
        ? { rows: range.endRow - range.startRow + 1, columns: range.endColumn - range.startColumn + 1 }
        : { rows: 1, columns: 1 };
    formulas.set(key(row, column), { value: first, spill });
    for (let r = row; r < row + spill.rows; r++) {
      for (let c = column; c < column + spill.columns; c++) {
        const own = r === row && c === column;
        places.set(key(r, c), { row: r, column: c });
        shown.set(key(r, c), own ? first : cellValue(spilled?.getValue(r, c), id, r, c));
      }
    }
  }
  return { results: places, formulas, shown, typed: typedIn(sheet) };
}

/** Most sheets of readings are never asked: their cells are put in order once one of them is. */
function typedIn({ cells }: SheetModel): SheetOutcome['typed'] {
  let rows: Map<number, Map<number, CellValue>> | undefined;
  return (row, column) => {
    if (!rows) {
      rows = new Map();
      for (const { row: r, column: c, value, formula } of cells) {
        if (formula !== undefined) continue;
        const line = rows.get(r);
        if (line) line.set(c, value);
        else rows.set(r, new Map([[c, value]]));
      }
    }
    return rows.get(row)?.get(column) ?? null;
  };
}

const hasFormula = (cell: CellModel): boolean => cell.formula !== undefined;

/** A formula that answers nothing shows 0, as a reference to a blank cell does. */
function cellValue(cell: Nullable<ICellData>, id: string, row: number, column: number): CellValue {
  const value = cell?.v;
  if (value === null || value === undefined) return 0;
  if (cell?.t === CellValueType.BOOLEAN) return value === 1 || value === true;
  if (typeof value === 'string' && isErrorText(value)) return errorShown(value, id, row, column);
  return value;
}

const errorShown = (text: string, id: string, row: number, column: number): CellError =>
  new CellError(errorCode(text), messageAt(unitId, id, row, column, text) ?? '');

/**
 * Errors that were typed are no results. Within a table that a formula answers, #N/A is an answer: a row
 * of orders has no weight for the free one.
 */
function errorsIn(sheet: SheetModel, { results, formulas, shown }: SheetOutcome): CalculatedError[] {
  return [...results]
    .map(([place, { row, column }]) => ({
      sheet: sheet.name,
      row,
      column,
      error: shown.get(place),
      spilled: !formulas.has(place),
    }))
    .filter((entry): entry is CalculatedError & { spilled: boolean } => entry.error instanceof CellError)
    .filter(({ error, spilled }) => !(spilled && error.code === '#N/A'))
    .map(({ spilled: _, ...entry }) => entry)
    .sort((a, b) => a.row - b.row || a.column - b.column);
}
