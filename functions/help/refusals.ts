/** What a function says when it refuses, and what helps, as a help page sets it. */
import type { CellFunction } from '../define';
import { refusalsOf, type Refused } from '../refusals';
import { escaped, table } from './html';

export function refusalSection(f: CellFunction): string {
  const rows = refusalsOf(f).map(refusalRow);
  const known = rows.length > 0 ? table(['the cell says', 'what helps'], rows) : '';
  return `${known}\n<p>What any function may say, of columns, gaps and units, stands in <a href="errors.html">When a cell shows an error</a>.</p>`;
}

export function refusalRow({ error: { code, message }, formula, mend }: Refused): string[] {
  const example =
    formula === undefined ? '' : `<br /><span class="quiet">as in <code>${escaped(formula)}</code></span>`;
  return [`<code>${code}</code> ${escaped(message)}${example}`, escaped(mend)];
}
