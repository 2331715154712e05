/**
 * `A:A` in good time: a whole column is read down to the last row in use. The engine (0.25.1) would walk
 * through the million cells below, for every formula that names one.
 */
import type { IRange, ObjectMatrix } from '@univerjs/core';
import { BaseReferenceObject } from '@univerjs/engine-formula';

let trimmed = false;

/** Calling it again changes nothing. */
export function trimWholeColumns(): void {
  if (trimmed) return;
  trimmed = true;
  const position = BaseReferenceObject.prototype.getRangePosition;
  BaseReferenceObject.prototype.getRangePosition = function (this: BaseReferenceObject) {
    const range = position.call(this);
    if (!this.isColumn()) return range;
    return { ...range, endRow: Math.max(range.startRow, Math.min(range.endRow, rowsInUse(this) - 1)) };
  };
}

function rowsInUse(reference: BaseReferenceObject): number {
  const unit = reference.getUnitId();
  const sheet = reference.getSheetId();
  const cells = reference.getUnitData()[unit]?.[sheet]?.cellData;
  const spills = [reference.getArrayFormulaRange(), reference.getRuntimeArrayFormulaRange()].flatMap(
    (ranges) => Object.values(ranges?.[unit]?.[sheet] ?? {}).flatMap((row) => Object.values(row ?? {})),
  );
  return spills.reduce<number>(
    (rows, range) => Math.max(rows, ((range as IRange | null)?.endRow ?? 0) + 1),
    cells ? lengthOf(cells) : 0,
  );
}

/** Asked for every reference, and a walk through all rows each time. */
const lengths = new WeakMap<ObjectMatrix<unknown>, number>();

function lengthOf(cells: ObjectMatrix<unknown>): number {
  const length = lengths.get(cells) ?? cells.getLength();
  lengths.set(cells, length);
  return length;
}
