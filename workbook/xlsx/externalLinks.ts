/** The parts of a package that lead to other workbooks; formulas know each by its place in the list. */
import { formulasIn, rewriteFormulas } from './formulaPlaces';
import { linkNumbersIn, withLinkNumbers } from './outside';
import { elementsIn, readXml, relationId, relationshipsOf, type Relationship } from './parts';
import { dropElements, removePart } from './removePart';
import { encodeXml } from './xml';
import type { Package } from './zip';

/** In the order that gives them their numbers, from 1; `undefined` where the package lacks one. */
export function linksIn(pack: Package, workbook: string): (Relationship | undefined)[] {
  const relations = relationshipsOf(pack, workbook);
  return elementsIn(pack, workbook)
    .filter(({ name }) => name === 'externalReference')
    .map(({ attributes }) => relations.find(({ id }) => id === relationId(attributes)));
}

/** Takes those out that no formula uses any more; formulas follow the others to their new numbers. */
export function dropUnusedLinks(pack: Package, workbook: string, unwanted: ReadonlySet<number>): void {
  if (unwanted.size === 0) return;
  const links = linksIn(pack, workbook);
  const parts = partsNamingLinks(pack, workbook, links);
  const used = new Set(parts.flatMap((path) => formulasIn(readXml(pack, path), path)).flatMap(linkNumbersIn));
  const isDropped = (number: number): boolean => unwanted.has(number) && !used.has(number);
  const dropped = links.flatMap((link, n) => (link && isDropped(n + 1) ? [{ ...link, number: n + 1 }] : []));
  if (dropped.length === 0) return;
  const moved = (number: number): number => number - dropped.filter((one) => one.number < number).length;
  for (const path of parts) {
    const xml = readXml(pack, path);
    const after = rewriteFormulas(xml, path, (formula) => withLinkNumbers(formula, moved));
    if (after !== xml) pack.write(path, encodeXml(after));
  }
  for (const { id, path } of dropped) {
    removePart(pack, workbook, path);
    dropElements(pack, workbook, 'externalReference', (attributes) => relationId(attributes) === id);
  }
  if (dropped.length === links.length) dropElements(pack, workbook, 'externalReferences', () => true);
}

/** The workbook and what lies beside it. Numbers within a linked workbook's own part are that workbook's. */
function partsNamingLinks(
  pack: Package,
  workbook: string,
  links: readonly (Relationship | undefined)[],
): string[] {
  const folder = workbook.slice(0, workbook.lastIndexOf('/') + 1);
  return pack
    .names()
    .filter((path) => path.startsWith(folder) && /\.(?:xml|vml)$/.test(path))
    .filter((path) => !links.some((link) => link?.path === path))
    .filter((path) => /\[\d+\]/.test(new TextDecoder().decode(pack.read(path))));
}
