/** Where the looks of a workbook's cells are listed; added to a package that has no such part. */
import { addPart, relate } from './addPart';
import { LookTable } from './createStyles';
import { namespacesOf } from './namespaces';
import { readXml, type WorkbookParts } from './parts';
import type { Package } from './zip';

const contentType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml';

export function stylesIn(pack: Package, parts: WorkbookParts): string {
  if (parts.styles !== undefined && pack.has(parts.styles)) return parts.styles;
  const path = `${parts.workbook.slice(0, parts.workbook.lastIndexOf('/') + 1)}styles.xml`;
  const { main, office } = namespacesOf(readXml(pack, parts.workbook));
  addPart(pack, path, new LookTable().xml(main), contentType);
  relate(pack, parts.workbook, path, `${office}/styles`);
  return path;
}
