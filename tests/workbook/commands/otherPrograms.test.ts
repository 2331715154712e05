/** What is written is a sound file to programs that owe us nothing. */
import { execFileSync, spawnSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { recalculate } from '../../../workbook/commands/recalculate';
import { calculate } from '../../../workbook/engine/univer/headless';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { book, column } from '../engine/book';
import { packageOf, worksheet } from '../xlsx/package';
import { temporaryFolder } from './command';

const hasOffice = spawnSync('soffice', ['--version']).status === 0;
if (!hasOffice)
  process.stderr.write('LibreOffice (soffice) is not installed: files are not opened with it\n');

let folder: ReturnType<typeof temporaryFolder>;
beforeEach(() => {
  folder = temporaryFolder();
});
afterEach(() => folder.remove());

/** The first sheet as LibreOffice shows it. */
function opened(bytes: Uint8Array): string[][] {
  writeFileSync(folder.path('book.xlsx'), bytes);
  const profile = `-env:UserInstallation=file://${folder.path('profile')}`;
  execFileSync(
    'soffice',
    [profile, '--headless', '--convert-to', 'csv', '--outdir', folder.path('.'), folder.path('book.xlsx')],
    {
      stdio: 'pipe',
    },
  );
  const lines = readFileSync(folder.path('book.csv'), 'utf8').trimEnd().split('\n');
  return lines.map((line) => line.split(','));
}

(hasOffice ? describe : describe.skip)('LibreOffice', () => {
  test('opens a new file and shows its values', async () => {
    const model = book({
      Run: {
        A1: 't',
        ...column('A2', [40, 25]),
        B2: '=PACE.EVENT(A2)',
        C2: '=A2*2',
        C3: '=A3>30',
        D2: '="x"&A2',
      },
    });
    const shown = opened(createWorkbook(model, await calculate(model)));
    expect(shown[0][0]).toBe('t');
    expect([shown[1][0], shown[1][2], shown[1][3], shown[2][2]]).toEqual(['40', '80', 'x40', 'FALSE']);
  }, 120_000);

  test('opens a file after a spill has grown in it, and shows what was there before', async () => {
    const before = packageOf({
      sheets: {
        Run: worksheet(
          '<row r="1"><c r="A1"><v>3</v></c><c r="B1"><f>PACE.EVENT(A1:A3)</f></c><c r="C1"><f>A1*7</f><v>0</v></c><c r="D1"><v>5</v></c></row><row r="3"><c r="A3"><v>8</v></c><c r="D3"><v>6</v></c></row>',
        ),
      },
    });
    const shown = opened((await recalculate(before)).bytes);
    expect(shown.map((row) => row[3])).toEqual(['5', '', '6']);
    expect(shown[0][2]).toBe('21');
  }, 120_000);
});
