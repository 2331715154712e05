/** Every file of the folder that Excel loads the add-in from, made before any is written. */
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { catalogue } from '../../functions/catalogue';
import { helpFiles } from '../../functions/help/files';
import { functionsMetadata } from '../../functions/metadata';
import { asJson } from '../derived';
import { hashedFolder, headersFile } from './headers';
import { filesNamed, manifestFor } from './manifest';
import { readme } from './readme';

export type Files = ReadonlyMap<string, Buffer>;

/**
 * @param built the folder of the built add-in
 * @param manifest the checked-in one
 * @throws where the manifest would have Excel load what is not there
 */
export function packagedFiles(built: string, manifest: string, address: string, version: string): Files {
  const files = filesIn(built);
  const script = [...files.keys()].find(
    (name) => name.startsWith(`${hashedFolder}/addin.`) && name.endsWith('.js'),
  );
  if (script === undefined) throw new Error(`the built add-in has no script: ${built} must be built anew`);
  const placed = manifestFor(manifest, { address, version, script });
  const add = (name: string, text: string): void => void files.set(name, Buffer.from(text));
  add('manifest.xml', placed);
  add('functions.json', asJson(functionsMetadata(catalogue, { helpBase: `${address}/help` })));
  for (const [name, content] of helpFiles(catalogue)) add(`help/${name}`, content);
  add('_headers', headersFile(address));
  add('README.txt', readme(address, version));
  const missing = filesNamed(placed, address).filter((name) => !files.has(name));
  if (missing.length > 0) throw new Error(`the manifest names what the folder lacks: ${missing.join(', ')}`);
  add('SHA256SUMS', checksums(files));
  return files;
}

/** As `sha256sum -c` reads them. */
const checksums = (files: Files): string =>
  [...files]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, content]) => `${createHash('sha256').update(content).digest('hex')}  ${name}\n`)
    .join('');

function filesIn(folder: string, under = ''): Map<string, Buffer> {
  const found = new Map<string, Buffer>();
  for (const entry of readdirSync(path.join(folder, under), { withFileTypes: true })) {
    const name = under === '' ? entry.name : `${under}/${entry.name}`;
    if (entry.isDirectory()) for (const [inner, content] of filesIn(folder, name)) found.set(inner, content);
    else found.set(name, readFileSync(path.join(folder, name)));
  }
  return found;
}
