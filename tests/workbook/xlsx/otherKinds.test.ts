/** Files given by mistake, as a library writes them that owes us nothing: what each is, and what to do. */
import * as XLSX from '@e965/xlsx';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { packageOf, worksheet, zipped } from './package';

const book: XLSX.WorkBook = {
  SheetNames: ['Run'],
  Sheets: {
    Run: XLSX.utils.aoa_to_sheet([
      ['t / s', 'V / mL'],
      [0, 1.5],
    ]),
  },
};
const saved = (bookType: XLSX.BookType): Uint8Array =>
  new Uint8Array(XLSX.write(book, { bookType, type: 'array' }) as ArrayBuffer);

/** An older container with these streams. */
function compound(...streams: string[]): Uint8Array {
  const container = XLSX.CFB.utils.cfb_new();
  for (const stream of streams) XLSX.CFB.utils.cfb_add(container, `/${stream}`, Buffer.alloc(5000, 7));
  return XLSX.CFB.write(container, { type: 'buffer' }) as Uint8Array;
}

const emptySheet = '<chartsheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"/>';

test.each<[string, Uint8Array, RegExp]>([
  [
    'an .xls workbook',
    saved('biff8'),
    /^the file is a workbook in the old \.xls form: save it as \.xlsx first$/,
  ],
  ['an older .xls workbook', saved('biff5'), /old \.xls form: save it/],
  ['an .xlsb workbook', saved('xlsb'), /^the file is a binary workbook, \.xlsb: save it as \.xlsx first$/],
  [
    'an .ods workbook',
    saved('ods'),
    /^the file is an OpenDocument workbook, \.ods: save it as \.xlsx first$/,
  ],
  [
    'a .csv',
    saved('csv'),
    /not an \.xlsx workbook but text, such as a \.csv: open it in .* and save it as \.xlsx/,
  ],
  ['text in UTF-16', saved('txt'), /but text/],
  ['a web page', saved('html'), /not an \.xlsx workbook but a web page: open it/],
  ['an XML spreadsheet', saved('xlml'), /XML Spreadsheet of 2003: save it as \.xlsx/],
  [
    'one with a password',
    compound('EncryptionInfo', 'EncryptedPackage'),
    /^the file is protected with a password: save it without one first$/,
  ],
  [
    'another file of that age',
    compound('WordDocument', '1Table'),
    /it is a file of an older Office program$/,
  ],
  ['a PDF', Buffer.from('%PDF-1.7\n%âãÏÓ'), /it is a PDF/],
  ['a picture', Buffer.from([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0, 0, 13]), /that is a zip package/],
  ['a package of Numbers', zipped({ 'Index/Document.iwa': 'x' }), /Numbers: export it to Excel/],
  ['some zip package', zipped({ 'photo.jpg': 'x' }), /a zip package, but not a workbook/],
  [
    'a workbook of charts alone',
    packageOf({
      sheets: {},
      parts: { 'xl/chartsheets/sheet1.xml': emptySheet },
      described: [{ path: 'xl/chartsheets/sheet1.xml', type: 'x/chartsheet+xml', kind: 'chartsheet' }],
      moreSheets: '<sheet name="Overview" sheetId="1" r:id="rId50"/>',
    }),
    /^the workbook has no sheet with cells: there is nothing to calculate$/,
  ],
])('%s', (_, bytes, words) => expect(() => readWorkbook(bytes)).toThrow(words));

test('a workbook whose sheets are empty is one', () => {
  expect(readWorkbook(saved('xlsx')).sheets[0].cells).toHaveLength(4);
  const empty = worksheet('').replace('<sheetData></sheetData>', '<sheetData/>');
  expect(readWorkbook(packageOf({ sheets: { Run: empty } })).sheets).toEqual([{ name: 'Run', cells: [] }]);
});
