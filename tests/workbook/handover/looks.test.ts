/** How the sheets and notes look that a copy has beyond the workbook, and that the workbook's own looks stay. */
import * as XLSX from '@e965/xlsx';
import { handOver } from '../../../workbook/handover/handOver';
import { packageOf, rowsOf, textOf, worksheet } from '../xlsx/package';
import { fit } from './fit';
import { otherEngines } from './otherEngines';

const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const looks = [
  '<numFmt numFmtId="164" formatCode="0.0&quot; s&quot;"/>',
  '<xf numFmtId="0"/><xf numFmtId="164"/>',
];
const lists = `<fonts count="1"><font><b/><sz val="9"/></font></fonts><fills count="1"><fill/></fills><borders count="1"><border/></borders><cellXfs count="2">${looks[1]}</cellXfs>`;
const after = '<tableStyles count="0"/>';
const styles = `<styleSheet xmlns="${main}"><numFmts count="1">${looks[0]}</numFmts>${lists}${after}</styleSheet>`;

const workbook = packageOf({
  sheets: {
    Run: worksheet(fit.replace('r="A1"', 'r="A1" s="1"').replace('<v>2</v>', '<v>2.1</v>'), {
      before: '<cols><col min="4" max="4" width="30"/><col min="5" max="5" width="40"/></cols>',
    }),
  },
  parts: { 'xl/styles.xml': styles },
  described: [
    {
      path: 'xl/styles.xml',
      type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml',
      kind: 'styles',
    },
  ],
});

let copy: Uint8Array;
beforeAll(async () => {
  copy = (await handOver(workbook, { version: '1.2.3', date: '2026-12-01' })).bytes;
});

const cellsOf = (sheet: string, bytes = copy): XLSX.CellObject[] =>
  Object.values(XLSX.read(bytes, { type: 'array', cellNF: true }).Sheets[sheet] as XLSX.WorkSheet).filter(
    (cell): cell is XLSX.CellObject => typeof cell === 'object' && 't' in cell,
  );

test('a number of many digits is shown with six of them, a constant with all it has', () => {
  const numbers = cellsOf('Workings').filter(({ v }) => typeof v === 'number');
  const long = numbers.filter(({ v }) => Number((v as number).toPrecision(6)) !== v);
  expect(long.length).toBeGreaterThan(2);
  for (const { v, w } of numbers) expect(Number(w)).toBe(Number((v as number).toPrecision(6)));
  const gasConstant = cellsOf('Method').find(({ v }) => v === 8.31446261815324);
  expect(gasConstant).toMatchObject({ z: 'General' });
});

test('looks are added behind those of the workbook, which stay as they were', () => {
  const now = textOf(copy, 'xl/styles.xml');
  for (const kept of [...looks, after]) expect(now).toContain(kept);
  expect(now).toMatch(/<\/cellXfs><dxfs count="1"><dxf>.*<\/dxf><\/dxfs><tableStyles/);
  expect(now).toMatch(
    /<fonts count="2"><font><b\/><sz val="9"\/><\/font><font><b\/><sz val="9"\/><\/font><\/fonts>/,
  );
  expect(rowsOf(copy)).toContain('<c r="A1" s="1">');
  const [, count] = /<cellXfs count="(\d+)"/.exec(now)!;
  expect(now.match(/<xf /g)).toHaveLength(Number(count));
});

test('the headings of Method stay in sight, and its flag catches the eye', () => {
  const method = textOf(copy, 'xl/worksheets/sheet2.xml');
  const headings = /<row r="(\d+)"[^>]*><c [^>]*><is><t [^>]*>Sheet</.exec(method)!;
  expect(method).toContain(`<pane ySplit="${headings[1]}"`);
  expect(method).toContain('operator="equal"><formula>"inputs have changed"</formula>');
});

test('a note is as high as its text, and about as wide as a line of it', () => {
  const drawing = textOf(copy, 'xl/drawings/vmlDrawing1.vml');
  const [left, , top, , right, , bottom] = /<x:Anchor>(.*?)<\/x:Anchor>/
    .exec(drawing)![1]
    .split(',')
    .map(Number);
  // columns D and E together are 70 characters wide
  expect([left, right]).toEqual([3, 5]);
  const text = /<t [^>]*>(.*?)<\/t>/s.exec(textOf(copy, 'xl/comments1.xml'))![1];
  expect(bottom - top).toBeGreaterThan(text.length / 60);
  expect(bottom - top).toBeLessThan(text.length / 60 + 8);
});

for (const engine of otherEngines) {
  (engine.isInstalled ? test : test.skip)(
    `${engine.name} shows the numbers of both sheets as they are meant`,
    () => {
      const saved = engine.saved(copy);
      for (const sheet of ['Method', 'Workings']) {
        const [ours, theirs] = [cellsOf(sheet), cellsOf(sheet, saved)].map((cells) =>
          cells.flatMap(({ v, w }) => (typeof v === 'number' ? [w] : [])),
        );
        expect(ours.length).toBeGreaterThan(5);
        expect(theirs).toEqual(ours);
      }
    },
    120_000,
  );
}
