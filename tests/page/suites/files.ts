/** Files in and out of the page: what is saved holds what was typed, and an opened file keeps all else that was in it. */
import * as XLSX from '@e965/xlsx';
import { strFromU8, strToU8, unzipSync, zipSync } from 'fflate';
import { readFile } from 'node:fs/promises';
import type { CellModel } from '../../../workbook/engine/engine';
import { kindOf } from '../../../workbook/xlsx/kinds';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { withMacros } from '../../workbook/xlsx/package';
import type { BenchPage } from '../bench';

export function filesSuite(sheet: () => BenchPage): void {
  const press = (label: string): Promise<void> => sheet().page.getByRole('button', { name: label }).click();
  const said = (): Promise<string> => sheet().page.locator('#strip .said').innerText();

  async function saved(): Promise<{ name: string; bytes: Uint8Array }> {
    const [download] = await Promise.all([sheet().page.waitForEvent('download'), press('Save as…')]);
    return {
      name: download.suggestedFilename(),
      bytes: new Uint8Array(await readFile(await download.path())),
    };
  }

  async function choose(name: string, content: Uint8Array): Promise<void> {
    const [chooser] = await Promise.all([sheet().page.waitForEvent('filechooser'), press('Open…')]);
    await chooser.setFiles({ name, mimeType: 'application/octet-stream', buffer: Buffer.from(content) });
  }

  function cellAt(bytes: Uint8Array, row: number, column: number): CellModel | undefined {
    const [first] = readWorkbook(bytes).sheets;
    return first.cells.find((cell) => cell.row === row && cell.column === column);
  }

  const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
  const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
  const package_ = 'http://schemas.openxmlformats.org/package/2006';
  const chart = '<c:chartSpace xmlns:c="http://schemas.openxmlformats.org/drawingml/2006/chart"/>';

  /** As another program might have written it, with a part that we know nothing of and a spill of three cells. */
  const timingCard = zipSync({
    '[Content_Types].xml': strToU8(
      `<Types xmlns="${package_}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Override PartName="/xl/workbook.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml"/><Override PartName="/xl/worksheets/sheet1.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml"/></Types>`,
    ),
    '_rels/.rels': strToU8(
      `<Relationships xmlns="${package_}/relationships"><Relationship Id="rId1" Type="${office}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    ),
    'xl/workbook.xml': strToU8(
      `<workbook xmlns="${main}" xmlns:r="${office}"><sheets><sheet name="Timing card" sheetId="1" r:id="rId1"/></sheets></workbook>`,
    ),
    'xl/_rels/workbook.xml.rels': strToU8(
      `<Relationships xmlns="${package_}/relationships"><Relationship Id="rId1" Type="${office}/worksheet" Target="worksheets/sheet1.xml"/></Relationships>`,
    ),
    'xl/worksheets/sheet1.xml': strToU8(
      `<worksheet xmlns="${main}"><sheetData><row r="1"><c r="A1"><v>20</v></c><c r="B1"><f t="array" ref="B1:B3">_xldudf_PACE_EVENT(A1:A3)</f><v>9</v></c></row><row r="2"><c r="A2"><v>25</v></c><c r="B2"><v>9</v></c></row><row r="3"><c r="A3"><v>40</v></c><c r="B3"><v>9</v></c></row></sheetData></worksheet>`,
    ),
    'xl/charts/chart7.xml': strToU8(chart),
  });

  beforeAll(() => sheet().showDemo());

  test('the demo is saved as a workbook with its formulas, their values and what was typed', async () => {
    await sheet().type("'Gas run'!Q1", '=PACE.EVENT({20;25;40})');
    const { name, bytes } = await saved();
    expect(name).toBe('demo.xlsx');
    expect(cellAt(bytes, 0, 16)).toMatchObject({ formula: 'PACE.EVENT({20;25;40})', value: 0.05 });
    const xml = strFromU8(unzipSync(bytes)['xl/worksheets/sheet1.xml']);
    expect(xml).toContain('ref="Q1:Q3"');
    expect(xml).toMatch(/<c r="Q3"[^>]*><v>0\.025<\/v>/);
    expect(await said()).toBe('saved as demo.xlsx');
    expect(await sheet().page.title()).toBe('demo.xlsx – Flaskpace');
  });

  test('a formula still being typed is in the file as well', async () => {
    await sheet().select("'Gas run'!R1");
    await sheet().page.keyboard.type('=2*21');
    const { bytes } = await saved();
    expect(cellAt(bytes, 0, 17)).toMatchObject({ formula: '2*21', value: 42 });
  });

  test('a file that is no workbook gets one sentence, and the sheet stays', async () => {
    const before = await sheet().cells("'Gas run'!A1:B9");
    await choose('notes.xlsx', strToU8('t / s,V / mL\n0,1.5\n'));
    await sheet()
      .page.locator('#strip .said.bad', { hasText: /^the file was not opened: .* text, such as a \.csv: / })
      .waitFor();
    expect((await said()).split('\n')).toHaveLength(1);
    expect(await sheet().cells("'Gas run'!A1:B9")).toEqual(before);
    expect(await sheet().page.title()).toBe('demo.xlsx – Flaskpace');
  });

  test('an opened file is shown with current values, and saved with all its parts', async () => {
    await choose('timing card.xlsx', timingCard);
    await sheet().page.waitForFunction(() => document.title.startsWith('timing card'));
    await sheet().shows("'Timing card'!B1:B3", [[0.05], [0.04], [0.025]]);
    await sheet().type("'Timing card'!A2", '50');
    await sheet().type("'Timing card'!D5", '=PACE.EVENT(A1:A2)');
    const { name, bytes } = await saved();
    expect(name).toBe('timing card.xlsx');
    expect(cellAt(bytes, 4, 3)).toMatchObject({ formula: 'PACE.EVENT(A1:A2)', value: 0.05 });
    expect(cellAt(bytes, 0, 1)).toMatchObject({ formula: 'PACE.EVENT(A1:A3)', value: 0.05 });
    const parts = unzipSync(bytes);
    const xml = strFromU8(parts['xl/worksheets/sheet1.xml']);
    expect(xml).toContain('<c r="A2"><v>50</v></c><c r="B2"><v>0.02</v></c>');
    expect(xml).toContain('ref="D5:D6">_xldudf_PACE_EVENT(A1:A2)</f>');
    expect(xml).toContain('<c r="D6"><v>0.02</v></c>');
    expect(strFromU8(parts['xl/charts/chart7.xml'])).toBe(chart);
  });

  test('what the pane puts into an opened file is saved with its number formats, a spill too', async () => {
    await sheet().page.evaluate(() =>
      window.flaskpace.port.write(
        [
          {
            area: { sheet: 'Timing card', row: 4, column: 5, rows: 1, columns: 1 },
            content: { formula: '=PACE.EVENT(A1:A3)' },
            spills: { rows: 3, columns: 1 },
            numberFormats: [['0.0000'], ['0.00E+00'], ['0.0 "1/s"']],
          },
        ],
        { overwrite: false, description: 'rates' },
      ),
    );
    await sheet().shows("'Timing card'!F5:F7", [[0.05], [0.02], [0.025]]);
    const { bytes } = await saved();
    const { F5, F6, F7, A1 } = XLSX.read(bytes, { type: 'array', cellNF: true }).Sheets['Timing card'];
    expect([F5, F6, F7, A1]).toMatchObject([
      { v: 0.05, z: '0.0000' },
      { v: 0.02, z: '0.00E+00' },
      { v: 0.025, z: '0.0 "1/s"' },
      { v: 20, z: 'General' },
    ]);
    const parts = unzipSync(bytes);
    expect(strFromU8(parts['xl/worksheets/sheet1.xml'])).toContain(
      'ref="F5:F7">_xldudf_PACE_EVENT(A1:A3)</f>',
    );
    expect(strFromU8(parts['xl/charts/chart7.xml'])).toBe(chart);
    expect(await said()).toBe('saved as timing card.xlsx');
  });

  test('a number format on an empty cell is saved, and taken away again', async () => {
    const format = (numberFormat: string): Promise<unknown> =>
      sheet().page.evaluate(
        (numberFormats) =>
          window.flaskpace.port.write(
            [
              {
                area: { sheet: 'Timing card', row: 8, column: 7, rows: 1, columns: 1 },
                content: { value: null },
                numberFormats,
              },
            ],
            { overwrite: true, description: 'a format' },
          ),
        [[numberFormat]],
      );
    const inFile = async (): Promise<string | undefined> => cellAt((await saved()).bytes, 8, 7)?.numberFormat;
    await format('0.000');
    expect(await inFile()).toBe('0.000');
    await format('General');
    expect(await inFile()).toBeUndefined();
  });

  test('work that is not saved is asked about before another book takes its place', async () => {
    await sheet().type("'Timing card'!A3", '100');
    await press('Demo');
    await sheet().page.getByRole('button', { name: 'Stay here' }).click();
    expect(await sheet().page.title()).toBe('• timing card.xlsx – Flaskpace');
    await press('Demo');
    await sheet().page.getByRole('button', { name: 'Go on without saving' }).click();
    await sheet().page.waitForFunction(() => document.title === 'demo.xlsx – Flaskpace');
  });

  test('a workbook with macros keeps its name and its kind', async () => {
    await choose('card.xlsm', withMacros(timingCard));
    await sheet().page.waitForFunction(() => document.title.startsWith('card.xlsm'));
    const { name, bytes } = await saved();
    expect([name, kindOf(bytes)?.extension]).toEqual(['card.xlsm', '.xlsm']);
    await press('Demo');
    await sheet().page.waitForFunction(() => document.title === 'demo.xlsx – Flaskpace');
  });

  test('leaving the page with work that is not saved is asked about', async () => {
    const leaves = (): Promise<boolean> =>
      sheet().page.evaluate(() => window.dispatchEvent(new Event('beforeunload', { cancelable: true })));
    expect(await leaves()).toBe(true);
    await sheet().type("'Gas run'!Q1", '1');
    await sheet().page.waitForFunction(() => document.title.startsWith('•'));
    expect(await leaves()).toBe(false);
  });

  test('where the browser can ask for a place, the file goes there under the name given', async () => {
    await sheet().page.evaluate(() => {
      const written: Blob[] = [];
      Object.assign(window, {
        written,
        showSaveFilePicker: async () => ({
          name: 'my runs.xlsx',
          createWritable: async () => ({
            write: async (blob: Blob) => void written.push(blob),
            close: async () => undefined,
          }),
        }),
      });
    });
    await press('Save as…');
    await sheet().page.waitForFunction(() => document.title === 'my runs.xlsx – Flaskpace');
    const bytes = await sheet().page.evaluate(async () => {
      const { written } = window as unknown as { written: Blob[] };
      return [...new Uint8Array(await written[0].arrayBuffer())];
    });
    await sheet().page.evaluate(() => Reflect.deleteProperty(window, 'showSaveFilePicker'));
    expect(cellAt(new Uint8Array(bytes), 0, 16)).toMatchObject({ value: 1 });
  });

  test('nothing complained on the way', () => expect(sheet().complaints).toEqual([]));
}
