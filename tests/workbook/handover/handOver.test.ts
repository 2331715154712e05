/** The file of a copy: what changes in it, and all that does not. */
import { readFileSync, writeFileSync } from 'node:fs';
import { handOver } from '../../../workbook/handover/handOver';
import { buildCommands, command, temporaryFolder } from '../commands/command';
import { packageOf, partsOf, rowsOf, textOf, worksheet } from '../xlsx/package';
import { fit } from './fit';

const origin = { version: '1.2.3', date: '2026-12-01' };
const copyOf = async (bytes: Uint8Array): Promise<Uint8Array> => (await handOver(bytes, origin)).bytes;

const readings =
  '<row r="1"><c r="A1"><v>40</v></c><c r="B1" s="0"><f>_xldudf_PACE_EVENT(A1)</f><v>9</v></c></row>';
/** Every formula in the file, of cells and of names. */
const formulasIn = (bytes: Uint8Array): string =>
  Object.keys(partsOf(bytes))
    .filter((path) => path.endsWith('.xml'))
    .flatMap((path) => textOf(bytes, path).match(/<(?:\w+:)?(?:f|definedName)\b[^>]*>[^<]*/g) ?? [])
    .join('\n');

describe('cells', () => {
  test('a call becomes built-in functions in its own cell, with its value', async () => {
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(readings) } }));
    expect(rowsOf(copy)).toContain('<c r="B1" s="0"><f>IF(COUNTIF($A$1,"&lt;=0")=0,IF(ISNUMBER(A1),1/A1,');
    expect(rowsOf(copy)).toContain('</f><v>0.025</v></c>');
  });

  test('a spill becomes one formula a cell, and no cell is marked as one that spills', async () => {
    const rows =
      '<row r="1"><c r="A1"><v>40</v></c><c r="B1" cm="1"><f t="array" ref="B1:B2">[1]!_xldudf_PACE_EVENT(A1:A2)</f></c></row><row r="2"><c r="A2"><v>25</v></c><c r="B2"/></row>';
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(rows) } }));
    expect(rowsOf(copy).match(/<f>/g)).toHaveLength(2);
    expect(rowsOf(copy)).not.toContain('cm=');
    expect(rowsOf(copy)).toMatch(/<c r="B2"><f>[^<]*1\/A2[^<]*<\/f><v>0.04<\/v>/);
  });

  test('what no built-in function can say keeps its value alone, with a note', async () => {
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(fit) } }));
    expect(rowsOf(copy)).toMatch(/<c r="C1"><v>0\.0693147[\d.]*<\/v><\/c>/);
    const note = textOf(copy, 'xl/comments1.xml');
    expect(note).toContain('<comment ref="C1" authorId="0">');
    expect(note).toContain('It was =PACE.COEFFICIENT(A1:A4,B1:B4,1)');
    expect(note).toContain('Flaskpace 1.2.3');
    expect(textOf(copy, 'xl/worksheets/sheet1.xml')).toMatch(
      /<\/sheetData><legacyDrawing [^>]*r:id="rId2"\/><\/worksheet>$/,
    );
  });

  test('a formula shared by several cells is spelled out in each', async () => {
    const rows =
      '<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f t="shared" ref="B1:B2" si="0">_xldudf_PACE_EVENT(A1)</f></c></row><row r="2"><c r="A2"><v>25</v></c><c r="B2"><f t="shared" si="0"/></c></row>';
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(rows) } }));
    expect(rowsOf(copy)).toMatch(/<c r="B2"><f>[^<]*1\/A2[^<]*<\/f><v>0.04<\/v>/);
    expect(rowsOf(copy)).not.toContain('shared');
  });

  test('the whole of a spill, by its first cell, is named by its cells', async () => {
    const rows =
      '<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>_xldudf_PACE_EVENT(A1:A2)</f></c><c r="C1"><f>SUM(_xlfn.ANCHORARRAY(B1))</f></c></row><row r="2"><c r="A2"><v>25</v></c></row>';
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(rows) } }));
    expect(rowsOf(copy)).toContain('<c r="C1"><f>SUM(B1:B2)</f><v>0.065</v></c>');
  });

  test('in merged cells, where no array formula may stand, a value stands', async () => {
    const rows =
      '<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>SUM(_xldudf_PACE_EVENT(A1:A2))</f></c></row><row r="2"><c r="A2"><v>25</v></c></row>';
    const after = '<mergeCells count="1"><mergeCell ref="B1:C1"/></mergeCells>';
    const { bytes, formulas } = await handOver(
      packageOf({ sheets: { Run: worksheet(rows, { after }) } }),
      origin,
    );
    expect(formulas[0].why).toBe('it stands in merged cells');
    expect(rowsOf(bytes)).toContain('<c r="B1"><v>0.065</v></c>');
  });
});

describe('the file', () => {
  test('no formula names the add-in, in sheets or names', async () => {
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(readings), 'My fit': worksheet(fit) } }));
    expect(formulasIn(copy)).toContain('<f');
    expect(formulasIn(copy)).not.toMatch(/PACE|_xldudf/i);
  });

  test('a name that stands for one of our formulas stands for its value', async () => {
    const names =
      '<definedNames><definedName name="area">Run!$A$1</definedName><definedName name="rate">-_xldudf_PACE_EVENT(Run!$A$1:$A$2)*1</definedName></definedNames>';
    const rows =
      '<row r="1"><c r="A1"><v>40</v></c><c r="C1"><f>SUM(rate)</f></c></row><row r="2"><c r="A2"><v>25</v></c></row>';
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(rows) }, names }));
    expect(textOf(copy, 'xl/workbook.xml')).toContain(
      '<definedName name="area">Run!$A$1</definedName><definedName name="rate">{-0.025;-0.04}</definedName>',
    );
    expect(formulasIn(copy)).not.toMatch(/PACE|_xldudf/i);
  });

  test('all that holds none of our formulas stays byte for byte', async () => {
    const bytes = packageOf({
      sheets: { Run: worksheet(readings), Other: worksheet('<row r="3"><c r="A3"><v>1</v></c></row>') },
      parts: {
        'xl/charts/chart1.xml': '<chart  odd = "1" />',
        'xl/unknown.bin': new Uint8Array([1, 2, 250]),
      },
    });
    const [before, copy] = [partsOf(bytes), partsOf(await copyOf(bytes))];
    const changedParts = Object.keys(before).filter(
      (path) => !Buffer.from(before[path]).equals(Buffer.from(copy[path])),
    );
    expect(changedParts.sort()).toEqual([
      '[Content_Types].xml',
      'xl/_rels/workbook.xml.rels',
      'xl/workbook.xml',
      'xl/worksheets/sheet1.xml',
    ]);
  });

  test('the rest of a sheet with our formulas stays to the letter', async () => {
    const after =
      '<conditionalFormatting sqref="A1"><x/></conditionalFormatting><pageMargins left="0.7" odd=\'1\'/><tableParts count="0"/>';
    const bytes = packageOf({
      sheets: {
        Run: worksheet(fit, { before: '<sheetViews><sheetView  workbookViewId="0"/></sheetViews>', after }),
      },
    });
    const strip = (xml: string): string =>
      xml.replace(/<sheetData>.*<\/sheetData>/s, '').replace(/<legacyDrawing [^>]*\/>/, '');
    const [sheet, copy] = [bytes, await copyOf(bytes)].map((one) => textOf(one, 'xl/worksheets/sheet1.xml'));
    expect(strip(copy)).toBe(strip(sheet));
    expect(copy).toMatch(/<legacyDrawing [^>]*\/><tableParts/);
  });

  test('a note that was there stays, and ours is put beside it', async () => {
    const parts = {
      'xl/comments7.xml':
        '<comments xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><authors><author>Ada</author></authors><commentList><comment ref="A1" authorId="0"><text><t>mine</t></text></comment></commentList></comments>',
      'xl/drawings/vmlDrawing7.vml':
        '<xml xmlns:v="urn:schemas-microsoft-com:vml"><v:shape id="_x0000_s1025"></v:shape></xml>',
      'xl/worksheets/_rels/sheet1.xml.rels':
        '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="http://schemas.openxmlformats.org/officeDocument/2006/relationships/comments" Target="../comments7.xml"/><Relationship Id="rId2" Type="http://schemas.openxmlformats.org/officeDocument/2006/relationships/vmlDrawing" Target="../drawings/vmlDrawing7.vml"/></Relationships>',
    };
    const after = '<legacyDrawing r:id="rId2"/>';
    const copy = await copyOf(packageOf({ sheets: { Run: worksheet(fit, { after }) }, parts }));
    const notes = textOf(copy, 'xl/comments7.xml');
    expect(notes).toContain(
      '<comment ref="A1" authorId="0"><text><t>mine</t></text></comment><comment ref="C1" authorId="1">',
    );
    expect(textOf(copy, 'xl/drawings/vmlDrawing7.vml')).toMatch(/_x0000_s1025".*_x0000_s1026"/);
  });

  test('a workbook without our formulas is copied byte for byte', async () => {
    const plain = packageOf({ sheets: { Run: worksheet('<row r="1"><c r="A1"><v>1</v></c></row>') } });
    expect(Buffer.from(await copyOf(plain)).equals(plain)).toBe(true);
  });

  test('the sheet Method is called otherwise where one of that name is there', async () => {
    const copy = await copyOf(packageOf({ sheets: { method: worksheet(readings) } }));
    expect(textOf(copy, 'xl/workbook.xml')).toContain('name="Method 2"');
  });
});

describe('the command', () => {
  let folder: ReturnType<typeof temporaryFolder>;
  beforeAll(buildCommands, 300_000);
  beforeEach(() => {
    folder = temporaryFolder();
  });
  afterEach(() => folder.remove());

  const run = (bytes: Uint8Array): ReturnType<typeof command> => {
    writeFileSync(folder.path('in.xlsx'), bytes);
    return command('handover', folder.path('in.xlsx'), folder.path('out.xlsx'));
  };

  test('exit code 0: what is live, what is frozen and why; IN as it was', () => {
    const bytes = packageOf({ sheets: { Run: worksheet(readings), 'My fit': worksheet(fit) } });
    expect(run(bytes)).toEqual({
      code: 0,
      out: `${folder.path('out.xlsx')}: 2 formulas handed over, 1 live, 1 frozen\n  frozen  'My fit'!C1  PACE.COEFFICIENT has no built-in counterpart\n`,
      err: '',
    });
    expect(readFileSync(folder.path('in.xlsx')).equals(bytes)).toBe(true);
  });

  test('exit code 1 where cells are errors, 2 where nothing was written', () => {
    const faulty = packageOf({ sheets: { Run: worksheet(readings.replace('<v>40</v>', '<v>0</v>')) } });
    expect(run(faulty)).toMatchObject({
      code: 1,
      out: expect.stringContaining('1 showed an error before'),
      err: 'Run!B1  #VALUE!  times must be above 0: row 1 (0)\n',
    });
    expect(run(faulty.slice(0, 200))).toMatchObject({ code: 2, out: '' });
  });
});
