/** Dates in a file: spelled out or as days, counted from 1900 or from 1904 (ISO/IEC 29500-1, 18.17.4). */
import * as XLSX from '@e965/xlsx';
import { recalculate } from '../../../workbook/commands/recalculate';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { otherEngines } from '../handover/otherEngines';
import { packageOf, partsOf, rowsOf, textOf, worksheet, zipped } from './package';

const rows =
  '<row r="1"><c r="A1" t="d"><v>2026-12-01T06:00:00</v></c><c r="B1"><f>YEAR(A1)</f><v>2026</v></c><c r="C1"><f>A1*2</f></c></row>';

const book = (date1904: string): Uint8Array => {
  const bytes = packageOf({ sheets: { Run: worksheet(rows) } });
  const workbook = textOf(bytes, 'xl/workbook.xml').replace('<sheets>', `<workbookPr ${date1904}/><sheets>`);
  return zipped({ ...partsOf(bytes), 'xl/workbook.xml': workbook });
};

/** 1 December 2026 is day 46357 from 1900, and day 44895 from 1904: 4 years and one day, 1462 days, less. */
test.each([
  ['', 46357.25],
  ['date1904="0"', 46357.25],
  ['date1904="1"', 44895.25],
  ['date1904="true"', 44895.25],
])('%s', async (date1904, serial) => {
  expect(readWorkbook(book(date1904)).sheets[0].cells[0].value).toBe(serial);
  const after = rowsOf((await recalculate(book(date1904))).bytes);
  expect(after).toContain('<f>YEAR(A1)</f><v>2026</v>');
  expect(after).toContain(`<f>A1*2</f><v>${2 * serial}</v>`);
});

test('a library counts the same days', () => {
  const day = XLSX.read(book('date1904="1"'), { type: 'array' }).Sheets.Run.A1 as XLSX.CellObject;
  const theirs = day.t === 'd' ? (Number(day.v) - Date.UTC(1904, 0, 1)) / 86_400_000 : day.v;
  expect(theirs).toBeCloseTo(44895.25, 6);
});

for (const engine of otherEngines.filter(({ name }) => name === 'LibreOffice'))
  (engine.isInstalled ? test : test.skip)(
    `${engine.name} counts the same days`,
    () => {
      expect(engine.recalculated(book('date1904="1"')).get('Run!C1')).toBe(2 * 44895.25);
      expect(engine.recalculated(book('')).get('Run!C1')).toBe(2 * 46357.25);
    },
    120_000,
  );
