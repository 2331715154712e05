/** New cells in a sheet's XML: each in its row and column, with rows of their own where there are none. */
import { areaName, parseArea } from '../../functions/address';
import { insertion, type Edit } from './edits';
import type { Holder, ScannedRow, ScannedSheet } from './sheetScan';

export interface NewCell {
  readonly row: number;
  readonly column: number;
  readonly xml: string;
}

export function placeCells(xml: string, sheet: ScannedSheet, cells: readonly NewCell[]): Edit[] {
  if (cells.length === 0 || !sheet.data) return [];
  const byRow = new Map<number, NewCell[]>();
  for (const cell of [...cells].sort((a, b) => a.row - b.row || a.column - b.column)) {
    byRow.set(cell.row, [...(byRow.get(cell.row) ?? []), cell]);
  }
  const newRows: Edit[] = [];
  const edits: Edit[] = [];
  const rows = new Map(sheet.rows.map((row) => [row.row, row]));
  for (const [number, added] of byRow) {
    const row = rows.get(number);
    if (row) edits.push(...intoRow(xml, row, added, sheet.prefix));
    else newRows.push(newRow(sheet, number, added));
  }
  edits.push(...(sheet.data.closed ? openedUp(xml, sheet.data, newRows) : newRows));
  return [...edits, ...dimension(sheet, cells)];
}

function intoRow(xml: string, row: ScannedRow, added: readonly NewCell[], prefix: string): Edit[] {
  if (row.closed) {
    const open = xml.slice(row.start, row.end).replace(/\s*\/>$/, '>');
    const cells = added.map((cell) => cell.xml).join('');
    return [{ start: row.start, end: row.end, text: `${open}${cells}</${prefix}row>` }];
  }
  return added.map((cell) => {
    const next = row.cells.find(({ column }) => column > cell.column);
    return insertion(next?.start ?? row.contentEnd, cell.xml);
  });
}

function newRow({ prefix, rows, data }: ScannedSheet, number: number, added: readonly NewCell[]): Edit {
  const next = rows[firstAfter(rows, number)];
  const cells = added.map((cell) => cell.xml).join('');
  return insertion(
    next?.start ?? data!.contentEnd,
    `<${prefix}row r="${number + 1}">${cells}</${prefix}row>`,
  );
}

/** Rows stand in order; a long spill asks for as many places as it has rows. */
function firstAfter(rows: readonly ScannedRow[], number: number): number {
  let low = 0;
  let high = rows.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (rows[middle].row > number) high = middle;
    else low = middle + 1;
  }
  return low;
}

/** `<sheetData/>` had room for nothing. */
function openedUp(xml: string, { start, end }: Holder, rows: readonly Edit[]): Edit[] {
  const tag = xml.slice(start, end).replace(/\s*\/>$/, '');
  const name = tag.slice(1).split(/\s/)[0];
  return [{ start, end, text: `${tag}>${rows.map(({ text }) => text).join('')}</${name}>` }];
}

/** The used area in the sheet's head must hold every cell. */
function dimension(sheet: ScannedSheet, cells: readonly NewCell[]): Edit[] {
  const area = sheet.dimension && parseArea(sheet.dimension.ref);
  if (!sheet.dimension || !area) return [];
  const rows = cells.map((cell) => cell.row).concat(area.row, area.row + area.rows - 1);
  const columns = cells.map((cell) => cell.column).concat(area.column, area.column + area.columns - 1);
  const row = least(rows);
  const column = least(columns);
  const ref = areaName({ row, column, rows: most(rows) - row + 1, columns: most(columns) - column + 1 });
  if (ref === sheet.dimension.ref) return [];
  return [{ ...sheet.dimension, text: `<${sheet.prefix}dimension ref="${ref}"/>` }];
}

/** Spread into Math.min, a long spill would overflow the stack. */
const least = (numbers: readonly number[]): number => numbers.reduce((a, b) => Math.min(a, b));
const most = (numbers: readonly number[]): number => numbers.reduce((a, b) => Math.max(a, b));
