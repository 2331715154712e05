/** "Strict Open XML Spreadsheet" has names of its own (ISO/IEC 29500-1, annex A): what is added goes by them too. */
import * as XLSX from '@e965/xlsx';
import { strFromU8 } from 'fflate';
import { handOver } from '../../../workbook/handover/handOver';
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

test('Method, Workings, notes and what points to them are in the workbook’s own namespaces', async () => {
  const { bytes } = await handOver(strictly(packageOf({ sheets: { Run: worksheet(fit) } })), {
    version: '1.2.3',
    date: '2026-12-01',
  });
  const added = Object.keys(partsOf(bytes)).filter((path) => /sheet[23]\.xml$|comments1\.xml$/.test(path));
  expect(added.sort()).toEqual(['xl/comments1.xml', 'xl/worksheets/sheet2.xml', 'xl/worksheets/sheet3.xml']);
  for (const path of Object.keys(partsOf(bytes)).filter((one) => !one.endsWith('.vml')))
    for (const [usual] of strictNames)
      expect([path, textOf(bytes, path).includes(usual)]).toEqual([path, false]);
  const { SheetNames } = XLSX.read(bytes, { type: 'array' });
  expect(SheetNames).toEqual(['Run', 'Method', 'Workings']);
});
