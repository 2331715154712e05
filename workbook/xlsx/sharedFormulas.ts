/** A formula that several cells share stands in one of them, the master; the others say only which one they mean. */
import { translateFormulaToA1, translateFormulaToR1C1 } from '@borgar/fx/xlsx';
import { cellName } from '../../functions/address';
import type { ScannedCell, ScannedChild } from './sheetScan';
import { plainText } from './xml';

export class SharedFormulas {
  /** By number, as seen from any cell: with references told by their distance. */
  private readonly masters = new Map<string, string>();

  /** What the formula of a cell says in that cell, as the file has it; empty where there is none. */
  textOf({ row, column }: ScannedCell, { attributes: { t: kind, si }, text }: ScannedChild): string {
    const own = plainText(text);
    if (kind !== 'shared') return own;
    const here = cellName(row, column);
    if (own !== '') {
      this.masters.set(si, translateFormulaToR1C1(own, here));
      return own;
    }
    const master = this.masters.get(si);
    return master === undefined ? '' : translateFormulaToA1(master, here);
  }
}
