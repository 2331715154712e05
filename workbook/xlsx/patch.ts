/** A workbook's own package with new values in it; every part that holds none of them stays byte for byte. */
import type { BookModel, CalculatedBook } from '../engine/engine';
import { dropCalcChain } from './calcChain';
import { dynamicArrayMark } from './dynamicArrays';
import { findParts, readXml, type WorkbookParts } from './parts';
import { patchSheet } from './patchSheet';
import { readSharedStrings } from './sharedStrings';
import { encodeXml } from './xml';
import { Package } from './zip';

/**
 * @param bytes the file as it was read
 * @param book what was read from it
 * @returns the same package with what the calculation found
 * @throws NotAWorkbook
 */
export function patchWorkbook(bytes: Uint8Array, book: BookModel, calculated: CalculatedBook): Uint8Array {
  const pack = Package.open(bytes);
  patchPackage(pack, findParts(pack), book, calculated);
  return pack.bytes();
}

/** The same in a package that is open already. @throws NotAWorkbook */
export function patchPackage(
  pack: Package,
  parts: WorkbookParts,
  book: BookModel,
  calculated: CalculatedBook,
): void {
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
}

function formulasOf(book: BookModel, sheet: string): Map<string, string> {
  const cells = book.sheets.find(({ name }) => name === sheet)?.cells ?? [];
  return new Map(
    cells
      .filter(({ formula }) => formula !== undefined)
      .map(({ row, column, formula }) => [`${row},${column}`, formula!]),
  );
}
