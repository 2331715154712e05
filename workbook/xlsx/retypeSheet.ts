/** One sheet's XML with other things typed into some of its cells; all else stays as it was, to the letter. */
import { cellName, parseArea } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { cellXml, formulaXml } from './cellXml';
import { applyEdits, type Edit } from './edits';
import { callsOurs, filedFormula } from './formulaText';
import { placeCells, type NewCell } from './placeCells';
import { childOf, scanSheet, type ScannedCell, type ScannedSheet } from './sheetScan';

/** What stands in a cell now; `null` and no formula is nothing. */
export interface Change {
  readonly row: number;
  readonly column: number;
  readonly value: CellValue;
  readonly formula?: string;
}

export interface Retyping {
  readonly changes: readonly Change[];
  /** The formula typed in a cell now. */
  typed(row: number, column: number): string | undefined;
  /** The `cm` of a cell that may spill; asked for only when one is needed. */
  spillMark(): string;
}

const key = (row: number, column: number): string => `${row},${column}`;

export function retypeSheet(xml: string, part: string, retyping: Retyping): string {
  const sheet = scanSheet(xml, part);
  const cells = new Map(
    sheet.rows.flatMap((row) => row.cells).map((cell) => [key(cell.row, cell.column), cell]),
  );
  const changes = new Map(retyping.changes.map((change) => [key(change.row, change.column), change]));
  for (const change of [...leftBehind(changes, cells), ...losingTheirMaster(changes, cells, retyping)]) {
    if (!changes.has(key(change.row, change.column))) changes.set(key(change.row, change.column), change);
  }
  const edits: Edit[] = [];
  const added: NewCell[] = [];
  for (const [place, change] of changes) {
    const cell = cells.get(place);
    if (cell) edits.push(replaced(xml, sheet, cell, change, retyping));
    else if (change.formula !== undefined || change.value !== null) {
      const { row, column } = change;
      added.push({ row, column, xml: written(sheet.prefix, change, {}, retyping) });
    }
  }
  return applyEdits(xml, [...edits, ...placeCells(xml, sheet, added)]);
}

/** Values that spilled from a formula which is no longer there. */
function leftBehind(changes: ReadonlyMap<string, Change>, cells: ReadonlyMap<string, ScannedCell>): Change[] {
  return [...changes.keys()].flatMap((place) => {
    const formula = cells.get(place) && childOf(cells.get(place)!, 'f');
    const area = formula?.attributes.t === 'array' ? parseArea(formula.attributes.ref ?? '') : undefined;
    if (!area) return [];
    return Array.from({ length: area.rows * area.columns }, (_, n) => ({
      row: area.row + Math.floor(n / area.columns),
      column: area.column + (n % area.columns),
      value: null,
    }));
  });
}

/** Cells that share a formula spelled out in one that changes: each gets its own. */
function losingTheirMaster(
  changes: ReadonlyMap<string, Change>,
  cells: ReadonlyMap<string, ScannedCell>,
  { typed }: Retyping,
): Change[] {
  const shared = (cell: ScannedCell | undefined): string | undefined => {
    const formula = cell && childOf(cell, 'f');
    return formula?.attributes.t === 'shared' ? formula.attributes.si : undefined;
  };
  const masters = new Set([...changes.keys()].map((place) => shared(cells.get(place))));
  masters.delete(undefined);
  if (masters.size === 0) return [];
  return [...cells.values()].flatMap(({ row, column, ...cell }) => {
    const formula = typed(row, column);
    const loses = masters.has(shared({ row, column, ...cell }));
    return loses && formula !== undefined ? [{ row, column, value: null, formula }] : [];
  });
}

function replaced(
  xml: string,
  sheet: ScannedSheet,
  cell: ScannedCell,
  change: Change,
  retyping: Retyping,
): Edit {
  const { cm: _cellMark, vm: _valueMark, ...attributes } = cell.attributes;
  const isEmpty = change.formula === undefined && change.value === null;
  const isBare = Object.keys(attributes).every((name) => name === 'r' || name === 't');
  const counts = sheet.rows.find(({ row }) => row === cell.row)?.countsCells;
  if (isEmpty && isBare && !counts) return { start: cell.start, end: cell.end, text: '' };
  const rest = cell.children
    .filter(({ name }) => name !== 'f' && name !== 'v' && name !== 'is')
    .map(({ start, end }) => xml.slice(start, end))
    .join('');
  return {
    start: cell.start,
    end: cell.end,
    text: written(sheet.prefix, change, attributes, retyping, rest),
  };
}

function written(
  prefix: string,
  { row, column, value, formula }: Change,
  attributes: Readonly<Record<string, string>>,
  { spillMark }: Retyping,
  rest = '',
): string {
  if (formula === undefined) return cellXml({ prefix, row, column, attributes, value, rest });
  // Excel would cut the answer of a function it does not know down to one cell, were it not marked
  const spills = callsOurs(formula);
  return cellXml({
    prefix,
    row,
    column,
    attributes: spills ? { ...attributes, cm: spillMark() } : attributes,
    formula: formulaXml(
      prefix,
      spills ? { t: 'array', ref: cellName(row, column) } : {},
      filedFormula(formula),
    ),
    value: null,
    rest,
  });
}
