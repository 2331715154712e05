import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { betweenMarkers, bringUpToDate, staleFiles, type DerivedFile } from '../../scripts/derived';

let folder: string;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'derived-'))));
afterEach(() => rmSync(folder, { recursive: true }));

const whole = (content: string): DerivedFile => ({
  path: join(folder, 'whole.json'),
  content: () => content,
});
const readme = (part: string): DerivedFile =>
  betweenMarkers(join(folder, 'README.md'), 'functions', () => part);

test('a missing or changed file is stale, an up-to-date one is not', () => {
  expect(staleFiles([whole('{}')])).toEqual([join(folder, 'whole.json')]);
  bringUpToDate([whole('{}')]);
  expect(staleFiles([whole('{}')])).toEqual([]);
  expect(staleFiles([whole('{"a":1}')])).toEqual([join(folder, 'whole.json')]);
});

test('looking for stale files changes none', () => {
  writeFileSync(join(folder, 'whole.json'), 'old');
  staleFiles([whole('new')]);
  expect(readFileSync(join(folder, 'whole.json'), 'utf8')).toBe('old');
});

test('between its markers a part is replaced, all else stays', () => {
  const file = join(folder, 'README.md');
  writeFileSync(file, 'before\n<!-- functions -->\nold\n<!-- end of functions -->\nafter\n');
  expect(bringUpToDate([readme('| new |')])).toEqual([file]);
  expect(readFileSync(file, 'utf8')).toBe(
    'before\n<!-- functions -->\n\n| new |\n\n<!-- end of functions -->\nafter\n',
  );
  expect(staleFiles([readme('| new |')])).toEqual([]);
});

test('a file without markers is named', () => {
  writeFileSync(join(folder, 'README.md'), 'no markers');
  expect(() => staleFiles([readme('x')])).toThrow(/README\.md must have <!-- functions -->/);
  rmSync(join(folder, 'README.md'));
  expect(() => staleFiles([readme('x')])).toThrow(/README\.md is missing/);
});
