/** A packaged folder as a web server offers it that follows its `_headers` file. */
import { readFileSync } from 'node:fs';
import type { RequestListener } from 'node:http';
import path from 'node:path';
import { filesOf } from '../../workbook/commands/start/folder';
import { headersOf } from './headers';

/** @param folder made for an address at the root of its server */
export function packageListener(folder: string): RequestListener {
  const rules = readFileSync(path.join(folder, '_headers'), 'utf8');
  return filesOf(folder, (name) => headersOf(rules, `/${name}`));
}
