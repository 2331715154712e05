/** What a function says when it refuses, and what helps: the words come from the function itself. */
import { isUnit } from '../../src/units';
import { CellError } from '../cell';
import type { CellFunction, Refusal } from '../define';
import { asRead } from '../documented';
import { calculate } from '../literal';
import { boundsInWords, type Bounds, type Parameter } from '../parameters';
import { escaped, table } from './html';

/** @throws Error where a call that should be refused is answered, since that is a slip of ours */
export function wordsOf(formula: string): CellError {
  const answer = calculate(formula);
  const error = [answer].flat(2).find((cell) => cell instanceof CellError);
  if (error) return error;
  throw new Error(`${formula} was expected to be refused, and is answered`);
}

export function refusalSection(f: CellFunction): string {
  const own = (f.refusals ?? []).map(refusalRow);
  const said = own.map(([cell]) => cell).join('\n');
  const bounds = Object.entries(f.parameters)
    .map(([name, parameter]) => boundsRow(name, parameter))
    .filter((row) => row !== undefined && !said.includes(row[0].split(':')[0]));
  const rows = [...own, ...(bounds as string[][])];
  const known = rows.length > 0 ? table(['the cell says', 'what helps'], rows) : '';
  return `${known}\n<p>What any function may say, of columns, gaps and units, stands in <a href="errors.html">When a cell shows an error</a>.</p>`;
}

export function refusalRow({ formula, mend }: Refusal): string[] {
  const { code, message } = wordsOf(formula);
  return [
    `<code>${code}</code> ${escaped(message)}<br /><span class="quiet">as in <code>${escaped(formula)}</code></span>`,
    escaped(mend),
  ];
}

/** The rule that stands in the definition, broken once; nothing where there is none. */
function boundsRow(name: string, { bounds = {}, read, unit }: Parameter): string[] | undefined {
  const value = outside(bounds);
  if (value === undefined) return undefined;
  const rule = boundsInWords(bounds);
  const number = bounds.whole ? rule : /^\d/.test(rule) ? `a number, ${rule}` : `a number ${rule}`;
  const mend = `Give ${number}${isUnit(unit) ? `, in ${asRead(unit)}` : ''}.`;
  try {
    read([[value]], name);
  } catch (error) {
    return [`<code>#VALUE!</code> ${escaped((error as Error).message)}`, escaped(mend)];
  }
  throw new Error(`${name} takes ${value}, which its bounds do not`);
}

function outside({ above, atLeast, below, atMost, whole }: Bounds): number | undefined {
  if (above !== undefined) return above === 0 ? -1 : above - 1;
  if (atLeast !== undefined) return atLeast - 1;
  if (below !== undefined) return below + 1;
  if (atMost !== undefined) return atMost + 1;
  return whole ? 2.5 : undefined;
}
