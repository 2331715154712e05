/** Calls of our functions in a formula as it is typed: where they stand, and what each was given. */
import { isFunction, isOperator, isWhitespace, tokenize, type Token } from '@borgar/fx/xlsx';
import { functionNamed } from '../../functions/catalogue';
import { namespace, type CellFunction } from '../../functions/define';

/** A stretch of a formula: `end` is the first character after. */
interface Stretch {
  readonly start: number;
  readonly end: number;
}

export interface Call extends Stretch {
  readonly f: CellFunction;
  /** In their order; an empty stretch is an argument left out. */
  readonly given: readonly GivenArgument[];
}

export interface GivenArgument extends Stretch {
  /** Calls of ours inside it. */
  readonly calls: readonly Call[];
}

type Placed = Token & { readonly loc: [number, number] };

/** Formulas of one column share most of their arguments, and each is looked at from several sides. */
const known = new Map<string, readonly Placed[]>();
const mostKnown = 1000;

/** @param formula without a leading `=` */
export function tokensOf(formula: string): readonly Placed[] {
  const before = known.get(formula);
  if (before) return before;
  if (known.size >= mostKnown) known.clear();
  const tokens = tokenize(formula, { withLocation: true }) as Placed[];
  known.set(formula, tokens);
  return tokens;
}

/** The calls that stand in no other call of ours. */
export function callsIn(formula: string): Call[] {
  return callsAmong(tokensOf(formula));
}

/** These calls and those within them. */
export const allCalls = (calls: readonly Call[]): Call[] =>
  calls.flatMap((call) => [call, ...allCalls(call.given.flatMap((argument) => argument.calls))]);

const opens = (token: Token): boolean => isOperator(token) && (token.value === '(' || token.value === '{');
const closes = (token: Token): boolean => isOperator(token) && (token.value === ')' || token.value === '}');

function callsAmong(tokens: readonly Placed[]): Call[] {
  const calls: Call[] = [];
  for (let at = 0; at < tokens.length; at++) {
    const f = functionAt(tokens, at);
    if (!f) continue;
    const end = closing(tokens, at + 1);
    calls.push({
      f,
      start: tokens[at].loc[0],
      end: tokens[end].loc[1],
      given: argumentsOf(tokens, at + 1, end),
    });
    at = end;
  }
  return calls;
}

function functionAt(tokens: readonly Placed[], at: number): CellFunction | undefined {
  const [space, name] = tokens[at].value.split('.');
  if (!isFunction(tokens[at]) || space.toUpperCase() !== namespace || !tokens[at + 1]) return undefined;
  return functionNamed(name ?? '');
}

/** The place of the bracket that closes the one at `open`; the last token of a formula cut short. */
function closing(tokens: readonly Placed[], open: number): number {
  let depth = 0;
  for (let at = open; at < tokens.length; at++) {
    if (opens(tokens[at])) depth += 1;
    if (closes(tokens[at])) depth -= 1;
    if (depth === 0) return at;
  }
  return tokens.length - 1;
}

function argumentsOf(tokens: readonly Placed[], open: number, end: number): GivenArgument[] {
  const given: GivenArgument[] = [];
  let first = open + 1;
  let depth = 0;
  for (let at = open + 1; at <= end; at++) {
    const token = tokens[at];
    const parts = depth === 0 && (at === end || (isOperator(token) && token.value === ','));
    if (parts) {
      given.push(argument(tokens.slice(first, at), token.loc[0]));
      first = at + 1;
    } else if (opens(token)) depth += 1;
    else if (closes(token)) depth -= 1;
  }
  return given.length === 1 && given[0].start === given[0].end ? [] : given;
}

function argument(tokens: readonly Placed[], end: number): GivenArgument {
  const filled = tokens.filter((token) => !isWhitespace(token));
  return {
    start: filled[0]?.loc[0] ?? end,
    end: filled.at(-1)?.loc[1] ?? end,
    calls: callsAmong(tokens),
  };
}
