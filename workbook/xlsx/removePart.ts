/** Parts taken out of a package: with their content type, and all by which others found them. */
import { applyEdits, type Edit } from './edits';
import { readXml, relationshipsOf, relationshipsPath } from './parts';
import { encodeXml, localName, scanXml, tagStart } from './xml';
import type { Package } from './zip';

/** @param from the part whose relationship leads to it; `''` for the package itself */
export function removePart(pack: Package, from: string, path: string): void {
  const ids = relationshipsOf(pack, from)
    .filter((relation) => relation.path === path)
    .map(({ id }) => id);
  dropElements(pack, relationshipsPath(from), 'Relationship', ({ Id }) => ids.includes(Id));
  dropElements(pack, '[Content_Types].xml', 'Override', ({ PartName }) => PartName === `/${path}`);
  pack.remove(path);
  if (pack.has(relationshipsPath(path))) pack.remove(relationshipsPath(path));
}

/** Elements go with all that is in them; the rest stays to the letter. */
export function dropElements(
  pack: Package,
  path: string,
  element: string,
  unwanted: (attributes: Readonly<Record<string, string>>, inside: string) => boolean,
): void {
  const xml = readXml(pack, path);
  const edits: Edit[] = [];
  const open: { start: number; openEnd: number; attributes: Readonly<Record<string, string>> }[] = [];
  scanXml(xml, path, {
    open: ({ name, attributes }, end) => {
      if (localName(name) === element) open.push({ start: tagStart(xml, end), openEnd: end, attributes });
    },
    close: ({ name }, end) => {
      if (localName(name) !== element) return;
      const { start, openEnd, attributes } = open.pop()!;
      if (unwanted(attributes, xml.slice(openEnd, end))) edits.push({ start, end, text: '' });
    },
  });
  if (edits.length > 0) pack.write(path, encodeXml(applyEdits(xml, edits)));
}
