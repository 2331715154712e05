/**
 * Names that LET and LAMBDA make up carry a prefix in a file, so that they cannot be taken for names of the
 * workbook ([MS-XLSX] 2.2.2.1): LET(x,2,x*3) is stored as LET(_xlpm.x,2,_xlpm.x*3).
 */
export const localPrefix = '_xlpm.';

/** Words in quotes, names in quotes, brackets of a call, commas, or a word. */
const tokens = /"(?:[^"]|"")*"|'(?:[^']|'')*'!?|[A-Z_\\][\w.\\]*\s*[(!]?|[(){},]|[^"'(){},A-Z_\\]+/gi;

interface Call {
  readonly kind: 'LET' | 'LAMBDA' | 'other';
  /** Which argument is being read, from 0. */
  argument: number;
  /** The argument's only token so far, or `undefined` once there is more. */
  alone?: string;
}

export function withLocalPrefixes(formula: string): string {
  if (!/\b(?:LET|LAMBDA)\s*\(/i.test(formula)) return formula;
  const parts = formula.match(tokens) ?? [];
  const local = new Set(localNames(parts).map((name) => name.toUpperCase()));
  return parts
    .map((part) => (local.has(part.trim().toUpperCase()) ? part.replace(/\S/, `${localPrefix}$&`) : part))
    .join('');
}

/** LET names every other argument, LAMBDA all: but the last, which is the formula itself. */
function localNames(parts: readonly string[]): string[] {
  const names: string[] = [];
  const open: Call[] = [];
  for (const part of parts) {
    const call = open.at(-1);
    if (/[({]$/.test(part)) {
      if (call) call.alone = undefined;
      const name = part.slice(0, -1).trim().toUpperCase();
      open.push({ kind: name === 'LET' || name === 'LAMBDA' ? name : 'other', argument: 0, alone: '' });
    } else if (/^[)}]$/.test(part)) open.pop();
    else if (part === ',' && call) {
      const named = call.kind === 'LAMBDA' || (call.kind === 'LET' && call.argument % 2 === 0);
      if (named && call.alone && /^[A-Z_\\][\w.\\]*$/i.test(call.alone)) names.push(call.alone);
      call.argument += 1;
      call.alone = '';
    } else if (call && part.trim() !== '') call.alone = call.alone === '' ? part.trim() : undefined;
  }
  return names;
}
