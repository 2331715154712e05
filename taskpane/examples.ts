/** How much room the example of a function takes: it is worked out, as a cell would. */
import { ask } from './calls/call';
import { isRange, type CellResult, type CellValue } from '../functions/cell';
import type { CellFunction } from '../functions/define';
import type { Size } from './insertions/insertion';

export function exampleSize({ example: { formula } }: CellFunction): Size {
  const answer = valueOf(formula.replace(/^=/, ''));
  return isRange(answer) ? { rows: answer.length, columns: answer[0].length } : { rows: 1, columns: 1 };
}

/** Examples hold constants and calls within calls, and point at no cells. */
function valueOf(text: string): CellResult | undefined {
  const call = /^PACE\.([A-Z]+)\((.*)\)$/s.exec(text);
  if (call) {
    const args = partsOf(call[2], ',').map((argument) => ({ value: valueOf(argument), text: argument }));
    return ask(call[1], args);
  }
  if (text.startsWith('{'))
    return partsOf(text.slice(1, -1), ';').map((row) => partsOf(row, ',').map(cellOf));
  return text === '' ? undefined : cellOf(text);
}

function cellOf(text: string): CellValue {
  if (text.startsWith('"')) return text.slice(1, -1).replace(/""/g, '"');
  if (/^(TRUE|FALSE)$/i.test(text)) return /^TRUE$/i.test(text);
  const value = Number(text);
  return Number.isFinite(value) ? value : text;
}

/** Cuts at a sign that stands in no brackets, braces or quotes. */
export function partsOf(text: string, separator: ',' | ';'): string[] {
  const parts = [''];
  let depth = 0;
  for (const piece of text.match(/"(?:[^"]|"")*"|[^"]/g) ?? []) {
    if (piece === '(' || piece === '{') depth += 1;
    if (piece === ')' || piece === '}') depth -= 1;
    if (piece === separator && depth === 0) parts.push('');
    else parts[parts.length - 1] += piece;
  }
  return parts.map((part) => part.trim());
}
