/** Formulas that differ in nothing but their place and the numbers they read, as those filled down a column do. */
import { translateFormulaToR1C1 } from '@borgar/fx/xlsx';
import { areaName, cellName, type Area } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import type { HandedFormula } from './handed';
import type { World } from './world';

/** The same formulas in groups, each in the order they came in. */
export function alike(formulas: readonly HandedFormula[], world: World): HandedFormula[][] {
  const groups = new Map<string, HandedFormula[]>();
  const kinds = kindsIn(world);
  for (const formula of formulas) {
    const { original, sheet, row, column, area, values } = formula;
    const key = JSON.stringify([
      translateFormulaToR1C1(original, cellName(row, column)),
      world.areasIn(world.spelledOut(original, formula), sheet).map((read) => kinds(read, sheet)),
      area.rows,
      area.columns,
      kindOf(values[0][0]),
    ]);
    const group = groups.get(key);
    if (group) group.push(formula);
    else groups.set(key, [formula]);
  }
  return [...groups.values()];
}

const kindOf = (value: CellValue): string => {
  if (value instanceof CellError) return value.code;
  return value === null ? 'blank' : typeof value;
};

/** How many cells of each kind an area holds. Formulas of one column mostly read the same areas. */
function kindsIn(world: World): (area: Area, sheet: string) => string {
  const known = new Map<string, string>();
  return (area, sheet) => {
    const place = areaName({ ...area, sheet: area.sheet ?? sheet });
    const before = known.get(place);
    if (before !== undefined) return before;
    const counts = new Map<string, number>();
    for (const cell of world.cellsIn(area, sheet).flat())
      counts.set(kindOf(cell), (counts.get(kindOf(cell)) ?? 0) + 1);
    const kinds = [...counts].sort().join(' ');
    known.set(place, kinds);
    return kinds;
  };
}
