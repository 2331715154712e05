/** One sheet's XML with its formulas' new values; whatever did not change stays as it was, to the letter. */
import { areaName, parseArea, type Area } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { isSpill, type Calculated } from '../engine/engine';
import { applyEdits, type Edit } from './edits';
import { cellXml, filedValue, formulaXml, showsAlready } from './cellXml';
import { filedFormula, withFiledNames } from './formulaText';
import { placeCells, type NewCell } from './placeCells';
import { childOf, scanSheet, type ScannedCell, type ScannedChild, type ScannedSheet } from './sheetScan';
import { plainText } from './xml';

export interface SheetToPatch {
  /** The outcome of the formula in this cell, if one stands there. */
  formula(row: number, column: number): Calculated | undefined;
  shown(row: number, column: number): CellValue;
  /** The formula as typed, with what a shared formula means in this cell spelled out. */
  typed(row: number, column: number): string | undefined;
  readonly sharedStrings: readonly string[];
  /** The `cm` of a cell that spills; asked for only when one is needed. */
  spillMark(): string;
}

export interface PatchedSheet {
  readonly xml: string;
  /** A plain formula became one that spills. */
  readonly newArrays: boolean;
}

export function patchSheet(xml: string, part: string, sheet: SheetToPatch): PatchedSheet {
  return new SheetPatch(xml, scanSheet(xml, part, reached(sheet)), sheet).result();
}

/** Formulas, and cells behind one in rows that it has filled or fills now: no others can change. */
function reached(sheet: SheetToPatch): (cell: ScannedCell) => boolean {
  let lastRow = -1;
  return (cell) => {
    const formula = childOf(cell, 'f');
    if (formula === undefined) return cell.row <= lastRow;
    const before = areaBefore({ ...cell, formula });
    const spill = sheet.formula(cell.row, cell.column)?.spill ?? { rows: 1 };
    lastRow = Math.max(lastRow, cell.row + Math.max(before.rows, spill.rows) - 1);
    return true;
  };
}

const key = (row: number, column: number): string => `${row},${column}`;

type FormulaCell = ScannedCell & { readonly formula: ScannedChild };

class SheetPatch {
  private readonly cells = new Map<string, ScannedCell>();
  private readonly formulas: FormulaCell[];
  /** Shared formulas one of whose cells now spills: each of their cells gets a formula of its own. */
  private readonly unshared: ReadonlySet<string>;
  /** Rows where a cell tells its column only by following another. */
  private readonly counting: ReadonlySet<number>;
  private readonly edits: Edit[] = [];
  private readonly added: NewCell[] = [];
  private newArrays = false;

  constructor(
    private readonly xml: string,
    private readonly scanned: ScannedSheet,
    private readonly sheet: SheetToPatch,
  ) {
    for (const row of scanned.rows)
      for (const cell of row.cells) this.cells.set(key(cell.row, cell.column), cell);
    this.counting = new Set(scanned.rows.filter((row) => row.countsCells).map(({ row }) => row));
    this.formulas = [...this.cells.values()].flatMap((cell) => {
      const formula = childOf(cell, 'f');
      return formula && sheet.formula(cell.row, cell.column) ? [{ ...cell, formula }] : [];
    });
    this.unshared = new Set(
      this.formulas
        .filter(({ row, column, formula }) => formula.attributes.t === 'shared' && this.spills(row, column))
        .map(({ formula }) => formula.attributes.si),
    );
  }

  result(): PatchedSheet {
    const covered = new Map<string, CellValue>();
    const before = new Set<string>();
    for (const cell of this.formulas) {
      const area = this.areaAfter(cell);
      each(areaBefore(cell), (row, column) => before.add(key(row, column)));
      each(area, (row, column) => covered.set(key(row, column), this.valueAt(cell, area, row, column)));
      this.formula(cell, area, covered.get(key(cell.row, cell.column))!);
    }
    for (const cell of this.formulas)
      for (const places of [before, covered]) places.delete(key(cell.row, cell.column));
    for (const [place, value] of covered) this.spilled(place, value);
    for (const place of before) if (!covered.has(place)) this.emptied(place);
    this.edits.push(...placeCells(this.xml, this.scanned, this.added));
    return { xml: applyEdits(this.xml, this.edits), newArrays: this.newArrays };
  }

  private spills(row: number, column: number): boolean {
    return isSpill(this.sheet.formula(row, column));
  }

  /** An array formula of fixed size keeps its cells, whatever it answers. */
  private areaAfter(cell: FormulaCell): Area {
    if (isFixed(cell)) return areaBefore(cell);
    return { row: cell.row, column: cell.column, ...this.sheet.formula(cell.row, cell.column)!.spill };
  }

  private valueAt(cell: FormulaCell, area: Area, row: number, column: number): CellValue {
    const { value, spill } = this.sheet.formula(cell.row, cell.column)!;
    if (row === cell.row && column === cell.column) return value;
    if (!isFixed(cell)) return this.sheet.shown(row, column);
    // one value, row or column fills the whole size; beyond a result of its own size there is #N/A
    const r = spill.rows === 1 ? 0 : row - area.row;
    const c = spill.columns === 1 ? 0 : column - area.column;
    if (r >= spill.rows || c >= spill.columns) return new CellError('#N/A');
    return r === 0 && c === 0 ? value : this.sheet.shown(area.row + r, area.column + c);
  }

  private formula(cell: FormulaCell, area: Area, value: CellValue): void {
    const { formula, attributes } = cell;
    const { prefix } = this.scanned;
    const element = this.formulaElement(cell, area);
    if (element === undefined && showsAlready(filedValue(cell, this.sheet.sharedStrings), value)) return;
    const { vm: _valueMark, ...kept } = attributes;
    const spilling = element !== undefined && element.marks ? { ...kept, cm: this.sheet.spillMark() } : kept;
    const text = element?.xml ?? this.xml.slice(formula.start, formula.end);
    this.replace(
      cell,
      cellXml({ prefix, ...cell, attributes: spilling, formula: text, value, rest: this.rest(cell) }),
    );
  }

  /** `undefined` where the formula can stay as it is. */
  private formulaElement(cell: FormulaCell, area: Area): { xml: string; marks: boolean } | undefined {
    const { formula, row, column } = cell;
    const { t: kind, ...attributes } = formula.attributes;
    const { prefix } = this.scanned;
    const filed = plainText(formula.text);
    const text = withFiledNames(filed);
    const ref = areaName({ row, column, rows: area.rows, columns: area.columns });
    if (kind === 'array') {
      if (text === filed && sameArea(areaBefore(cell), area)) return undefined;
      return { xml: formulaXml(prefix, { ...formula.attributes, ref }, text), marks: false };
    }
    const shared = kind === 'shared' && !this.unshared.has(attributes.si);
    // typed by hand into the file, or answering more than one cell: what Excel calls a dynamic array
    if (!shared && (this.spills(row, column) || text !== filed)) {
      const own = kind === 'shared' ? filedFormula(this.sheet.typed(row, column)!, 'array') : text;
      const { si: _shared, ref: _ref, ...others } = attributes;
      this.newArrays = true;
      return { xml: formulaXml(prefix, { ...others, t: 'array', ref }, own), marks: true };
    }
    if (kind === 'shared' && !shared) {
      const own = filedFormula(this.sheet.typed(row, column)!);
      return { xml: formulaXml(prefix, {}, own), marks: false };
    }
    return text === filed ? undefined : { xml: formulaXml(prefix, formula.attributes, text), marks: false };
  }

  private spilled(place: string, value: CellValue): void {
    const cell = this.cells.get(place);
    const { prefix } = this.scanned;
    if (!cell) {
      const [row, column] = place.split(',').map(Number);
      this.added.push({ row, column, xml: cellXml({ prefix, row, column, value }) });
    } else if (!showsAlready(filedValue(cell, this.sheet.sharedStrings), value)) {
      const { vm: _valueMark, ...attributes } = cell.attributes;
      this.replace(cell, cellXml({ prefix, ...cell, attributes, value, rest: this.rest(cell) }));
    }
  }

  /** The spill has left this cell: its look stays, if it has one. */
  private emptied(place: string): void {
    const cell = this.cells.get(place);
    if (!cell) return;
    const { vm: _valueMark, cm: _cellMark, ...attributes } = cell.attributes;
    const bare =
      Object.keys(attributes).every((name) => name === 'r' || name === 't') && !this.counting.has(cell.row);
    this.replace(
      cell,
      bare ? '' : cellXml({ prefix: this.scanned.prefix, ...cell, attributes, value: null }),
    );
  }

  private rest(cell: ScannedCell): string {
    const others = cell.children.filter(({ name }) => name !== 'f' && name !== 'v' && name !== 'is');
    return others.map(({ start, end }) => this.xml.slice(start, end)).join('');
  }

  private replace({ start, end }: ScannedCell, text: string): void {
    this.edits.push({ start, end, text });
  }
}

const isArray = ({ formula }: FormulaCell): boolean => formula.attributes.t === 'array';

const isFixed = (cell: FormulaCell): boolean => isArray(cell) && cell.attributes.cm === undefined;

function areaBefore(cell: FormulaCell): Area {
  const area = isArray(cell) ? parseArea(cell.formula.attributes.ref ?? '') : undefined;
  return area ?? { row: cell.row, column: cell.column, rows: 1, columns: 1 };
}

const sameArea = (a: Area, b: Area): boolean => a.rows === b.rows && a.columns === b.columns;

function each(area: Area, visit: (row: number, column: number) => void): void {
  for (let row = area.row; row < area.row + area.rows; row++) {
    for (let column = area.column; column < area.column + area.columns; column++) visit(row, column);
  }
}
