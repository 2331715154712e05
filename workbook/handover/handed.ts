/** What becomes of each formula that calls our functions: live in built-in functions, or frozen to its value. */
import type { Area } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { NotSaid, type OfTheDay } from '../../functions/builtIn/said';
import type { CellFunction } from '../../functions/define';
import { isSpill, type CalculatedBook } from '../engine/engine';
import { callsOurs } from '../xlsx/formulaText';
import { isArrayFormula } from './arrayFormula';
import { allCalls, callsIn } from './calls';
import { sayFormula, type Scene } from './say';
import { FitWatch } from './fits';
import type { WorkingsSheet } from './workings';
import type { Position, World } from './world';

export interface HandedFormula extends Position {
  /** As it was typed, without `=`. */
  readonly original: string;
  /** Ours that it calls, in their order. */
  readonly functions: readonly CellFunction[];
  readonly area: Area;
  /** What its cells show, row by row. */
  readonly values: readonly (readonly CellValue[])[];
  /** The formula of each cell in built-in functions, row by row; nothing where it is frozen. */
  readonly said?: readonly (readonly string[])[];
  /** What in it stays as it was on the day of the copy, although it is live. */
  readonly ofTheDay?: OfTheDay;
  /** Why it is frozen. */
  readonly why?: string;
  /** Where the fits of a frozen formula stand, with whether they still fit. */
  readonly fits?: readonly string[];
}

/** @param merged whether a cell is one of several that were merged, where no array formula may stand */
export function handFormulas(
  world: World,
  calculated: CalculatedBook,
  merged: (position: Position) => boolean,
  workings: WorkingsSheet,
): HandedFormula[] {
  const book = { calculated, merged, watch: new FitWatch() };
  return world.book.sheets.flatMap(({ name: sheet, cells }) =>
    cells.flatMap(({ row, column, value, formula, outsideFormula }) => {
      const position = { sheet, row, column };
      if (formula !== undefined && callsOurs(formula))
        return [handFormula(formula, position, { sheet, world, workings }, book)];
      return outsideFormula !== undefined && callsOurs(outsideFormula)
        ? [handOutside(outsideFormula, position, value)]
        : [];
    }),
  );
}

const functionsIn = (formula: string): CellFunction[] => [
  ...new Set(allCalls(callsIn(formula)).map(({ f }) => f)),
];

const handOutside = (original: string, position: Position, value: CellValue): HandedFormula => ({
  ...position,
  original,
  functions: functionsIn(original),
  area: { row: position.row, column: position.column, rows: 1, columns: 1 },
  values: [[value]],
  why: 'it needs another workbook or add-in, or dates from 1904',
});

/** What is the same for all formulas of a book. */
interface Book {
  readonly calculated: CalculatedBook;
  readonly merged: (position: Position) => boolean;
  readonly watch: FitWatch;
}

function handFormula(
  original: string,
  position: Position,
  scene: Scene,
  { calculated, merged, watch }: Book,
): HandedFormula {
  const { sheet, row, column } = position;
  const { world, workings } = scene;
  const area = world.spillAt(position);
  const each = <T>(of: (r: number, c: number) => T): T[][] =>
    Array.from({ length: area.rows }, (_, r) => Array.from({ length: area.columns }, (__, c) => of(r, c)));
  const common = {
    ...position,
    original,
    functions: functionsIn(original),
    area,
    values: each((r, c) => calculated.shown(sheet, row + r, column + c)),
  };
  try {
    const outcome = calculated.formula(sheet, row, column);
    if (outcome?.value instanceof CellError && isSpill(outcome) && outcome.value.code === '#SPILL!')
      throw new NotSaid('its result had no room');
    return workings.attempt(() => {
      const { at, ...kept } = sayFormula(original, position, scene);
      const said = each(at);
      if (merged(position) && isArrayFormula(said[0][0])) throw new NotSaid('it stands in merged cells');
      return { ...common, said, ...kept };
    });
  } catch (error) {
    if (!(error instanceof NotSaid)) throw error;
    const fits = watch.placesOf(original, position, scene);
    return { ...common, why: error.message, ...(fits.length > 0 ? { fits } : {}) };
  }
}

/** The same formula, frozen after all. */
export const frozen = (
  { said: _said, ofTheDay: _ofTheDay, ...formula }: HandedFormula,
  why: string,
): HandedFormula => ({
  ...formula,
  why,
});
