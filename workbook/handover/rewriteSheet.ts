/** One sheet's XML with the formulas that called us in their new form; all else stays as it was, to the letter. */
import { cellName } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { cellXml, formulaXml } from '../xlsx/cellXml';
import { applyEdits, type Edit } from '../xlsx/edits';
import { filedFormula } from '../xlsx/formulaText';
import { placeCells, type NewCell } from '../xlsx/placeCells';
import { scanSheet } from '../xlsx/sheetScan';
import { isArrayFormula } from './arrayFormula';

export interface RewrittenCell {
  readonly row: number;
  readonly column: number;
  readonly value: CellValue;
  /** As typed, without `=`; left out for a cell that keeps its value alone. */
  readonly formula?: string;
  /** A formula of the workbook's own, whose result may spill as it did. */
  readonly keepsForm?: boolean;
}

export function rewriteSheet(xml: string, part: string, cells: readonly RewrittenCell[]): string {
  const rows = new Set(cells.map(({ row }) => row));
  const sheet = scanSheet(xml, part, ({ row }) => rows.has(row));
  const wanted = new Map(cells.map((cell) => [`${cell.row},${cell.column}`, cell]));
  const edits: Edit[] = [];
  for (const scanned of sheet.rows.flatMap((row) => row.cells)) {
    const cell = wanted.get(`${scanned.row},${scanned.column}`);
    if (!cell) continue;
    wanted.delete(`${scanned.row},${scanned.column}`);
    const rest = scanned.children
      .filter(({ name }) => name !== 'f' && name !== 'v' && name !== 'is')
      .map(({ start, end }) => xml.slice(start, end))
      .join('');
    const own = scanned.children.find(({ name }) => name === 'f');
    const { cm, vm: _valueMark, ...attributes } = scanned.attributes;
    const kept = cell.keepsForm && cm !== undefined ? { ...attributes, cm } : attributes;
    const form = cell.keepsForm ? own?.attributes : undefined;
    edits.push({
      start: scanned.start,
      end: scanned.end,
      text: written(sheet.prefix, cell, kept, rest, form),
    });
  }
  const added = [...wanted.values()].map((cell): NewCell => ({
    row: cell.row,
    column: cell.column,
    xml: written(sheet.prefix, cell, {}, ''),
  }));
  return applyEdits(xml, [...edits, ...placeCells(xml, sheet, added)]);
}

function written(
  prefix: string,
  { row, column, value, formula }: RewrittenCell,
  attributes: Readonly<Record<string, string>>,
  rest: string,
  form?: Readonly<Record<string, string>>,
): string {
  return cellXml({
    prefix,
    row,
    column,
    attributes,
    value,
    rest,
    ...(formula === undefined ? {} : { formula: formulaElement(prefix, row, column, formula, form) }),
  });
}

/** @param form attributes that the formula has already and keeps */
export function formulaElement(
  prefix: string,
  row: number,
  column: number,
  formula: string,
  form?: Readonly<Record<string, string>>,
): string {
  const isArray = form ? form.t === 'array' : isArrayFormula(formula);
  const attributes: Readonly<Record<string, string>> =
    form ?? (isArray ? { t: 'array', ref: cellName(row, column) } : {});
  return formulaXml(prefix, attributes, filedFormula(formula, isArray ? 'array' : 'plain'));
}
