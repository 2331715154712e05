/** Excel's own note of the order in which a workbook was last calculated. */
import { applyEdits, type Edit } from './edits';
import { readXml, relationshipsPath, type WorkbookParts } from './parts';
import { encodeXml, localName, scanXml } from './xml';
import type { Package } from './zip';

/**
 * The chain names every cell with a formula, and says whether it is an array. Where one came, went or
 * became an array it would be false, and Excel asks to repair such a file; without a chain it makes a new one.
 */
export function dropCalcChain(pack: Package, { workbook, calcChain }: WorkbookParts): void {
  if (calcChain === undefined || !pack.has(calcChain)) return;
  pack.remove(calcChain);
  dropElements(pack, '[Content_Types].xml', ({ PartName }) => PartName === `/${calcChain}`);
  dropElements(pack, relationshipsPath(workbook), ({ Type }) => Type?.endsWith('/calcChain'));
}

function dropElements(
  pack: Package,
  path: string,
  unwanted: (attributes: Readonly<Record<string, string>>) => boolean | undefined,
): void {
  const xml = readXml(pack, path);
  const edits: Edit[] = [];
  let start = -1;
  scanXml(xml, path, {
    open: ({ attributes }, end) => {
      start = unwanted(attributes) ? xml.lastIndexOf('<', end - 1) : -1;
    },
    close: ({ name }, end) => {
      if (start >= 0 && /^(?:Override|Relationship)$/.test(localName(name)))
        edits.push({ start, end, text: '' });
      start = -1;
    },
  });
  pack.write(path, encodeXml(applyEdits(xml, edits)));
}
