/** A workbook's own package with new values in it; every part that holds none of them stays byte for byte. */
import type { BookModel, CalculatedBook } from '../engine/engine';
import { dynamicArrayMark } from './dynamicArrays';
import { applyEdits, type Edit } from './edits';
import { findParts, readXml, relationshipsPath, type WorkbookParts } from './parts';
import { patchSheet } from './patchSheet';
import { readSharedStrings } from './sharedStrings';
import { encodeXml, localName, scanXml } from './xml';
import { Package } from './zip';

/**
 * @param bytes the file as it was read
 * @param book what was read from it
 * @returns the same package with what the calculation found
 * @throws NotAWorkbook
 */
export function patchWorkbook(bytes: Uint8Array, book: BookModel, calculated: CalculatedBook): Uint8Array {
  const pack = Package.open(bytes);
  const parts = findParts(pack);
  const sharedStrings = readSharedStrings(pack, parts.sharedStrings);
  let mark: string | undefined;
  let newArrays = false;
  for (const { name, path } of parts.sheets) {
    const typed = formulasOf(book, name);
    if (typed.size === 0) continue;
    const before = readXml(pack, path);
    const after = patchSheet(before, path, {
      formula: (row, column) => calculated.formula(name, row, column),
      shown: (row, column) => calculated.shown(name, row, column),
      typed: (row, column) => typed.get(`${row},${column}`),
      sharedStrings,
      spillMark: () => (mark ??= dynamicArrayMark(pack, parts)),
    });
    newArrays ||= after.newArrays;
    if (after.xml !== before) pack.write(path, encodeXml(after.xml));
  }
  if (newArrays) dropCalcChain(pack, parts);
  return pack.bytes();
}

function formulasOf(book: BookModel, sheet: string): Map<string, string> {
  const cells = book.sheets.find(({ name }) => name === sheet)?.cells ?? [];
  return new Map(
    cells.flatMap(({ row, column, formula }) =>
      formula === undefined ? [] : [[`${row},${column}`, formula]],
    ),
  );
}

/**
 * The calculation chain says of each formula whether it is an array. Where a plain one became an array
 * it would be false, and Excel asks to repair such a file; without a chain it makes a new one.
 */
function dropCalcChain(pack: Package, { workbook, calcChain }: WorkbookParts): void {
  if (calcChain === undefined || !pack.has(calcChain)) return;
  pack.remove(calcChain);
  dropElements(pack, '[Content_Types].xml', ({ PartName }) => PartName === `/${calcChain}`);
  dropElements(pack, relationshipsPath(workbook), ({ Type }) => Type?.endsWith('/calcChain'));
}

function dropElements(
  pack: Package,
  path: string,
  unwanted: (attributes: Readonly<Record<string, string>>) => boolean | undefined,
): void {
  const xml = readXml(pack, path);
  const edits: Edit[] = [];
  let start = -1;
  scanXml(xml, path, {
    open: ({ attributes }, end) => {
      start = unwanted(attributes) ? xml.lastIndexOf('<', end - 1) : -1;
    },
    close: ({ name }, end) => {
      if (start >= 0 && /^(?:Override|Relationship)$/.test(localName(name)))
        edits.push({ start, end, text: '' });
      start = -1;
    },
  });
  pack.write(path, encodeXml(applyEdits(xml, edits)));
}
