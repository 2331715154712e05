/** Builds what is stale: the bundles whose sources no longer read as they did at the last build. */
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { whileLocked } from './lock.mjs';

export const root = dirname(dirname(fileURLToPath(import.meta.url)));

const everywhere = ['package-lock.json', 'webpack.config.js', 'src', 'functions'];

/** Files and folders that go into each bundle of webpack.config.js. */
const sources = {
  addin: [...everywhere, 'taskpane', 'workbook', 'assets'],
  workbook: [...everywhere, 'taskpane', 'workbook', 'assets'],
  commands: [
    ...everywhere,
    'taskpane',
    'workbook',
    'scripts',
    'tests/bench',
    'tests/simulations',
    'tests/support',
  ],
};

/** @param names of bundles; says one line when there is something to build. @throws with the first errors of a build */
export async function buildStale(names) {
  if (names.every(isFresh)) return;
  // two commands started at once must not write into one folder together
  await whileLocked(join(root, '.cache', 'build.lock'), async () => {
    const stale = names.filter((name) => !isFresh(name));
    if (stale.length > 0) await build(stale);
  });
}

async function build(names) {
  const start = Date.now();
  const prints = Object.fromEntries(names.map((name) => [name, fingerprint(name)]));
  const isFirst = names.some((name) => !existsSync(stamp(name)));
  const shownNames = names.join(' and ');
  process.stderr.write(
    isFirst ? `building ${shownNames}, which takes a while the first time … ` : `building ${shownNames} … `,
  );
  try {
    await webpack(names);
  } catch (error) {
    process.stderr.write('\n');
    throw error;
  }
  for (const name of names) {
    mkdirSync(dirname(stamp(name)), { recursive: true });
    writeFileSync(stamp(name), prints[name]);
  }
  process.stderr.write(`done in ${((Date.now() - start) / 1000).toFixed(1)} s\n`);
}

function webpack(names) {
  const require = createRequire(import.meta.url);
  const configs = require(join(root, 'webpack.config.js')).filter(({ name }) => names.includes(name));
  const compiler = require('webpack')(configs);
  return new Promise((resolve, reject) => {
    compiler.run((broken, stats) => {
      // closing writes the cache that makes the next build quick
      compiler.close((unclosed) => {
        const failed = broken ?? unclosed;
        if (failed) reject(failed);
        else if (stats.hasErrors())
          reject(new Error(stats.toString({ preset: 'errors-only', colors: false })));
        else resolve();
      });
    });
  });
}

const stamp = (name) => join(root, '.cache', `${name}.built`);

function isFresh(name) {
  if (!existsSync(join(root, 'dist', name)) || !existsSync(stamp(name))) return false;
  return readFileSync(stamp(name), 'utf8') === fingerprint(name);
}

/** By content, since a checkout or a copy changes times and nothing else. */
function fingerprint(name) {
  const hash = createHash('sha256');
  for (const file of sources[name].flatMap(filesIn)) {
    hash.update(`${file}\0`);
    hash.update(readFileSync(join(root, file)));
  }
  return hash.digest('hex');
}

function filesIn(path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full)
    .sort()
    .flatMap((name) => filesIn(`${path}/${name}`));
}
