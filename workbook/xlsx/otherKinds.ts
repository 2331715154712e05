/** Files given by mistake: each is called what it is, with what to do about it. The name of a file can lie. */
import { NotAWorkbook } from './notAWorkbook';
import type { Package } from './zip';

const remedy = 'save it as .xlsx first';
const notXlsx = 'the file is not an .xlsx workbook';

const starts = (bytes: Uint8Array, ...head: readonly number[]): boolean =>
  head.every((byte, place) => bytes[place] === byte);

/** @throws NotAWorkbook for what is no zip package */
export function refuseOtherKinds(bytes: Uint8Array): void {
  if (bytes.length === 0) throw new NotAWorkbook('the file is empty');
  if (starts(bytes, 0x50, 0x4b)) return;
  if (starts(bytes, 0xd0, 0xcf, 0x11, 0xe0)) throw new NotAWorkbook(compoundKind(bytes));
  throw new NotAWorkbook(textKind(bytes) ?? `${notXlsx}: that is a zip package, and this is not`);
}

/** The older container ([MS-CFB]): the names of what it holds stand in it in UTF-16. An encrypted package is in one too ([MS-OFFCRYPTO] 2.3.4). */
function compoundKind(bytes: Uint8Array): string {
  const names = new TextDecoder('utf-16le').decode(bytes.subarray(0, bytes.length & ~1));
  if (names.includes('EncryptedPackage'))
    return 'the file is protected with a password: save it without one first';
  if (names.includes('Workbook\0') || names.includes('Book\0'))
    return `the file is a workbook in the old .xls form: ${remedy}`;
  return `${notXlsx}: it is a file of an older Office program`;
}

/** `undefined` where it is no text. */
function textKind(bytes: Uint8Array): string | undefined {
  const encoding = starts(bytes, 0xff, 0xfe) ? 'utf-16le' : starts(bytes, 0xfe, 0xff) ? 'utf-16be' : 'utf-8';
  const text = new TextDecoder(encoding).decode(bytes.subarray(0, 1000)).trimStart();
  if (text.includes('\0')) return undefined;
  if (text.startsWith('%PDF')) return `${notXlsx}: it is a PDF`;
  if (/^<(?:!doctype html|html|table|meta)/i.test(text))
    return `${notXlsx} but a web page: open it in a spreadsheet program and ${remedy}`;
  if (/urn:schemas-microsoft-com:office:spreadsheet/.test(text))
    return `the file is an XML Spreadsheet of 2003: ${remedy}`;
  return `${notXlsx} but text, such as a .csv: open it in a spreadsheet program and ${remedy}`;
}

/** @throws NotAWorkbook for packages of other programs */
export function refuseOtherPackages(pack: Package): void {
  const type = pack.has('mimetype') ? new TextDecoder().decode(pack.read('mimetype')) : '';
  if (type.includes('opendocument.spreadsheet'))
    throw new NotAWorkbook(`the file is an OpenDocument workbook, .ods: ${remedy}`);
  if (pack.has('Index/Document.iwa'))
    throw new NotAWorkbook(`${notXlsx}, but perhaps one of Numbers: export it to Excel there first`);
  if (!pack.has('_rels/.rels')) throw new NotAWorkbook('the file is a zip package, but not a workbook');
}
