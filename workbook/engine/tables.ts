/**
 * References to tables, `Run1[Volume]`, spelled out as the cells they mean: the engine needs no tables then.
 * Grammar: [MS-XLSX] and ISO/IEC 29500-1, 18.17.2.3, structured references.
 */
import { areaName, type Area } from '../../functions/address';
import type { BookModel, SheetModel } from './engine';

export interface TableModel {
  readonly name: string;
  readonly sheet: string;
  /** The whole table, head and totals included. */
  readonly area: Area;
  readonly headRows: number;
  readonly totalRows: number;
  /** From left to right. */
  readonly columns: readonly string[];
}

interface Position {
  readonly sheet: string;
  readonly row: number;
}

/** The same workbook without a reference to a table; itself where it has no tables. */
export function withPlainReferences(book: BookModel): BookModel {
  const { tables = [] } = book;
  if (tables.length === 0) return book;
  const inSheet = (sheet: SheetModel): SheetModel => ({
    ...sheet,
    cells: sheet.cells.map((cell) =>
      cell.formula === undefined
        ? cell
        : { ...cell, formula: plainReferences(cell.formula, tables, { sheet: sheet.name, row: cell.row }) },
    ),
  });
  return {
    sheets: book.sheets.map(inSheet),
    names: book.names.map((name) => ({ ...name, refersTo: plainReferences(name.refersTo, tables) })),
  };
}

/** Words and sheet names in quotes, or a table's name with what stands in its brackets, one level deep. */
const references =
  /"(?:[^"]|"")*"|'(?:[^']|'')*'|([A-Z_\\][\w.\\]*)\[((?:'.|\[(?:'.|[^\]'])*\]|[^[\]'])*)\]/gi;

/** @param position where the formula stands, for `[#This Row]`; left out for a name, which stands nowhere */
export function plainReferences(formula: string, tables: readonly TableModel[], position?: Position): string {
  if (!formula.includes('[')) return formula;
  return formula.replace(references, (whole, name?: string, inside = '') => {
    const table = tables.find((t) => t.name.toUpperCase() === name?.toUpperCase());
    if (!table) return whole;
    const area = areaOf(table, inside, position);
    return area ? absolute({ ...area, sheet: table.sheet }) : '#REF!';
  });
}

/** A part in brackets: a column's name, or a word for a part of the table. */
const parts = /\[((?:'.|[^\]'])*)\]|(?:'.|[^[\],:'])+|[:,]/g;

const bare = (column: string): string => column.replace(/'(.)/g, '$1');

function areaOf(table: TableModel, inside: string, position: Position | undefined): Area | undefined {
  const tokens = [...inside.replace(/^@/, '[#This Row],').matchAll(parts)].map(([token, bracketed]) =>
    (bracketed ?? token).trim(),
  );
  const words = tokens.filter((token) => token !== '' && token !== ',' && token !== ':');
  const items = words.filter((word) => word.startsWith('#')).map((word) => word.toUpperCase());
  const columns = words.filter((word) => !word.startsWith('#')).map((word) => placeOf(bare(word), table));
  if (columns.includes(-1)) return undefined;
  const rows = rowsOf(table, items, position);
  if (!rows) return undefined;
  const first = columns.length > 0 ? Math.min(...columns) : 0;
  const last = columns.length > 0 ? Math.max(...columns) : table.area.columns - 1;
  return { ...rows, column: table.area.column + first, columns: last - first + 1 };
}

const placeOf = (column: string, { columns }: TableModel): number =>
  columns.findIndex((name) => name.toUpperCase() === column.toUpperCase());

function rowsOf(
  { area, headRows, totalRows, sheet }: TableModel,
  items: readonly string[],
  position: Position | undefined,
): Pick<Area, 'row' | 'rows'> | undefined {
  const data = { row: area.row + headRows, rows: area.rows - headRows - totalRows };
  const spans = (items.length > 0 ? items : ['#DATA']).map((item) => {
    if (item === '#ALL') return area;
    if (item === '#DATA') return data;
    if (item === '#HEADERS' && headRows > 0) return { row: area.row, rows: headRows };
    if (item === '#TOTALS' && totalRows > 0)
      return { row: area.row + area.rows - totalRows, rows: totalRows };
    const here =
      position && position.sheet === sheet && position.row >= data.row && position.row < data.row + data.rows;
    return item === '#THIS ROW' && here ? { row: position.row, rows: 1 } : undefined;
  });
  if (spans.some((span) => span === undefined || span.rows < 1)) return undefined;
  const known = spans as Pick<Area, 'row' | 'rows'>[];
  const row = Math.min(...known.map((span) => span.row));
  return { row, rows: Math.max(...known.map((span) => span.row + span.rows)) - row };
}

/** `'Gas run'!$B$2:$B$9`, so that nothing moves it. */
const absolute = (area: Area): string => {
  const text = areaName(area);
  const cut = text.lastIndexOf('!') + 1;
  return text.slice(0, cut) + text.slice(cut).replace(/[A-Z]+|\d+/g, '$$$&');
};
