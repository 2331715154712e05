/** What a function refuses, and what helps: the words come from the function itself. */
import { isUnit } from '../src/units';
import { CellError } from './cell';
import type { CellFunction, Refusal } from './define';
import { asRead } from './documented';
import { calculate } from './literal';
import { boundsInWords, type Bounds, type Parameter } from './parameters';

export interface Refused {
  /** As the cell shows it, with the words beside it. */
  readonly error: CellError;
  /** A call that is refused so; left out where it is a bound of one argument. */
  readonly formula?: string;
  readonly mend: string;
}

/** What its definition names, then the bounds of its arguments that are not among that. */
export function refusalsOf(f: CellFunction): Refused[] {
  const own = (f.refusals ?? []).map(refused);
  const said = own.map(({ error }) => error.message).join('\n');
  const bounds = Object.entries(f.parameters).flatMap(([name, parameter]) => beyond(name, parameter));
  return [...own, ...bounds.filter(({ error }) => !said.includes(error.message.split(':')[0]))];
}

export const refused = ({ formula, mend }: Refusal): Refused => ({ error: wordsOf(formula), formula, mend });

/** @throws Error where a call that should be refused is answered, since that is a slip of ours */
export function wordsOf(formula: string): CellError {
  const answer = calculate(formula);
  const error = [answer].flat(2).find((cell) => cell instanceof CellError);
  if (error) return error;
  throw new Error(`${formula} was expected to be refused, and is answered`);
}

/** The rule that stands in the definition, broken once; nothing where there is none. */
function beyond(name: string, { bounds = {}, read, unit }: Parameter): Refused[] {
  const value = outside(bounds);
  if (value === undefined) return [];
  const rule = boundsInWords(bounds);
  const number = bounds.whole ? rule : /^\d/.test(rule) ? `a number, ${rule}` : `a number ${rule}`;
  const mend = `Give ${number}${isUnit(unit) ? `, in ${asRead(unit)}` : ''}.`;
  try {
    read([[value]], name);
  } catch (error) {
    return [{ error: new CellError('#VALUE!', (error as Error).message), mend }];
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
