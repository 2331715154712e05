/** A block of cells → the columns in it that are times or readings, and the run a person most likely means. */
import { areaName, columnName } from '../functions/address';
import type { CellRange, CellValue } from '../functions/cell';
import { isUnitOnly, readHeading, type Heading } from './headers';
import type { RangeReading, SheetArea } from './port';

export interface TableColumn {
  /** In the sheet, from 0. */
  readonly column: number;
  readonly heading: Heading;
}

/** Columns of numbers under headings. Rows are the sheet's own, from 0. */
export interface Table {
  readonly sheet: string;
  readonly area: SheetArea;
  readonly cells: CellRange;
  readonly columns: readonly TableColumn[];
  readonly firstRow: number;
  readonly lastRow: number;
}

/** One run: which column holds the times, which the readings, and the rows that count. */
export interface Run {
  readonly timeColumn: number;
  readonly readingColumn: number;
  readonly firstRow: number;
  readonly lastRow: number;
}

const isNumber = (cell: CellValue | undefined): cell is number => typeof cell === 'number';
const isText = (cell: CellValue | undefined): cell is string =>
  typeof cell === 'string' && cell.trim() !== '';

/** @returns why there is no run in this block, in words, or the table */
export function findTable({ area, cells }: RangeReading): Table | string {
  const first = cells.findIndex((row) => row.filter(isNumber).length >= 2);
  if (first < 0) return noNumbers(cells, area);
  const last = cells.length - 1 - [...cells].reverse().findIndex((row) => row.some(isNumber));
  const columns = Array.from({ length: area.columns }, (_, place) => place)
    .filter((place) => isNumeric(cells.slice(first, last + 1).map((row) => row[place])))
    .map((place) => ({
      column: area.column + place,
      heading: headingAbove(cells, first, place, area.column + place),
    }));
  if (columns.length < 2)
    return `a run needs a column of times and a column of readings: ${areaName(area)} has one column of numbers`;
  if (last - first < 1) return `a run needs two readings or more: ${areaName(area)} has one row of numbers`;
  return { sheet: area.sheet, area, cells, columns, firstRow: area.row + first, lastRow: area.row + last };
}

function noNumbers(cells: CellRange, area: SheetArea): string {
  return cells.flat().some(isNumber)
    ? `a run needs a column of times and a column of readings, side by side: ${areaName(area)} has one column of numbers`
    : `a run is made of numbers: ${areaName(area)} holds none`;
}

/** At least two numbers, and no more words than numbers. */
function isNumeric(cells: readonly (CellValue | undefined)[]): boolean {
  const numbers = cells.filter(isNumber).length;
  return numbers >= 2 && numbers >= cells.filter(isText).length;
}

/** The words above the numbers; a row of units is read together with the names above it. */
function headingAbove(cells: CellRange, first: number, place: number, column: number): Heading {
  const [near, far] = [cells[first - 1]?.[place], cells[first - 2]?.[place]];
  if (isText(near) && isText(far) && isUnitOnly(near)) {
    return readHeading(`${far.trim()} / ${near.trim().replace(/^\((.*)\)$/, '$1')}`);
  }
  if (isText(near)) return readHeading(near);
  return { text: `column ${columnName(column)}`, quantity: 'unknown', unit: '' };
}

/** The time column that serves a reading: the nearest to its left, or the only one. */
export function timeColumnFor(table: Table, readingColumn: number): number {
  const times = table.columns.filter(({ heading }) => heading.quantity === 'time');
  const candidates = times.length > 0 ? times : table.columns.slice(0, 1);
  const toTheLeft = candidates.filter(({ column }) => column < readingColumn);
  return (toTheLeft[toTheLeft.length - 1] ?? candidates[0]).column;
}

/** The first column of readings with its times, over all rows. */
export function proposeRun(table: Table): Run {
  const anyTime = table.columns.some(({ heading }) => heading.quantity === 'time');
  const reading =
    table.columns.find(({ heading }, place) => (anyTime ? heading.quantity !== 'time' : place > 0)) ??
    table.columns[1];
  const timeColumn = timeColumnFor(table, reading.column);
  const other = table.columns.find(({ column }) => column !== timeColumn)!;
  const readingColumn = reading.column === timeColumn ? other.column : reading.column;
  return { timeColumn, readingColumn, firstRow: table.firstRow, lastRow: table.lastRow };
}

export function headingOf(table: Table, column: number): Heading {
  return table.columns.find((one) => one.column === column)!.heading;
}

/** The cells of one column over the run's rows, as an area and as values. */
export function columnOf(table: Table, column: number, { firstRow, lastRow }: Run): RangeReading {
  const area = { sheet: table.sheet, row: firstRow, column, rows: lastRow - firstRow + 1, columns: 1 };
  const cells = table.cells
    .slice(firstRow - table.area.row, lastRow - table.area.row + 1)
    .map((row) => [row[column - table.area.column] ?? null]);
  return { area, cells };
}

/** Points of the run that are numbers on both sides, in the order of the sheet. */
export function pointsOf(table: Table, run: Run): { readonly time: number; readonly value: number }[] {
  const times = columnOf(table, run.timeColumn, run).cells;
  const values = columnOf(table, run.readingColumn, run).cells;
  return times.flatMap(([time], row) => {
    const value = values[row][0];
    return isNumber(time) && isNumber(value) ? [{ time, value }] : [];
  });
}
