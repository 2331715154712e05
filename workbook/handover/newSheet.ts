/** A sheet of our own, for the copy: its cells, and how they look. */
import { areaName, cellName } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { exponentOf } from '../../functions/format';
import type { AddedLook, AddedLooks } from '../xlsx/addLooks';
import { cellXml } from '../xlsx/cellXml';
import { xmlText } from '../xlsx/xml';
import { formulaElement } from './rewriteSheet';
import { wrapped } from './wrapped';

/** A value, a heading, or a formula with what it shows. */
export type SheetCell =
  CellValue | { readonly heading: string } | { readonly formula: string; readonly value: CellValue };

export interface SheetColumn {
  /** In characters. */
  readonly width: number;
  /** Long words go on in a further line, and not over the next column. */
  readonly wraps?: boolean;
  /** Numbers in it are shown to the last digit. */
  readonly isExact?: boolean;
}

export interface NewSheet {
  readonly name: string;
  readonly rows: readonly (readonly SheetCell[])[];
  /** From the first on. */
  readonly columns: readonly SheetColumn[];
  /** Rows at the top that stay in sight. */
  readonly fixedRows?: number;
  /** Words of a formula that shall catch the eye. */
  readonly warnings: readonly string[];
}

const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';

export function newSheetXml(sheet: NewSheet, looks: AddedLooks, main: string): string {
  const { rows, columns } = sheet;
  const widths = columns.map(
    ({ width }, n) => `<col min="${n + 1}" max="${n + 1}" width="${width}" customWidth="1"/>`,
  );
  const data = rows.map((cells, row) => {
    const all = cells.map((cell, column) =>
      newCell(cell, row, column, looks.look(lookOf(sheet, row, column))),
    );
    return `<row r="${row + 1}"${heightXml(sheet, row)}>${all.join('')}</row>`;
  });
  return [
    `${head}<worksheet xmlns="${main}"><sheetPr><pageSetUpPr fitToPage="1"/></sheetPr>`,
    viewXml(sheet),
    `<cols>${widths.join('')}</cols><sheetData>${data.join('')}</sheetData>`,
    warningsXml(sheet, looks),
    // printed across, as wide as a page, with its name and the page below
    '<pageMargins left="0.4" right="0.4" top="0.5" bottom="0.6" header="0.3" footer="0.3"/>',
    '<pageSetup orientation="landscape" fitToHeight="0"/>',
    '<headerFooter><oddFooter>&amp;L&amp;A&amp;R&amp;P / &amp;N</oddFooter></headerFooter></worksheet>',
  ].join('');
}

function viewXml({ fixedRows }: NewSheet): string {
  if (!fixedRows) return '';
  const first = cellName(fixedRows, 0);
  return `<sheetViews><sheetView workbookViewId="0"><pane ySplit="${fixedRows}" topLeftCell="${first}" activePane="bottomLeft" state="frozen"/><selection pane="bottomLeft" activeCell="${first}" sqref="${first}"/></sheetView></sheetViews>`;
}

function warningsXml({ rows, columns, warnings }: NewSheet, looks: AddedLooks): string {
  const everywhere = areaName({ row: 0, column: 0, rows: rows.length, columns: columns.length });
  const rules = warnings.map(
    (words, n) =>
      `<cfRule type="cellIs" dxfId="${looks.warning()}" priority="${n + 1}" operator="equal"><formula>"${xmlText(words)}"</formula></cfRule>`,
  );
  return `<conditionalFormatting sqref="${everywhere}">${rules.join('')}</conditionalFormatting>`;
}

/** Not every program finds out by itself how high wrapped words stand. */
function heightXml(sheet: NewSheet, row: number): string {
  const lines = sheet.rows[row].map((cell, column) => {
    const shown = shownIn(cell);
    if (typeof shown !== 'string' || !lookOf(sheet, row, column).wrap) return 1;
    // a width is counted in figures: words are narrower, unless they are bold or a formula's
    const isWide = isHeading(cell) || shown.startsWith('=');
    const width = Math.floor((sheet.columns[column].width - 1) * (isWide ? 1 : 1.2));
    return wrapped(shown, width).reduce((sum, line) => sum + Math.ceil(line.length / width), 0);
  });
  const most = Math.max(1, ...lines);
  return most === 1 ? '' : ` ht="${most * lineHeight}" customHeight="1"`;
}

/** In points. */
const lineHeight = 15;

/** Headings stand as what is below them does; words after a number are set clear of it. */
function lookOf({ rows, columns }: NewSheet, row: number, column: number): AddedLook {
  const cell = rows[row][column];
  const shown = shownIn(cell);
  if (typeof shown === 'number')
    return { numberFormat: columns[column]?.isExact ? undefined : formatOf(shown), vertical: 'top' };
  const isAlone = rows[row].length === 1;
  const isNumber = (at: number): boolean => !isAlone && typeof firstBelow(rows, row, at) === 'number';
  const isRight = isHeading(cell) && isNumber(column);
  return {
    ...(isHeading(cell) ? { bold: true } : {}),
    ...(!isAlone && (isHeading(cell) || columns[column]?.wraps) ? { wrap: true } : {}),
    ...(isRight ? { align: 'right' } : isNumber(column - 1) ? { align: 'left', indent: 1 } : {}),
    vertical: isHeading(cell) ? 'bottom' : 'top',
  };
}

/** What stands there, or below a heading; a run may begin with a row that has nothing to say. */
function firstBelow(rows: NewSheet['rows'], row: number, column: number): CellValue {
  const cell = rows[row]?.[column] ?? null;
  if (!isHeading(cell)) return shownIn(cell);
  const below = [1, 2].map((n) => shownIn(rows[row + n]?.[column] ?? null));
  return below.find((value) => value !== null && value !== '') ?? null;
}

const digits = 6;

/** Numbers with more digits than a reader wants are shown with fewer. */
function formatOf(value: number): string | undefined {
  if (Number(value.toPrecision(digits)) === value) return undefined;
  const exponent = exponentOf(value);
  if (exponent < -4 || exponent >= digits) return `0.${'0'.repeat(digits - 1)}E+00`;
  return exponent === digits - 1 ? '0' : `0.${'0'.repeat(digits - 1 - exponent)}`;
}

const isHeading = (cell: SheetCell): cell is { readonly heading: string } =>
  typeof cell === 'object' && cell !== null && 'heading' in cell;

function shownIn(cell: SheetCell): CellValue {
  if (typeof cell !== 'object' || cell === null || cell instanceof CellError) return cell;
  return 'heading' in cell ? cell.heading : cell.value;
}

function newCell(cell: SheetCell, row: number, column: number, look: number): string {
  if (cell === null || cell === '') return '';
  const place = { prefix: '', row, column, attributes: { s: String(look) } };
  if (typeof cell === 'object' && !(cell instanceof CellError) && 'formula' in cell)
    return cellXml({
      ...place,
      value: cell.value,
      formula: formulaElement('', row, column, cell.formula),
    });
  const value = shownIn(cell);
  if (typeof value !== 'string') return cellXml({ ...place, value });
  const text = `<is><t xml:space="preserve">${xmlText(value)}</t></is>`;
  return `<c r="${cellName(row, column)}" s="${look}" t="inlineStr">${text}</c>`;
}
