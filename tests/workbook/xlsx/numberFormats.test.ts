/** Number formats given on the page go into the file that was opened, beside the looks it has. */
import * as XLSX from '@e965/xlsx';
import type { BookModel, CellModel } from '../../../workbook/engine/engine';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { typeCells } from '../../../workbook/xlsx/typeCells';
import { otherEngines } from '../handover/otherEngines';
import { packageOf, partsOf, rowsOf, textOf, worksheet } from './package';

const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const styles = (formats: string, prefix = ''): string => {
  const p = prefix;
  return `<${p}styleSheet xmlns${p ? `:${p.slice(0, -1)}` : ''}="${main}">${formats}<${p}fonts count="2"><${p}font/><${p}font><${p}i/></${p}font></${p}fonts><${p}fills count="1"><${p}fill/></${p}fills><${p}borders count="1"><${p}border/></${p}borders><${p}cellXfs count="2"><${p}xf numFmtId="0" fontId="0"/><${p}xf applyFont="1" fontId="1" numFmtId='2'><${p}alignment horizontal="center"/></${p}xf></${p}cellXfs></${p}styleSheet>`;
};

const rows =
  '<row r="1"><c r="A1" s="1"><v>1.5</v></c><c r="B1" ><f>A1*2</f><v>3</v></c><c r="C1" s="1"/></row>';

const opened = (xml: string): Uint8Array =>
  packageOf({
    sheets: { Run: worksheet(rows) },
    parts: { 'xl/styles.xml': xml },
    described: [
      {
        path: 'xl/styles.xml',
        type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml',
        kind: 'styles',
      },
    ],
  });

function formatted(bytes: Uint8Array, formats: Readonly<Record<string, string | undefined>>): Uint8Array {
  const before = readWorkbook(bytes);
  const [sheet] = before.sheets;
  const cells = sheet.cells.map((cell): CellModel => {
    const place = XLSX.utils.encode_cell({ r: cell.row, c: cell.column });
    return place in formats ? { ...cell, numberFormat: formats[place] } : cell;
  });
  const now: BookModel = { ...before, sheets: [{ ...sheet, cells }] };
  return typeCells(bytes, before, now);
}

test('a format of one’s own: the cell’s font and alignment stay, and so does every byte of what was there', () => {
  const xml = styles('');
  const bytes = formatted(opened(xml), { A1: '0.0 "m&l"', B1: '0.0 "m&l"' });
  expect(rowsOf(bytes)).toBe(rows.replace('A1" s="1"', 'A1" s="2"').replace('B1" >', 'B1" s="3" >'));
  const now = textOf(bytes, 'xl/styles.xml');
  expect(now).toBe(
    xml
      .replace(
        '<fonts',
        '<numFmts count="1"><numFmt numFmtId="164" formatCode="0.0 &quot;m&amp;l&quot;"/></numFmts><fonts',
      )
      .replace('<cellXfs count="2">', '<cellXfs count="4">')
      .replace(
        '</cellXfs>',
        '<xf numFmtId="164" applyNumberFormat="1" applyFont="1" fontId="1"><alignment horizontal="center"/></xf><xf numFmtId="164" applyNumberFormat="1" fontId="0"/></cellXfs>',
      ),
  );
  const { A1, B1 } = XLSX.read(bytes, { type: 'array', cellNF: true }).Sheets.Run;
  expect([A1, B1]).toMatchObject([
    { z: '0.0 "m&l"', v: 1.5 },
    { z: '0.0 "m&l"', v: 3 },
  ]);
});

test('formats that the file or the standard knows are named again, under a prefix too', () => {
  const known = '<x:numFmts count="1"><x:numFmt numFmtId="170" formatCode="0.0E+0"/></x:numFmts>';
  const bytes = formatted(opened(styles(known, 'x:')), { A1: '0.0E+0', B1: '0.00E+00' });
  const now = textOf(bytes, 'xl/styles.xml');
  expect(now).toContain(known);
  expect(now).toContain('<x:xf numFmtId="170" applyNumberFormat="1" applyFont="1" fontId="1">');
  expect(now).toContain('<x:xf numFmtId="11" applyNumberFormat="1" fontId="0"/></x:cellXfs>');
  expect(readWorkbook(bytes).sheets[0].cells.map(({ numberFormat }) => numberFormat)).toContain('0.0E+0');
});

describe('an empty cell', () => {
  const cellsOf = (bytes: Uint8Array): Record<string, string | undefined> =>
    Object.fromEntries(
      readWorkbook(bytes).sheets[0].cells.map(({ row, column, numberFormat }) => [
        XLSX.utils.encode_cell({ r: row, c: column }),
        numberFormat,
      ]),
    );
  const retyped = (bytes: Uint8Array, change: (cells: readonly CellModel[]) => CellModel[]): Uint8Array => {
    const before = readWorkbook(bytes);
    const [sheet] = before.sheets;
    return typeCells(bytes, before, { ...before, sheets: [{ ...sheet, cells: change(sheet.cells) }] });
  };

  test('has the format that it is given, and one that the file gave it', () => {
    const empty = { row: 3, column: 1, value: null, numberFormat: '0.000' };
    const bytes = retyped(opened(styles('')), (cells) => [...cells, empty]);
    expect(rowsOf(bytes)).toBe(`${rows}<row r="4"><c r="B4" s="2"/></row>`);
    expect(cellsOf(bytes)).toEqual({ A1: '0.00', B1: undefined, C1: '0.00', B4: '0.000' });
  });

  test('loses it with the cell, and keeps it without', () => {
    const bytes = opened(styles(''));
    const cleared = retyped(bytes, (cells) => cells.filter(({ column }) => column !== 2));
    expect(cellsOf(cleared)).toEqual({ A1: '0.00', B1: undefined });
    expect(Buffer.from(retyped(bytes, (cells) => [...cells])).equals(bytes)).toBe(true);
  });

  test('keeps it when its number goes', () => {
    const emptied = retyped(opened(styles('')), (cells) =>
      cells.map((cell) => (cell.column === 0 ? { ...cell, value: null } : cell)),
    );
    expect(rowsOf(emptied)).toBe(rows.replace('<c r="A1" s="1"><v>1.5</v></c>', '<c r="A1" s="1"/>'));
  });
});

describe('styles without looks for cells', () => {
  const fonts = '<fonts count="1"><font/></fonts>';
  test.each([
    [
      'with fonts',
      `<styleSheet xmlns="${main}">${fonts}<dxfs count="0"/></styleSheet>`,
      /<\/fonts><cellXfs count="2">/,
    ],
    ['with nothing', `<styleSheet xmlns="${main}"/>`, /<\/numFmts><cellXfs count="2">/],
    [
      'under a prefix',
      `<x:styleSheet xmlns:x="${main}"></x:styleSheet>`,
      /<\/x:numFmts><x:cellXfs count="2">/,
    ],
  ])('%s get a list of them in its place, plain cells first', (_, xml, place) => {
    const bytes = formatted(opened(xml), { B1: '0.0 "m"' });
    expect(textOf(bytes, 'xl/styles.xml')).toMatch(place);
    const { A1, B1 } = XLSX.read(bytes, { type: 'array', cellNF: true }).Sheets.Run;
    expect(B1).toMatchObject({ z: '0.0 "m"', v: 3 });
    expect(A1).toMatchObject({ v: 1.5 });
  });
});

test('a format is taken away: the number is shown as it is', () => {
  const bytes = formatted(opened(styles('')), { A1: undefined });
  expect(XLSX.read(bytes, { type: 'array', cellNF: true }).Sheets.Run.A1).toMatchObject({ z: 'General' });
});

test('no other part has changed; with no styles in it, the file is given some', () => {
  const before = opened(styles(''));
  const after = partsOf(formatted(before, { A1: '0' }));
  const changed = Object.entries(partsOf(before)).filter(
    ([path, part]) => !Buffer.from(part).equals(after[path]),
  );
  expect(changed.map(([path]) => path)).toEqual(['xl/worksheets/sheet1.xml', 'xl/styles.xml']);
  const bare = packageOf({ sheets: { Run: worksheet('<row r="1"><c r="A1"><v>0.5</v></c></row>') } });
  const { A1 } = XLSX.read(formatted(bare, { A1: '0.0 %' }), { type: 'array', cellNF: true }).Sheets.Run;
  expect(A1).toMatchObject({ z: '0.0 %', v: 0.5 });
});

for (const engine of otherEngines) {
  (engine.isInstalled ? test : test.skip)(
    `a file that ${engine.name} saved: it reads the new format, and other cells keep theirs`,
    () => {
      const theirs = engine.saved(formatted(opened(styles('')), { B1: '0.000' }));
      const ours = engine.saved(formatted(theirs, { A1: '0.0000 "mol"' }));
      const { A1, B1 } = XLSX.read(ours, { type: 'array', cellNF: true }).Sheets.Run;
      expect([A1, B1]).toMatchObject([{ w: '1.5000 mol' }, { z: '0.000', w: '3.000' }]);
    },
    120_000,
  );
}
