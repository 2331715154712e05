/** One process at a time, by a lock file that names its holder. */
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';

const lookAgainAfter = 200; // ms

/** Runs the work when no other process holds the lock; waits for one that does, and passes over one that died. */
export async function whileLocked(path, work) {
  mkdirSync(dirname(path), { recursive: true });
  while (!take(path)) {
    if (isAbandoned(path)) rmSync(path, { force: true });
    else await pause(lookAgainAfter);
  }
  try {
    return await work();
  } finally {
    rmSync(path, { force: true });
  }
}

function take(path) {
  try {
    writeFileSync(path, String(process.pid), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error.code === 'EEXIST' || error.code === 'EPERM') return false;
    throw error;
  }
}

function isAbandoned(path) {
  try {
    const holder = Number(readFileSync(path, 'utf8'));
    if (!holder) return false; // being written this moment
    process.kill(holder, 0);
    return false;
  } catch (error) {
    return error.code === 'ESRCH';
  }
}
