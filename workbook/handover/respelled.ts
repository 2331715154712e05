/** Formulas of the workbook's own that name the spill of one of ours, `SUM(F2#)`: in the copy nothing spills there. */
import type { CalculatedBook } from '../engine/engine';
import { withHash } from '../engine/anchorText';
import { callsOurs } from '../xlsx/formulaText';
import type { RewrittenCell } from './rewriteSheet';
import type { World } from './world';

export function respelled(sheet: string, world: World, calculated: CalculatedBook): RewrittenCell[] {
  const cells = world.book.sheets.find(({ name }) => name === sheet)?.cells ?? [];
  return cells.flatMap(({ row, column, formula }): RewrittenCell[] => {
    if (formula === undefined || callsOurs(formula) || !/#|ANCHORARRAY/i.test(formula)) return [];
    const typed = withHash(formula);
    const spelled = world.withoutOurSpills(typed, { sheet, row, column });
    if (spelled === typed) return [];
    return [{ row, column, formula: spelled, keepsForm: true, value: calculated.shown(sheet, row, column) }];
  });
}
