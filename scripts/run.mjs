/**
 * One way to start anything that is built first: `node scripts/run.mjs start`, `… recalc IN.xlsx OUT.xlsx`.
 * Builds what has changed since the last build, then hands over arguments, input and exit code.
 * `… build` builds whatever is stale and ends; `… build page` only what the page needs.
 */
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { constants } from 'node:os';
import { join } from 'node:path';
import { buildStale, root } from './build.mjs';

/** What has to be built before each command runs; all but `build` are entries of dist/commands. */
const needs = {
  start: ['workbook', 'commands'],
  recalc: ['commands'],
  handover: ['commands'],
  derive: ['commands'],
  bench: ['commands'],
  simulate: ['commands'],
  package: ['addin', 'commands'],
  excel: ['addin', 'commands'],
};
const wholes = { page: ['workbook', 'commands'], all: ['addin', 'workbook', 'commands'] };

const oldestNode = 20;
const exitCode = { refused: 2 };

function refuse(words) {
  process.stderr.write(`${words}\n`);
  process.exit(exitCode.refused);
}

async function main([command, ...args]) {
  if (Number(process.versions.node.split('.')[0]) < oldestNode) {
    refuse(`Node ${oldestNode} or newer is needed: this is ${process.versions.node}`);
  }
  if (!existsSync(join(root, 'node_modules', 'webpack'))) {
    refuse('the packages are not installed yet: run `npm ci` first');
  }
  const builds = command === 'build' ? wholes[args[0] ?? 'all'] : needs[command];
  if (!builds) refuse(`unknown command "${[command, ...args].join(' ').trim()}": ${known().join(', ')}`);
  try {
    await buildStale(builds);
  } catch (error) {
    refuse(`the build failed: ${error.message}`);
  }
  if (command !== 'build') handOver(command, args);
}

const known = () => [...Object.keys(needs), ...Object.keys(wholes).map((whole) => `build ${whole}`)];

function handOver(command, args) {
  const child = spawn(process.execPath, [join(root, 'dist', 'commands', `${command}.cjs`), ...args], {
    stdio: 'inherit',
  });
  // Ctrl+C reaches the child by itself: stay until it has ended in its own way
  process.on('SIGINT', () => {});
  for (const signal of ['SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal));
  child.on('error', (error) => refuse(`${command} could not be run: ${error.message}`));
  child.on('exit', (code, signal) => process.exit(code ?? 128 + (constants.signals[signal] ?? 0)));
}

await main(process.argv.slice(2));
