/**
 * Large spills in good time. For every cell that a spill fills, the engine (0.25.1) looks for the cell's
 * row among all values of the column, to take it out of the old value's list: minutes for 100 000 rows.
 * The same bookkeeping with a note of which list each row is in.
 */
import { CELL_INVERTED_INDEX_CACHE as index } from '@univerjs/engine-formula';

type Rows = Set<number>;
type ValueLists = NonNullable<ReturnType<typeof index.getCellValuePositions>>;

let mended = false;

/** Calling it again changes nothing. */
export function mendLargeSpills(): void {
  if (mended) return;
  mended = true;
  const add = index.set;
  const alwaysBuilding = Object.create(index, {
    shouldContinueBuildingCache: { value: () => true },
  }) as typeof index;
  const listOfRow = new WeakMap<ValueLists, Map<number, Rows>>();
  const keyOf = keyFinder();

  index.set = (unitId, sheetId, column, value, row, replace = false) => {
    if (!replace && !index.shouldContinueBuildingCache(unitId, sheetId, column, row)) return;
    const before = index.getCellValuePositions(unitId, sheetId, column);
    if (replace && before) listOfRow.get(before)?.get(row)?.delete(row);
    add.call(alwaysBuilding, unitId, sheetId, column, value, row, false);
    const lists = index.getCellValuePositions(unitId, sheetId, column)!;
    const notes = listOfRow.get(lists) ?? new Map<number, Rows>();
    notes.set(row, lists.get(keyOf(value))!);
    listOfRow.set(lists, notes);
  };
}

/** Under which key the index files a value: asked of an index of one cell. */
function keyFinder(): (value: Parameters<typeof index.set>[3]) => string | number | boolean | symbol {
  const Index = index.constructor as new () => typeof index;
  const single = new Index();
  const { set } = Index.prototype as typeof index;
  return (value) => {
    single.getCellValuePositions('', '', 0)?.clear();
    set.call(single, '', '', 0, value, 0, true);
    return single.getCellValuePositions('', '', 0)!.keys().next().value!;
  };
}
