/** What was typed since a workbook was opened, and the number formats given since, put into its own package. */
import { CellError } from '../../functions/cell';
import { isEmptyCell, type BookModel, type CellModel, type SheetModel } from '../engine/engine';
import { AddedNumberFormats } from './addNumberFormats';
import { dropCalcChain } from './calcChain';
import { dynamicArrayMark } from './dynamicArrays';
import { plainNumber } from './formatCodes';
import { findParts, readXml } from './parts';
import { restyleSheet, type Restyling } from './restyleSheet';
import { retypeSheet, type Change } from './retypeSheet';
import { stylesIn } from './stylesPart';
import { encodeXml } from './xml';
import { Package } from './zip';

/**
 * @param bytes the file as it was opened
 * @param before what was typed in it then
 * @param now the same sheets as they are typed now
 * @returns the package with the typed cells in it; formulas among them have no values yet
 * @throws NotAWorkbook
 */
export function typeCells(bytes: Uint8Array, before: BookModel, now: BookModel): Uint8Array {
  const pack = Package.open(bytes);
  const parts = findParts(pack);
  let mark: string | undefined;
  let formats: AddedNumberFormats | undefined;
  let isChanged = false;
  for (const { name, path } of parts.sheets) {
    const [was, typed] = [typedIn(before, name), typedIn(now, name)];
    const restyled = restyledFrom(was, typed);
    const changes = changesFrom(was, typed);
    if (changes.length > 0) {
      isChanged = true;
      const xml = retypeSheet(readXml(pack, path), path, {
        changes,
        typed: (row, column) => typed.get(placeOf({ row, column }))?.formula,
        spillMark: () => (mark ??= dynamicArrayMark(pack, parts)),
      });
      pack.write(path, encodeXml(xml));
    }
    if (restyled.length > 0) {
      const all = (formats ??= new AddedNumberFormats(pack, stylesIn(pack, parts)));
      const xml = restyleSheet(readXml(pack, path), path, restyled, (own, format) => all.look(own, format));
      pack.write(path, encodeXml(xml));
    }
  }
  formats?.write();
  if (isChanged) dropCalcChain(pack, parts);
  return pack.bytes();
}

const placeOf = ({ row, column }: { readonly row: number; readonly column: number }): string =>
  `${row},${column}`;

type Typed = ReadonlyMap<string, CellModel>;

function typedIn(book: BookModel, name: string): Typed {
  const sheet: SheetModel | undefined = book.sheets.find((one) => one.name === name);
  return new Map((sheet?.cells ?? []).map((cell) => [placeOf(cell), cell]));
}

function changesFrom(before: Typed, now: Typed): Change[] {
  const typed = [...now.values()].filter((cell) => !isSameTyping(before.get(placeOf(cell)), cell));
  const emptied = [...before.values()].filter((cell) => !isEmptyCell(cell) && !now.has(placeOf(cell)));
  return [...typed, ...emptied.map(({ row, column }) => ({ row, column, value: null }))];
}

/** A cell that is new and plain has the look of its file's plain cells already. */
function restyledFrom(before: Typed, now: Typed): Restyling[] {
  return [...new Map([...before, ...now])].flatMap(([place, { row, column }]) => {
    const numberFormat = now.get(place)?.numberFormat;
    if (before.get(place)?.numberFormat === numberFormat) return [];
    return [{ row, column, numberFormat: numberFormat ?? plainNumber }];
  });
}

function isSameTyping(a: CellModel | undefined, b: CellModel): boolean {
  if (a === undefined) return isEmptyCell(b);
  if (a.formula !== undefined || b.formula !== undefined) return a.formula === b.formula;
  if (a.value instanceof CellError && b.value instanceof CellError) return a.value.code === b.value.code;
  return a.value === b.value;
}
