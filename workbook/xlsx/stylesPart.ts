/** Where the looks of a workbook's cells are listed; added to a package that has no such part. */
import { addPart, relate } from './addPart';
import { LookTable } from './createStyles';
import type { WorkbookParts } from './parts';
import type { Package } from './zip';

const contentType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml';
const relationship = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships/styles';

export function stylesIn(pack: Package, parts: WorkbookParts): string {
  if (parts.styles !== undefined && pack.has(parts.styles)) return parts.styles;
  const path = `${parts.workbook.slice(0, parts.workbook.lastIndexOf('/') + 1)}styles.xml`;
  addPart(pack, path, new LookTable().xml(), contentType);
  relate(pack, parts.workbook, path, relationship);
  return path;
}
