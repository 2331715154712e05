/** "Strict Open XML Spreadsheet" has names of its own (ISO/IEC 29500-1, annex A): what is added goes by them too. */
import * as XLSX from '@e965/xlsx';
import { strFromU8 } from 'fflate';
import { recalculate } from '../../../workbook/commands/recalculate';
import type { CellModel } from '../../../workbook/engine/engine';
import { handOver } from '../../../workbook/handover/handOver';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { typeCells } from '../../../workbook/xlsx/typeCells';
import { packageOf, partsOf, textOf, worksheet, zipped } from '../xlsx/package';
import { fit } from './fit';

const strictNames: readonly (readonly [string, string])[] = [
  [
    'http://schemas.openxmlformats.org/spreadsheetml/2006/main',
    'http://purl.oclc.org/ooxml/spreadsheetml/main',
  ],
  [
    'http://schemas.openxmlformats.org/officeDocument/2006/relationships',
    'http://purl.oclc.org/ooxml/officeDocument/relationships',
  ],
];

const strictly = (bytes: Uint8Array): Uint8Array =>
  zipped(
    Object.fromEntries(
      Object.entries(partsOf(bytes)).map(([path, part]) => [
        path,
        strictNames.reduce((xml, [usual, strict]) => xml.replaceAll(usual, strict), strFromU8(part)),
      ]),
    ),
  );

const usualNames = (bytes: Uint8Array): string[] =>
  Object.keys(partsOf(bytes)).filter(
    (path) => !path.endsWith('.vml') && strictNames.some(([usual]) => textOf(bytes, path).includes(usual)),
  );

test('a spill, and a number format where there were no styles', async () => {
  const bytes = strictly(
    packageOf({ sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c></row>') } }),
  );
  const before = readWorkbook(bytes);
  const cells: CellModel[] = [
    { row: 0, column: 0, value: 40, numberFormat: '0.00' },
    { row: 0, column: 1, value: null, formula: 'PACE.EVENT({40;25})' },
  ];
  const typed = typeCells(bytes, before, { ...before, sheets: [{ name: 'Run', cells }] });
  const after = (await recalculate(typed)).bytes;
  expect(usualNames(after)).toEqual([]);
  expect(Object.keys(partsOf(after))).toEqual(expect.arrayContaining(['xl/metadata.xml', 'xl/styles.xml']));
  const { A1, B2 } = XLSX.read(after, { type: 'array', cellNF: true }).Sheets.Run;
  expect([A1, B2]).toMatchObject([{ v: 40, z: '0.00' }, { v: 0.04 }]);
});

test('Method, Workings, notes and what points to them are in the workbook’s own namespaces', async () => {
  const { bytes } = await handOver(strictly(packageOf({ sheets: { Run: worksheet(fit) } })), {
    version: '1.2.3',
    date: '2026-12-01',
  });
  const added = Object.keys(partsOf(bytes)).filter((path) => /sheet[23]\.xml$|comments1\.xml$/.test(path));
  expect(added.sort()).toEqual(['xl/comments1.xml', 'xl/worksheets/sheet2.xml', 'xl/worksheets/sheet3.xml']);
  expect(usualNames(bytes)).toEqual([]);
  const { SheetNames } = XLSX.read(bytes, { type: 'array' });
  expect(SheetNames).toEqual(['Run', 'Method', 'Workings']);
});
