/** XML may be spelled in more ways than one: a copy is made of each, and each still reads the same. */
import * as XLSX from '@e965/xlsx';
import { handOver } from '../../../workbook/handover/handOver';
import { packageOf, textOf } from '../xlsx/package';

const origin = { version: '1.2.3', date: '2026-12-01' };
const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const fit = '_xldudf_PACE_HALFLIFE(A1:A4,B1:B4,1)';
const readings = [
  [0, 8],
  [10, 4],
  [20, 2],
  [30, 1],
];

/** Every element under a prefix, no cell or row with a name of its own, formulas in CDATA, no dimension. */
const prefixed = `<?xml version='1.0' encoding='UTF-8'?>
<x:worksheet xmlns:x="${main}">
  <x:sheetData>
    ${readings
      .map(([t, y], n) => {
        const calls = [`_xldudf_PACE_EVENT(A${n + 1}+1)`, ...(n === 0 ? [fit] : [])];
        const cells = calls.map((call) => `<x:c><x:f><![CDATA[${call}]]></x:f></x:c>`);
        return `<x:row><x:c><x:v>${t}</x:v></x:c><x:c><x:v> ${y} </x:v></x:c>${cells.join('')}</x:row>`;
      })
      .join('\n    ')}
  </x:sheetData>
  <x:pageMargins left='0.7' right="0.7" top="1" bottom="1" header="0" footer="0"/>
</x:worksheet>`;

/** Attributes in single quotes, text with space at its ends, rich text. */
const plain = `<worksheet xmlns='${main}'><sheetData><row r='1' spans='1:4' ht='30' customHeight='1'><c r='A1'><v>1</v></c><c r='B1'><f>_xldudf_PACE_EVENT(A1:A2)</f></c><c r='C1' t='inlineStr'><is><r><t xml:space='preserve'> a </t></r><r><rPr><i/></rPr><t>b</t></r></is></c></row><row r='2'><c r='A2'><v>4</v></c></row></sheetData></worksheet>`;

const valuesOf = (bytes: Uint8Array, sheet: string): unknown[][] =>
  XLSX.utils.sheet_to_json(XLSX.read(bytes, { type: 'array' }).Sheets[sheet], { header: 1, defval: null });

test('under a prefix, without names, in CDATA', async () => {
  const { bytes, formulas } = await handOver(packageOf({ sheets: { Run: prefixed } }), origin);
  expect(formulas.map(({ said }) => said !== undefined)).toEqual([true, false, true, true, true]);
  const [first, ...others] = valuesOf(bytes, 'Run') as number[][];
  expect(first.slice(0, 3)).toEqual([0, 8, 1]);
  expect(first[3]).toBeCloseTo(10, 9); // the readings halve every 10
  expect(others.map((row) => row.slice(0, 3))).toEqual([
    [10, 4, 1 / 11],
    [20, 2, 1 / 21],
    [30, 1, 1 / 31],
  ]);
  const sheet = textOf(bytes, 'xl/worksheets/sheet1.xml');
  expect(sheet).not.toMatch(/PACE|<c[ >]|<f[ >]|<row[ >]/);
  expect(sheet).toMatch(/left='0\.7' right="0\.7"[^>]*\/>\s*<x:legacyDrawing /);
});

test('in single quotes, with a row’s looks and rich text beside a spill', async () => {
  const { bytes } = await handOver(packageOf({ sheets: { Run: plain } }), origin);
  const sheet = textOf(bytes, 'xl/worksheets/sheet1.xml');
  expect(sheet).toContain(`<row r='1' spans='1:4' ht='30' customHeight='1'>`);
  expect(sheet).toContain(`<is><r><t xml:space='preserve'> a </t></r><r><rPr><i/></rPr><t>b</t></r></is>`);
  expect(valuesOf(bytes, 'Run')).toEqual([
    [1, 1, ' a b'],
    [4, 0.25, null],
  ]);
});
