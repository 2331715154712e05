/** Nothing of the add-in is left in a copy: not the link that its functions were called through, nor its pane. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { handOver } from '../../../workbook/handover/handOver';
import { addInId } from '../../../workbook/handover/ownReferences';
import { packageOf, partsOf, rowsOf, textOf, worksheet, type PackageOptions } from '../xlsx/package';

const relationships = 'http://schemas.openxmlformats.org/package/2006/relationships';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const copyOf = async (options: PackageOptions): Promise<Uint8Array> =>
  (await handOver(packageOf(options), { version: '1.2.3', date: '2026-12-01' })).bytes;

test('the number is the one in the manifest', () => {
  const manifest = readFileSync(join(__dirname, '..', '..', '..', 'manifest.xml'), 'utf8');
  expect(/<Id>([^<]+)<\/Id>/.exec(manifest)![1]).toBe(addInId);
});

describe('links', () => {
  const relation = (target: string): string =>
    `<Relationships xmlns="${relationships}"><Relationship Id="rId1" Type="${office}/externalLinkPath" Target="${target}" TargetMode="External"/></Relationships>`;
  const link =
    '<externalLink xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><externalBook xmlns:r="http://schemas.openxmlformats.org/officeDocument/2006/relationships" r:id="rId1"/></externalLink>';
  const part = (number: number): string => `xl/externalLinks/externalLink${number}.xml`;

  /** One link a target, in this order. */
  const linked = (formula: string, targets: readonly string[]): PackageOptions => ({
    sheets: {
      Run: worksheet(
        `<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>[1]!_xldudf_PACE_EVENT(A1)</f></c><c r="C1"><f>${formula}</f><v>7</v></c></row>`,
      ),
    },
    parts: Object.fromEntries(
      targets.flatMap((target, n) => [
        [part(n + 1), link],
        [`xl/externalLinks/_rels/externalLink${n + 1}.xml.rels`, relation(target)],
      ]),
    ),
    described: targets.map((_, n) => ({
      path: part(n + 1),
      type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.externalLink+xml',
      kind: 'externalLink',
    })),
    names: `<externalReferences>${targets.map((_, n) => `<externalReference r:id="rId${n + 50}"/>`).join('')}</externalReferences>`,
  });

  test('one that our functions alone were called through goes, with all that led to it', async () => {
    const copy = await copyOf(linked('A1*2', ['pace.xlam']));
    expect(Object.keys(partsOf(copy)).filter((path) => path.includes('externalLink'))).toEqual([]);
    expect(textOf(copy, 'xl/workbook.xml')).not.toContain('externalReference');
    expect(textOf(copy, 'xl/_rels/workbook.xml.rels')).not.toContain('externalLink');
    expect(textOf(copy, '[Content_Types].xml')).not.toContain('externalLink');
  });

  test.each([
    ['another formula uses it', '[1]Sheet1!A1', ['data.xlsx']],
    ['others follow, which would lose their numbers', '[2]Sheet1!A1', ['pace.xlam', 'data.xlsx']],
  ])('it stays where %s', async (_, formula, targets) => {
    const options = linked(formula, targets);
    const [before, copy] = [partsOf(packageOf(options)), partsOf(await copyOf(options))];
    for (const path of Object.keys(before).filter((name) => name.includes('externalLink')))
      expect(Buffer.from(copy[path]).equals(Buffer.from(before[path]))).toBe(true);
    expect(rowsOf(await copyOf(options))).toContain(`<f>${formula}</f>`);
    expect(textOf(await copyOf(options), 'xl/workbook.xml').match(/<externalReference /g)).toHaveLength(
      targets.length,
    );
  });
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
