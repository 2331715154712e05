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
  const next = rows.find(({ row }) => row > number);
  const cells = added.map((cell) => cell.xml).join('');
  return insertion(
    next?.start ?? data!.contentEnd,
    `<${prefix}row r="${number + 1}">${cells}</${prefix}row>`,
  );
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
  const row = Math.min(area.row, ...cells.map((cell) => cell.row));
  const column = Math.min(area.column, ...cells.map((cell) => cell.column));
  const lastRow = Math.max(area.row + area.rows - 1, ...cells.map((cell) => cell.row));
  const lastColumn = Math.max(area.column + area.columns - 1, ...cells.map((cell) => cell.column));
  const ref = areaName({ row, column, rows: lastRow - row + 1, columns: lastColumn - column + 1 });
  if (ref === sheet.dimension.ref) return [];
  return [{ ...sheet.dimension, text: `<${sheet.prefix}dimension ref="${ref}"/>` }];
}
