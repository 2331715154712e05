/** A sheet of our own at the end of a workbook, whose other parts stay as they are. */
import type { AddedLooks } from '../xlsx/addLooks';
import { addPart, freePath, relate } from '../xlsx/addPart';
import { applyEdits, insertion, type Edit } from '../xlsx/edits';
import { namespacesOf } from '../xlsx/namespaces';
import { elementsIn, readXml, type WorkbookParts } from '../xlsx/parts';
import { encodeXml, localName, scanXml, tagStart, xmlAttribute } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';
import { newSheetXml, type NewSheet } from './newSheet';

const sheetType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml';

export function addSheet(pack: Package, parts: WorkbookParts, sheet: NewSheet, looks: AddedLooks): void {
  const folder = parts.workbook.slice(0, parts.workbook.lastIndexOf('/') + 1);
  const path = freePath(pack, `${folder}worksheets/sheet`, '.xml');
  const { main, office } = namespacesOf(readXml(pack, parts.workbook));
  addPart(pack, path, newSheetXml(sheet, looks, main), sheetType);
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
