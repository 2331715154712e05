/** A column that was just put in becomes the run's readings. */
import type { CellRange } from '../../functions/cell';
import { readHeading } from '../headers';
import type { Plan } from '../plan';
import type { SheetArea } from '../port';
import { findTable, type Table } from '../runs';
import type { Bench } from './bench';

/**
 * Nothing happens where the column does not stand row by row beside the times.
 *
 * @param converted as the pane has worked it out, since the workbook may still be calculating
 * @returns whether it is the run's column now
 */
export async function adoptColumn(
  { store, port }: Bench,
  { target }: Plan,
  heading: string,
  converted: CellRange,
): Promise<boolean> {
  const { table, run } = store.state;
  if (!table || !run || target.sheet !== table.sheet || target.row !== run.firstRow) return false;
  const area = around(table.area, { ...target, rows: converted.length });
  const { cells } = await port.read(area);
  const column = target.column - area.column;
  const first = target.row - area.row;
  const known = cells.map((row, r) => {
    const value = converted[r - first]?.[0];
    return value === undefined ? row : row.map((cell, c) => (c === column ? value : cell));
  });
  const grown = findTable({ area, cells: known });
  if (typeof grown === 'string' || !grown.columns.some((one) => one.column === target.column)) return false;
  store.change({ table: renamed(grown, target.column, heading), proposal: null });
  return true;
}

/** The heading stands above the run's first row, which need not be the table's. */
const renamed = (table: Table, column: number, heading: string): Table => ({
  ...table,
  columns: table.columns.map((one) =>
    one.column === column ? { column, heading: readHeading(heading) } : one,
  ),
});

function around(a: SheetArea, b: SheetArea): SheetArea {
  const [row, column] = [Math.min(a.row, b.row), Math.min(a.column, b.column)];
  const bottom = Math.max(a.row + a.rows, b.row + b.rows);
  const right = Math.max(a.column + a.columns, b.column + b.columns);
  return { sheet: a.sheet, row, column, rows: bottom - row, columns: right - column };
}
