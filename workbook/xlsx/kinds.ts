/** The kinds of workbook that a package can be: Excel opens a file only under the name of its kind. */
import { elementsIn, findParts } from './parts';
import { Package } from './zip';

export interface WorkbookKind {
  readonly extension: string;
  /** Of the file as a whole. */
  readonly mediaType: string;
  /** What the package says of its workbook part. */
  readonly contentType: string;
}

const open = 'application/vnd.openxmlformats-officedocument.spreadsheetml';
const excel = 'application/vnd.ms-excel';
const withMacros = (extension: string, what: string): WorkbookKind => ({
  extension,
  mediaType: `${excel}.${what}.macroEnabled.12`,
  contentType: `${excel}.${what}.macroEnabled.main+xml`,
});

export const plainKind: WorkbookKind = {
  extension: '.xlsx',
  mediaType: `${open}.sheet`,
  contentType: `${open}.sheet.main+xml`,
};

export const workbookKinds: readonly WorkbookKind[] = [
  plainKind,
  { extension: '.xltx', mediaType: `${open}.template`, contentType: `${open}.template.main+xml` },
  withMacros('.xlsm', 'sheet'),
  withMacros('.xltm', 'template'),
];

/** By the name of a file; `undefined` for one that is no workbook's. */
export const kindNamed = (name: string): WorkbookKind | undefined =>
  workbookKinds.find(({ extension }) => name.toLowerCase().endsWith(extension));

/** @returns `undefined` where the package does not say. @throws NotAWorkbook */
export function kindOf(bytes: Uint8Array): WorkbookKind | undefined {
  const pack = Package.open(bytes);
  const { workbook } = findParts(pack);
  const stated = elementsIn(pack, '[Content_Types].xml').find(
    ({ attributes }) => attributes.PartName === `/${workbook}`,
  );
  return workbookKinds.find(({ contentType }) => contentType === stated?.attributes.ContentType);
}
