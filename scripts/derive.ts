/**
 * Writes what derives from the definitions: functions.json, docs/functions.md and the table in the README.
 * With `--check` it writes nothing and fails, naming each file that is stale.
 */
import { catalogue } from '../functions/catalogue';
import { functionsMetadata } from '../functions/metadata';
import { readmeTable } from '../functions/readmeTable';
import { referencePage } from '../functions/referencePage';
import { asJson, betweenMarkers, bringUpToDate, staleFiles, type DerivedFile } from './derived';

const files: readonly DerivedFile[] = [
  { path: 'functions/functions.json', content: () => asJson(functionsMetadata(catalogue)) },
  { path: 'docs/functions.md', content: () => referencePage(catalogue) },
  betweenMarkers('README.md', 'functions', () => readmeTable(catalogue)),
];

if (process.argv.includes('--check')) {
  const stale = staleFiles(files);
  for (const path of stale) console.error(`${path} is stale: run \`npm run derive\``);
  if (stale.length > 0) process.exitCode = 1;
} else {
  for (const path of bringUpToDate(files)) console.log(`wrote ${path}`);
}
