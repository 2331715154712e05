import { readFileSync } from 'node:fs';
import { manifestFor, requireAddress } from '../../scripts/packaged';

const manifest = readFileSync('manifest.xml', 'utf8');

test('manifestFor moves every address, and nothing else', () => {
  const moved = manifestFor(manifest, 'https://example.org/flaskpace/');
  expect(moved).not.toContain('localhost');
  expect(moved.replaceAll('https://example.org/flaskpace', 'https://localhost:3000')).toBe(manifest);
});

test.each(['http://example.org', 'example.org', '', 'https://example.org/?a=1'])(
  'requireAddress refuses "%s"',
  (text) => {
    expect(() => requireAddress(text)).toThrow(
      `the address must be https:// and no more than a folder: got "${text}"`,
    );
  },
);
