/** Formulas that fill more cells than their own, and Excels that know none. */
import type { Area } from '../../functions/address';

/**
 * Cells that only show what another one spilled into them: nothing of their own could be put back.
 *
 * @param range over the area
 */
export async function spilledInto(
  context: Excel.RequestContext,
  range: Excel.Range,
  { row, column, rows, columns }: Area,
): Promise<boolean[][]> {
  const parents = Array.from({ length: rows }, (_, r) =>
    Array.from({ length: columns }, (_, c) => {
      const parent = range.getCell(r, c).getSpillParentOrNullObject();
      parent.load({ rowIndex: true, columnIndex: true });
      return parent;
    }),
  );
  await context.sync();
  return parents.map((line, r) =>
    line.map(
      (parent, c) =>
        !parent.isNullObject && (parent.rowIndex !== row + r || parent.columnIndex !== column + c),
    ),
  );
}

/**
 * The same answer without spilling, a formula a cell: any Excel takes these as they are.
 *
 * @example oneEach('=PACE.ALONG(A2:A9,B2:B9)', { rows: 2, columns: 1 })[1][0] // '=INDEX(PACE.ALONG(A2:A9,B2:B9),2,1)'
 */
export const oneEach = (formula: string, { rows, columns }: Pick<Area, 'rows' | 'columns'>): string[][] =>
  Array.from({ length: rows }, (_, r) =>
    Array.from({ length: columns }, (_, c) => `=INDEX(${formula.slice(1)},${r + 1},${c + 1})`),
  );
