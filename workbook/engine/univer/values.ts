/** The engine's values ↔ cells as every function sees them. */
import type { Nullable } from '@univerjs/core';
import {
  ArrayValueObject,
  BooleanValueObject,
  ErrorType,
  ErrorValueObject,
  NumberValueObject,
  StringValueObject,
  type BaseValueObject,
} from '@univerjs/engine-formula';
import {
  CellError,
  isRange,
  type CellRange,
  type CellResult,
  type CellValue,
  type ErrorCode,
} from '../../../functions/cell';

/**
 * One argument. A reference comes as rows even where it is one cell, so that a blank cell (`[[null]]`)
 * differs from an argument that was left out (`undefined`).
 */
export function argumentFrom(value: BaseValueObject): CellResult | undefined {
  if (!value.isArray()) return value.isNull() ? undefined : cellFrom(value);
  const array = value as ArrayValueObject;
  const before = read.get(array);
  if (before) return before;
  const cells = cellsFrom(array);
  read.set(array, cells);
  return cells;
}

/** The engine reads a range once a round, however many formulas are given it. */
const read = new WeakMap<ArrayValueObject, CellRange>();

const cellsFrom = (array: ArrayValueObject): CellRange =>
  Array.from({ length: array.getRowCount() }, (_, row) =>
    Array.from({ length: array.getColumnCount() }, (__, column) => cellFrom(array.get(row, column))),
  );

function cellFrom(value: Nullable<BaseValueObject>): CellValue {
  if (!value || value.isNull()) return null;
  if (value.isError()) {
    const error = value as ErrorValueObject;
    return new CellError(errorCode(error.getErrorType()), error.getErrorContent());
  }
  return value.getValue();
}

/** A result as the engine spills it; our words for an error ride on the error itself. */
export function resultFor(result: CellResult): BaseValueObject {
  if (!isRange(result)) return valueFor(result);
  const columnCount = result[0]?.length ?? 0;
  if (columnCount === 0) return valueFor(new CellError('#CALC!', 'the result holds no cells'));
  return ArrayValueObject.create({
    calculateValueList: (result as CellRange).map((row) => row.map(valueFor)),
    rowCount: result.length,
    columnCount,
    unitId: '',
    sheetId: '',
    row: -1,
    column: -1,
  });
}

/** A formula cannot answer a blank cell: "" stands for it. */
function valueFor(cell: CellValue): BaseValueObject {
  if (cell === null) return StringValueObject.create('');
  if (cell instanceof CellError) return ErrorValueObject.create(errorType(cell.code), cell.message);
  if (typeof cell === 'number') return NumberValueObject.create(cell);
  return typeof cell === 'boolean' ? BooleanValueObject.create(cell) : StringValueObject.create(cell);
}

const engineErrors: ReadonlySet<string> = new Set(Object.values(ErrorType));

const errorType = (code: ErrorCode): ErrorType =>
  engineErrors.has(code) ? (code as ErrorType) : ErrorType.VALUE;

/** The engine knows a few that no file can hold: a formula that feeds on itself, a value that never came. */
const unfiled: ReadonlyMap<string, ErrorCode> = new Map<string, ErrorCode>([
  [ErrorType.CYCLE, '#REF!'],
  [ErrorType.ERROR, '#VALUE!'],
  [ErrorType.CONNECT, '#BUSY!'],
]);

export const errorCode = (engineError: string): ErrorCode =>
  unfiled.get(engineError) ?? (engineError as ErrorCode);

/** The engine shows an error in a cell as its text. */
export const isErrorText = (text: string): boolean => engineErrors.has(text);
