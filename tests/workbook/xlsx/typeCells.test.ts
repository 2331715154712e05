/** What is typed into an opened workbook goes into its own package, and nothing else in it moves. */
import type { BookModel, CellModel } from '../../../workbook/engine/engine';
import { recalculate } from '../../../workbook/commands/recalculate';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { typeCells } from '../../../workbook/xlsx/typeCells';
import { packageOf, partsOf, rowsOf, sharedStrings, textOf, worksheet } from './package';

/** The book as read, with some cells typed anew; an empty cell is one without value and formula. */
function retyped(book: BookModel, cells: readonly CellModel[]): BookModel {
  const [first, ...others] = book.sheets;
  const kept = first.cells.filter(
    (was) => !cells.some((is) => is.row === was.row && is.column === was.column),
  );
  const typed = cells.filter(({ value, formula }) => value !== null || formula !== undefined);
  return { ...book, sheets: [{ ...first, cells: [...kept, ...typed] }, ...others] };
}

function after(bytes: Uint8Array, ...cells: readonly CellModel[]): Uint8Array {
  const book = readWorkbook(bytes);
  return typeCells(bytes, book, retyped(book, cells));
}

const one = (rows: string): Uint8Array => packageOf({ sheets: { Run: worksheet(rows) } });
const cell = (row: number, column: number, value: CellModel['value'], formula?: string): CellModel => ({
  row,
  column,
  value,
  ...(formula === undefined ? {} : { formula }),
});

test('nothing typed: the file is the same to the last byte', () => {
  const bytes = one('<row r="1"><c r="A1"><v>1</v></c></row>');
  expect(Buffer.from(after(bytes)).equals(bytes)).toBe(true);
});

test('a number, words and a truth value go into their cells; looks and neighbours stay', () => {
  const bytes = one(
    '<row r="1" ht="20"><c r="A1" s="3"><v>1</v></c><!-- kept --><c  r="B1" ><v>2.50</v></c></row>',
  );
  expect(rowsOf(after(bytes, cell(0, 0, 7), cell(0, 2, 'a < b'), cell(2, 1, true)))).toBe(
    '<row r="1" ht="20"><c r="A1" s="3"><v>7</v></c><!-- kept --><c  r="B1" ><v>2.50</v></c>' +
      '<c r="C1" t="str"><v>a &lt; b</v></c></row><row r="3"><c r="B3" t="b"><v>1</v></c></row>',
  );
});

test('a word from the shared table gives way to what is typed over it; the table stays', () => {
  const bytes = packageOf({
    sheets: { Run: worksheet('<row r="1"><c r="A1" t="s"><v>0</v></c></row>') },
    ...sharedStrings('<si><t>time</t></si>'),
  });
  const typed = after(bytes, cell(0, 0, 5));
  expect(rowsOf(typed)).toBe('<row r="1"><c r="A1"><v>5</v></c></row>');
  expect(partsOf(typed)['xl/sharedStrings.xml']).toEqual(partsOf(bytes)['xl/sharedStrings.xml']);
});

test('an emptied cell is gone, or keeps only its look', () => {
  const bytes = one('<row r="1"><c r="A1"><v>1</v></c><c r="B1" s="2"><f>A1</f><v>1</v></c></row>');
  expect(rowsOf(after(bytes, cell(0, 0, null), cell(0, 1, null)))).toBe('<row r="1"><c r="B1" s="2"/></row>');
});

test('a formula of ours is filed as one that may spill, a formula of the workbook as it is', () => {
  const typed = after(
    one('<row r="1"><c r="A1"><v>40</v></c></row>'),
    cell(0, 1, null, 'PACE.EVENT(A1)'),
    cell(0, 2, null, 'A1*2'),
  );
  expect(rowsOf(typed)).toContain('<c r="B1" cm="1"><f t="array" ref="B1">_xldudf_PACE_EVENT(A1)</f></c>');
  expect(rowsOf(typed)).toContain('<c r="C1"><f>A1*2</f></c>');
  expect(textOf(typed, 'xl/metadata.xml')).toContain('XLDAPR');
});

test('what had spilled from a formula goes when the formula does', () => {
  const bytes = one(
    '<row r="1"><c r="B1"><f t="array" ref="B1:B3">_xldudf_PACE_EVENT({1;2;3})</f><v>1</v></c></row>' +
      '<row r="2"><c r="B2"><v>0.5</v></c></row><row r="3"><c r="B3" s="1"><v>0.3</v></c></row>',
  );
  expect(rowsOf(after(bytes, cell(0, 1, 8)))).toBe(
    '<row r="1"><c r="B1"><v>8</v></c></row><row r="2"></row><row r="3"><c r="B3" s="1"/></row>',
  );
});

test('a formula shared among cells is spelled out in the others when its own cell changes', async () => {
  const bytes = one(
    '<row r="1"><c r="A1"><v>1</v></c><c r="B1"><f t="shared" ref="B1:B3" si="0">A1*2</f><v>2</v></c></row>' +
      '<row r="2"><c r="A2"><v>2</v></c><c r="B2"><f t="shared" si="0"/><v>4</v></c></row>' +
      '<row r="3"><c r="A3"><v>3</v></c><c r="B3"><f t="shared" si="0"/><v>6</v></c></row>',
  );
  const typed = after(bytes, cell(0, 1, 100));
  expect(rowsOf(typed)).toContain('<f>A2*2</f>');
  expect(rowsOf(typed)).toContain('<f>A3*2</f>');
  const [sheet] = readWorkbook((await recalculate(typed)).bytes).sheets;
  expect(sheet.cells.filter(({ column }) => column === 1).map(({ value }) => value)).toEqual([100, 4, 6]);
});

test('the note of the order of calculation goes, since it would name cells that changed', () => {
  const path = 'xl/calcChain.xml';
  const type = 'application/vnd.openxmlformats-officedocument.spreadsheetml.calcChain+xml';
  const bytes = packageOf({
    sheets: { Run: worksheet('<row r="1"><c r="B1"><f>1+1</f><v>2</v></c></row>') },
    parts: { [path]: '<calcChain><c r="B1" i="1"/></calcChain>' },
    described: [{ path, type, kind: 'calcChain' }],
  });
  const typed = after(bytes, cell(0, 1, 2));
  expect(Object.keys(partsOf(typed))).not.toContain(path);
  expect(textOf(typed, '[Content_Types].xml')).not.toContain('calcChain');
});

test('the used area in the head of the sheet reaches to what is typed', () => {
  const before = '<dimension ref="A1:A1"/>';
  const bytes = packageOf({
    sheets: { Run: worksheet('<row r="1"><c r="A1"><v>1</v></c></row>', { before }) },
  });
  expect(textOf(after(bytes, cell(8, 3, 1)), 'xl/worksheets/sheet1.xml')).toContain(
    '<dimension ref="A1:D9"/>',
  );
});
