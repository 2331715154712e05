/** Calls a function as a cell would, from a formula whose arguments are written out: numbers, text, truth values, {1;2}, calls. */
import { callFunction } from './call';
import { functionNamed } from './catalogue';
import { CellError, type CellResult, type CellValue } from './cell';
import type { CellFunction } from './define';

/** The function that a formula calls and its arguments. @param formula `=PACE.EVENT({40;25},,-1)` */
export function callIn(formula: string): { f: CellFunction; args: (CellResult | undefined)[] } {
  const match = /^=PACE\.([A-Z]+)\((.*)\)$/s.exec(formula);
  const f = match && functionNamed(match[1]);
  if (!f) throw new Error(`not one call of a PACE function: ${formula}`);
  return { f, args: match[2] === '' ? [] : partsOf(match[2], ',').map(argument) };
}

export function calculate(formula: string): CellResult {
  const { f, args } = callIn(formula);
  return callFunction(f, args);
}

function argument(text: string): CellResult | undefined {
  if (text === '') return undefined;
  if (text.startsWith('PACE.')) return calculate(`=${text}`);
  if (!text.startsWith('{')) return cell(text);
  return partsOf(text.slice(1, -1), ';').map((row) => partsOf(row, ',').map(cell));
}

/** Nothing between two separators of an array stands for a blank cell, as it can in a sheet. */
function cell(text: string): CellValue {
  if (text === '') return null;
  if (/^(TRUE|FALSE)$/i.test(text)) return /^TRUE$/i.test(text);
  if (text.startsWith('"')) return text.slice(1, -1).replace(/""/g, '"');
  if (text.startsWith('#')) return new CellError(text as CellError['code']);
  const value = Number(text);
  if (Number.isNaN(value)) throw new Error(`not a literal: ${text}`);
  return value;
}

/** As {@link cutAt}, without the blanks around. */
export const partsOf = (text: string, separator: ',' | ';'): string[] =>
  cutAt(text, separator).map((part) => part.trim());

/** Cuts at a sign that stands in no brackets, braces or quotes. */
export function cutAt(text: string, separator: ',' | ';'): string[] {
  const parts = [''];
  let depth = 0;
  for (const piece of text.match(/"(?:[^"]|"")*"|'(?:[^']|'')*'|[^"]/g) ?? []) {
    if (piece === '(' || piece === '{') depth += 1;
    if (piece === ')' || piece === '}') depth -= 1;
    if (piece === separator && depth === 0) parts.push('');
    else parts[parts.length - 1] += piece;
  }
  return parts;
}
