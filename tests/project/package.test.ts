import { readFileSync } from 'node:fs';
import { headersFile, headersOf } from '../../scripts/package/headers';
import { filesNamed, manifestFor, requireAddress } from '../../scripts/package/manifest';
import { readOptions } from '../../scripts/package/options';
import { requireVersion, versionAt } from '../../scripts/package/version';

const manifest = readFileSync('manifest.xml', 'utf8');

test('manifestFor moves every address, names the built script and raises the version, and nothing else', () => {
  const [address, version, script] = ['https://example.org/flaskpace', '0.1.0.77', 'built/addin.0123.js'];
  const moved = manifestFor(manifest, { address, version, script });
  expect(moved).not.toContain('localhost');
  const back = moved
    .replaceAll(address, 'https://localhost:3000')
    .replace(script, 'addin.js')
    .replace(version, '0.1.0.0');
  expect(back).toBe(manifest);
});

test('filesNamed tells what a manifest has Excel load', () =>
  expect(filesNamed(manifest, 'https://localhost:3000').sort()).toEqual([
    'addin.js',
    'assets/icon-16.png',
    'assets/icon-32.png',
    'assets/icon-64.png',
    'assets/icon-80.png',
    'functions.json',
    'help/index.html',
    'taskpane.html',
  ]));

test.each(['http://example.org', 'example.org', '', 'https://example.org/?a=1'])(
  'requireAddress refuses "%s"',
  (text) => {
    expect(() => requireAddress(text)).toThrow(
      `the address must be https:// and no more than a folder: got "${text}"`,
    );
  },
);

test('a manifest made later has the higher version, and one that its format allows', () => {
  const numbers = (time: string): number[] => versionAt('0.1.0', new Date(time)).split('.').map(Number);
  expect(numbers('2026-01-01T00:59:59Z')).toEqual([0, 1, 0, 0]);
  expect(numbers('2026-01-01T01:00:00Z')).toEqual([0, 1, 0, 1]);
  expect(numbers('2026-12-01T12:00:00Z')).toEqual([0, 1, 0, 334 * 24 + 12]); // 1 December is day 335
  expect(requireVersion(versionAt('99999.0.0', new Date('2036-12-31')))).toMatch(/^99999\.0\.0\.\d{5}$/);
});

test.each(['1.2.3', '1.2.3.4.5', '1.2.3.x', '1.2.3.123456', ''])('requireVersion refuses "%s"', (text) => {
  expect(() => requireVersion(text)).toThrow(
    `the version must be four numbers of five digits at most, such as 1.2.3.4: got "${text}"`,
  );
});

describe('the words after npm run package', () => {
  test('are an address, a folder and perhaps a version, in any order', () => {
    const expected = { address: 'https://example.org/lab', version: '1.2.3.4', out: 'there' };
    expect(readOptions(['--url', 'https://example.org/lab/', '--version=1.2.3.4', 'there'])).toEqual(
      expected,
    );
    expect(readOptions(['there', '--version', '1.2.3.4', '--url=https://example.org/lab'])).toEqual(expected);
    expect(readOptions(['--url=https://example.org', 'x'])).toEqual({
      address: 'https://example.org',
      out: 'x',
    });
  });

  test.each([
    [['there'], '--url ADDRESS is needed: where the folder will stand'],
    [['--url', 'https://example.org'], 'one OUT_FOLDER is needed: got 0'],
    [['--url', 'https://example.org', 'a', 'b'], 'one OUT_FOLDER is needed: got 2'],
    [['--to', 'x'], 'unknown option "--to": --url ADDRESS and --version N.N.N.N are known'],
    [['a', '--url'], 'the address must be https:// and no more than a folder: got ""'],
  ])('%j are refused', (words, why) => expect(() => readOptions(words)).toThrow(why));
});

describe('_headers', () => {
  const file = headersFile('https://example.org/lab');

  test('counts paths from the root of the server', () => {
    expect(headersOf(file, '/lab/built/addin.0123.js')['Cache-Control']).toContain('immutable');
    expect(headersOf(file, '/lab/taskpane.html')['Cache-Control']).toBe('no-cache');
    expect(headersOf(file, '/taskpane.html')).toEqual({});
    expect(headersOf(headersFile('https://example.org'), '/taskpane.html')['Cache-Control']).toBe('no-cache');
  });

  test('lets Office.js in from its two addresses, and Excel on the web show the pages', () => {
    const policy = headersOf(file, '/lab/taskpane.html')['Content-Security-Policy'];
    const directive = (name: string): string[] =>
      policy
        .split('; ')
        .find((part) => part.startsWith(`${name} `))!
        .split(' ')
        .slice(1);
    expect(directive('script-src')).toContain(
      new URL(/<script src="([^"]+)"/.exec(readFileSync('workbook/addin/taskpane.html', 'utf8'))![1]).origin,
    );
    expect(directive('script-src')).not.toContain("'unsafe-inline'");
    expect(directive('frame-ancestors')).toContain('https://*.officeapps.live.com');
    expect(directive('default-src')).toEqual(["'none'"]);
  });

  test('says no header twice for one file, since servers differ in what they then do', () => {
    for (const path of [
      '/lab/built/a.js',
      '/lab/functions.json',
      '/lab/help/index.html',
      '/lab/manifest.xml',
    ]) {
      const blocks = file.split('\n\n').filter((block) => Object.keys(headersOf(block, path)).length > 0);
      const names = blocks.flatMap((block) => Object.keys(headersOf(block, path)));
      expect(blocks).toHaveLength(2);
      expect(new Set(names).size).toBe(names.length);
    }
  });
});
