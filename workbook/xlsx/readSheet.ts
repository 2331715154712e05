/** What was typed into a sheet, read cell by cell: nothing of the XML around them is kept. */
import { columnIndex, parseArea, type Area } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import type { CellModel, SheetModel } from '../engine/engine';
import { daysFrom1900, daysFrom1904, filedErrors, filedValue } from './cellXml';
import { countsDays, reachesOutside } from './outside';
import { callsOurs, typedFormula } from './formulaText';
import { withIntersections } from './intersection';
import { SharedFormulas } from './sharedFormulas';
import { childOf, scanSheet, type ScannedCell, type ScannedChild, type ScannedWidth } from './sheetScan';
import type { CellLook } from './styles';

export interface SheetContext {
  /** Names, in capitals, that lead out of the workbook. */
  readonly outsideNames: ReadonlySet<string>;
  readonly sharedStrings: readonly string[];
  /** Dates count days from 1904, and formulas here would take them for such from 1900. */
  readonly is1904: boolean;
  readonly looks: readonly CellLook[];
}

/** @throws NotAWorkbook where the XML is not well formed */
export function readSheet(
  xml: string,
  part: string,
  context: SheetContext,
): Pick<SheetModel, 'cells' | 'columnWidths'> {
  const cells: CellModel[] = [];
  const shared = new SharedFormulas();
  const spills = new Spills();
  const { widths } = scanSheet(xml, part, (scanned) => {
    const own = childOf(scanned, 'f');
    const formula = own === undefined ? '' : formulaOf(scanned, own, shared);
    const isOutside = formula !== '' && needsOthers(formula, context);
    if (own?.attributes.t === 'array' && !isOutside) spills.add(own.attributes.ref);
    // nobody typed what another cell's formula spilled
    if (formula !== '' || !spills.cover(scanned)) {
      const cell = cellModel(scanned, formula, isOutside, context);
      if (cell) cells.push(cell);
    }
    return false;
  });
  const columnWidths = widthsByColumn(widths, cells);
  return { cells, ...(Object.keys(columnWidths).length > 0 ? { columnWidths } : {}) };
}

const needsOthers = (formula: string, { outsideNames, is1904 }: SheetContext): boolean =>
  reachesOutside(formula, outsideNames) || (is1904 && countsDays(formula));

/** A plain formula takes one cell of a range where it wants one value; ours are meant as they would be typed. */
function formulaOf(cell: ScannedCell, own: ScannedChild, shared: SharedFormulas): string {
  const filed = shared.textOf(cell, own);
  if (filed === '') return '';
  const typed = typedFormula(filed);
  return own.attributes.t === 'array' || callsOurs(typed) ? typed : withIntersections(typed);
}

function cellModel(
  scanned: ScannedCell,
  formula: string,
  isOutside: boolean,
  { sharedStrings, looks, is1904 }: SheetContext,
): CellModel | undefined {
  const { row, column, attributes } = scanned;
  const { bold, wrap, numberFormat } = looks[Number(attributes.s ?? 0)] ?? {};
  const value = valueOf(scanned, sharedStrings, is1904 ? daysFrom1904 : daysFrom1900);
  if (value === null && formula === '' && !bold && !wrap && numberFormat === undefined) return undefined;
  const plain: CellModel = { row, column, value };
  // nearly every cell of a large sheet: a spread would make it larger
  if (formula === '' && numberFormat === undefined && !bold && !wrap) return plain;
  return {
    ...plain,
    ...(formula === '' ? {} : isOutside && value !== null ? { outsideFormula: formula } : { formula }),
    ...(numberFormat === undefined ? {} : { numberFormat }),
    ...(bold ? { bold } : {}),
    ...(wrap ? { wrap } : {}),
  };
}

/** Errors that no file should hold are read as #VALUE!, as Excel itself writes them. */
function valueOf(cell: ScannedCell, sharedStrings: readonly string[], dayZero: number): CellValue {
  const value = filedValue(cell, sharedStrings, dayZero);
  if (value instanceof CellError && !filedErrors.has(value.code))
    return new CellError((value.code as string) === '#GETTING_DATA' ? '#BUSY!' : '#VALUE!');
  return value;
}

/** Areas that array formulas fill, forgotten once the rows below them are read. */
class Spills {
  private areas: Area[] = [];
  private row = -1;

  add(ref: string | undefined): void {
    const area = parseArea(ref ?? '');
    if (area && area.rows * area.columns > 1) this.areas.push(area);
  }

  cover({ row, column }: ScannedCell): boolean {
    if (row !== this.row) this.areas = this.areas.filter((area) => row < area.row + area.rows);
    this.row = row;
    return this.areas.some((area) => column >= area.column && column < area.column + area.columns);
  }
}

/** One entry can stand for all columns to the end of the sheet: those in use, or in sight, are enough. */
function widthsByColumn(
  widths: readonly ScannedWidth[],
  cells: readonly CellModel[],
): Record<number, number> {
  const lastUsed = cells.reduce((last, { column }) => Math.max(last, column), columnIndex('Z'));
  const list: Record<number, number> = {};
  for (const { first, last, width } of widths) {
    for (let column = first; column <= Math.min(last, lastUsed); column++) list[column] = width;
  }
  return list;
}
