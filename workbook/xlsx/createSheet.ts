/** A sheet of a new file. */
import { areaName } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { isSpill, type CalculatedBook, type CellModel, type SheetModel } from '../engine/engine';
import { cellXml, formulaXml } from './cellXml';
import type { LookTable } from './createStyles';
import { callsOurs, filedFormula } from './formulaText';
import { transitional } from './namespaces';
import { xmlText } from './xml';

export interface CreatedSheet {
  readonly xml: string;
  /** Some cell is marked as one that can spill. */
  readonly marked: boolean;
}

interface Place {
  readonly row: number;
  readonly column: number;
  readonly xml: string;
}

export function createSheet(sheet: SheetModel, calculated: CalculatedBook, looks: LookTable): CreatedSheet {
  const places = new Map<string, Place>();
  let marked = false;
  const own = new Map(sheet.cells.map((cell) => [`${cell.row},${cell.column}`, cell]));
  const put = (place: Place): void => void places.set(`${place.row},${place.column}`, place);

  for (const cell of sheet.cells.filter(({ formula }) => formula === undefined)) put(typedCell(cell, looks));
  for (const cell of sheet.cells.filter(({ formula }) => formula !== undefined)) {
    const outcome = calculated.formula(sheet.name, cell.row, cell.column);
    const spill = outcome?.spill ?? { rows: 1, columns: 1 };
    const spills = isSpill(outcome);
    // Excel cuts a plain formula down to one value: what spills, or could, says so
    const dynamic = spills || callsOurs(cell.formula!);
    marked ||= dynamic;
    put(formulaCell(cell, outcome?.value ?? null, { ...cell, ...spill }, dynamic, looks));
    for (let row = cell.row; row < cell.row + spill.rows; row++) {
      for (let column = cell.column; column < cell.column + spill.columns; column++) {
        if (row === cell.row && column === cell.column) continue;
        const value = calculated.shown(sheet.name, row, column);
        const attributes = looks.attributes(own.get(`${row},${column}`) ?? cell);
        put({ row, column, xml: cellXml({ prefix: '', row, column, value, attributes }) });
      }
    }
  }
  const ordered = [...places.values()].sort((a, b) => a.row - b.row || a.column - b.column);
  return {
    // printed across, as wide as a page
    xml: `<worksheet xmlns="${transitional.main}"><sheetPr><pageSetUpPr fitToPage="1"/></sheetPr>${dimension(ordered)}${columns(sheet)}<sheetData>${rows(ordered)}</sheetData><pageSetup orientation="landscape" fitToHeight="0"/></worksheet>`,
    marked,
  };
}

/** Words stand in the cell itself; a table of shared texts would only save room. */
function typedCell(cell: CellModel, looks: LookTable): Place {
  const { row, column, value } = cell;
  const attributes = looks.attributes(cell);
  if (typeof value !== 'string')
    return { row, column, xml: cellXml({ prefix: '', row, column, value, attributes }) };
  const empty = cellXml({ prefix: '', row, column, value: null, attributes });
  const text = `<is><t xml:space="preserve">${xmlText(value)}</t></is>`;
  return { row, column, xml: empty.replace(/\/>$/, ` t="inlineStr">${text}</c>`) };
}

function formulaCell(
  cell: CellModel,
  value: CellValue,
  area: { row: number; column: number; rows: number; columns: number },
  dynamic: boolean,
  looks: LookTable,
): Place {
  const { row, column } = cell;
  const { row: r, column: c, rows: height, columns: width } = area;
  const ref = areaName({ row: r, column: c, rows: height, columns: width });
  return {
    row,
    column,
    xml: cellXml({
      prefix: '',
      row,
      column,
      value: value instanceof CellError || value !== null ? value : 0,
      attributes: { ...looks.attributes(cell), ...(dynamic ? { cm: '1' } : {}) },
      formula: formulaXml(
        '',
        dynamic ? { t: 'array', ref } : {},
        filedFormula(cell.formula!, dynamic ? 'array' : 'plain'),
      ),
    }),
  };
}

function dimension(places: readonly Place[]): string {
  if (places.length === 0) return '<dimension ref="A1"/>';
  const least = (of: (place: Place) => number): number =>
    places.reduce((n, place) => Math.min(n, of(place)), Infinity);
  const most = (of: (place: Place) => number): number =>
    places.reduce((n, place) => Math.max(n, of(place)), 0);
  const row = least((p) => p.row);
  const column = least((p) => p.column);
  const area = {
    row,
    column,
    rows: most((p) => p.row) - row + 1,
    columns: most((p) => p.column) - column + 1,
  };
  return `<dimension ref="${areaName(area)}"/>`;
}

function columns({ columnWidths = {} }: SheetModel): string {
  const list = Object.entries(columnWidths).map(
    ([column, width]) =>
      `<col min="${Number(column) + 1}" max="${Number(column) + 1}" width="${width}" customWidth="1"/>`,
  );
  return list.length > 0 ? `<cols>${list.join('')}</cols>` : '';
}

function rows(ordered: readonly Place[]): string {
  const byRow = new Map<number, string[]>();
  for (const { row, xml } of ordered) {
    const cells = byRow.get(row) ?? [];
    cells.push(xml);
    byRow.set(row, cells);
  }
  return [...byRow].map(([row, cells]) => `<row r="${row + 1}">${cells.join('')}</row>`).join('');
}
