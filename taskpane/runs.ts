/** What a table and a run are, and what stands in them. */
import type { CellRange, CellValue } from '../functions/cell';
import { numberInText } from '../functions/column';
import { InvalidInput } from '../src/errors';
import type { Heading } from './headers';
import type { RangeReading, SheetArea } from './port';
import { turnedArea, turnedCells } from './turned';

export interface TableColumn {
  /** In the sheet, from 0. */
  readonly column: number;
  readonly heading: Heading;
}

/** Rows that belong to one of several runs under each other. */
export interface Stretch {
  readonly name: string;
  readonly firstRow: number;
  readonly lastRow: number;
}

/** What a person has said of a table in place of what was guessed. */
export interface Corrections {
  readonly isTurned?: boolean;
  /** The column of run names; `null` where there is none. */
  readonly names?: number | null;
  /** By column, where its heading names none. */
  readonly units?: Readonly<Record<number, string>>;
}

/**
 * Columns of numbers under headings. Rows and columns are the sheet's own, from 0; where the runs stand in
 * rows the table is read turned, so that a column here is a row of the sheet.
 */
export interface Table {
  readonly sheet: string;
  /** As it stands in the sheet. */
  readonly area: SheetArea;
  readonly isTurned: boolean;
  /** As the table is read. */
  readonly cells: CellRange;
  readonly columns: readonly TableColumn[];
  readonly firstRow: number;
  readonly lastRow: number;
  /** All that has a heading or holds something, words too: one of them may name the runs. */
  readonly labels: readonly TableColumn[];
  /** The column that names the runs, where several stand under each other. */
  readonly names: number | null;
  readonly stretches: readonly Stretch[];
  /** In words, which runs do not lie together; empty where all do. */
  readonly apart: string;
  readonly corrections: Corrections;
}

/** One run: which column holds the times, which the readings, and the rows that count. */
export interface Run {
  readonly timeColumn: number;
  readonly readingColumn: number;
  readonly firstRow: number;
  readonly lastRow: number;
}

/** Whether they are readings of the same run, whatever rows of it count. */
export const isSameRun = (a: Run, b: Run): boolean =>
  a.readingColumn === b.readingColumn && a.firstRow === b.firstRow;

/** The block that the table was found in. */
export const blockOf = ({ area, cells, isTurned }: Table): RangeReading => ({
  area,
  cells: isTurned ? turnedCells(cells) : cells,
});

/** The time column that serves a reading: the nearest to its left, or the only one. */
export function timeColumnFor(table: Table, readingColumn: number): number {
  const times = table.columns.filter(({ heading }) => heading.quantity === 'time');
  const candidates = times.length > 0 ? times : table.columns.slice(0, 1);
  const toTheLeft = candidates.filter(({ column }) => column < readingColumn);
  return (toTheLeft[toTheLeft.length - 1] ?? candidates[0]).column;
}

/** The first column of readings with its times, over all rows or those of the first run. */
export function proposeRun(table: Table): Run {
  const anyTime = table.columns.some(({ heading }) => heading.quantity === 'time');
  const reading =
    table.columns.find(({ heading }, place) => (anyTime ? heading.quantity !== 'time' : place > 0)) ??
    table.columns[1];
  const timeColumn = timeColumnFor(table, reading.column);
  const other = table.columns.find(({ column }) => column !== timeColumn)!;
  const readingColumn = reading.column === timeColumn ? other.column : reading.column;
  const { firstRow, lastRow } = table.stretches[0] ?? table;
  return { timeColumn, readingColumn, firstRow, lastRow };
}

/** The rows that a run can have: of its stretch where several runs stand under each other. */
export const limitsOf = (table: Table, row: number): Pick<Run, 'firstRow' | 'lastRow'> =>
  stretchAt(table, row) ?? table;

export const stretchAt = ({ stretches }: Table, row: number): Stretch | undefined =>
  stretches.find(({ firstRow, lastRow }) => row >= firstRow && row <= lastRow);

export function headingOf(table: Table, column: number): Heading {
  return table.columns.find((one) => one.column === column)!.heading;
}

/** Columns side by side over the run's rows, as the sheet names them. */
export function areaOf(
  { sheet, isTurned }: Table,
  column: number,
  { firstRow, lastRow }: Pick<Run, 'firstRow' | 'lastRow'>,
  columns = 1,
): SheetArea {
  const area = { sheet, row: firstRow, column, rows: lastRow - firstRow + 1, columns };
  return isTurned ? turnedArea(area) : area;
}

/** The cells of one column over the run's rows, one below the other however the table lies. */
export function columnOf(table: Table, column: number, { firstRow, lastRow }: Run): CellRange {
  const { row, column: left } = table.isTurned ? turnedArea(table.area) : table.area;
  return table.cells.slice(firstRow - row, lastRow - row + 1).map((cells) => [cells[column - left] ?? null]);
}

/** As the functions take it, a number stored as text too; nothing where they refuse it or pass over it. */
function numberIn(cell: CellValue): number | null {
  if (typeof cell !== 'string') return typeof cell === 'number' ? cell : null;
  try {
    return numberInText(cell, () => '');
  } catch (error) {
    if (error instanceof InvalidInput) return null; // it could mean two numbers
    throw error;
  }
}

/** Points of the run that are numbers on both sides, in the order of the sheet. */
export function pointsOf(table: Table, run: Run): { readonly time: number; readonly value: number }[] {
  const times = columnOf(table, run.timeColumn, run);
  const values = columnOf(table, run.readingColumn, run);
  return times.flatMap(([cell], row) => {
    const [time, value] = [numberIn(cell), numberIn(values[row][0])];
    return time !== null && value !== null ? [{ time, value }] : [];
  });
}
