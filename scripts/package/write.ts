/** Writing a folder anew, over nothing that is there. */
import { mkdirSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import type { Files } from './files';

/** @throws where something stands in the way, in words */
export function requireRoom(out: string): void {
  const there = statSync(out, { throwIfNoEntry: false });
  if (there && !there.isDirectory()) throw new Error(`OUT_FOLDER must be a folder: ${out} is a file`);
  if (there && readdirSync(out).length > 0) throw new Error(`the folder must be empty: ${out} is not`);
}

export function writeFiles(out: string, files: Files): void {
  for (const [name, content] of files) {
    const file = path.join(out, ...name.split('/'));
    mkdirSync(path.dirname(file), { recursive: true });
    writeFileSync(file, content, { flag: 'wx' });
  }
}
