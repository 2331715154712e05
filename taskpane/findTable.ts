/** A block of cells → the table in it: which lines are quantities, under which headings. */
import { areaName } from '../functions/address';
import type { CellRange, CellValue } from '../functions/cell';
import { isNumberAsText } from '../src/series/check/textKind';
import { isUnitOnly, readHeading, withUnit, type Heading } from './headers';
import { runsBelowEachOther } from './longForm';
import type { RangeReading, SheetArea } from './port';
import type { Corrections, Table, TableColumn } from './runs';
import { turnedArea, turnedCells, unnamed } from './turned';

const isNumber = (cell: CellValue | undefined): cell is number => typeof cell === 'number';
const isText = (cell: CellValue | undefined): cell is string =>
  typeof cell === 'string' && cell.trim() !== '';
/** A number, or one for a person that is text for the sheet: `21.4 degC`, `16,0`. */
const isFigure = (cell: CellValue | undefined): boolean =>
  isNumber(cell) || (isText(cell) && isNumberAsText(cell));

/**
 * @param corrections what the person has said of it, before anything is guessed
 * @returns why there is no run in this block, in words, or the table
 */
export function findTable(block: RangeReading, corrections: Corrections = {}): Table | string {
  const isTurned = corrections.isTurned ?? standsInRows(block);
  const grid = gridIn(block, isTurned);
  if (typeof grid === 'string') return grid;
  const { sheet } = block.area;
  const found = runsBelowEachOther(grid, corrections.names);
  const columns = grid.columns
    .filter(({ column }) => column !== found.names)
    .map((one) => ({ ...one, heading: withUnit(one.heading, corrections.units?.[one.column] ?? '') }));
  const { cells, labels, firstRow, lastRow } = grid;
  const rest = { cells, labels, firstRow, lastRow, isTurned, corrections };
  return { sheet, area: block.area, columns, ...rest, ...found };
}

/** A block as it is read, before anything is asked of its runs. */
export interface Grid extends Pick<
  Table,
  'isTurned' | 'cells' | 'columns' | 'labels' | 'firstRow' | 'lastRow'
> {
  /** The first row and column of the cells. */
  readonly area: SheetArea;
}

function gridIn({ area: stands, cells: standing }: RangeReading, isTurned: boolean): Grid | string {
  const [area, cells] = isTurned ? [turnedArea(stands), turnedCells(standing)] : [stands, standing];
  const line = isTurned ? 'row' : 'column';
  const first = firstRowOfNumbers(cells);
  if (first < 0)
    return cells.flat().some(isNumber)
      ? `a run needs a ${line} of times and a ${line} of readings, side by side: ${areaName(stands)} has one ${line} of numbers${timesInWords(cells)}`
      : `a run is made of numbers: ${areaName(stands)} holds none`;
  const last = cells.length - 1 - [...cells].reverse().findIndex((row) => row.some(isFigure));
  const lines = Array.from({ length: area.columns }, (_, place) => {
    const below = cells.slice(first, last + 1).map((row) => row[place]);
    const heading = headingAbove(cells, first, place, unnamed(area.column + place, isTurned));
    const unit = commonUnit(below) || unitOfGroup(cells, first, place);
    return { column: area.column + place, heading: withUnit(heading, unit), below };
  });
  const columns = lines.filter(({ below }) => isNumeric(below)).map(named);
  if (columns.length < 2)
    return `a run needs a ${line} of times and a ${line} of readings: ${areaName(stands)} has one ${line} of numbers`;
  if (last - first < 1)
    return `a run needs two readings or more: ${areaName(stands)} has one ${isTurned ? 'column' : 'row'} of numbers`;
  return {
    area,
    isTurned,
    cells,
    columns,
    labels: lines.filter(({ below }) => below.some((cell) => isText(cell) || isNumber(cell))).map(named),
    firstRow: area.row + first,
    lastRow: area.row + last,
  };
}

/** Dates that were typed as words look like numbers to a person. */
function timesInWords(cells: CellRange): string {
  const words = cells.slice(1).flat().filter(isText);
  const dated = words.filter((word) => /\d.*[-/.:]\s*\d/.test(word));
  return dated.length < 2
    ? ''
    : `; “${dated[0].trim()}” is text: type times as numbers, or as a date that the sheet knows`;
}

const named = ({ column, heading }: TableColumn): TableColumn => ({ column, heading });

/** Two figures or more, and not a row of headings such as `t / s`, 1, 2, 3. */
function firstRowOfNumbers(cells: CellRange): number {
  const isHeadingRow = (r: number): boolean =>
    cells[r].some(
      (cell, c) =>
        isText(cell) &&
        !isFigure(cell) &&
        readHeading(cell).quantity !== 'unknown' &&
        isFigure(cells[r + 1]?.[c]),
    );
  const holds = (r: number, numbers: number): boolean =>
    cells[r].filter(isFigure).length >= 2 && cells[r].filter(isNumber).length >= numbers && !isHeadingRow(r);
  const rows = cells.map((_, r) => r);
  return rows.find((r) => holds(r, 1)) ?? rows.find((r) => holds(r, 0)) ?? -1;
}

/** At least two figures, and no more words than figures. */
function isNumeric(cells: readonly (CellValue | undefined)[]): boolean {
  const figures = cells.filter(isFigure).length;
  return figures >= 2 && 2 * figures >= cells.filter((cell) => isFigure(cell) || isText(cell)).length;
}

/** The words above the numbers; a row of units is read together with the names above it. */
function headingAbove(cells: CellRange, first: number, place: number, without: string): Heading {
  const [near, far] = [cells[first - 1]?.[place], cells[first - 2]?.[place]];
  if (isText(near) && isText(far) && isUnitOnly(near)) {
    return readHeading(`${far.trim()} / ${near.trim().replace(/^\((.*)\)$/, '$1')}`);
  }
  if (isText(near)) return readHeading(near);
  return { text: isNumber(near) ? String(near) : without, quantity: 'unknown', unit: '' };
}

/** Of `V / mL` that stands once above the names of several runs: it holds as far as the next such heading. */
function unitOfGroup(cells: CellRange, first: number, place: number): string {
  if (!isText(cells[first - 1]?.[place])) return '';
  const group = cells[first - 2]
    ?.slice(0, place + 1)
    .filter(isText)
    .at(-1);
  const { unit } = readHeading(group ?? '');
  return isUnitOnly(unit) ? unit : '';
}

/** The unit that every cell of a column carries itself: `°C` of `21.4 °C` and `25 °C`. */
function commonUnit(cells: readonly (CellValue | undefined)[]): string {
  const units = cells.filter(isText).map((cell) => /[^\d\s.,+−-].*$/.exec(cell.trim())?.[0] ?? '');
  const isOne = units.length > 1 && units.every((unit) => unit === units[0]) && !cells.some(isNumber);
  return isOne && isUnitOnly(units[0]) ? units[0] : '';
}

/** Only where headings say so, or, where there are none, times that rise along the first row alone. */
function standsInRows(block: RangeReading): boolean {
  const [upright, turned] = [gridIn(block, false), gridIn(block, true)];
  if (typeof turned === 'string') return false;
  if (typeof upright === 'string') return true;
  const [down, across] = [wordsIn(upright), wordsIn(turned)];
  if (down > 0 || across > 0) return across > down;
  const [column, row] = [upright, turned].map(({ cells }) => rises(cells.map(([cell]) => cell)));
  return row && (!column || block.area.columns > block.area.rows);
}

/** How much its headings say: of what the readings are taken over, of anything, nothing. */
function wordsIn({ columns, isTurned }: Grid): 0 | 1 | 2 {
  if (columns.some(({ heading }) => ['time', 'temperature'].includes(heading.quantity))) return 2;
  return columns.some(({ column, heading }) => heading.text !== unnamed(column, isTurned)) ? 1 : 0;
}

const rises = (cells: readonly CellValue[]): boolean =>
  cells.every((cell, i) => isNumber(cell) && (i === 0 || cell > Number(cells[i - 1])));
