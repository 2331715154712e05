/** What a table keeps to fill its next row with: a formula that calls us has no next row in a copy. */
import { callsOurs, typedFormula } from '../xlsx/formulaText';
import { relationshipsOf, type WorkbookParts } from '../xlsx/parts';
import { dropElements } from '../xlsx/removePart';
import { plainText } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';

/** The cells of such a column have their own formulas, in built-in functions or frozen like any other. */
export function dropColumnFormulas(pack: Package, { sheets }: WorkbookParts): void {
  for (const sheet of sheets) {
    for (const { kind, path } of relationshipsOf(pack, sheet.path)) {
      if (kind !== 'table' || !pack.has(path)) continue;
      for (const element of ['calculatedColumnFormula', 'totalsRowFormula'])
        dropElements(pack, path, element, (_, text) => callsOurs(typedFormula(plainText(text))));
    }
  }
}
