/** New parts in a package: their content type, and the relationship by which others find them. */
import { applyEdits, insertion } from './edits';
import { readXml, relationshipsPath } from './parts';
import { elementsOf, encodeXml, xmlAttribute } from './xml';
import type { Package } from './zip';

const contentTypes = '[Content_Types].xml';
const relationshipsRoot = 'http://schemas.openxmlformats.org/package/2006/relationships';
const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';

/** `xl/worksheets/sheet4.xml`: the first number that is free. */
export function freePath(pack: Package, before: string, after: string): string {
  for (let n = 1; ; n++) if (!pack.has(`${before}${n}${after}`)) return `${before}${n}${after}`;
}

export function addPart(pack: Package, path: string, xml: string, contentType: string): void {
  pack.write(path, encodeXml(xml));
  appendTo(pack, contentTypes, 'Types', `<Override PartName="/${path}" ContentType="${contentType}"/>`);
}

/** The type of all parts whose names end alike, unless the package states it already. */
export function addDefaultType(pack: Package, extension: string, contentType: string): void {
  const stated = elementsOf(readXml(pack, contentTypes), contentTypes).some(
    ({ name, attributes }) => name === 'Default' && attributes.Extension?.toLowerCase() === extension,
  );
  if (stated) return;
  const xml = readXml(pack, contentTypes);
  const place = xml.indexOf('>', xml.search(/<(?:[\w.-]+:)?Types[\s>]/)) + 1;
  const prefix = /<([\w.-]+:)?Types[\s>]/.exec(xml)?.[1] ?? '';
  const element = `<${prefix}Default Extension="${extension}" ContentType="${contentType}"/>`;
  pack.write(contentTypes, encodeXml(applyEdits(xml, [insertion(place, element)])));
}

/** @returns the id by which `from` now knows the part */
export function relate(pack: Package, from: string, to: string, type: string): string {
  const path = relationshipsPath(from);
  if (!pack.has(path)) {
    pack.write(path, encodeXml(`${head}<Relationships xmlns="${relationshipsRoot}"></Relationships>`));
  }
  const id = freeId(readXml(pack, path), path);
  appendTo(
    pack,
    path,
    'Relationships',
    `<Relationship Id="${id}" Type="${type}" Target="${xmlAttribute(targetFrom(from, to))}"/>`,
  );
  return id;
}

/** Below its own folder a part is named from there, elsewhere from the root. */
function targetFrom(from: string, to: string): string {
  const folder = from.slice(0, from.lastIndexOf('/') + 1);
  return to.startsWith(folder) ? to.slice(folder.length) : `/${to}`;
}

function freeId(xml: string, part: string): string {
  const taken = new Set(elementsOf(xml, part).map(({ attributes }) => attributes.Id));
  for (let n = 1; ; n++) if (!taken.has(`rId${n}`)) return `rId${n}`;
}

/** Puts an element at the end of a part's root, under the prefix that the root has. */
export function appendTo(pack: Package, path: string, root: string, element: string): void {
  const xml = readXml(pack, path).replace(
    new RegExp(`<((?:[\\w.-]+:)?${root})((?:\\s[^>]*)?)/>\\s*$`),
    '<$1$2></$1>',
  );
  const close = new RegExp(`</([\\w.-]+:)?${root}\\s*>\\s*$`).exec(xml);
  if (!close) throw new Error(`${path} does not end with its root element`);
  const edit = insertion(close.index, element.replace('<', `<${close[1] ?? ''}`));
  pack.write(path, encodeXml(applyEdits(xml, [edit])));
}
