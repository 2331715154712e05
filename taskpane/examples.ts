/** How much room the example of a function takes: it is worked out, as a cell would. */
import { isRange } from '../functions/cell';
import type { CellFunction } from '../functions/define';
import { calculate } from '../functions/literal';
import type { Size } from './insertions/insertion';

/** Examples hold constants and calls within calls, and point at no cells. */
export function exampleSize({ example: { formula } }: CellFunction): Size {
  const answer = calculate(formula);
  return isRange(answer) ? { rows: answer.length, columns: answer[0].length } : { rows: 1, columns: 1 };
}
