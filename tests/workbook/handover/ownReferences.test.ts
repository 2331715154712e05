/** Nothing of the add-in is left in a copy: its pane does not open there. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { handOver } from '../../../workbook/handover/handOver';
import { addInId } from '../../../workbook/handover/ownReferences';
import { packageOf, partsOf, textOf, worksheet, type PackageOptions } from '../xlsx/package';

const relationships = 'http://schemas.openxmlformats.org/package/2006/relationships';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const copyOf = async (options: PackageOptions): Promise<Uint8Array> =>
  (await handOver(packageOf(options), { version: '1.2.3', date: '2026-12-01' })).bytes;

test('the number is the one in the manifest', () => {
  const manifest = readFileSync(join(__dirname, '..', '..', '..', 'manifest.xml'), 'utf8');
  expect(/<Id>([^<]+)<\/Id>/.exec(manifest)![1]).toBe(addInId);
});

describe('panes', () => {
  const panes = 'http://schemas.microsoft.com/office/webextensions/taskpanes/2010/11';
  const extension = (id: string): string =>
    `<we:webextension xmlns:we="http://schemas.microsoft.com/office/webextensions/webextension/2010/11" id="{00000000-0000-4000-8000-000000000001}"><we:reference id="${id}" version="0.1.0.0" store="developer" storeType="Registry"/><we:alternateReferences/><we:properties/><we:bindings/></we:webextension>`;

  /** The pane of each of these add-ins opens with the workbook. */
  function withPanes(ids: readonly string[]): Record<string, string> {
    const list = ids.map(
      (_, n) =>
        `<wetp:taskpane dockstate="right" visibility="0" width="350" row="4"><wetp:webextensionref xmlns:r="${office}" r:id="rId${n + 1}"/></wetp:taskpane>`,
    );
    const relations = ids.map(
      (_, n) =>
        `<Relationship Id="rId${n + 1}" Type="http://schemas.microsoft.com/office/2011/relationships/webextension" Target="webextension${n + 1}.xml"/>`,
    );
    return {
      '_rels/.rels': `<Relationships xmlns="${relationships}"><Relationship Id="rId1" Type="${office}/officeDocument" Target="xl/workbook.xml"/><Relationship Id="rId2" Type="http://schemas.microsoft.com/office/2011/relationships/webextensiontaskpanes" Target="xl/webextensions/taskpanes.xml"/></Relationships>`,
      'xl/webextensions/taskpanes.xml': `<wetp:taskpanes xmlns:wetp="${panes}">${list.join('')}</wetp:taskpanes>`,
      'xl/webextensions/_rels/taskpanes.xml.rels': `<Relationships xmlns="${relationships}">${relations.join('')}</Relationships>`,
      ...Object.fromEntries(ids.map((id, n) => [`xl/webextensions/webextension${n + 1}.xml`, extension(id)])),
    };
  }

  const workbook = (ids: readonly string[]): PackageOptions => ({
    sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c></row>') },
    parts: withPanes(ids),
    described: [
      {
        path: 'xl/webextensions/taskpanes.xml',
        type: 'application/vnd.ms-office.webextensiontaskpanes+xml',
      },
      ...ids.map((_, n) => ({
        path: `xl/webextensions/webextension${n + 1}.xml`,
        type: 'application/vnd.ms-office.webextension+xml',
      })),
    ],
  });

  test('ours goes, with the list of panes where no other is in it', async () => {
    const copy = await copyOf(workbook([addInId.toUpperCase()]));
    expect(Object.keys(partsOf(copy)).filter((path) => path.includes('webextension'))).toEqual([]);
    expect(textOf(copy, '_rels/.rels')).not.toContain('webextension');
    expect(textOf(copy, '[Content_Types].xml')).not.toContain('webextension');
  });

  test('that of another add-in stays to the letter', async () => {
    const other = '11111111-2222-4333-8444-555555555555';
    const copy = await copyOf(workbook([other, addInId]));
    expect(textOf(copy, 'xl/webextensions/webextension1.xml')).toBe(extension(other));
    expect(
      textOf(copy, 'xl/webextensions/taskpanes.xml').match(/<wetp:taskpane .*?<\/wetp:taskpane>/g),
    ).toEqual([expect.stringContaining('r:id="rId1"')]);
    expect(Object.keys(partsOf(copy))).not.toContain('xl/webextensions/webextension2.xml');
    expect(textOf(copy, '[Content_Types].xml')).not.toContain('webextension2');
  });

  test('without ours, the file stays byte for byte', async () => {
    const options = workbook(['11111111-2222-4333-8444-555555555555']);
    expect(Buffer.from(await copyOf(options)).equals(packageOf(options))).toBe(true);
  });
});
