/** A column that was just put in becomes the run's readings. */
import type { CellRange } from '../../functions/cell';
import { findTable } from '../findTable';
import { readHeading } from '../headers';
import type { Plan } from '../plan';
import type { SheetArea } from '../port';
import type { Table } from '../runs';
import { turnedArea, turnedCells } from '../turned';
import type { Bench } from './bench';

/**
 * Nothing happens where the column does not stand row by row beside the times.
 *
 * @param converted as the pane has worked it out, since the workbook may still be calculating
 * @returns the run's column now, as the table is read; `null` where nothing happened
 */
export async function adoptColumn(
  { store, port }: Bench,
  { target }: Plan,
  heading: string,
  converted: CellRange,
): Promise<number | null> {
  const { table, run } = store.state;
  if (!table || !run || target.sheet !== table.sheet) return null;
  const { isTurned, corrections } = table;
  const asRead = (area: SheetArea): SheetArea => (isTurned ? turnedArea(area) : area);
  const { row, column } = asRead(target);
  if (row !== run.firstRow) return null;
  const reach = asRead({ ...asRead(target), rows: converted.length, columns: 1 });
  const area = around(table.area, reach);
  const { cells } = await port.read(area);
  const values = isTurned ? turnedCells(converted) : converted;
  const known = cells.map((line, r) =>
    line.map((cell, c) => values[area.row + r - target.row]?.[area.column + c - target.column] ?? cell),
  );
  const grown = findTable({ area, cells: known }, { ...corrections, isTurned });
  if (typeof grown === 'string' || !grown.columns.some((one) => one.column === column)) return null;
  store.change({ table: renamed(grown, column, heading), proposal: null });
  return column;
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
