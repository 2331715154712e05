/** Built-in formulas are believed only after our own engine has worked them out: each must come to our value. */
import { CellError, type CellValue } from '../../functions/cell';
import type { BookModel, CalculatedBook, CellModel, SheetModel } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { alike } from './alike';
import { frozen, type HandedFormula } from './handed';
import type { NewSheet } from './newSheet';
import { settled } from './settled';
import type { WorkingsSheet } from './workings';
import type { World } from './world';

/** Relative; what two ways of writing one sum differ by is a thousand times less. */
const tolerance = 1e-9;

/** Of a sum of numbers, relative to the largest of them. */
const rounding = 1e-12;

/** Columns to the right, beyond what any sheet of readings uses. */
const aside = 8000;

/** Formulas alike in all but their numbers, and cells of one long result: so many of them are enough. */
const mostJudged = 60;

export interface Checked {
  /** The same formulas; those that came to something else are frozen. */
  readonly formulas: readonly HandedFormula[];
  /** The sheet of their workings, worked out; nothing where they need none. */
  readonly workings?: NewSheet;
}

/** Where a single one of formulas that are alike came to something else, each of them is judged. */
export async function checked(
  formulas: readonly HandedFormula[],
  world: World,
  workings: WorkingsSheet,
): Promise<Checked> {
  const book = settled(world, formulas);
  const worked = workings.isEmpty
    ? undefined
    : await workings.workedOut((sheet) => calculate(withSheet(book, sheet)));
  const whole = worked ? withSheet(book, workings.values(worked)) : book;
  const groups = alike(
    formulas.filter(({ said }) => said),
    world,
  );
  const first = groups.flatMap((group) => group.filter((_, place) => isChosen(place, group.length)));
  const isFirst = new Set(first);
  const scales = new Map<HandedFormula, Sizes>();
  for (const group of groups) {
    const sizes = largestAlike(group);
    for (const formula of group) scales.set(formula, sizes);
  }
  const judged = (some: readonly HandedFormula[]): Promise<Found> => foundOff(some, whole, world, scales);
  const off = await judged(first);
  const doubtful = groups.filter((group) => group.some((formula) => off.has(formula))).flat();
  const rest = await judged(doubtful.filter((formula) => !isFirst.has(formula)));
  return {
    formulas: formulas.map((formula) => {
      const why = off.get(formula) ?? rest.get(formula);
      return why === undefined ? formula : frozen(formula, why);
    }),
    ...(worked ? { workings: workings.sheet(worked) } : {}),
  };
}

/** Spread over all, the first and the last among them. */
const isChosen = (place: number, all: number): boolean =>
  all <= mostJudged || place === all - 1 || place % Math.ceil(all / mostJudged) === 0;

/** Formulas that came to something else, with what that was. */
type Found = ReadonlyMap<HandedFormula, string>;

/** Of each column of a result, the largest number that formulas alike show there. */
type Sizes = readonly number[];

async function foundOff(
  formulas: readonly HandedFormula[],
  book: BookModel,
  world: World,
  sizes: ReadonlyMap<HandedFormula, Sizes>,
): Promise<Found> {
  if (formulas.length === 0) return new Map();
  const calculated = await calculate(withFormulasAside(formulas, book));
  return new Map(
    formulas.flatMap((formula) => {
      const off = firstOff(formula, calculated, sizes.get(formula)!, world);
      return off === undefined ? [] : [[formula, off]];
    }),
  );
}

function isJudged(values: HandedFormula['values'], row: number, column: number): boolean {
  return isChosen(row * values[0].length + column, values.length * values[0].length);
}

const withSheet = (book: BookModel, sheet: SheetModel): BookModel => ({
  ...book,
  sheets: [...book.sheets, sheet],
});

const withFormulasAside = (formulas: readonly HandedFormula[], book: BookModel): BookModel => ({
  ...book,
  sheets: book.sheets.map((sheet) => ({
    ...sheet,
    cells: [
      ...sheet.cells,
      ...formulas.filter((formula) => formula.sheet === sheet.name).flatMap(cellsAside),
    ],
  })),
});

const cellsAside = ({ row, column, said, values }: HandedFormula): CellModel[] =>
  (said ?? []).flatMap((line, r) =>
    line.flatMap((formula, c) =>
      isJudged(values, r, c) ? [{ row: row + r, column: aside + column + c, value: null, formula }] : [],
    ),
  );

function firstOff(
  formula: HandedFormula,
  calculated: CalculatedBook,
  sizes: Sizes,
  world: World,
): string | undefined {
  const { sheet, row, column, values } = formula;
  for (const [r, line] of values.entries()) {
    for (const [c, ours] of line.entries()) {
      if (!isJudged(values, r, c)) continue;
      const theirs = calculated.formula(sheet, row + r, aside + column + c)?.value ?? null;
      if (isSame(ours, theirs, sizes[c]) || isRoundingOfZero(ours, theirs, formula, world)) continue;
      return `built-in functions give ${shown(theirs)} for ${shown(ours)}`;
    }
  }
  return undefined;
}

/** @param size the largest number among others of its kind: what ought to be 0 can come out as their rounding */
export function isSame(ours: CellValue, theirs: CellValue, size: number): boolean {
  if (typeof ours === 'number' && typeof theirs === 'number')
    return Math.abs(ours - theirs) <= Math.max(tolerance * Math.abs(ours), rounding * size);
  if (ours instanceof CellError) return theirs instanceof CellError && theirs.code === ours.code;
  return (ours ?? '') === (theirs ?? '');
}

/** The slope of a level run is 0 here, and some 1E-17 where the same sum is taken in another order. */
function isRoundingOfZero(ours: CellValue, theirs: CellValue, formula: HandedFormula, world: World): boolean {
  if (ours !== 0 || typeof theirs !== 'number') return false;
  const { original, sheet } = formula;
  const read = world
    .areasIn(world.spelledOut(original, formula), sheet)
    .map((area) => largest(world.cellsIn(area, sheet).flat()));
  return Math.abs(theirs) <= rounding * Math.max(0, ...read);
}

/** A lone row has no others of its kind: there the whole result is the measure. */
function largestAlike(group: readonly HandedFormula[]): Sizes {
  const rows = group.flatMap(({ values }) => values);
  return rows[0].map((_, c) => largest(rows.length === 1 ? rows[0] : rows.map((row) => row[c])));
}

const largest = (values: readonly CellValue[]): number =>
  values.reduce<number>(
    (most, value) => (typeof value === 'number' ? Math.max(most, Math.abs(value)) : most),
    0,
  );

const shown = (value: CellValue): string => (value instanceof CellError ? value.code : JSON.stringify(value));
