/** A new .xlsx file from a workbook and its calculation, such as Excel itself would save. */
import { zipSync, type Zippable } from 'fflate';
import type { BookModel, CalculatedBook } from '../engine/engine';
import { createSheet } from './createSheet';
import { LookTable } from './createStyles';
import { metadataContentType, metadataPart, metadataRelationship } from './dynamicArrays';
import { filedFormula } from './formulaText';
import { transitional } from './namespaces';
import { encodeXml, xmlAttribute, xmlText } from './xml';

const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const package_ = 'http://schemas.openxmlformats.org/package/2006';
const spreadsheet = 'application/vnd.openxmlformats-officedocument.spreadsheetml';
const { main, office } = transitional;

/** The same workbook gives the same bytes, on any day: the zip's earliest date. */
const noTime = new Date(1980, 0, 1);

export function createWorkbook(book: BookModel, calculated: CalculatedBook): Uint8Array {
  const looks = new LookTable();
  const sheets = book.sheets.map((sheet) => createSheet(sheet, calculated, looks));
  const spills = sheets.some((sheet) => sheet.marked);
  const files: Record<string, string> = {
    '[Content_Types].xml': contentTypes(sheets.length, spills),
    '_rels/.rels': relationships([{ type: `${office}/officeDocument`, target: 'xl/workbook.xml' }]),
    'xl/workbook.xml': workbookXml(book),
    'xl/_rels/workbook.xml.rels': relationships([
      ...sheets.map((_, place) => ({
        type: `${office}/worksheet`,
        target: `worksheets/sheet${place + 1}.xml`,
      })),
      { type: `${office}/styles`, target: 'styles.xml' },
      ...(spills ? [{ type: metadataRelationship(office), target: 'metadata.xml' }] : []),
    ]),
    ...Object.fromEntries(
      sheets.map(({ xml }, place) => [`xl/worksheets/sheet${place + 1}.xml`, head + xml]),
    ),
    'xl/styles.xml': head + looks.xml(main),
    ...(spills ? { 'xl/metadata.xml': metadataPart(main) } : {}),
  };
  const entries = Object.entries(files).map(
    ([name, xml]) => [name, [encodeXml(xml), { mtime: noTime }]] as const,
  );
  return zipSync(Object.fromEntries(entries) as unknown as Zippable);
}

function contentTypes(sheets: number, spills: boolean): string {
  const override = (part: string, type: string): string =>
    `<Override PartName="/xl/${part}" ContentType="${type}"/>`;
  const overrides = [
    override('workbook.xml', `${spreadsheet}.sheet.main+xml`),
    ...Array.from({ length: sheets }, (_, n) =>
      override(`worksheets/sheet${n + 1}.xml`, `${spreadsheet}.worksheet+xml`),
    ),
    override('styles.xml', `${spreadsheet}.styles+xml`),
    ...(spills ? [override('metadata.xml', metadataContentType)] : []),
  ];
  return `${head}<Types xmlns="${package_}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/>${overrides.join('')}</Types>`;
}

function relationships(list: readonly { type: string; target: string }[]): string {
  const each = list.map(
    ({ type, target }, n) => `<Relationship Id="rId${n + 1}" Type="${type}" Target="${target}"/>`,
  );
  return `${head}<Relationships xmlns="${package_}/relationships">${each.join('')}</Relationships>`;
}

function workbookXml({ sheets, names }: BookModel): string {
  const sheetList = sheets.map(
    ({ name }, n) => `<sheet name="${xmlAttribute(name)}" sheetId="${n + 1}" r:id="rId${n + 1}"/>`,
  );
  const nameList = names.map(({ name, refersTo, sheet }) => {
    const local = sheet === undefined ? '' : ` localSheetId="${sheets.findIndex((s) => s.name === sheet)}"`;
    return `<definedName name="${xmlAttribute(name)}"${local}>${xmlText(filedFormula(refersTo))}</definedName>`;
  });
  const definedNames = nameList.length > 0 ? `<definedNames>${nameList.join('')}</definedNames>` : '';
  return `${head}<workbook xmlns="${main}" xmlns:r="${office}"><sheets>${sheetList.join('')}</sheets>${definedNames}</workbook>`;
}
