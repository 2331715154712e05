/** Where the parts of a workbook lie in its package: found by their relationships, as the format asks. */
import { NotAWorkbook } from './notAWorkbook';
import { decodeXml, elementsOf, type XmlElement } from './xml';
import type { Package } from './zip';

export interface SheetPart {
  readonly name: string;
  /** `xl/worksheets/sheet1.xml`. */
  readonly path: string;
}

export interface WorkbookParts {
  readonly workbook: string;
  readonly sheets: readonly SheetPart[];
  /** Chart sheets and dialogue sheets, which hold no cells. */
  readonly otherSheets: readonly SheetPart[];
  readonly sharedStrings?: string;
  readonly styles?: string;
  readonly metadata?: string;
  readonly calcChain?: string;
}

export interface Relationship {
  readonly id: string;
  /** The last word of its type: `worksheet`, `styles`. */
  readonly kind: string;
  readonly path: string;
}

export const readXml = (pack: Package, path: string): string => decodeXml(pack.read(path), path);

export function elementsIn(pack: Package, path: string): XmlElement[] {
  return elementsOf(readXml(pack, path), path);
}

/** @throws NotAWorkbook where the package is of another kind */
export function findParts(pack: Package): WorkbookParts {
  const main = relationshipsOf(pack, '').find(({ kind }) => kind === 'officeDocument');
  if (!main || !pack.has(main.path))
    throw new NotAWorkbook('the file is an Office package without a workbook in it');
  if (main.path.endsWith('.bin'))
    throw new NotAWorkbook('the file is a binary workbook, .xlsb: save it as .xlsx first');
  const root = elementsIn(pack, main.path);
  if (root[0]?.name !== 'workbook')
    throw new NotAWorkbook(`the file is not a workbook: it holds a ${root[0]?.name ?? 'nothing'}`);
  const relations = relationshipsOf(pack, main.path);
  const path = (kind: string): string | undefined => relations.find((r) => r.kind === kind)?.path;
  const sheets = root
    .filter(({ name }) => name === 'sheet')
    .flatMap(({ attributes }) => {
      const relation = relations.find(({ id }) => id === relationId(attributes));
      return relation ? [{ name: attributes.name, path: relation.path, kind: relation.kind }] : [];
    });
  return {
    workbook: main.path,
    sheets: sheets.filter(({ kind }) => kind === 'worksheet'),
    otherSheets: sheets.filter(({ kind }) => kind !== 'worksheet'),
    sharedStrings: path('sharedStrings'),
    styles: path('styles'),
    metadata: path('sheetMetadata'),
    calcChain: path('calcChain'),
  };
}

/** The relationship by which an element refers to a part, under whatever prefix: `r:id`. */
export const relationId = (attributes: Readonly<Record<string, string>>): string | undefined =>
  Object.entries(attributes).find(([key]) => key.endsWith(':id'))?.[1];

export function relationshipsPath(part: string): string {
  const cut = part.lastIndexOf('/') + 1;
  return `${part.slice(0, cut)}_rels/${part.slice(cut)}.rels`;
}

export function relationshipsOf(pack: Package, part: string): Relationship[] {
  const path = relationshipsPath(part);
  if (!pack.has(path)) return [];
  return elementsIn(pack, path)
    .filter(({ name, attributes }) => name === 'Relationship' && attributes.TargetMode !== 'External')
    .map(({ attributes }) => ({
      id: attributes.Id,
      kind: attributes.Type.slice(attributes.Type.lastIndexOf('/') + 1),
      path: resolved(attributes.Target, part),
    }));
}

function resolved(target: string, from: string): string {
  if (target.startsWith('/')) return target.slice(1);
  const steps = from.split('/').slice(0, -1);
  for (const step of target.split('/')) {
    if (step === '..') steps.pop();
    else if (step !== '.') steps.push(step);
  }
  return steps.join('/');
}
