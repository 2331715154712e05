/** All help pages as files, to be put beside each other anywhere. */
import type { CellFunction } from '../define';
import { functionPage, pageName } from './functionPage';
import { styles } from './html';
import { indexPage, script } from './indexPage';

/** By file name. */
export const helpFiles = (catalogue: readonly CellFunction[]): ReadonlyMap<string, string> =>
  new Map([
    ['index.html', indexPage(catalogue)],
    ['help.css', styles],
    ['help.js', script],
    ...catalogue.map((f): [string, string] => [pageName(f), functionPage(f)]),
  ]);
