/** A file's bytes → the workbook: what was typed into its cells. Values of formulas are what the file last showed. */
import { read, type CellObject, type WorkBook, type WorkSheet } from '@e965/xlsx';
import { cellName, columnIndex } from '../../functions/address';
import { CellError, type CellValue, type ErrorCode } from '../../functions/cell';
import type { BookModel, CellModel, DefinedName, SheetModel } from '../engine/engine';
import { callsOurs, typedFormula } from './formulaText';
import { withIntersections } from './intersection';
import { NotAWorkbook } from './notAWorkbook';
import { findParts, readXml } from './parts';
import { childOf, scanSheet, type ScannedCell, type ScannedSheet } from './sheetScan';
import { readLooks, type CellLook } from './styles';
import { readTables } from './tables';
import { Package } from './zip';

/** @throws NotAWorkbook with the reason, for what is not a whole .xlsx workbook */
export function readWorkbook(bytes: Uint8Array): BookModel {
  refuseOtherKinds(bytes);
  const pack = Package.open(bytes);
  const parts = findParts(pack);
  const library = readByLibrary(bytes);
  const looks = readLooks(pack, parts.styles);
  const tables = readTables(pack, parts.sheets);
  return {
    sheets: parts.sheets.map(({ name, path }) => {
      const sheet = library.Sheets[name];
      // the library passes over a sheet that it stumbles at
      if (!sheet) throw new NotAWorkbook(`a sheet cannot be read: ${name}`);
      return sheetModel(name, sheet, scanSheet(readXml(pack, path), path), looks);
    }),
    names: definedNames(library),
    ...(tables.length > 0 ? { tables } : {}),
  };
}

/** The first bytes tell the kind; the name of a file can lie. */
function refuseOtherKinds(bytes: Uint8Array): void {
  const starts = (...head: number[]): boolean => head.every((byte, place) => bytes[place] === byte);
  if (bytes.length === 0) throw new NotAWorkbook('the file is empty');
  if (starts(0xd0, 0xcf, 0x11, 0xe0)) {
    throw new NotAWorkbook(
      'the file is protected with a password, or in the old .xls form: save it as .xlsx without a password first',
    );
  }
  if (!starts(0x50, 0x4b))
    throw new NotAWorkbook('the file is not an .xlsx workbook: that is a zip package, and this is not');
}

function readByLibrary(bytes: Uint8Array): WorkBook {
  try {
    return read(bytes, {
      type: 'array',
      cellFormula: true,
      xlfn: true,
      cellNF: true,
      sheetStubs: true,
      cellText: false,
      cellHTML: false,
    });
  } catch (error) {
    throw new NotAWorkbook(
      `the workbook cannot be read: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}

function sheetModel(
  name: string,
  sheet: WorkSheet,
  scanned: ScannedSheet,
  looks: readonly CellLook[],
): SheetModel {
  const cells = scanned.rows.flatMap((row) => row.cells);
  const widths = columnWidths(scanned);
  return {
    name,
    cells: cells.flatMap((cell) =>
      cellModel(cell, sheet[cellName(cell.row, cell.column)] as CellObject | undefined, looks),
    ),
    ...(Object.keys(widths).length > 0 ? { columnWidths: widths } : {}),
  };
}

/** One entry can stand for all columns to the end of the sheet: those in use, or in sight, are enough. */
function columnWidths({ rows, widths }: ScannedSheet): Record<number, number> {
  const lastUsed = rows.reduce(
    (last, row) => Math.max(last, row.cells.at(-1)?.column ?? 0),
    columnIndex('Z'),
  );
  const list: Record<number, number> = {};
  for (const { first, last, width } of widths) {
    for (let column = first; column <= Math.min(last, lastUsed); column++) list[column] = width;
  }
  return list;
}

/** A cell that another's formula spilled into is left out: nobody typed it. */
function cellModel(
  scanned: ScannedCell,
  cell: CellObject | undefined,
  looks: readonly CellLook[],
): CellModel[] {
  const { row, column, attributes } = scanned;
  if (!cell || (cell.F !== undefined && cell.f === undefined)) return [];
  const look = looks[Number(attributes.s ?? 0)];
  const value = valueOf(cell);
  if (value === null && !cell.f && !look?.bold && !look?.wrap) return [];
  return [
    {
      row,
      column,
      value,
      ...(cell.f ? { formula: formulaOf(cell.f, scanned) } : {}),
      ...(typeof cell.z === 'string' && cell.z !== 'General' ? { numberFormat: cell.z } : {}),
      ...(look?.bold ? { bold: true } : {}),
      ...(look?.wrap ? { wrap: true } : {}),
    },
  ];
}

/** A plain formula takes one cell of a range where it wants one value; ours are meant as they would be typed. */
function formulaOf(filed: string, cell: ScannedCell): string {
  const typed = typedFormula(filed);
  const isArray = childOf(cell, 'f')?.attributes.t === 'array';
  return isArray || callsOurs(typed) ? typed : withIntersections(typed);
}

/** The library's numbers for errors ([MS-XLS] 2.5.10, BErr). */
const errorCodes: Readonly<Record<number, ErrorCode>> = {
  0: '#NULL!',
  7: '#DIV/0!',
  15: '#VALUE!',
  23: '#REF!',
  29: '#NAME?',
  36: '#NUM!',
  42: '#N/A',
  43: '#BUSY!',
};

function valueOf({ t: type, v: value }: CellObject): CellValue {
  if (type === 'e') return new CellError(errorCodes[value as number] ?? '#VALUE!');
  if (type === 'z' || value === undefined || value instanceof Date) return null;
  return value;
}

/** Names that Excel keeps for itself (print areas, filters) are no formulas of anybody's. */
function definedNames({ Workbook, SheetNames }: WorkBook): DefinedName[] {
  return (Workbook?.Names ?? [])
    .filter(({ Name, Ref }) => Ref && !Name.startsWith('_xlnm.'))
    .map(({ Name, Ref, Sheet }) => ({
      name: Name,
      refersTo: typedFormula(Ref),
      ...(Sheet === undefined ? {} : { sheet: SheetNames[Sheet] }),
    }));
}
