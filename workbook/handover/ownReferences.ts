/**
 * What a file says of the add-in besides its formulas: a link by which Excel found our functions, `[2]!` before
 * their names, and the pane that opens with the workbook. In a copy neither has anything left to lead to.
 */
import { filedPrefix } from '../engine/names';
import { linksIn } from '../xlsx/externalLinks';
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
