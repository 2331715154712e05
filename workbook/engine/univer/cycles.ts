/** Formulas that feed on their own result. The engine goes round such a circle once or twice and takes what comes out. */
import type { IFormulaDependencyTreeJson } from '@univerjs/engine-formula';

type Formula = Pick<IFormulaDependencyTreeJson, 'subUnitId' | 'row' | 'column' | 'rangeList'>;

const inCircle = 'the formula depends on its own result';
const behindCircle = 'the formula depends on one that depends on its own result';

export const circleKey = (sheetId: string, row: number, column: number): string =>
  `${sheetId}!${row},${column}`;

/** @returns what is wrong, by `circleKey`, for every formula in a circle or behind one */
export function circles(formulas: readonly Formula[]): Map<string, string> {
  const precedents = formulas.map((formula) =>
    formulas.flatMap((other, place) => (feeds(other, formula) ? [place] : [])),
  );
  const inside = new Set(
    formulas.flatMap((_, place) => (reaches(place, (p) => p === place, precedents) ? [place] : [])),
  );
  const words = new Map<string, string>();
  formulas.forEach(({ subUnitId, row, column }, place) => {
    const key = circleKey(subUnitId, row, column);
    if (inside.has(place)) words.set(key, inCircle);
    else if (reaches(place, (p) => inside.has(p), precedents)) words.set(key, behindCircle);
  });
  return words;
}

const feeds = (other: Formula, formula: Formula): boolean =>
  formula.rangeList.some(
    ({ sheetId, range }) =>
      sheetId === other.subUnitId &&
      range.startRow <= other.row &&
      other.row <= range.endRow &&
      range.startColumn <= other.column &&
      other.column <= range.endColumn,
  );

/** Whether following what feeds a formula leads to one that is wanted. */
function reaches(from: number, wanted: (place: number) => boolean, precedents: readonly number[][]): boolean {
  const seen = new Set<number>();
  const open = [...precedents[from]];
  for (let place = open.pop(); place !== undefined; place = open.pop()) {
    if (wanted(place)) return true;
    if (seen.has(place)) continue;
    seen.add(place);
    open.push(...precedents[place]);
  }
  return false;
}
