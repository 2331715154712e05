/**
 * `@`: of a range, the one cell in the formula's own row or column. A plain formula in a file means that
 * wherever one value is wanted of a range, and Excel shows it with an `@`; only arrays take all of it.
 */
const cell = String.raw`\$?[A-Z]{1,3}\$?\d+`;
const column = String.raw`\$?[A-Z]{1,3}`;
const row = String.raw`\$?\d+`;
const sheet = String.raw`(?:'(?:[^']|'')+'!|[A-Z_][\w.]*!)?`;
const range = `${sheet}(?:${cell}:${cell}|${column}:${column}|${row}:${row})(?![\\w(:])`;

/** Words in quotes, a range, a call's opening, brackets, or anything else that is a word. */
const tokens = new RegExp(
  String.raw`"(?:[^"]|"")*"|(@?${range})|([A-Z_\\][\w.\\]*\s*\(|[({])|([)}])|\[[^\]]*\]|'(?:[^']|'')*'!?|[\w.$\\]+`,
  'gi',
);

/** `A2:A9*2` → `@A2:A9*2`; ranges that a function is given stay whole. */
export function withIntersections(formula: string): string {
  if (!formula.includes(':')) return formula;
  const open: boolean[] = [];
  return formula.replace(tokens, (token: string, found?: string, opens?: string, closes?: string) => {
    if (opens !== undefined) open.push(opens.length > 1 || opens === '{');
    else if (closes !== undefined) open.pop();
    else if (found !== undefined && !found.startsWith('@') && !open.includes(true)) return `@${token}`;
    return token;
  });
}

const marked = new RegExp(String.raw`"(?:[^"]|"")*"|@(${range}|${sheet}${cell}|[A-Z_\\][\w.\\]*)`, 'gi');

/** For a plain formula in a file, where `@` goes without saying. */
export const withoutIntersections = (formula: string): string =>
  formula.replace(marked, (all, cells?: string) => cells ?? all);

/** For an array in a file, where `@` is a function's name. */
export const namedIntersections = (formula: string): string =>
  formula.replace(marked, (all, cells?: string) => (cells === undefined ? all : `_xlfn.SINGLE(${cells})`));
