/** Columns that were just put in belong to the table from now on. */
import type { ConvertedRun } from '../calls/readings';
import { findTable } from '../findTable';
import { readHeading } from '../headers';
import type { Insertion } from '../insertions/insertion';
import type { Plan } from '../plan';
import type { SheetArea } from '../port';
import { isSameRun, type Table } from '../runs';
import { turnedArea, turnedCells } from '../turned';
import type { Bench } from './bench';

/**
 * Nothing happens where they do not stand row by row beside their times.
 *
 * @param converted a part of the insertion each, in their order, as the pane has worked it out, since the workbook may still be calculating
 * @returns the chosen run's column now, as the table is read; `null` where nothing happened
 */
export async function adoptColumns(
  { store, port }: Bench,
  { target }: Plan,
  { parts, headings }: Insertion,
  converted: readonly ConvertedRun[],
): Promise<number | null> {
  const { table, run } = store.state;
  if (!table || !run || target.sheet !== table.sheet) return null;
  const { isTurned, corrections } = table;
  const asRead = (area: SheetArea): SheetArea => (isTurned ? turnedArea(area) : area);
  const placed = parts.map(({ down, right }, i) => {
    const { row, column } = asRead({ ...target, row: target.row + down, column: target.column + right });
    return { row, column, ...converted[i] };
  });
  if (placed.some((one) => one.row !== one.run.firstRow)) return null;
  const columns = placed.map(({ row, column, answer }) => ({
    row,
    column,
    cells: answer.kind === 'column' ? answer.cells : [],
  }));
  const area = columns
    .map(({ row, column, cells }) => ({ sheet: table.sheet, row, column, rows: cells.length, columns: 1 }))
    .reduce(around, asRead(table.area));
  const { cells: standing } = await port.read(asRead(area));
  const known = (isTurned ? turnedCells(standing) : standing).map((line) => [...line]);
  for (const { row, column, cells } of columns)
    cells.forEach(([cell], r) => (known[row + r - area.row][column - area.column] = cell));
  const cells = isTurned ? turnedCells(known) : known;
  const grown = findTable({ area: asRead(area), cells }, { ...corrections, isTurned });
  if (typeof grown === 'string') return null;
  const written = [...new Set(columns.map(({ column }) => column))];
  if (!written.every((column) => grown.columns.some((one) => one.column === column))) return null;
  store.change({ table: renamed(grown, written, headings), proposal: null });
  return placed.find((one) => isSameRun(one.run, run))?.column ?? null;
}

/** The headings stand above the first run's first row, which need not be the table's. */
const renamed = (table: Table, written: readonly number[], headings: readonly string[]): Table => ({
  ...table,
  columns: table.columns.map((one) => {
    const heading = headings[written.indexOf(one.column)];
    return heading === undefined ? one : { ...one, heading: readHeading(heading) };
  }),
});

function around(a: SheetArea, b: SheetArea): SheetArea {
  const [row, column] = [Math.min(a.row, b.row), Math.min(a.column, b.column)];
  const bottom = Math.max(a.row + a.rows, b.row + b.rows);
  const right = Math.max(a.column + a.columns, b.column + b.columns);
  return { sheet: a.sheet, row, column, rows: bottom - row, columns: right - column };
}
