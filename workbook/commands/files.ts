/** Reading a file that must be there, and replacing one only by a whole one. */
import { randomUUID } from 'node:crypto';
import { open, readFile, realpath, rename, rm, stat } from 'node:fs/promises';
import { basename, dirname, join, resolve } from 'node:path';
import { kindNamed, kindOf } from '../xlsx/kinds';

/** The file cannot be used; the message says which and why. */
export class FileTrouble extends Error {
  override readonly name = 'FileTrouble';
}

/** @throws FileTrouble */
export async function readInput(path: string): Promise<Uint8Array> {
  try {
    return await readFile(path);
  } catch (error) {
    throw new FileTrouble(`${path} cannot be read: ${reason(error)}`);
  }
}

/** @throws FileTrouble where `output` cannot become a new file beside or in place of another than `input` */
export async function requireOutput(output: string, input: string): Promise<void> {
  const folder = dirname(resolve(output));
  const inFolder = await stat(folder).catch(() => undefined);
  if (!inFolder?.isDirectory()) throw new FileTrouble(`the folder of ${output} does not exist: ${folder}`);
  const there = await stat(output).catch(() => undefined);
  if (there && !there.isFile()) throw new FileTrouble(`${output} is not a file, so it cannot be replaced`);
  if (there && (await isSame(output, input))) {
    throw new FileTrouble(`OUT must be another file than IN, which is never changed: both are ${output}`);
  }
}

/** @throws FileTrouble where Excel would not open `made` under that name */
export function requireNameOfKind(output: string, made: Uint8Array): void {
  const [own, given] = [kindOf(made), kindNamed(output)];
  if (own && given && own !== given)
    throw new FileTrouble(
      `OUT must end in ${own.extension}, as its kind of workbook does, or Excel will not open it: got ${output}`,
    );
}

/** One file can go by two names: a link, another spelling of its path. */
async function isSame(a: string, b: string): Promise<boolean> {
  const [first, second] = await Promise.all(
    [a, b].map((path) => stat(path, { bigint: true }).catch(() => undefined)),
  );
  if (!first || !second) return false;
  if (first.ino !== 0n) return first.ino === second.ino && first.dev === second.dev;
  return (await realpath(a)) === (await realpath(b));
}

/** The file appears, or is replaced, in one step; until then nothing of it can be seen. @throws FileTrouble */
export async function writeWhole(path: string, bytes: Uint8Array): Promise<void> {
  const beside = join(dirname(resolve(path)), `.${basename(path)}.${randomUUID()}.part`);
  try {
    const file = await open(beside, 'wx');
    try {
      await file.writeFile(bytes);
      await file.sync();
    } finally {
      await file.close();
    }
    await rename(beside, path);
  } catch (error) {
    await rm(beside, { force: true });
    throw new FileTrouble(`${path} cannot be written: ${reason(error)}`);
  }
}

const reasons: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EISDIR: 'it is a folder',
  ENOTDIR: 'a part of its path is not a folder',
  EACCES: 'permission is denied',
  EPERM: 'permission is denied',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  EBUSY: 'another program is using it',
};

function reason(error: unknown): string {
  const { code = '', message = String(error) } = error as NodeJS.ErrnoException;
  return reasons[code] ?? message;
}
