/** Excel's own note of the order in which a workbook was last calculated. */
import type { WorkbookParts } from './parts';
import { removePart } from './removePart';
import type { Package } from './zip';

/**
 * The chain names every cell with a formula, and says whether it is an array. Where one came, went or
 * became an array it would be false, and Excel asks to repair such a file; without a chain it makes a new one.
 */
export function dropCalcChain(pack: Package, { workbook, calcChain }: WorkbookParts): void {
  if (calcChain !== undefined && pack.has(calcChain)) removePart(pack, workbook, calcChain);
}
