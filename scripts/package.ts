/**
 * Makes the folder that a web server must offer so that Excel can load the add-in, with its help pages, and
 * the manifest that points there: `npm run package -- --url https://example.org/flaskpace OUT_FOLDER`.
 */
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { OfficeAddinManifest } from 'office-addin-manifest';
import { packagedFiles } from './package/files';
import { readOptions, usage } from './package/options';
import { versionAt } from './package/version';
import { requireRoom, writeFiles } from './package/write';

async function main(words: readonly string[]): Promise<void> {
  if (words.length === 0 || words.includes('--help') || words.includes('-h')) return void console.log(usage);
  const { address, out, version = defaultVersion() } = readOptions(words);
  requireRoom(out);
  const manifest = readFileSync('manifest.xml', 'utf8');
  writeFiles(out, packagedFiles(path.join('dist', 'addin'), manifest, address, version));
  const file = path.join(out, 'manifest.xml');
  // read back as Office's own tools read it
  const { displayName, version: written } = await OfficeAddinManifest.readManifestFile(file);
  console.log(
    `${displayName} ${written} is in ${out}: put the folder at ${address}, then load ${file} in Excel`,
  );
}

function defaultVersion(): string {
  const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
  return versionAt(version, new Date());
}

main(process.argv.slice(2)).catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : String(error));
  process.exitCode = 2;
});
