/** Files, or parts of them, that are worked out from the definitions of the functions and checked in. */
import { readFileSync, writeFileSync } from 'node:fs';

export interface DerivedFile {
  /** From the root of the project. */
  readonly path: string;
  /** The whole file as it should be, given how it stands; `null` where there is none yet. */
  content(current: string | null): string;
}

/**
 * The part of a file between `<!-- name -->` and `<!-- end of name -->`, each on a line of its own.
 *
 * @throws when the file is missing or lacks a marker
 */
export function betweenMarkers(path: string, name: string, part: () => string): DerivedFile {
  const [start, end] = [`<!-- ${name} -->`, `<!-- end of ${name} -->`];
  return {
    path,
    content(current) {
      if (current === null)
        throw new Error(`${path} is missing: it should hold the ${name} between ${start} and ${end}`);
      const [from, to] = [current.indexOf(start), current.indexOf(end)];
      if (from < 0 || to < from) throw new Error(`${path} must have ${start} and ${end}, in this order`);
      return `${current.slice(0, from + start.length)}\n\n${part().trim()}\n\n${current.slice(to)}`;
    },
  };
}

export function asJson(value: unknown): string {
  return `${JSON.stringify(value, null, 2)}\n`;
}

/** @returns paths that are not as they should be */
export function staleFiles(files: readonly DerivedFile[]): string[] {
  return files.filter((file) => file.content(read(file.path)) !== read(file.path)).map(({ path }) => path);
}

/** @returns paths that were rewritten */
export function bringUpToDate(files: readonly DerivedFile[]): string[] {
  const stale = staleFiles(files);
  for (const file of files) {
    if (stale.includes(file.path)) writeFileSync(file.path, file.content(read(file.path)));
  }
  return stale;
}

function read(path: string): string | null {
  try {
    return readFileSync(path, 'utf8');
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}
