import { strToU8 } from 'fflate';
import { CellError } from '../../../functions/cell';
import type { CellModel } from '../../../workbook/engine/engine';
import { NotAWorkbook } from '../../../workbook/xlsx/notAWorkbook';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { at } from '../engine/book';
import { packageOf, sharedStrings, worksheet, zipped } from './package';

const read = (rows: string, more: Partial<Parameters<typeof packageOf>[0]> = {}, before = '') =>
  readWorkbook(packageOf({ sheets: { Run: worksheet(rows, { before }) }, ...more }));

function cell(book: ReturnType<typeof readWorkbook>, name: string): CellModel | undefined {
  return book.sheets[0].cells.find(({ row, column }) => row === at(name).row && column === at(name).column);
}

describe('values', () => {
  test('numbers with all digits, truth values, errors, and words of every kind', () => {
    const book = read(
      '<row r="1"><c r="A1"><v>0.1234567890123456</v></c><c r="B1" t="b"><v>0</v></c><c r="C1" t="e"><v>#DIV/0!</v></c><c r="D1" t="s"><v>1</v></c><c r="E1" t="inlineStr"><is><r><t>in</t></r><r><rPr><b/></rPr><t xml:space="preserve"> line</t></r></is></c><c r="F1" t="str"><f>"x"</f><v>x</v></c><c r="G1"/></row>',
      sharedStrings(
        '<si><t>zero</t></si><si><r><t>rich </t></r><r><t>text</t></r><rPh sb="0" eb="1"><t>hint</t></rPh></si>',
      ),
    );
    const values = ['A1', 'B1', 'C1', 'D1', 'E1', 'F1', 'G1'].map((name) => cell(book, name)?.value);
    expect(values).toEqual([
      0.1234567890123456,
      false,
      new CellError('#DIV/0!'),
      'rich text',
      'in line',
      'x',
      undefined,
    ]);
  });

  test('a date in words is the number of its day; what is no number is nothing; hints are no part of a text', () => {
    const book = read(
      '<row r="1"><c r="A1" t="d"><v>2026-12-01T12:00:00</v></c><c r="B1" t="d"><v>1900-03-01</v></c><c r="C1"><v>none</v></c><c r="D1" t="e"><v>#GETTING_DATA</v></c><c r="E1" t="e"><v>#SPILL!</v></c><c r="F1" t="inlineStr"><is><t>said</t><rPh sb="0" eb="1"><t>hint</t></rPh></is></c></row>',
    );
    const values = ['A1', 'B1', 'C1', 'D1', 'E1', 'F1'].map((name) => cell(book, name)?.value);
    // 1 March 1900 is day 61 in every program that counts the 29 February 1900 of old
    expect(values).toEqual([
      46357.5,
      61,
      undefined,
      new CellError('#BUSY!'),
      new CellError('#VALUE!'),
      'said',
    ]);
  });

  test('the space by which a writer sets its elements apart is no part of a text', () => {
    const book = read(
      `<row r="1">
        <c r="A1" t="inlineStr">
          <is>
            <t>plain</t>
          </is>
        </c>
        <c r="B1" t="inlineStr">
          <is>
            <r><rPr><b/></rPr>
              <t xml:space="preserve">in </t>
            </r>
            <r><t>parts</t></r>
          </is>
        </c>
        <c r="C1">
          <f>A1&amp;"x"</f>
          <v>7</v>
        </c>
      </row>`,
    );
    expect(['A1', 'B1', 'C1'].map((name) => cell(book, name)?.value)).toEqual(['plain', 'in parts', 7]);
    expect(cell(book, 'C1')?.formula).toBe('A1&"x"');
  });

  test('what a formula spilled is left out, since nobody typed it', () => {
    const book = read(
      '<row r="1"><c r="A1" cm="1"><f t="array" ref="A1:A2">_xlfn.SEQUENCE(2)</f><v>1</v></c></row><row r="2"><c r="A2"><v>2</v></c></row><row r="3"><c r="A3"><v>2</v></c></row>',
    );
    expect(book.sheets[0].cells.map(({ row, formula }) => [row, formula])).toEqual([
      [0, 'SEQUENCE(2)'],
      [2, undefined],
    ]);
  });

  test('looks, formats of numbers, and widths', () => {
    const styles =
      '<styleSheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><numFmts count="1"><numFmt numFmtId="164" formatCode="0.000&quot; mL&quot;"/></numFmts><fonts count="3"><font/><font><b/></font><font><b val="0"/></font></fonts><fills count="1"><fill/></fills><borders count="1"><border/></borders><cellXfs count="4"><xf numFmtId="0" fontId="0"/><xf numFmtId="164" fontId="0"/><xf numFmtId="0" fontId="1"><alignment wrapText="1"/></xf><xf numFmtId="0" fontId="2"/></cellXfs></styleSheet>';
    const book = read(
      '<row r="1"><c r="A1" s="1"><v>1</v></c><c r="B1" s="2"><v>1</v></c><c r="C1" s="3"><v>1</v></c></row>',
      {
        parts: { 'xl/styles.xml': styles },
        described: [
          {
            path: 'xl/styles.xml',
            type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml',
            kind: 'styles',
          },
        ],
      },
      '<cols><col min="2" max="2" width="21.5" customWidth="1"/></cols>',
    );
    expect(cell(book, 'A1')).toEqual({ row: 0, column: 0, value: 1, numberFormat: '0.000" mL"' });
    expect(cell(book, 'B1')).toEqual({ row: 0, column: 1, value: 1, bold: true, wrap: true });
    expect(cell(book, 'C1')).toEqual({ row: 0, column: 2, value: 1 });
    expect(book.sheets[0].columnWidths).toEqual({ 1: 21.5 });
  });
});

describe('formulas', () => {
  test.each([
    ['_xlfn.STDEV.S(A1:A9)', 'STDEV.S(A1:A9)'],
    ['_xlfn._xlws.FILTER(A1:A9,A1:A9&gt;0)', 'FILTER(A1:A9,A1:A9>0)'],
    ['_xldudf_PACE_EVENT(A1:A9)', 'PACE.EVENT(A1:A9)'],
    ['[2]!_xldudf_PACE_EVENT(A1)*2', 'PACE.EVENT(A1)*2'],
    ['PACE.EVENT(A1)', 'PACE.EVENT(A1)'],
    ['SUM(_xlfn.ANCHORARRAY(F2))', 'SUM(F2#)'],
    ['_xlfn.LET(_xlpm.x,A1,_xlpm.x*2)', 'LET(x,A1,x*2)'],
    ['"_xlfn.STDEV.S("&amp;A1', '"_xlfn.STDEV.S("&A1'],
  ])('%s is read as it is typed', (filed, typed) => {
    expect(cell(read(`<row r="1"><c r="A1"><f>${filed}</f></c></row>`), 'A1')?.formula).toBe(typed);
  });

  test.each([
    ['A1:A9*2', '@A1:A9*2'],
    ['-(A:A+Run!$B$1:$B$9)', '-(@A:A+@Run!$B$1:$B$9)'],
    ['SUM(A1:A9)+MAX((A1:A9)*2)', 'SUM(A1:A9)+MAX((A1:A9)*2)'],
    ['"A1:A9"&amp;A1&amp;Run!A1', '"A1:A9"&A1&Run!A1'],
    ['PACE.EVENT(A1)*A1:A9', 'PACE.EVENT(A1)*A1:A9'],
  ])('a plain %s takes one cell of a range, as %s', (filed, typed) => {
    const rows = (attributes: string): string =>
      `<row r="1"><c r="A1"><f${attributes}>${filed}</f></c></row>`;
    expect(cell(read(rows('')), 'A1')?.formula).toBe(typed);
    const asArray = cell(read(rows(' t="array" ref="A1"')), 'A1')?.formula;
    expect(asArray).toBe(filed.replace(/&amp;/g, '&'));
  });

  test('a shared one is spelled out for its cell', () => {
    const book = read(
      '<row r="1"><c r="B1"><f t="shared" ref="B1:B3" si="0">_xldudf_PACE_EVENT(A1,$A$1)</f></c></row><row r="3"><c r="B3"><f t="shared" si="0"/></c></row>',
    );
    expect(cell(book, 'B3')?.formula).toBe('PACE.EVENT(A3,$A$1)');
  });

  test('a shared one moves what is relative in it, in every kind of reference, and nothing else', () => {
    const book = read(
      `<row r="2"><c r="D2"><f t="shared" ref="D2:E3" si="4">SUM(A2:B2,$A2,A$2,'My run'!A2,C:C)&amp;"A2"&amp;rate</f></c></row><row r="3"><c r="E3"><f t="shared" si="4"/></c></row>`,
    );
    expect(cell(book, 'E3')?.formula).toBe(`SUM(B3:C3,$A3,B$2,'My run'!B3,D:D)&"A2"&rate`);
  });

  test('a data table is no formula: its cells keep their values', () => {
    const book = read(
      '<row r="1"><c r="B1"><f t="dataTable" ref="B1:B2" dt2D="0" dtr="0" r1="A1"/><v>7</v></c></row>',
    );
    expect(cell(book, 'B1')).toEqual({ row: 0, column: 1, value: 7 });
  });

  test('names, but not those that Excel keeps for itself', () => {
    const book = read('<row r="1"/>', {
      names:
        '<definedNames><definedName name="rate">Run!$A$1</definedName><definedName name="local" localSheetId="0">Run!$A$2</definedName><definedName name="_xlnm.Print_Area" localSheetId="0">Run!$A$1</definedName></definedNames>',
    });
    expect(book.names).toEqual([
      { name: 'rate', refersTo: 'Run!$A$1' },
      { name: 'local', refersTo: 'Run!$A$2', sheet: 'Run' },
    ]);
  });
});

describe('what is no workbook is refused in words', () => {
  const good = packageOf({ sheets: { Run: worksheet('<row r="1"><c r="A1"><v>1</v></c></row>') } });
  const damaged = good.slice();
  damaged[good.length >> 1] ^= 0xff;

  test.each<[string, Uint8Array, RegExp]>([
    ['an empty file', new Uint8Array(), /empty/],
    [
      'one with a password, or an old .xls',
      new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]),
      /password|\.xls/,
    ],
    ['comma separated text', strToU8('t,V\n0,0\n'), /not an \.xlsx/],
    ['a file cut off', good.slice(0, -40), /cut off or damaged/],
    ['the start of a zip and no more', strToU8('PK\u0003\u0004'), /cut off or damaged/],
    ['a zip of something else', zipped({ 'a.txt': 'a' }), /not a workbook/],
    ['a part missing', packageOf({ sheets: { Run: '' } }).slice(), /damaged|cannot be read/],
    [
      'a text document',
      zipped({
        '_rels/.rels':
          '<Relationships><Relationship Id="r" Type="x/officeDocument" Target="word/document.xml"/></Relationships>',
        'word/document.xml': '<document/>',
      }),
      /holds a document/,
    ],
    [
      'XML that is not well formed',
      packageOf({ sheets: { Run: '<worksheet><sheetData><row></sheetData></worksheet>' } }),
      /damaged/,
    ],
  ])('%s', (_, bytes, words) => {
    const reading = (): unknown => readWorkbook(bytes);
    expect(reading).toThrow(NotAWorkbook);
    expect(reading).toThrow(words);
  });

  test('bytes that have changed on the way', () => {
    expect(() => readWorkbook(damaged)).toThrow(NotAWorkbook);
  });
});
