/** Formulas that reach outside their workbook: a file names other workbooks by number, `[2]Data!A1`. */
import { isFunction, isReference, tokenize, type Token } from '@borgar/fx/xlsx';
import type { DefinedName } from '../engine/engine';
import { filedPrefix } from '../engine/names';

/** At the head of a reference: `[2]Data!A1`, `'[2]My data'!A1`, `[2]!rate`. */
const head = /^('?)\[(\d+)\]/;

/** Not `Table1[2]`, a column, nor words in quotes. */
const namesLink = (token: Token): boolean =>
  head.test(token.value) &&
  (token.type.startsWith('context') || (isReference(token) && token.value.includes('!')));

const tokensOf = (formula: string): Token[] => (/\[\d+\]/.test(formula) ? tokenize(formula) : []);

/** Such as `_xldudf_OTHER_RATE`: ours are typed by another name. */
const callsOtherAddIn = (formula: string): boolean => formula.includes(filedPrefix);

/**
 * Whether a formula reads another workbook or calls another add-in: neither is at hand.
 *
 * @param formula as it is typed
 * @param names in capitals: those that reach outside themselves
 */
export const reachesOutside = (formula: string, names: ReadonlySet<string> = new Set()): boolean =>
  tokensOf(formula).some(namesLink) ||
  callsOtherAddIn(formula) ||
  (names.size > 0 &&
    tokenize(formula).some((token) => isReference(token) && names.has(token.value.toUpperCase())));

/** In capitals; a name may reach outside through another. */
export function namesReachingOutside(
  names: readonly DefinedName[],
  known: ReadonlySet<string> = new Set(),
): ReadonlySet<string> {
  const found = new Set(
    names.filter(({ refersTo }) => reachesOutside(refersTo, known)).map(({ name }) => name.toUpperCase()),
  );
  return found.size === known.size ? found : namesReachingOutside(names, found);
}

const dayFunctions = new Set(
  'DATE DATEDIF DATEVALUE DAY DAYS360 EDATE EOMONTH ISOWEEKNUM MONTH NETWORKDAYS NETWORKDAYS.INTL NOW TEXT TODAY WEEKDAY WEEKNUM WORKDAY WORKDAY.INTL YEAR YEARFRAC'.split(
    ' ',
  ),
);

/** Whether what it comes to hangs on the day from which dates are counted. */
export const countsDays = (formula: string): boolean =>
  tokenize(formula).some((token) => isFunction(token) && dayFunctions.has(token.value.toUpperCase()));

export const linkNumbersIn = (formula: string): number[] =>
  tokensOf(formula)
    .filter(namesLink)
    .map(({ value }) => Number(head.exec(value)![2]));

export function withLinkNumbers(formula: string, moved: (number: number) => number): string {
  const tokens = tokensOf(formula);
  if (!tokens.some(namesLink)) return formula;
  const renumbered = (text: string): string =>
    text.replace(head, (_, quote: string, number: string) => `${quote}[${moved(Number(number))}]`);
  return tokens.map((token) => (namesLink(token) ? renumbered(token.value) : token.value)).join('');
}
