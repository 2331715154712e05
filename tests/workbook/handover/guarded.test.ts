/** Workbooks that somebody guards: protected, with hidden sheets, with macros. Copies keep all of it. */
import { recalculate } from '../../../workbook/commands/recalculate';
import { handOver } from '../../../workbook/handover/handOver';
import { kindOf } from '../../../workbook/xlsx/kinds';
import { packageOf, partsOf, textOf, withMacros, worksheet } from '../xlsx/package';
import { fit } from './fit';

const sheetProtection =
  '<sheetProtection algorithmName="SHA-512" hashValue="aGFzaA==" saltValue="c2FsdA==" spinCount="100000" sheet="1" objects="1"/><protectedRanges><protectedRange sqref="A1:B9" name="readings"/></protectedRanges>';
const workbookProtection = '<workbookProtection workbookAlgorithmName="SHA-512" lockStructure="1"/>';
const signature = {
  path: 'xl/vbaProjectSignature.bin',
  type: 'application/vnd.ms-office.vbaProjectSignature',
};
const project = {
  path: 'xl/vbaProject.bin',
  type: 'application/vnd.ms-office.vbaProject',
  kind: 'vbaProject',
};

const plain = packageOf({
  sheets: { Run: worksheet(fit, { after: sheetProtection }) },
  parts: {
    'xl/worksheets/hidden.xml': worksheet('<row r="1"><c r="A1"><f>_xldudf_PACE_EVENT(2)</f></c></row>'),
    [project.path]: new Uint8Array([0xd0, 0xcf, 1, 2, 3]),
    [signature.path]: new Uint8Array([9, 8]),
  },
  described: [
    {
      path: 'xl/worksheets/hidden.xml',
      type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml',
      kind: 'worksheet',
    },
    project,
    signature,
  ],
  moreSheets: `<sheet name="Aside" sheetId="7" state="veryHidden" r:id="rId50"/>`,
  names: workbookProtection,
});

test.each([
  ['recalculated', async (bytes: Uint8Array) => (await recalculate(bytes)).bytes],
  [
    'handed over',
    async (bytes: Uint8Array) => (await handOver(bytes, { version: '1.2.3', date: '2026-12-01' })).bytes,
  ],
])('%s: protection, hiding and macros are as they were', async (_, copied) => {
  const bytes = withMacros(plain);
  const copy = await copied(bytes);
  const workbook = textOf(copy, 'xl/workbook.xml');
  expect(workbook).toContain('<sheet name="Aside" sheetId="7" state="veryHidden" r:id="rId50"/>');
  expect(workbook).toContain(workbookProtection);
  expect(textOf(copy, 'xl/worksheets/sheet1.xml')).toContain(sheetProtection);
  for (const { path, type } of [project, signature]) {
    expect(partsOf(copy)[path]).toEqual(partsOf(bytes)[path]);
    expect(textOf(copy, '[Content_Types].xml')).toContain(`PartName="/${path}" ContentType="${type}"`);
  }
  expect(kindOf(copy)?.extension).toBe('.xlsm');
  // what is hidden is worked out all the same
  expect(textOf(copy, 'xl/worksheets/hidden.xml')).toContain('<v>0.5</v>');
});
