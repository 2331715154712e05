/**
 * What a file says of the add-in besides its formulas: a link by which Excel found our functions, `[2]!` before
 * their names, and the pane that opens with the workbook. In a copy neither has anything left to lead to.
 */
import { filedPrefix } from '../engine/names';
import { elementsIn, readXml, relationshipsOf, type WorkbookParts } from '../xlsx/parts';
import { dropElements, removePart } from '../xlsx/removePart';
import type { Package } from '../xlsx/zip';

/** The add-in's own number, as its manifest has it. */
export const addInId = 'd03420eb-8443-46ce-883d-95a827a0d6b4';

const calledThrough = new RegExp(String.raw`\[(\d+)\]!${filedPrefix}PACE_`, 'gi');

/** The numbers of links that our functions are called through, before the formulas are written anew. */
export function ownLinks(pack: Package, { workbook, sheets }: WorkbookParts): ReadonlySet<number> {
  if (linksIn(pack, workbook).length === 0) return new Set();
  const xml = [workbook, ...sheets.map(({ path }) => path)].map((path) => readXml(pack, path));
  return new Set(
    xml.flatMap((text) => [...text.matchAll(calledThrough)].map(([, number]) => Number(number))),
  );
}

/**
 * Formulas know a link by its place in the list: one that others follow stays, so that these keep their numbers.
 *
 * @param own of what `ownLinks` found; a link that anything else in the file uses stays too
 */
export function dropLinks(pack: Package, { workbook }: WorkbookParts, own: ReadonlySet<number>): void {
  const links = linksIn(pack, workbook);
  for (let number = links.length; own.has(number) && !isUsed(pack, number); number--) {
    const { id, path } = links[number - 1];
    removePart(pack, workbook, path);
    dropElements(pack, workbook, 'externalReference', (attributes) => relationId(attributes) === id);
    if (number === 1) dropElements(pack, workbook, 'externalReferences', () => true);
  }
}

interface Link {
  readonly id: string;
  readonly path: string;
}

function linksIn(pack: Package, workbook: string): Link[] {
  const relations = relationshipsOf(pack, workbook);
  return elementsIn(pack, workbook)
    .filter(({ name }) => name === 'externalReference')
    .flatMap(({ attributes }) => relations.find(({ id }) => id === relationId(attributes)) ?? []);
}

const relationId = (attributes: Readonly<Record<string, string>>): string | undefined =>
  Object.entries(attributes).find(([key]) => key.endsWith(':id'))?.[1];

/** In formulas of any part: sheets, names, charts. Other words that happen to look like one keep it as well. */
const isUsed = (pack: Package, number: number): boolean =>
  pack
    .names()
    .filter((name) => name.endsWith('.xml'))
    .some((name) => new TextDecoder().decode(pack.read(name)).includes(`[${number}]`));

/** Panes of other add-ins stay. */
export function dropPane(pack: Package): void {
  for (const { path: panes } of relationshipsOf(pack, '').filter(({ kind }) => kind === paneKind)) {
    if (!pack.has(panes)) continue;
    const own = relationshipsOf(pack, panes).filter(({ path }) => pack.has(path) && isOurs(pack, path));
    for (const { id, path } of own) {
      dropElements(pack, panes, 'taskpane', (_, inside) => inside.includes(`"${id}"`));
      removePart(pack, panes, path);
    }
    if (own.length > 0 && !elementsIn(pack, panes).some(({ name }) => name === 'taskpane'))
      removePart(pack, '', panes);
  }
}

const paneKind = 'webextensiontaskpanes';

const isOurs = (pack: Package, path: string): boolean =>
  elementsIn(pack, path).some(
    ({ name, attributes }) => name === 'reference' && attributes.id?.toLowerCase() === addInId,
  );
