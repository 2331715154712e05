/** Calls of ours in charts, controls, pivot tables and whatever else has a part of its own beside the sheets. */
import { elsewhereLine } from '../../../workbook/handover/elsewhere';
import { handOver, type HandedOver } from '../../../workbook/handover/handOver';
import { packageOf, partsOf, textOf, worksheet, type PackageOptions } from '../xlsx/package';

const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const call = (cell: string): string => `_xldudf_PACE_EVENT(Run!${cell})`;

/** In this order: the ids count from rId1. */
const relations = (...list: readonly (readonly [kind: string, target: string])[]): string =>
  `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">${list
    .map(
      ([kind, target], n) => `<Relationship Id="rId${n + 1}" Type="${office}/${kind}" Target="${target}"/>`,
    )
    .join('')}</Relationships>`;

const chart = (inside: string): string =>
  `<c:chartSpace xmlns:c="http://schemas.openxmlformats.org/drawingml/2006/chart"><c:chart>${inside}</c:chart></c:chartSpace>`;

const series = (formula: string): string =>
  `<c:plotArea><c:ser><c:val><c:numRef><c:f>${formula}</c:f></c:numRef></c:val></c:ser></c:plotArea>`;

const drawing = (inside: string): string =>
  `<xdr:wsDr xmlns:xdr="http://schemas.openxmlformats.org/drawingml/2006/spreadsheetDrawing" xmlns:r="${office}" xmlns:c="http://schemas.openxmlformats.org/drawingml/2006/chart">${inside}</xdr:wsDr>`;
const frame = (id: string): string => `<xdr:graphicFrame><c:chart r:id="${id}"/></xdr:graphicFrame>`;

/** One reading in A1 of the sheet Run; the given parts belong to it, in the order of their ids. */
const onSheet = (
  list: readonly (readonly [kind: string, target: string])[],
  parts: Readonly<Record<string, string>>,
  after = '',
): PackageOptions => ({
  sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c></row>', { after }) },
  parts: { 'xl/worksheets/_rels/sheet1.xml.rels': relations(...list), ...parts },
});

/** Every part is as it was. */
async function copyOf(options: PackageOptions): Promise<HandedOver> {
  const bytes = packageOf(options);
  const copy = await handOver(bytes, { version: '1.2.3', date: '2026-12-01' });
  const [before, after] = [partsOf(bytes), partsOf(copy.bytes)];
  for (const path of Object.keys(options.parts ?? {}))
    expect([path, Buffer.from(after[path]).equals(Buffer.from(before[path]))]).toEqual([path, true]);
  return copy;
}

const linesOf = async (options: PackageOptions): Promise<string[]> =>
  (await copyOf(options)).elsewhere.map(elsewhereLine);

test('charts are counted as they stand on their sheet, and a title or an extension counts too', async () => {
  const options = onSheet([['drawing', '../drawings/drawing1.xml']], {
    'xl/drawings/drawing1.xml': drawing(
      `<xdr:sp textlink="${call('A1')}"/><xdr:sp macro="" textlink="Run!A1"/>${frame('rId3')}${frame('rId1')}${frame('rId2')}`,
    ),
    'xl/drawings/_rels/drawing1.xml.rels': relations(
      ['chart', '../charts/chart7.xml'],
      ['chart', '../charts/chart8.xml'],
      ['chart', '../charts/chart9.xml'],
    ),
    'xl/charts/chart7.xml': chart(
      `<c:title><c:tx><c:strRef><c:f>PACE.UNIT(1)&amp;""</c:f></c:strRef></c:tx></c:title>${series('Run!$A$1')}`,
    ),
    'xl/charts/chart8.xml': chart(
      `${series(call('A1'))}<c:extLst><c:ext><c15:f xmlns:c15="urn:c15">${call('A2')}</c15:f></c:ext></c:extLst>`,
    ),
    'xl/charts/chart9.xml': chart(
      `${series('Run!$A$1')}<c:title><c:tx><c:rich><a:t xmlns:a="urn:a">PACE.EVENT(A1)</a:t></c:rich></c:tx></c:title>`,
    ),
  });
  const kept = 'without the add-in it keeps what it last showed';
  expect(await linesOf(options)).toEqual([
    `a shape on sheet Run calls PACE.EVENT: ${kept}`,
    `chart 2 on sheet Run calls PACE.UNIT: ${kept}`,
    `chart 3 on sheet Run calls PACE.EVENT: ${kept}`,
    `chart 3 on sheet Run calls PACE.EVENT: ${kept}`,
  ]);
});

test('a chart that is a sheet of its own, whose name ours must not take', async () => {
  const options: PackageOptions = {
    sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c></row>') },
    parts: {
      'xl/chartsheets/sheet1.xml': `<chartsheet xmlns="${main}" xmlns:r="${office}"><sheetViews><sheetView workbookViewId="0"/></sheetViews><drawing r:id="rId1"/></chartsheet>`,
      'xl/chartsheets/_rels/sheet1.xml.rels': relations(['drawing', '../drawings/drawing1.xml']),
      'xl/drawings/drawing1.xml': drawing(frame('rId1')),
      'xl/drawings/_rels/drawing1.xml.rels': relations(['chart', '../charts/chart1.xml']),
      'xl/charts/chart1.xml': chart(series(call('A1'))),
    },
    described: [
      {
        path: 'xl/chartsheets/sheet1.xml',
        type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.chartsheet+xml',
        kind: 'chartsheet',
      },
    ],
    moreSheets: '<sheet name="Method" sheetId="9" r:id="rId50"/>',
  };
  const { bytes, elsewhere } = await copyOf(options);
  expect(elsewhere.map(elsewhereLine)).toEqual([
    'chart 1 on sheet Method calls PACE.EVENT: without the add-in it keeps what it last showed',
  ]);
  expect(textOf(bytes, 'xl/workbook.xml')).toContain(' name="Method 2" ');
});

test('controls, the old kind too, whose drawing need not be well-formed', async () => {
  const options = onSheet(
    [
      ['vmlDrawing', '../drawings/vmlDrawing1.vml'],
      ['ctrlProp', '../ctrlProps/ctrlProp1.xml'],
    ],
    {
      'xl/drawings/vmlDrawing1.vml': `<xml xmlns:x="urn:x"><div><br></div><x:ClientData><x:FmlaLink>PACE.EVENT(A1)</x:FmlaLink><x:FmlaMacro>[0]!PACE.UNIT(1)</x:FmlaMacro><x:FmlaRange>$A$1:$A$9</x:FmlaRange></x:ClientData></xml>`,
      'xl/ctrlProps/ctrlProp1.xml': `<formControlPr xmlns="urn:ctrl" objectType="Drop" fmlaRange="${call('A1')}" fmlaLink="$B$1"/>`,
    },
    `<controls><control r:id="rId2"><controlPr linkedCell="${call('A1')}"/></control></controls>`,
  );
  const follows = 'without the add-in it follows no cells any more';
  expect(await linesOf(options)).toEqual([
    `a control on sheet Run calls PACE.EVENT: ${follows}`,
    `a control on sheet Run calls PACE.EVENT: ${follows}`,
    `a control on sheet Run calls PACE.UNIT: ${follows}`,
    `a control on sheet Run calls PACE.EVENT: ${follows}`,
  ]);
});

test('sparklines, newer formats and validations, on a sheet without cells', async () => {
  const x14 = 'http://schemas.microsoft.com/office/spreadsheetml/2009/9/main';
  const xm = 'http://schemas.microsoft.com/office/excel/2006/main';
  const sheet = `<worksheet xmlns="${main}"><sheetData/><extLst><ext xmlns:x14="${x14}" xmlns:xm="${xm}"><x14:dataValidations><x14:dataValidation type="list"><x14:formula1><xm:f>${call('A1:A3')}</xm:f></x14:formula1><xm:sqref>B2:B3</xm:sqref></x14:dataValidation></x14:dataValidations><x14:sparklineGroups><x14:sparklineGroup><x14:sparklines><x14:sparkline><xm:f>Run!A1:A3</xm:f><xm:sqref>C1</xm:sqref></x14:sparkline><x14:sparkline><xm:f>${call('A1:A3')}</xm:f><xm:sqref>D1</xm:sqref></x14:sparkline></x14:sparklines></x14:sparklineGroup></x14:sparklineGroups></ext></extLst></worksheet>`;
  expect(await linesOf({ sheets: { 'My run': sheet } })).toEqual([
    "a validation on 'My run'!B2:B3 calls PACE.EVENT: without the add-in it holds nothing back any more",
    "a sparkline on 'My run'!D1 calls PACE.EVENT: without the add-in it is drawn no more",
  ]);
});

describe('pivot tables', () => {
  const cache = (fields: string): string =>
    `<pivotCacheDefinition xmlns="${main}" xmlns:r="${office}" r:id="rId1"><cacheSource type="worksheet"><worksheetSource ref="A1:B9" sheet="Run"/></cacheSource><cacheFields count="2">${fields}</cacheFields></pivotCacheDefinition>`;
  const pivot = (fields: string): PackageOptions =>
    onSheet([['pivotTable', '../pivotTables/pivotTable1.xml']], {
      'xl/pivotTables/pivotTable1.xml': `<pivotTableDefinition xmlns="${main}" name="Sums" cacheId="1"/>`,
      'xl/pivotTables/_rels/pivotTable1.xml.rels': relations([
        'pivotCacheDefinition',
        '../pivotCache/pivotCacheDefinition1.xml',
      ]),
      'xl/pivotCache/pivotCacheDefinition1.xml': cache(fields),
      'xl/pivotCache/_rels/pivotCacheDefinition1.xml.rels': relations([
        'pivotCacheRecords',
        'pivotCacheRecords1.xml',
      ]),
      'xl/pivotCache/pivotCacheRecords1.xml': `<pivotCacheRecords xmlns="${main}" count="1"><r><s v="=PACE.EVENT(A1)"/><n v="0.025"/></r></pivotCacheRecords>`,
    });

  test('a calculated field goes by the name of the table', async () => {
    const options = pivot(`<cacheField name="rate" formula="${call('A1')}" databaseField="0"/>`);
    expect(await linesOf(options)).toEqual([
      'the pivot table Sums on sheet Run calls PACE.EVENT: without the add-in what it calculates stays as it was',
    ]);
  });

  test('what it took from cells of ours is values, which stay good: nothing to tell', async () => {
    const options = pivot(
      '<cacheField name="PACE.EVENT(t)"><sharedItems><s v="PACE.EVENT(A1)"/><n v="0.025"/></sharedItems></cacheField>',
    );
    expect(await linesOf(options)).toEqual([]);
  });
});

test('connections, queries, names of linked workbooks, and print areas', async () => {
  const part = (path: string, kind: string): NonNullable<PackageOptions['described']>[number] => ({
    path,
    kind,
    type: `application/vnd.openxmlformats-officedocument.spreadsheetml.${kind}+xml`,
  });
  const options: PackageOptions = {
    sheets: { Run: worksheet('<row r="1"><c r="A1"><v>40</v></c></row>') },
    parts: {
      'xl/connections.xml': `<connections xmlns="${main}"><connection id="1" name="Lab"><dbPr connection="x" command="SELECT ${call('A1')}"/></connection></connections>`,
      'xl/externalLinks/externalLink1.xml': `<externalLink xmlns="${main}"><externalBook><definedNames><definedName name="rate" refersTo="=${call('A1')}"/><definedName name="_xldudf_PACE_EVENT"/></definedNames><sheetDataSet><sheetData sheetId="0"><row r="1"><cell r="A1" t="str"><v>PACE.EVENT(1)</v></cell></row></sheetData></sheetDataSet></externalBook></externalLink>`,
      'customXml/item1.xml': '<notes><f>PACE.EVENT(A1)</f></notes>',
    },
    described: [
      part('xl/connections.xml', 'connections'),
      part('xl/externalLinks/externalLink1.xml', 'externalLink'),
      part('customXml/item1.xml', 'customXml'),
    ],
    names: `<definedNames><definedName name="_xlnm.Print_Area" localSheetId="0">OFFSET(Run!A1,0,0,${call('A1')},1)</definedName></definedNames>`,
  };
  expect(await linesOf(options)).toEqual([
    'a connection calls PACE.EVENT: without the add-in it brings nothing new',
    'a linked workbook calls PACE.EVENT: without the add-in its last values stay',
    'a print area, title or filter calls PACE.EVENT: without the add-in it comes to nothing',
  ]);
});
