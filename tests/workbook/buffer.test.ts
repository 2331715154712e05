/** Files arrive as Node's Buffer, which is a Uint8Array whose slices share memory. */
import * as XLSX from '@e965/xlsx';
import { recalculate } from '../../workbook/commands/recalculate';

test('recalculate: a Buffer is read, left alone, and gives a whole file', async () => {
  const sheet: XLSX.WorkSheet = XLSX.utils.aoa_to_sheet([
    [0, 0],
    [1, 1],
    [2, 4],
  ]);
  sheet.D1 = { t: 'n', f: 'PACE.ALONG(A1:A3,B1:B3,3)' };
  sheet['!ref'] = 'A1:D3';
  const bytes = XLSX.write(XLSX.utils.book_new(sheet, 'Run'), { type: 'buffer', bookType: 'xlsx' }) as Buffer;
  const before = Buffer.from(bytes);
  const result = await recalculate(bytes);
  expect(bytes.equals(before)).toBe(true);
  const shown = XLSX.read(result.bytes, { type: 'array' }).Sheets.Run;
  // the slopes of t²
  ['D1', 'D2', 'D3'].forEach((cell, i) => expect((shown[cell] as XLSX.CellObject).v).toBeCloseTo(2 * i, 12));
});
