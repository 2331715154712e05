/**
 * What marks a cell as one that spills: its `cm` points to an entry of xl/metadata.xml
 * ([MS-XLSX] 2.4.58, XLDAPR). Without it Excel reads an array formula as one of fixed size.
 */
import { applyEdits, insertion, type Edit } from './edits';
import { elementsOf, encodeXml, localName, scanXml, tagStart } from './xml';
import { addPart, relate } from './addPart';
import { namespacesOf } from './namespaces';
import { readXml, type WorkbookParts } from './parts';
import type { Package } from './zip';

const arrays = 'http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray';
const extension = '{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}';

export const metadataContentType =
  'application/vnd.openxmlformats-officedocument.spreadsheetml.sheetMetadata+xml';
export const metadataRelationship = (office: string): string => `${office}/sheetMetadata`;

const metadataType =
  '<metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/>';
const futureMetadata = `<futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="${extension}"><xda:dynamicArrayProperties xmlns:xda="${arrays}" fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata>`;

/** A whole part for a workbook that had none; its first entry is the one, so `cm="1"`. */
export const metadataPart = (main: string): string => `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>
<metadata xmlns="${main}"><metadataTypes count="1">${metadataType}</metadataTypes>${futureMetadata}<cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata></metadata>`;

/** @returns the `cm` of a cell that spills, with the part behind it put into the package where it was missing */
export function dynamicArrayMark(pack: Package, parts: WorkbookParts): string {
  const path = parts.metadata;
  if (path !== undefined && pack.has(path)) {
    const { xml, mark } = withDynamicArrays(readXml(pack, path), path);
    if (xml !== undefined) pack.write(path, encodeXml(xml));
    return mark;
  }
  addMetadata(pack, parts);
  return '1';
}

function addMetadata(pack: Package, parts: WorkbookParts): void {
  const path = `${parts.workbook.slice(0, parts.workbook.lastIndexOf('/') + 1)}metadata.xml`;
  const { main, office } = namespacesOf(readXml(pack, parts.workbook));
  addPart(pack, path, metadataPart(main), metadataContentType);
  relate(pack, parts.workbook, path, metadataRelationship(office));
}

/** `xml` is left out where the part knows dynamic arrays already. */
function withDynamicArrays(xml: string, path: string): { xml?: string; mark: string } {
  const elements = elementsOf(xml, path);
  const types = elements
    .filter(({ name }) => name === 'metadataType')
    .map(({ attributes }) => attributes.name);
  const entries = elements.filter(({ name, inside }) => name === 'rc' && inside.includes('cellMetadata'));
  const type = types.indexOf('XLDAPR') + 1;
  const entry = entries.findIndex(({ attributes }) => type > 0 && Number(attributes.t) === type) + 1;
  if (entry > 0) return { mark: String(entry) };
  return { xml: extended(xml, path, types.length + 1), mark: String(entries.length + 1) };
}

/** The order of a metadata part: types, strings, mdx, future, cell, value (ISO/IEC 29500-1, 18.9.11). */
function extended(xml: string, path: string, type: number): string {
  const ends = new Map<string, { inner: number; after: number }>();
  scanXml(xml, path, {
    open: () => undefined,
    close: ({ name }, end) => ends.set(localName(name), { inner: tagStart(xml, end), after: end }),
  });
  const types = ends.get('metadataTypes');
  const cells = ends.get('cellMetadata');
  const entry = `<bk><rc t="${type}" v="0"/></bk>`;
  const before =
    ends.get('futureMetadata') ?? ends.get('mdxMetadata') ?? ends.get('metadataStrings') ?? types;
  const place = before?.after ?? ends.get('metadata')!.inner;
  const edits: Edit[] = [
    types
      ? insertion(types.inner, metadataType)
      : insertion(place, `<metadataTypes count="1">${metadataType}</metadataTypes>`),
    insertion(place, futureMetadata),
    cells
      ? insertion(cells.inner, entry)
      : insertion(place, `<cellMetadata count="1">${entry}</cellMetadata>`),
  ];
  return recounted(applyEdits(xml, edits));
}

/** The counts are hints, but false ones would be ours. */
const recounted = (xml: string): string =>
  xml.replace(
    /<(metadataTypes|cellMetadata) count="(\d+)">([\s\S]*?)<\/\1>/g,
    (_, name: string, _count, inside: string) => {
      const one = name === 'metadataTypes' ? /<metadataType /g : /<bk>/g;
      return `<${name} count="${inside.match(one)?.length ?? 0}">${inside}</${name}>`;
    },
  );
