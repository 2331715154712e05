import { catalogue } from '../../functions/catalogue';
import { isRange } from '../../functions/cell';
import { typedName, type CellFunction } from '../../functions/define';
import type { CellModel, SheetModel } from '../engine/engine';

const headings = ['function', 'answers', 'example, as typed', 'what it shows'];

/** Every function with its own example, live; made from the definitions. */
export function everyFunction(): SheetModel {
  const cells: CellModel[] = headings.map((value, column) => ({ row: 0, column, value, bold: true }));
  let row = 1;
  for (const f of catalogue) {
    cells.push(
      { row, column: 0, value: typedName(f) },
      { row, column: 1, value: f.summary },
      { row, column: 2, value: f.example.formula },
      { row, column: 3, value: null, formula: f.example.formula.slice(1) },
    );
    row += heightOf(f) + 1;
  }
  return { name: 'Every function', cells, columnWidths: { 0: 22, 1: 60, 2: 58, 3: 22, 4: 22 } };
}

const heightOf = ({ example }: CellFunction): number => (isRange(example.equals) ? example.equals.length : 1);
