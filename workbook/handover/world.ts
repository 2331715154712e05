/** What a formula can see of its workbook on the day of the copy: values, names, tables and how far results spilled. */
import { areaName, parseArea, type Area } from '../../functions/address';
import type { CellRange } from '../../functions/cell';
import { isFunction, isOperator, isRange, isReference, type Token } from '@borgar/fx/xlsx';
import { isEmptyCell, type BookModel, type CalculatedBook } from '../engine/engine';
import { plainReferences } from '../engine/tables';
import { applyEdits, type Edit } from '../xlsx/edits';
import { callsOurs } from '../xlsx/formulaText';
import { tokensOf } from './calls';

/** Where a formula stands. */
export interface Position {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/** It reads what stands in no reference. */
const wanders = (token: Token): boolean =>
  isFunction(token) ? /^(?:OFFSET|INDIRECT)$/i.test(token.value) : isOperator(token) && token.value === ':';

/** What it comes to depends on where it stands. */
const isOfItsPlace = (token: Token): boolean =>
  isFunction(token)
    ? /^(?:ROW|COLUMN|CELL|SHEET|INDIRECT)$/i.test(token.value)
    : isOperator(token) && token.value === '@';

export class World {
  private readonly cells = new Map<string, CellRange>();

  constructor(
    readonly book: BookModel,
    private readonly calculated: CalculatedBook,
  ) {}

  /** The formula with tables and `F2#` spelled out as the cells they mean: results have a fixed size in the copy. */
  spelledOut(formula: string, position: Position): string {
    return this.withoutSpills(
      plainReferences(formula, this.book.tables ?? [], position),
      position,
      () => true,
    );
  }

  /** The formula with only those `F2#` spelled out whose F2 calls one of our functions. */
  withoutOurSpills(formula: string, position: Position): string {
    return this.withoutSpills(formula, position, (sheet, { row, column }) => {
      const cells = this.book.sheets.find(({ name }) => name === sheet)?.cells ?? [];
      const anchor = cells.find((cell) => cell.row === row && cell.column === column);
      return anchor?.formula !== undefined && callsOurs(anchor.formula);
    });
  }

  private withoutSpills(
    formula: string,
    { sheet }: Position,
    wanted: (sheet: string, area: Area) => boolean,
  ): string {
    if (!formula.includes('#')) return formula;
    const tokens = tokensOf(formula);
    const edits = tokens.flatMap((token, at): Edit[] => {
      const hash = tokens[at + 1];
      if (!isRange(token) || !hash || !isOperator(hash) || hash.value !== '#') return [];
      const anchor = parseArea(token.value);
      if (!anchor || anchor.rows * anchor.columns > 1 || !wanted(anchor.sheet ?? sheet, anchor)) return [];
      const { row, column } = anchor;
      const spill = { ...anchor, ...this.spillAt({ sheet: anchor.sheet ?? sheet, row, column }) };
      return [{ start: token.loc[0], end: hash.loc[1], text: areaName(spill) }];
    });
    return applyEdits(formula, edits);
  }

  /** The cells that a formula's result covers. */
  spillAt({ sheet, row, column }: Position): Area {
    const spill = this.calculated.formula(sheet, row, column)?.spill ?? { rows: 1, columns: 1 };
    return { row, column, ...spill };
  }

  /** The area a reference or a name means; its sheet only where that is named. */
  areaOf(text: string, sheet: string): Area | undefined {
    const area = parseArea(text);
    if (area) return area;
    const name = this.nameOf(text, sheet);
    return name === undefined ? undefined : parseArea(name);
  }

  /** An expression as any other sheet has to spell it; `undefined` where it means something else there. */
  fromAfar(text: string, sheet: string): string | undefined {
    const tokens = tokensOf(text);
    if (tokens.some(isOfItsPlace)) return undefined;
    const edits: Edit[] = [];
    for (const { value, loc } of tokens.filter((token) => isReference(token))) {
      const area = this.areaOf(value, sheet);
      if (!area) return undefined;
      edits.push({ start: loc[0], end: loc[1], text: areaName({ sheet, ...area }) });
    }
    return applyEdits(text, edits);
  }

  /** Every area that a formula names. */
  areasIn(formula: string, sheet: string): Area[] {
    const areas = this.referencesIn(formula, sheet).flatMap((area) => area ?? []);
    return [...new Map(areas.map((area) => [areaName(area), area])).values()];
  }

  /** Every area that a formula as it is typed can read; `undefined` where only working it out would tell. */
  reads(formula: string, position: Position): Area[] | undefined {
    const text = this.spelledOut(formula, position);
    const areas = this.referencesIn(text, position.sheet);
    const isTold = (area: Area | undefined): area is Area => area !== undefined;
    return areas.every(isTold) && !tokensOf(text).some(wanders) ? areas : undefined;
  }

  private referencesIn(text: string, sheet: string): (Area | undefined)[] {
    return tokensOf(text)
      .filter((token) => isReference(token))
      .map(({ value }) => this.areaOf(value, sheet) ?? this.lineOf(value, sheet));
  }

  /** Formulas of one column mostly read the same cells: looked up once. */
  cellsIn(area: Area, sheet: string): CellRange {
    const place = areaName({ ...area, sheet: area.sheet ?? sheet });
    const cells = this.cells.get(place) ?? this.lookUp(area, sheet);
    this.cells.set(place, cells);
    return cells;
  }

  private lookUp(area: Area, sheet: string): CellRange {
    return Array.from({ length: area.rows }, (_, r) =>
      Array.from({ length: area.columns }, (__, c) =>
        this.calculated.shown(area.sheet ?? sheet, area.row + r, area.column + c),
      ),
    );
  }

  private nameOf(text: string, sheet: string): string | undefined {
    const fits = this.book.names.filter(({ name }) => name.toUpperCase() === text.toUpperCase());
    const found = fits.find((name) => name.sheet === sheet) ?? fits.find((name) => name.sheet === undefined);
    return found?.refersTo;
  }

  /** `A:B`, down to the last row in use. */
  private lineOf(text: string, sheet: string): Area | undefined {
    const [, place = '', first, last] = /^(.*!)?\$?([A-Z]{1,3}):\$?([A-Z]{1,3})$/i.exec(text) ?? [];
    if (first === undefined) return undefined;
    const named = parseArea(`${place}A1`)?.sheet;
    const cells = this.book.sheets.find(({ name }) => name === (named ?? sheet))?.cells ?? [];
    const rows = cells
      .filter((cell) => !isEmptyCell(cell))
      .reduce((most, { row }) => Math.max(most, row + 1), 1);
    return parseArea(`${place}${first}1:${last}${rows}`);
  }
}
