/**
 * Makes the folder that a web server must offer so that Excel can load the add-in, with its help pages, and
 * the manifest that points there: `npm run package -- https://example.org/flaskpace OUT_FOLDER`.
 */
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { OfficeAddinManifest } from 'office-addin-manifest';
import { catalogue } from '../functions/catalogue';
import { helpFiles } from '../functions/help/files';
import { functionsMetadata } from '../functions/metadata';
import { asJson } from './derived';
import { manifestFor, requireAddress } from './packaged';

const usage = 'usage: npm run package -- https://where.it.will.stand/folder OUT_FOLDER';

async function main(args: readonly string[]): Promise<void> {
  const [address, out] = args;
  if (args.length !== 2) throw new Error(usage);
  const manifest = manifestFor(readFileSync('manifest.xml', 'utf8'), address);
  if (existsSync(out) && readdirSync(out).length > 0)
    throw new Error(`the folder must be empty: ${out} is not`);
  cpSync(path.join('dist', 'addin'), out, { recursive: true });
  writeFileSync(
    path.join(out, 'functions.json'),
    asJson(functionsMetadata(catalogue, { helpBase: `${requireAddress(address)}/help` })),
  );
  mkdirSync(path.join(out, 'help'));
  for (const [name, content] of helpFiles(catalogue)) writeFileSync(path.join(out, 'help', name), content);
  const file = path.join(out, 'manifest.xml');
  writeFileSync(file, manifest);
  // read back as Office's own tools read it
  const { displayName, version, id } = await OfficeAddinManifest.readManifestFile(file);
  console.log(
    `${displayName} ${version} (${id}) is in ${out}: put the folder at ${address}, then load ${file} in Excel`,
  );
}

main(process.argv.slice(2)).catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : String(error));
  process.exitCode = 2;
});
