/** Where a reader of the workbook finds what a part of its package holds: `chart 2` on `sheet Gas run`. */
import { elementsIn, relationshipsOf, type Relationship, type WorkbookParts } from '../xlsx/parts';
import type { Package } from '../xlsx/zip';

export interface PartPlace {
  readonly path: string;
  /** `chart 2`, `a shape`, `the pivot table Sums`. */
  readonly kind: string;
  /** `sheet Gas run`; left out for what belongs to no sheet. */
  readonly where?: string;
  /** What a reader without the add-in misses where it calls us. */
  readonly loss: string;
}

const kept = 'it keeps what it last showed';
const chart = { kind: 'chart', loss: kept };
const control = { kind: 'a control', loss: 'it follows no cells any more' };
const pivotTable = { kind: 'the pivot table', loss: 'what it calculates stays as it was' };
const connection = { kind: 'a connection', loss: 'it brings nothing new' };

/** By the last word of the relationship that leads to them. */
const known: Readonly<Record<string, Pick<PartPlace, 'kind' | 'loss'>>> = {
  chart,
  chartEx: chart,
  drawing: { kind: 'a shape', loss: kept },
  ctrlProp: control,
  vmlDrawing: control,
  pivotTable,
  pivotCacheDefinition: pivotTable,
  queryTable: connection,
  connections: connection,
  externalLink: { kind: 'a linked workbook', loss: 'its last values stay' },
};
const unknown = { kind: 'a formula', loss: 'it comes to nothing' };

/** Sheets and tables are seen to by themselves; in the rest no formula of the workbook's stands. */
const passedOver =
  /^(?:\w*sheet|table|sharedStrings|styles|theme|calcChain|comments|customXml|pivotCacheRecords)$/i;

/** Every part that may hold formulas, but for the workbook itself and the sheets with its cells. */
export function partPlaces(pack: Package, { workbook, sheets, otherSheets }: WorkbookParts): PartPlace[] {
  const found = new Map<string, PartPlace>();
  for (const { name, path } of otherSheets) found.set(path, { path, ...unknown, where: `sheet ${name}` });
  for (const { name, path } of [...sheets, ...otherSheets]) visit(pack, path, found, `sheet ${name}`);
  visit(pack, workbook, found);
  return [...found.values()];
}

function visit(pack: Package, from: string, found: Map<string, PartPlace>, where?: string): void {
  for (const { kind, path } of inReadingOrder(pack, from)) {
    if (passedOver.test(kind) || found.has(path) || !pack.has(path) || !/\.(?:xml|vml)$/.test(path)) continue;
    const place = { path, ...(known[kind] ?? unknown), ...(where === undefined ? {} : { where }) };
    found.set(path, { ...place, kind: named(place, pack, from, found) });
    visit(pack, path, found, where);
  }
}

/** Charts go by their number on the sheet, pivot tables by their names, which those share who share their data. */
function named(
  { kind, path, where }: PartPlace,
  pack: Package,
  from: string,
  found: Map<string, PartPlace>,
): string {
  if (kind === chart.kind)
    return `${kind} ${[...found.values()].filter((one) => one.where === where && one.kind.startsWith(`${kind} `)).length + 1}`;
  if (kind !== pivotTable.kind) return kind;
  const parent = found.get(from);
  return parent?.kind.startsWith(kind)
    ? parent.kind
    : `${kind} ${elementsIn(pack, path)[0].attributes.name ?? ''}`.trim();
}

/** As the part itself names them, whatever the order of its list of relationships. */
function inReadingOrder(pack: Package, from: string): Relationship[] {
  const relations = relationshipsOf(pack, from);
  if (relations.length < 2) return relations;
  const text = new TextDecoder().decode(pack.read(from));
  const place = ({ id }: Relationship): number => text.indexOf(`"${id}"`);
  return relations.sort((a, b) => place(a) - place(b));
}
