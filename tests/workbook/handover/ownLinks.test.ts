/** The link that our functions were called through is not in a copy; those of others lead where they led. */
import { handOver } from '../../../workbook/handover/handOver';
import { linksIn } from '../../../workbook/xlsx/externalLinks';
import { Package } from '../../../workbook/xlsx/zip';
import { packageOf, partsOf, rowsOf, textOf, worksheet, type PackageOptions } from '../xlsx/package';
import { otherEngines, shownIn, withoutResults } from './otherEngines';

const relationships = 'http://schemas.openxmlformats.org/package/2006/relationships';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const copyOf = async (options: PackageOptions): Promise<Uint8Array> =>
  (await handOver(packageOf(options), { version: '1.2.3', date: '2026-12-01' })).bytes;

const part = (number: number): string => `xl/externalLinks/externalLink${number}.xml`;
const relation = (target: string): string =>
  `<Relationships xmlns="${relationships}"><Relationship Id="rId1" Type="${office}/externalLinkPath" Target="${target}" TargetMode="External"/></Relationships>`;

/** Its sheets Data and My data, with a number in A1 that tells the two apart; a name that points into another book. */
const link = (value: number): string =>
  `<externalLink xmlns="${main}"><externalBook xmlns:r="${office}" r:id="rId1"><sheetNames><sheetName val="Data"/><sheetName val="My data"/></sheetNames><definedNames><definedName name="rate" refersTo="='[2]Data'!$A$1"/></definedNames><sheetDataSet>${[0, 1].map((n) => `<sheetData sheetId="${n}"><row r="1"><cell r="A1"><v>${value + n}</v></cell></row></sheetData>`).join('')}</sheetDataSet></externalBook></externalLink>`;

/** One link a target, in this order. */
const links = (
  targets: readonly string[],
): Pick<PackageOptions, 'described' | 'names'> & {
  readonly parts: Record<string, string>;
} => ({
  parts: Object.fromEntries(
    targets.flatMap((target, n) => [
      [part(n + 1), link(100 * target.charCodeAt(0))],
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

const own = 'pace.xlam';
const row = (called: number, formula: string): string =>
  `<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>[${called}]!_xldudf_PACE_EVENT(A1)</f></c><c r="C1"><f>${formula}</f><v>7</v></c></row>`;

/** The file that a link leads to, by its number. */
function targetsOf(bytes: Uint8Array): string[] {
  const pack = Package.open(bytes);
  return linksIn(pack, 'xl/workbook.xml').map((found) => {
    const [, folder, name] = /^(.*\/)([^/]*)$/.exec(found!.path)!;
    return /Target="(?:[^"]*\/)?([^"/]+)"/.exec(textOf(bytes, `${folder}_rels/${name}.rels`))![1];
  });
}

test('alone, it goes with all that led to it', async () => {
  const copy = await copyOf({ sheets: { Run: worksheet(row(1, 'A1*2')) }, ...links([own]) });
  expect(Object.keys(partsOf(copy)).filter((path) => path.includes('externalLink'))).toEqual([]);
  expect(textOf(copy, 'xl/workbook.xml')).not.toContain('externalReference');
  expect(textOf(copy, 'xl/_rels/workbook.xml.rels')).not.toContain('externalLink');
  expect(textOf(copy, '[Content_Types].xml')).not.toContain('externalLink');
});

test.each([
  ['another formula uses it', '[1]Sheet1!A1', ''],
  [
    'a format still calls us through it',
    'A1*2',
    '<conditionalFormatting sqref="A1"><cfRule type="expression" priority="1"><formula>[1]!_xldudf_PACE_EVENT(A1)</formula></cfRule></conditionalFormatting>',
  ],
])('it stays where %s', async (_, formula, after) => {
  const options = { sheets: { Run: worksheet(row(1, formula), { after }) }, ...links(['data.xlsx']) };
  const [before, copy] = [partsOf(packageOf(options)), partsOf(await copyOf(options))];
  for (const path of Object.keys(before).filter((name) => name.includes('externalLink')))
    expect(Buffer.from(copy[path]).equals(Buffer.from(before[path]))).toBe(true);
  expect(rowsOf(await copyOf(options))).toContain(`<f>${formula}</f>`);
});

describe.each([
  [[own, 'a.xlsx', 'b.xlsx']],
  [[own, 'b.xlsx', 'a.xlsx']],
  [['a.xlsx', own, 'b.xlsx']],
  [['b.xlsx', own, 'a.xlsx']],
  [['a.xlsx', 'b.xlsx', own]],
  [['b.xlsx', 'a.xlsx', own]],
])('among %s', (targets) => {
  const number = (target: string, list: readonly string[] = targets): number => list.indexOf(target) + 1;

  /** Formulas in every sort of place, the links in them by number. */
  function options(): PackageOptions {
    const [a, b] = [number('a.xlsx'), number('b.xlsx')];
    const { parts, described, names } = links(targets);
    return {
      sheets: {
        Run: worksheet(
          row(
            number(own),
            `[${a}]Data!$A$1+'[${b}]My data'!$A$1*1&amp;" [${b}] "&amp;T[${b}]&amp;T[[#Totals],[${b}]]`,
          ) + `<row r="2"><c r="A2" t="inlineStr"><is><t>see [${b}]</t></is></c></row>`,
          {
            after: `<conditionalFormatting sqref="A1"><cfRule type="expression" priority="1"><formula>[${a}]!rate&gt;A1</formula></cfRule></conditionalFormatting><dataValidations count="1"><dataValidation type="list" sqref="A1"><formula1>'[${b}]My data'!$A$1:$A$9</formula1></dataValidation></dataValidations><oleObjects><oleObject link='[${b}]!&apos;x&apos;' shapeId="1"/></oleObjects>`,
          },
        ),
      },
      parts: {
        ...parts,
        'xl/charts/chart1.xml': `<c:chartSpace xmlns:c="urn:c"><c:f>[${b}]Data!$A$1:$A$9</c:f><c:v>[${b}]Data!$A$1</c:v></c:chartSpace>`,
        'xl/drawings/vmlDrawing1.vml': `<xml><br><x:FmlaLink>[${b}]Data!$A$1</x:FmlaLink></xml>`,
        'customXml/item1.xml': `<f>[${b}]Data!A1</f>`,
      },
      described,
      names: `${names}<definedNames><definedName name="first">[${b}]Data!$A$1</definedName></definedNames>`,
    };
  }

  test('formulas of every part follow the others to their new numbers', async () => {
    const copy = await copyOf(options());
    const left = targets.filter((target) => target !== own);
    expect(targetsOf(copy)).toEqual(left);
    const [a, b, was] = [number('a.xlsx', left), number('b.xlsx', left), number('b.xlsx')];
    expect(rowsOf(copy)).toContain(
      `<f>[${a}]Data!$A$1+'[${b}]My data'!$A$1*1&amp;" [${was}] "&amp;T[${was}]&amp;T[[#Totals],[${was}]]</f><v>7</v>`,
    );
    expect(rowsOf(copy)).toContain(`<t>see [${was}]</t>`);
    const sheet = textOf(copy, 'xl/worksheets/sheet1.xml');
    expect(sheet).toContain(`<formula>[${a}]!rate&gt;A1</formula>`);
    expect(sheet).toContain(`<formula1>'[${b}]My data'!$A$1:$A$9</formula1>`);
    expect(sheet).toMatch(new RegExp(String.raw`link=["']\[${b}\]!(?:'|&apos;)x(?:'|&apos;)["']`));
    expect(textOf(copy, 'xl/workbook.xml')).toContain(`<definedName name="first">[${b}]Data!$A$1<`);
    expect(textOf(copy, 'xl/charts/chart1.xml')).toContain(
      `<c:f>[${b}]Data!$A$1:$A$9</c:f><c:v>[${was}]Data!$A$1</c:v>`,
    );
    expect(textOf(copy, 'xl/drawings/vmlDrawing1.vml')).toContain(`<x:FmlaLink>[${b}]Data!$A$1<`);
    expect(textOf(copy, 'customXml/item1.xml')).toBe(`<f>[${was}]Data!A1</f>`);
    expect(textOf(copy, 'xl/externalLinks/externalLink3.xml' in partsOf(copy) ? part(3) : part(1))).toContain(
      `refersTo="='[2]Data'!$A$1"`,
    );
  });

  for (const engine of otherEngines.filter(({ name }) => name === 'LibreOffice'))
    (engine.isInstalled ? test : test.skip)(
      `${engine.name} finds in the copy the two files that were meant`,
      async () => {
        const simple = {
          sheets: {
            Run: worksheet(
              row(number(own), `[${number('a.xlsx')}]Data!$A$1+'[${number('b.xlsx')}]My data'!$A$1`),
            ),
          },
          ...links(targets),
        };
        const saved = engine.saved(withoutResults(await copyOf(simple)));
        const [, a, b] = /\[(\d)\]Data!\$A\$1\+&apos;\[(\d)\]My data&apos;!\$A\$1/.exec(rowsOf(saved))!;
        expect([targetsOf(saved)[Number(a) - 1], targetsOf(saved)[Number(b) - 1]]).toEqual([
          'a.xlsx',
          'b.xlsx',
        ]);
        expect(shownIn(saved).get('Run!C1')).toBe(9700 + 9801);
      },
      120_000,
    );
});
