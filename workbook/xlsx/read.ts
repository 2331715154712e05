/** A file's bytes → the workbook: what was typed into its cells. Values of formulas are what the file last showed. */
import type { BookModel, DefinedName } from '../engine/engine';
import { namesReachingOutside } from './outside';
import { typedFormula } from './formulaText';
import { NotAWorkbook } from './notAWorkbook';
import { refuseOtherKinds, refuseOtherPackages } from './otherKinds';
import { elementsIn, findParts, readXml } from './parts';
import { readSheet } from './readSheet';
import { readSharedStrings } from './sharedStrings';
import { isOn, readLooks } from './styles';
import { readTables } from './tables';
import { plainText } from './xml';
import { Package } from './zip';

/** @throws NotAWorkbook with the reason, for what is not a whole .xlsx workbook */
export function readWorkbook(bytes: Uint8Array): BookModel {
  refuseOtherKinds(bytes);
  const pack = Package.open(bytes);
  refuseOtherPackages(pack);
  const parts = findParts(pack);
  if (parts.sheets.length === 0)
    throw new NotAWorkbook('the workbook has no sheet with cells: there is nothing to calculate');
  const names = definedNames(pack, parts.workbook);
  const context = {
    outsideNames: namesReachingOutside(names),
    is1904: elementsIn(pack, parts.workbook).some(
      ({ name, attributes }) => name === 'workbookPr' && isOn(attributes.date1904 ?? '0'),
    ),
    sharedStrings: readSharedStrings(pack, parts.sharedStrings),
    looks: readLooks(pack, parts.styles),
  };
  const tables = readTables(pack, parts.sheets);
  return {
    sheets: parts.sheets.map(({ name, path }) => ({
      name,
      ...readSheet(readXml(pack, path), path, context),
    })),
    names,
    ...(tables.length > 0 ? { tables } : {}),
  };
}

/** Names that Excel keeps for itself (print areas, filters) are no formulas of anybody's. */
export const isReservedName = (name: string): boolean => name.startsWith('_xlnm.');

function definedNames(pack: Package, workbook: string): DefinedName[] {
  const elements = elementsIn(pack, workbook);
  const sheets = elements.filter(({ name }) => name === 'sheet').map(({ attributes }) => attributes.name);
  return elements
    .filter(({ name, attributes }) => name === 'definedName' && !isReservedName(attributes.name))
    .filter(({ text }) => text !== '')
    .map(({ attributes: { name, localSheetId }, text }) => ({
      name,
      refersTo: typedFormula(plainText(text)),
      ...(localSheetId === undefined ? {} : { sheet: sheets[Number(localSheetId)] }),
    }));
}
