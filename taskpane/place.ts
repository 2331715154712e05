/** Where things are in the sheet around a run: headings above a selection, free cells beside it. */
import { areaName, parseArea } from '../functions/address';
import type { CellValue } from '../functions/cell';
import type { RangeReading, SheetArea, WorkbookPort } from './port';

/** Names and units stand on one row or two. */
const headingRows = 2;

const isText = (cell: CellValue): boolean => typeof cell === 'string' && cell.trim() !== '';

/** A selection of numbers alone, widened to the headings that stand right above it. */
export async function withHeadingsAbove(port: WorkbookPort, selection: RangeReading): Promise<RangeReading> {
  const { area, cells } = selection;
  const above = Math.min(headingRows, area.row);
  const startsWithNumbers = cells[0].filter((cell) => typeof cell === 'number').length >= 2;
  if (above === 0 || !startsWithNumbers) return selection;
  const wider = await port.read({ ...area, row: area.row - above, rows: area.rows + above });
  const firstText = wider.cells.slice(0, above).findIndex((row) => row.some(isText));
  const noHeading = firstText < 0 || wider.cells.slice(firstText, above).some((row) => !row.some(isText));
  if (noHeading) return selection;
  const cut = { ...wider.area, row: wider.area.row + firstText, rows: wider.area.rows - firstText };
  return { area: cut, cells: wider.cells.slice(firstText) };
}

/** How far to the right a free place is looked for; a sheet ends at column XFD. */
const farthest = 60;
const lastColumn = 16383;

/** The first cell right of the block where the answer and a heading above it fit into empty cells. */
export async function firstFree(
  port: WorkbookPort,
  block: SheetArea,
  row: number,
  size: { readonly rows: number; readonly columns: number },
): Promise<string> {
  const left = block.column + block.columns;
  const top = Math.max(row - 1, 0);
  const reach = Math.min(farthest, lastColumn - left + 1);
  const strip: SheetArea = {
    sheet: block.sheet,
    row: top,
    column: left,
    rows: size.rows + 1,
    columns: reach,
  };
  const taken = new Set<number>();
  for (const name of await port.occupied(strip)) {
    const area = parseArea(name);
    for (let place = 0; area && place < area.columns; place++) taken.add(area.column + place);
  }
  let column = left;
  while (column < left + reach && hasAny(taken, column, size.columns)) column++;
  return areaName({ sheet: block.sheet, row, column, rows: 1, columns: 1 });
}

const hasAny = (taken: ReadonlySet<number>, first: number, count: number): boolean =>
  Array.from({ length: count }, (_, place) => first + place).some((column) => taken.has(column));
