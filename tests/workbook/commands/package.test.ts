import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { command, temporaryFolder, type Outcome } from './command';

const address = 'https://example.org/lab';
const folder = temporaryFolder();
const out = folder.path('out');
const packaged = (...words: string[]): Outcome => command('package', ...words);
let said: Outcome;

beforeAll(() => {
  execFileSync(process.execPath, ['scripts/run.mjs', 'build'], { stdio: 'pipe' });
  said = packaged('--url', address, '--version', '9.8.7.6', out);
}, 240_000);
afterAll(() => folder.remove());

const text = (file: string): string => readFileSync(path.join(out, file), 'utf8');
const files = (): string[] =>
  readdirSync(out, { recursive: true, encoding: 'utf8' })
    .filter((name) => statSync(path.join(out, name)).isFile())
    .map((name) => name.split(path.sep).join('/'));

test('it says what was made, where it belongs and what to do next', () =>
  expect(said).toEqual({
    code: 0,
    out: `Flaskpace 9.8.7.6 is in ${out}: put the folder at ${address}, then load ${path.join(out, 'manifest.xml')} in Excel\n`,
    err: '',
  }));

test('every address in the manifest is a file of the folder', () => {
  const addresses = [...text('manifest.xml').matchAll(/DefaultValue="(https:[^"]+)"/g)].map(([, url]) => url);
  expect(addresses.length).toBeGreaterThan(8);
  for (const url of addresses) expect(files()).toContain(url.replace(`${address}/`, ''));
});

test('the page asks for files of the folder, each named by its content', () => {
  const asked = [...text('taskpane.html').matchAll(/(?:src|href)="(?!https:)([^"]+)"/g)].map(
    ([, name]) => name,
  );
  expect(asked).toHaveLength(2);
  for (const name of asked) {
    expect(name).toMatch(/^built\/addin\.[0-9a-f]{12}\.(js|css)$/);
    expect(files()).toContain(name);
  }
  expect(
    files().filter((name) => name.startsWith('built/') && !/\.[0-9a-f]{12}\.(js|css)$/.test(name)),
  ).toEqual([]);
});

test('every function leads to its help page', () => {
  const { functions } = JSON.parse(text('functions.json')) as { functions: { helpUrl: string }[] };
  expect(functions.length).toBeGreaterThan(30);
  for (const { helpUrl } of functions) expect(files()).toContain(helpUrl.replace(`${address}/`, ''));
});

test('the checksums are those of all other files', () => {
  const listed = text('SHA256SUMS')
    .trimEnd()
    .split('\n')
    .map((line) => line.split('  '));
  expect(listed.map(([, name]) => name).sort()).toEqual(
    files()
      .filter((name) => name !== 'SHA256SUMS')
      .sort(),
  );
  for (const [sum, name] of listed)
    expect(
      createHash('sha256')
        .update(readFileSync(path.join(out, name)))
        .digest('hex'),
    ).toBe(sum);
});

test('what Excel loads at first stays below the 5 MB it allows', () => {
  const loaded = files().filter((name) => name.startsWith('built/') || name === 'taskpane.html');
  const bytes = loaded.reduce((sum, name) => sum + readFileSync(path.join(out, name)).length, 0);
  expect(bytes).toBeLessThan(5e6);
});

test('nothing is overwritten, and the reason is said', () => {
  expect(packaged('--url', address, out)).toEqual({
    code: 2,
    out: '',
    err: `the folder must be empty: ${out} is not\n`,
  });
  const file = folder.path('file');
  writeFileSync(file, 'mine');
  expect(packaged('--url', address, file)).toMatchObject({
    code: 2,
    err: `OUT_FOLDER must be a folder: ${file} is a file\n`,
  });
  expect(readFileSync(file, 'utf8')).toBe('mine');
});

test('an address that Excel would not take is refused before anything is written', () => {
  const other = folder.path('other');
  expect(packaged('--url', 'http://example.org', other).err).toContain('must be https://');
  expect(() => readdirSync(other)).toThrow();
});
