/** Calls a function as a cell would, from a formula whose arguments are written out: numbers, text, truth values, {1;2}. */
import { callFunction } from '../../functions/call';
import { functionNamed } from '../../functions/catalogue';
import type { CellResult, CellValue } from '../../functions/cell';
import { CellError } from '../../functions/cell';
import type { CellFunction } from '../../functions/define';

/** The function that a formula calls and its arguments. @param formula `=PACE.EVENT({40;25},,-1)` */
export function callIn(formula: string): { f: CellFunction; args: (CellResult | undefined)[] } {
  const match = /^=PACE\.([A-Z]+)\((.*)\)$/.exec(formula);
  const f = match && functionNamed(match[1]);
  if (!f) throw new Error(`not one call of a PACE function: ${formula}`);
  return { f, args: match[2] === '' ? [] : splitTop(match[2], ',').map(argument) };
}

export function calculate(formula: string): CellResult {
  const { f, args } = callIn(formula);
  return callFunction(f, args);
}

/** @returns the words beside the error, after its code: `#VALUE! volume must …` */
export function errorOf(formula: string): string {
  const result = calculate(formula);
  if (!(result instanceof CellError)) throw new Error(`${formula} is no error: ${JSON.stringify(result)}`);
  return `${result.code} ${result.message}`;
}

function argument(text: string): CellResult | undefined {
  const trimmed = text.trim();
  if (trimmed === '') return undefined;
  if (!trimmed.startsWith('{')) return cell(trimmed);
  return splitTop(trimmed.slice(1, -1), ';').map((row) => splitTop(row, ',').map((one) => cell(one.trim())));
}

/** Nothing between two separators of an array stands for a blank cell, as it can in a sheet. */
function cell(text: string): CellValue {
  if (text === '') return null;
  if (text === 'TRUE' || text === 'FALSE') return text === 'TRUE';
  if (text.startsWith('"')) return text.slice(1, -1);
  if (text.startsWith('#')) return new CellError(text as CellError['code']);
  const value = Number(text);
  if (Number.isNaN(value)) throw new Error(`not a literal: ${text}`);
  return value;
}

function splitTop(text: string, separator: string): string[] {
  const parts = [''];
  let depth = 0;
  let isQuoted = false;
  for (const letter of text) {
    if (letter === '"') isQuoted = !isQuoted;
    if (letter === '{' && !isQuoted) depth++;
    if (letter === '}' && !isQuoted) depth--;
    if (letter === separator && depth === 0 && !isQuoted) parts.push('');
    else parts[parts.length - 1] += letter;
  }
  return parts;
}
