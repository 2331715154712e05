/** Other spreadsheet programs, run without a screen: what they make of a file when they work it out themselves. */
import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { strFromU8, strToU8, unzipSync, zipSync } from 'fflate';
import { cellName } from '../../../functions/address';
import type { CellValue } from '../../../functions/cell';
import { readWorkbook } from '../../../workbook/xlsx/read';

/** By `Sheet!A1`. */
export type Shown = ReadonlyMap<string, CellValue>;

export interface OtherEngine {
  readonly name: string;
  readonly isInstalled: boolean;
  recalculated(bytes: Uint8Array): Shown;
  /** The file as the program saves it anew. */
  saved(bytes: Uint8Array): Uint8Array;
}

const answers = (command: string): boolean => spawnSync(command, ['--version']).status === 0;

/** LibreOffice and Gnumeric share no code, neither with each other nor with the engine here. */
export const otherEngines: readonly OtherEngine[] = [
  engine('LibreOffice', 'soffice', (folder) => [
    `-env:UserInstallation=file://${folder}/profile`,
    '--headless',
    '--convert-to',
    'xlsx',
    '--outdir',
    join(folder, 'out'),
    join(folder, 'book.xlsx'),
  ]),
  engine('Gnumeric', 'ssconvert', (folder) => [
    '--recalc',
    join(folder, 'book.xlsx'),
    join(folder, 'out', 'book.xlsx'),
  ]),
];

function engine(name: string, command: string, args: (folder: string) => string[]): OtherEngine {
  const isInstalled = answers(command);
  if (!isInstalled)
    process.stderr.write(`${name} (${command}) is not installed: copies are not recalculated in it\n`);
  return {
    name,
    isInstalled,
    recalculated: (bytes) => shownIn(saved(withoutResults(bytes))),
    saved,
  };

  function saved(bytes: Uint8Array): Uint8Array {
    const folder = mkdtempSync(join(tmpdir(), 'copy-'));
    try {
      writeFileSync(join(folder, 'book.xlsx'), bytes);
      execFileSync('mkdir', ['-p', join(folder, 'out')]);
      execFileSync(command, args(folder), { stdio: 'pipe', timeout: 120_000 });
      return readFileSync(join(folder, 'out', 'book.xlsx'));
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  }
}

/** No formula keeps a value: a program that only showed what the file says would show nothing. */
export function withoutResults(bytes: Uint8Array): Uint8Array {
  const parts = unzipSync(bytes);
  for (const path of Object.keys(parts).filter((name) => /^xl\/worksheets\/[^/]+\.xml$/.test(name))) {
    parts[path] = strToU8(strFromU8(parts[path]).replace(/(<\/f>|<f[^>]*\/>)<v>[^<]*<\/v>/g, '$1'));
  }
  return zipSync(parts);
}

export function shownIn(bytes: Uint8Array): Shown {
  return new Map(
    readWorkbook(bytes).sheets.flatMap(({ name, cells }) =>
      cells.map(({ row, column, value }): [string, CellValue] => [`${name}!${cellName(row, column)}`, value]),
    ),
  );
}
