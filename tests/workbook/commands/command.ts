/** The built command as a person runs it: a process of its own. */
import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const root = join(__dirname, '..', '..', '..');

/** Builds what has changed since the last build. */
export function buildCommands(): void {
  execFileSync(process.execPath, [join(root, 'scripts', 'run.mjs'), 'recalc', '--help'], {
    cwd: root,
    stdio: 'pipe',
  });
}

export interface Outcome {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

export const recalc = (...args: string[]): Outcome => command('recalc', ...args);

export function command(name: string, ...args: string[]): Outcome {
  const bundle = join(root, 'dist', 'commands', `${name}.cjs`);
  const { status, stdout, stderr } = spawnSync(process.execPath, [bundle, ...args], {
    encoding: 'utf8',
    timeout: 60_000,
  });
  return { code: status, out: stdout, err: stderr };
}

/** A folder of its own for each test, gone afterwards. */
export function temporaryFolder(): { path(name: string): string; remove(): void } {
  const folder = mkdtempSync(join(tmpdir(), 'recalc-'));
  return {
    path: (name) => join(folder, name),
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}
