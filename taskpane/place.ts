/** Where things are in the sheet around a run: headings beside a selection, free cells for an answer. */
import { areaName, parseArea } from '../functions/address';
import type { CellRange, CellValue } from '../functions/cell';
import type { Insertion } from './insertions/insertion';
import type { RangeReading, SheetArea, WorkbookPort } from './port';
import type { Run, Table } from './runs';
import { turnedArea, turnedCells } from './turned';

/** Names and units stand on one row or two. */
const headingRows = 2;

const isText = (cell: CellValue): boolean => typeof cell === 'string' && cell.trim() !== '';

/** A selection of numbers alone, widened to the headings that stand right above it, or else left of it. */
export async function withHeadings(port: WorkbookPort, selection: RangeReading): Promise<RangeReading> {
  return (await widened(port, selection, false)) ?? (await widened(port, selection, true)) ?? selection;
}

/** @returns nothing where there is no heading in every row looked at, from the first that has one on */
async function widened(
  port: WorkbookPort,
  { area: selected, cells: selectedCells }: RangeReading,
  isTurned: boolean,
): Promise<RangeReading | null> {
  const asRead = (area: SheetArea): SheetArea => (isTurned ? turnedArea(area) : area);
  const cellsAsRead = (cells: CellRange): CellRange => (isTurned ? turnedCells(cells) : cells);
  const area = asRead(selected);
  const above = Math.min(headingRows, area.row);
  const startsWithNumbers =
    cellsAsRead(selectedCells)[0].filter((cell) => typeof cell === 'number').length >= 2;
  if (above === 0 || !startsWithNumbers) return null;
  const wider = await port.read(asRead({ ...area, row: area.row - above, rows: area.rows + above }));
  const cells = cellsAsRead(wider.cells);
  const isHeading = (row: readonly CellValue[]): boolean => (isTurned ? row.every(isText) : row.some(isText));
  const firstText = cells.slice(0, above).findIndex(isHeading);
  if (firstText < 0 || !cells.slice(firstText, above).every(isHeading)) return null;
  const rows = above - firstText;
  return {
    area: asRead({ ...area, row: area.row - rows, rows: area.rows + rows }),
    cells: cellsAsRead(cells.slice(firstText)),
  };
}

/** How far a free place is looked for; a sheet ends at column XFD. */
const farthest = 60;
const lastColumn = 16383;

/**
 * The first cell where the answer and its heading fit into empty cells: right of the table, and for a
 * table whose runs stand in rows below it.
 */
export async function firstFree(
  port: WorkbookPort,
  table: Table,
  chosen: Run,
  { size, isAlongRun = false, isApart = false, beside = chosen }: Insertion,
): Promise<string> {
  const asRead = (area: SheetArea): SheetArea => (table.isTurned ? turnedArea(area) : area);
  const whole = asRead(table.area);
  const end = whole.column + whole.columns;
  const one = { sheet: table.sheet, rows: 1, columns: 1 };
  if (isAlongRun || !table.isTurned) {
    const answer = asRead({ ...one, row: 0, column: 0, ...size });
    const top = Math.max(beside.firstRow - 1, 0);
    const strip = { ...answer, row: top, rows: answer.rows + 1, column: end };
    const column = await freeColumn(port, strip, asRead, isApart);
    return areaName(asRead({ ...one, row: beside.firstRow, column }));
  }
  // a row left blank keeps it apart from the table, and its heading stands above it
  const strip = { ...one, row: whole.row, rows: size.columns, column: end + 1, columns: size.rows + 1 };
  const column = await freeColumn(port, strip, asRead);
  return areaName(asRead({ ...one, row: whole.row, column: column + 1 }));
}

/**
 * Where a strip of that height, moved along, first meets empty cells as wide as it is: next to the table or
 * to what was written there before, or else with a blank column on either side, so that it touches nothing.
 *
 * @param isApart it must touch nothing
 */
async function freeColumn(
  port: WorkbookPort,
  strip: SheetArea,
  asRead: (area: SheetArea) => SheetArea,
  isApart = false,
): Promise<number> {
  const reach = Math.min(farthest, lastColumn - strip.column + 1);
  const taken = new Set<number>();
  for (const name of await port.occupied(asRead({ ...strip, columns: reach }))) {
    const found = parseArea(name);
    const area = found && asRead({ ...found, sheet: strip.sheet });
    for (let place = 0; area && place < area.columns; place++) taken.add(area.column + place);
  }
  const isFree = (column: number): boolean => !taken.has(column);
  const columnsFrom = (first: number, count: number): number[] =>
    Array.from({ length: count }, (_, place) => first + place);
  const fits = (column: number): boolean => {
    const isJoined = !isApart && !columnsFrom(strip.column, column - strip.column).some(isFree);
    return (isJoined || isFree(column - 1)) && columnsFrom(column, strip.columns + 1).every(isFree);
  };
  const end = strip.column + reach;
  const first = isApart ? 1 : 0;
  return columnsFrom(strip.column + first, reach - first).find(fits) ?? end;
}
