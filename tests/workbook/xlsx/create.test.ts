import * as XLSX from '@e965/xlsx';
import { recalculate } from '../../../workbook/commands/recalculate';
import type { BookModel, CellModel } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { CellError } from '../../../functions/cell';
import { book } from '../engine/book';
import { partsOf, rowsOf, textOf } from './package';

const created = async (model: BookModel): Promise<Uint8Array> =>
  createWorkbook(model, await calculate(model));

const full: BookModel = {
  sheets: [
    {
      name: "Gas & 'air'",
      columnWidths: { 0: 12, 3: 30.5 },
      cells: [
        { row: 0, column: 0, value: 't / s', bold: true },
        { row: 0, column: 1, value: ' <two>\nlines & "quotes" _x000D_ ', wrap: true },
        { row: 1, column: 0, value: 40, numberFormat: '0.00" s"' },
        { row: 2, column: 0, value: 0.1, numberFormat: '0.00" s"', bold: true },
        { row: 3, column: 0, value: true },
        { row: 4, column: 0, value: new CellError('#N/A') },
      ],
    },
    { name: 'Empty', cells: [] },
  ],
  names: [
    { name: 'first', refersTo: "'Gas & ''air'''!$A$2" },
    { name: 'first', refersTo: 'Empty!$A$1', sheet: 'Empty' },
  ],
};

test('what is written is read back as it was', async () => {
  expect(readWorkbook(await created(full))).toEqual(full);
});

test('formulas come back as typed, in a file that holds them as Excel stores them', async () => {
  const typed = {
    A1: 40,
    A2: 25,
    B1: '=PACE.EVENT(A1:A2)',
    C1: '=SUM(B1#)',
    D1: '=STDEV.S(A1:A2)',
    E1: '=SORT(A1:A2)',
    F1: '=A1*2',
  };
  const bytes = await created(book({ Run: typed }));
  const formulas = readWorkbook(bytes).sheets[0].cells.flatMap(({ formula }) =>
    formula ? [`=${formula}`] : [],
  );
  expect(formulas).toEqual(Object.values(typed).slice(2));
  const rows = rowsOf(bytes);
  expect(rows).toContain(
    '<c r="B1" cm="1"><f t="array" ref="B1:B2">_xldudf_PACE_EVENT(A1:A2)</f><v>0.025</v></c>',
  );
  expect(rows).toContain('<f>SUM(_xlfn.ANCHORARRAY(B1))</f>');
  expect(rows).toContain('<f>_xlfn.STDEV.S(A1:A2)</f>');
  expect(rows).toContain('<f t="array" ref="E1:E2">_xlfn._xlws.SORT(A1:A2)</f><v>25</v>');
  expect(rows).toContain('<f>A1*2</f><v>80</v>');
  expect(rows).toContain('<c r="B2"><v>0.04</v></c>');
});

test('a spill without room can spill once there is some', async () => {
  const bytes = await created(book({ Run: { A1: '=SEQUENCE(3)', A3: 'in the way' } }));
  expect(rowsOf(bytes)).toContain(
    '<c r="A1" cm="1" t="e"><f t="array" ref="A1">_xlfn.SEQUENCE(3)</f><v>#VALUE!</v></c>',
  );
});

test('the file is complete: calculating it again changes not a byte', async () => {
  const bytes = await created(
    book({
      Run: { A1: 40, A2: 25, B1: '=PACE.EVENT(A1:A2)', C1: '=PACE.EVENT(0)', D1: '="words"', E1: '=A1>1' },
      Other: { A1: '=Run!B2' },
    }),
  );
  expect(Buffer.from((await recalculate(bytes)).bytes).equals(bytes)).toBe(true);
});

test('the same workbook gives the same bytes', async () => {
  expect(Buffer.from(await created(full)).equals(await created(full))).toBe(true);
});

test('a workbook where nothing can spill has no part for it', async () => {
  const bytes = await created(book({ Run: { A1: '=1+1' } }));
  expect(Object.keys(partsOf(bytes))).not.toContain('xl/metadata.xml');
  expect(textOf(bytes, '[Content_Types].xml')).not.toContain('metadata');
});

test('what a result spills into keeps the look it was given; the rest looks as the formula does', async () => {
  const model = book({ Run: { A1: 40, A2: 25, A3: 20, B1: '=PACE.EVENT(A1:A3)' } });
  const [run] = model.sheets;
  const cells = run.cells.map((cell) => (cell.formula ? { ...cell, bold: true } : cell));
  const shown: CellModel = { row: 1, column: 1, value: null, numberFormat: '0.00%' };
  const bytes = await created({ ...model, sheets: [{ ...run, cells: [...cells, shown] }] });
  const { Sheets } = XLSX.read(bytes, { type: 'array', cellNF: true });
  expect(Sheets.Run.B2).toMatchObject({ v: 0.04, z: '0.00%', w: '4.00%' });
  const [first, second, third] = ['B1', 'B2', 'B3'].map(
    (place) => new RegExp(`<c r="${place}" s="(\\d+)"`).exec(rowsOf(bytes))?.[1],
  );
  expect(third).toBe(first);
  expect(second).not.toBe(first);
});

test('a sheet is printed across, as wide as a page and as long as it takes', async () => {
  const sheet = textOf(await created(full), 'xl/worksheets/sheet1.xml');
  expect(sheet).toMatch(/^<\?xml[^>]*>\s*<worksheet [^>]*><sheetPr><pageSetUpPr fitToPage="1"\/><\/sheetPr>/);
  expect(sheet).toMatch(/<\/sheetData><pageSetup orientation="landscape" fitToHeight="0"\/><\/worksheet>$/);
});
