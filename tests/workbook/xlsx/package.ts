/** Packages written by hand, so that a test decides every byte of what a file holds. */
import { strFromU8, strToU8, unzipSync, zipSync, type Zippable } from 'fflate';

const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\r\n';
const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const types = 'application/vnd.openxmlformats-officedocument.spreadsheetml';

export const worksheet = (rows: string, { before = '', after = '' } = {}): string =>
  `${head}<worksheet xmlns="${main}" xmlns:r="${office}">${before}<sheetData>${rows}</sheetData>${after}</worksheet>`;

export interface PackageOptions {
  /** Whole XML by sheet name. */
  readonly sheets: Readonly<Record<string, string>>;
  /** More parts: their content by path, put in after the workbook's own. */
  readonly parts?: Readonly<Record<string, string | Uint8Array>>;
  /** Content types of such parts by path; a relationship of the workbook's where `kind` is given. */
  readonly described?: readonly { readonly path: string; readonly type: string; readonly kind?: string }[];
  readonly names?: string;
  /** Behind the worksheets in the workbook's list. */
  readonly moreSheets?: string;
}

export function packageOf({
  sheets,
  parts = {},
  described = [],
  names = '',
  moreSheets = '',
}: PackageOptions): Uint8Array {
  const list = Object.keys(sheets);
  const overrides = [
    `<Override PartName="/xl/workbook.xml" ContentType="${types}.sheet.main+xml"/>`,
    ...list.map(
      (_, n) =>
        `<Override PartName="/xl/worksheets/sheet${n + 1}.xml" ContentType="${types}.worksheet+xml"/>`,
    ),
    ...described.map(({ path, type }) => `<Override PartName="/${path}" ContentType="${type}"/>`),
  ];
  const relations = [
    ...list.map(
      (_, n) =>
        `<Relationship Id="rId${n + 1}" Type="${office}/worksheet" Target="worksheets/sheet${n + 1}.xml"/>`,
    ),
    ...described.flatMap(({ path, kind }, n) =>
      kind ? [`<Relationship Id="rId${n + 50}" Type="${office}/${kind}" Target="/${path}"/>`] : [],
    ),
  ];
  const files: Record<string, string | Uint8Array> = {
    '[Content_Types].xml': `${head}<Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Default Extension="bin" ContentType="application/octet-stream"/>${overrides.join('')}</Types>`,
    '_rels/.rels': `${head}<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="${office}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    'xl/workbook.xml': `${head}<workbook xmlns="${main}" xmlns:r="${office}"><sheets>${list.map((name, n) => `<sheet name="${name}" sheetId="${n + 1}" r:id="rId${n + 1}"/>`).join('')}${moreSheets}</sheets>${names}</workbook>`,
    'xl/_rels/workbook.xml.rels': `${head}<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">${relations.join('')}</Relationships>`,
    ...Object.fromEntries(list.map((name, n) => [`xl/worksheets/sheet${n + 1}.xml`, sheets[name]])),
    ...parts,
  };
  return zipped(files);
}

/** Each entry gets a time of its own, and every other one is stored unpacked. */
export function zipped(files: Readonly<Record<string, string | Uint8Array>>): Uint8Array {
  const entries = Object.entries(files).map(([name, content], n) => {
    const bytes = typeof content === 'string' ? strToU8(content) : content;
    return [name, [bytes, { mtime: new Date(2024, 1, 3, 4, 5, n * 2), level: n % 2 === 0 ? 6 : 0 }]];
  });
  return zipSync(Object.fromEntries(entries) as Zippable);
}

/** The same as a workbook with macros: an .xlsm. */
export const withMacros = (bytes: Uint8Array): Uint8Array =>
  zipped(
    Object.fromEntries(
      Object.entries(partsOf(bytes)).map(([path, part]) => [
        path,
        path === '[Content_Types].xml'
          ? strFromU8(part).replace(`${types}.sheet.main`, 'application/vnd.ms-excel.sheet.macroEnabled.main')
          : part,
      ]),
    ),
  );

export const partsOf = (bytes: Uint8Array): Record<string, Uint8Array> => unzipSync(bytes);

export const textOf = (bytes: Uint8Array, path: string): string => strFromU8(partsOf(bytes)[path]);

/** What stands between `<sheetData>` and its end. */
export const rowsOf = (bytes: Uint8Array, sheet = 1): string =>
  /<(?:\w+:)?sheetData>(.*)<\/(?:\w+:)?sheetData>/s.exec(
    textOf(bytes, `xl/worksheets/sheet${sheet}.xml`),
  )![1];

/** The options that give a package its table of texts. */
export const sharedStrings = (items: string): Pick<PackageOptions, 'parts' | 'described'> => ({
  parts: { 'xl/sharedStrings.xml': `${head}<sst xmlns="${main}">${items}</sst>` },
  described: [{ path: 'xl/sharedStrings.xml', type: `${types}.sharedStrings+xml`, kind: 'sharedStrings' }],
});
