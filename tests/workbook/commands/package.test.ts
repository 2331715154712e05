import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

test('`npm run package` makes a folder with the bundle and a manifest that points to it', () => {
  const out = path.join(mkdtempSync(path.join(tmpdir(), 'package-')), 'out');
  const said = execFileSync(
    process.execPath,
    ['scripts/run.mjs', 'package', 'https://example.org/lab', out],
    {
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'ignore'],
    },
  );
  expect(said).toContain('Flaskpace');
  for (const file of [
    'manifest.xml',
    'taskpane.html',
    'addin.js',
    'functions.json',
    'assets/icon-32.png',
    'help/tangent.html',
  ]) {
    expect(existsSync(path.join(out, file))).toBe(true);
  }
  expect(readFileSync(path.join(out, 'manifest.xml'), 'utf8')).not.toContain('localhost');
  const { functions } = JSON.parse(readFileSync(path.join(out, 'functions.json'), 'utf8')) as {
    functions: { helpUrl: string }[];
  };
  for (const { helpUrl } of functions) {
    expect(helpUrl.startsWith('https://example.org/lab/help/')).toBe(true);
    expect(existsSync(path.join(out, helpUrl.replace('https://example.org/lab/', '')))).toBe(true);
  }
}, 180_000);
