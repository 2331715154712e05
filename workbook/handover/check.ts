/** Built-in formulas are believed only after our own engine has worked them out: each must come to our value. */
import { CellError, type CellValue } from '../../functions/cell';
import type { BookModel, CalculatedBook, CellModel } from '../engine/engine';
import { calculate } from '../engine/univer/headless';
import { frozen, type HandedFormula } from './handed';
import type { World } from './world';

/** Relative; what two ways of writing one sum differ by is a thousand times less. */
const tolerance = 1e-9;

/** Columns to the right, beyond what any sheet of readings uses. */
const aside = 8000;

/** The same formulas; those that came to something else are frozen. */
export async function checked(formulas: readonly HandedFormula[], world: World): Promise<HandedFormula[]> {
  if (!formulas.some(({ said }) => said)) return [...formulas];
  const calculated = await calculate(withFormulasAside(world.book, formulas));
  return formulas.map((formula) => {
    const off = firstOff(formula, calculated);
    return off === undefined ? formula : frozen(formula, off);
  });
}

/** Cells of a long result differ in the reading they take alone: so many of them are enough. */
const mostJudged = 60;

function isJudged(values: HandedFormula['values'], row: number, column: number): boolean {
  const all = values.length * values[0].length;
  const place = row * values[0].length + column;
  return all <= mostJudged || place === all - 1 || place % Math.ceil(all / mostJudged) === 0;
}

/** Each formula is judged by itself: what it reads from another of ours is that one's value. */
function withFormulasAside(book: BookModel, formulas: readonly HandedFormula[]): BookModel {
  const bySheet = new Map<string, CellModel[]>();
  for (const { sheet, row, column, said, values } of formulas) {
    const cells = bySheet.get(sheet) ?? [];
    bySheet.set(sheet, cells);
    values.forEach((line, r) =>
      line.forEach((value, c) => {
        cells.push({ row: row + r, column: column + c, value });
        const formula = isJudged(values, r, c) ? said?.[r][c] : undefined;
        if (formula !== undefined)
          cells.push({ row: row + r, column: aside + column + c, value: null, formula });
      }),
    );
  }
  return {
    ...book,
    sheets: book.sheets.map((sheet) => {
      const added = bySheet.get(sheet.name) ?? [];
      const taken = new Set(added.map(({ row, column }) => `${row},${column}`));
      return {
        ...sheet,
        cells: [...sheet.cells.filter(({ row, column }) => !taken.has(`${row},${column}`)), ...added],
      };
    }),
  };
}

function firstOff(
  { sheet, row, column, said, values }: HandedFormula,
  calculated: CalculatedBook,
): string | undefined {
  if (!said) return undefined;
  const size = largest(values);
  for (const [r, line] of values.entries()) {
    for (const [c, ours] of line.entries()) {
      if (!isJudged(values, r, c)) continue;
      const theirs = calculated.formula(sheet, row + r, aside + column + c)?.value ?? null;
      if (!isSame(ours, theirs, size)) return `built-in functions give ${shown(theirs)} for ${shown(ours)}`;
    }
  }
  return undefined;
}

/** @param size the largest number of the whole result: a 0 among rates can come out as their rounding */
function isSame(ours: CellValue, theirs: CellValue, size: number): boolean {
  if (typeof ours === 'number' && typeof theirs === 'number')
    return Math.abs(ours - theirs) <= tolerance * Math.max(Math.abs(ours), size / 1000);
  if (ours instanceof CellError) return theirs instanceof CellError && theirs.code === ours.code;
  return (ours ?? '') === (theirs ?? '');
}

const largest = (values: HandedFormula['values']): number =>
  values
    .flat()
    .reduce<number>((most, value) => (typeof value === 'number' ? Math.max(most, Math.abs(value)) : most), 0);

const shown = (value: CellValue): string => (value instanceof CellError ? value.code : JSON.stringify(value));
