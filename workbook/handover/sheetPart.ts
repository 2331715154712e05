/** A sheet of our own at the end of a workbook, whose other parts stay as they are. */
import { cellName } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { addPart, freePath, relate } from '../xlsx/addPart';
import { cellXml } from '../xlsx/cellXml';
import { applyEdits, insertion, type Edit } from '../xlsx/edits';
import { namespacesOf } from '../xlsx/namespaces';
import { elementsIn, readXml, type WorkbookParts } from '../xlsx/parts';
import { encodeXml, localName, scanXml, tagStart, xmlAttribute, xmlText } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';
import { formulaElement } from './rewriteSheet';

/** A value, a heading, or a formula with what it shows. */
export type SheetCell =
  CellValue | { readonly heading: string } | { readonly formula: string; readonly value: CellValue };

export interface NewSheet {
  readonly name: string;
  readonly rows: readonly (readonly SheetCell[])[];
  /** In characters, from the first column on. */
  readonly widths: readonly number[];
}

const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const sheetType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml';

export function addSheet(pack: Package, parts: WorkbookParts, sheet: NewSheet): void {
  const folder = parts.workbook.slice(0, parts.workbook.lastIndexOf('/') + 1);
  const path = freePath(pack, `${folder}worksheets/sheet`, '.xml');
  const { main, office } = namespacesOf(readXml(pack, parts.workbook));
  addPart(pack, path, sheetXml(sheet, main), sheetType);
  const id = relate(pack, parts.workbook, path, `${office}/worksheet`);
  const taken = elementsIn(pack, parts.workbook).filter(({ name }) => name === 'sheet');
  const number = taken.reduce((most, { attributes }) => Math.max(most, Number(attributes.sheetId)), 0) + 1;
  const xml = readXml(pack, parts.workbook);
  const edits: Edit[] = [];
  scanXml(xml, parts.workbook, {
    open: () => undefined,
    close({ name }, end) {
      if (localName(name) !== 'sheets') return;
      const prefix = name.slice(0, name.length - localName(name).length);
      const element = `<${prefix}sheet xmlns:r="${office}" name="${xmlAttribute(sheet.name)}" sheetId="${number}" r:id="${id}"/>`;
      edits.push(insertion(tagStart(xml, end), element));
    },
  });
  pack.write(parts.workbook, encodeXml(applyEdits(xml, edits)));
}

function sheetXml({ rows, widths }: NewSheet, main: string): string {
  const columns = widths.map(
    (width, n) => `<col min="${n + 1}" max="${n + 1}" width="${width}" customWidth="1"/>`,
  );
  const data = rows.map(
    (cells, row) =>
      `<row r="${row + 1}">${cells.map((cell, column) => newCell(cell, row, column)).join('')}</row>`,
  );
  // printed across, as wide as a page
  return `${head}<worksheet xmlns="${main}"><sheetPr><pageSetUpPr fitToPage="1"/></sheetPr><cols>${columns.join('')}</cols><sheetData>${data.join('')}</sheetData><pageSetup orientation="landscape" fitToHeight="0"/></worksheet>`;
}

function newCell(cell: SheetCell, row: number, column: number): string {
  if (cell === null || cell === '') return '';
  if (typeof cell === 'string') return textCell(`<t xml:space="preserve">${xmlText(cell)}</t>`, row, column);
  if (typeof cell !== 'object' || cell instanceof CellError)
    return cellXml({ prefix: '', row, column, value: cell });
  // bold within the text itself: the workbook's own styles stay as they are
  if ('heading' in cell)
    return textCell(
      `<r><rPr><b/></rPr><t xml:space="preserve">${xmlText(cell.heading)}</t></r>`,
      row,
      column,
    );
  return cellXml({
    prefix: '',
    row,
    column,
    value: cell.value,
    formula: formulaElement('', row, column, cell.formula),
  });
}

const textCell = (inside: string, row: number, column: number): string =>
  `<c r="${cellName(row, column)}" t="inlineStr"><is>${inside}</is></c>`;
