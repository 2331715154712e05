/** A workbook's bytes → a copy of it that needs no add-in. */
import { areaName, quotedSheet } from '../../functions/address';
import { CellError } from '../../functions/cell';
import type { CalculatedBook } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { AddedLooks } from '../xlsx/addLooks';
import { dropCalcChain } from '../xlsx/calcChain';
import { dropUnusedLinks } from '../xlsx/externalLinks';
import { findParts, readXml } from '../xlsx/parts';
import { patchPackage } from '../xlsx/patch';
import { readWorkbook } from '../xlsx/read';
import { stylesIn } from '../xlsx/stylesPart';
import { encodeXml } from '../xlsx/xml';
import { Package } from '../xlsx/zip';
import { checked } from './check';
import { callsElsewhere, type CallElsewhere } from './elsewhere';
import { handFormulas, type HandedFormula } from './handed';
import { mergedCells } from './mergedCells';
import { isOfTheDay, methodSheet, noteText, type Origin } from './methodSheet';
import { freezeNames, frozenNames, type FrozenName } from './names';
import { addNotes } from './notes';
import { rewriteSheet, type RewrittenCell } from './rewriteSheet';
import { dropPane, ownLinks } from './ownReferences';
import { respelled } from './respelled';
import { addSheet } from './sheetPart';
import { dropColumnFormulas } from './tableColumns';
import { WorkingsSheet } from './workings';
import { World } from './world';

export interface HandedOver {
  readonly bytes: Uint8Array;
  /** Formulas that called us. */
  readonly formulas: readonly HandedFormula[];
  /** Names that stood for a formula with one of ours, and now for a value. */
  readonly names: readonly FrozenName[];
  /** Calls of ours that stand in no cell, and stay. */
  readonly elsewhere: readonly CallElsewhere[];
  /** Cells of the whole workbook that show an error, in reading order. */
  readonly errors: CalculatedBook['errors'];
}

/** @throws NotAWorkbook for bytes that are no whole .xlsx workbook */
export async function handOver(bytes: Uint8Array, origin: Origin): Promise<HandedOver> {
  const book = readWorkbook(bytes);
  const calculated = await calculate(book);
  const pack = Package.open(bytes);
  const parts = findParts(pack);
  dropPane(pack);
  const links = ownLinks(pack, parts);
  patchPackage(pack, parts, book, calculated);
  const world = new World(book, calculated);
  const taken = new Set([...parts.sheets, ...parts.otherSheets].map(({ name }) => name.toLowerCase()));
  const aside = new WorkingsSheet(freeName('Workings', taken));
  const { formulas, workings } = await checked(
    handFormulas(world, calculated, mergedCells(pack, parts.sheets), aside),
    world,
    aside,
  );
  const names = await frozenNames(book);
  const elsewhere = callsElsewhere(pack, parts);
  const told = { formulas, names, elsewhere };
  if (formulas.length + names.length + elsewhere.length === 0)
    return { bytes: pack.bytes(), ...told, errors: calculated.errors };
  for (const sheet of parts.sheets) {
    const cells = [
      ...formulas.filter((formula) => formula.sheet === sheet.name).flatMap(cellsOf),
      ...respelled(sheet.name, world, calculated),
    ];
    if (cells.length > 0)
      pack.write(sheet.path, encodeXml(rewriteSheet(readXml(pack, sheet.path), sheet.path, cells)));
    const notes = formulas
      .filter((formula) => formula.sheet === sheet.name && isOfTheDay(formula))
      .map((formula) => ({ row: formula.row, column: formula.column, text: noteText(formula, origin) }));
    if (notes.length > 0) addNotes(pack, sheet, notes);
  }
  const looks = new AddedLooks(pack, stylesIn(pack, parts));
  addSheet(pack, parts, methodSheet(freeName('Method', taken), told, world, origin), looks);
  if (workings) addSheet(pack, parts, workings, looks);
  looks.write();
  freezeNames(pack, parts.workbook, names);
  dropColumnFormulas(pack, parts);
  dropCalcChain(pack, parts);
  dropUnusedLinks(pack, parts.workbook, links);
  return { bytes: pack.bytes(), ...told, errors: calculated.errors };
}

function cellsOf({ row, column, said, values }: HandedFormula): RewrittenCell[] {
  return values.flatMap((line, r) =>
    line.map((value, c): RewrittenCell => {
      const formula = said?.[r][c];
      return { row: row + r, column: column + c, value, ...(formula === undefined ? {} : { formula }) };
    }),
  );
}

function freeName(wanted: string, taken: ReadonlySet<string>): string {
  for (let n = 1; ; n++) {
    const name = n === 1 ? wanted : `${wanted} ${n}`;
    if (!taken.has(name.toLowerCase())) return name;
  }
}

/** `'Gas run'!C5:C24`. */
export const placeOf = ({ sheet, area }: HandedFormula): string => `${quotedSheet(sheet)}!${areaName(area)}`;

export const showsError = ({ values }: HandedFormula): boolean => values[0][0] instanceof CellError;
