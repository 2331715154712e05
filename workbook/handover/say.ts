/** A formula that calls our functions → the same in built-in ones, one formula for each cell of its result. */
import { isFunction, isOperator } from '@borgar/fx/xlsx';
import { Given } from '../../functions/builtIn/given';
import { NotSaid, type Argument, type Arguments, type Said } from '../../functions/builtIn/said';
import { typedName } from '../../functions/define';
import { InvalidInput } from '../../src/errors';
import { applyEdits } from '../xlsx/edits';
import { filedModernName } from '../xlsx/modernFunctions';
import { argumentOf, whole } from './arguments';
import { callsIn, tokensOf, type Call, type GivenArgument } from './calls';
import type { Position, World } from './world';

/** A cell holds no longer formula (Excel specifications and limits). */
const longest = 8192;

/** @returns the formula of each cell, counted from the first. @throws NotSaid */
export function sayFormula(
  formula: string,
  position: Position,
  world: World,
): (row: number, column: number) => string {
  const text = world.spelledOut(formula, position);
  const calls = callsIn(text);
  const [only] = calls;
  const isAlone =
    calls.length === 1 && text.slice(0, only.start).trim() === '' && text.slice(only.end).trim() === '';
  const said = isAlone
    ? sayCall(only, text, position.sheet, world)
    : sayAround(calls, text, position.sheet, world);
  const { rows, columns } = world.spillAt(position);
  return (row, column) => checked(cellText(said, row, column, rows * columns === 1));
}

function cellText({ cell, whole: all }: Said, row: number, column: number, isSingle: boolean): string {
  if (cell) return cell(row, column);
  if (!all) throw new NotSaid('its result cannot be told cell by cell');
  return isSingle ? all() : `INDEX(${all()},${row + 1},${column + 1})`;
}

/** Calls within a larger formula. */
function sayAround(calls: readonly Call[], text: string, sheet: string, world: World): Said {
  const tokens = tokensOf(text);
  if (tokens.some((token) => isFunction(token) && /^(?:LET|LAMBDA)$/i.test(token.value)))
    throw new NotSaid('it stands within LET or LAMBDA');
  if (tokens.some((token) => isOperator(token) && token.value === '@'))
    throw new NotSaid('it stands beside an @');
  const expression = applyEdits(
    text,
    calls.map((call) => ({
      start: call.start,
      end: call.end,
      text: whole(wholeOf(sayCall(call, text, sheet, world), call)),
    })),
  );
  return { whole: () => expression };
}

function sayCall({ f, given }: Call, text: string, sheet: string, world: World): Said {
  if (!f.builtIn) throw new NotSaid(`${typedName(f)} has no counterpart in built-in functions`);
  const names = Object.keys(f.parameters);
  const sayArgument = (argument: GivenArgument): Argument | undefined => {
    if (argument.start === argument.end) return undefined;
    const { calls, start } = argument;
    const own = text.slice(start, argument.end);
    if (calls.length === 0) return argumentOf(own, sheet, world);
    const edits = calls.map((call) => ({
      start: call.start - start,
      end: call.end - start,
      text: whole(wholeOf(sayCall(call, text, sheet, world), call)),
    }));
    return { text: whole(applyEdits(own, edits)) };
  };
  const args: Arguments = Object.fromEntries(
    names.map((name, place) => [name, given[place] && sayArgument(given[place])]),
  );
  try {
    return f.builtIn(new Given(f.parameters, args));
  } catch (error) {
    if (error instanceof InvalidInput) throw new NotSaid(error.message);
    throw error;
  }
}

function wholeOf(said: Said, { f }: Call): string {
  if (!said.whole) throw new NotSaid(`${typedName(f)} within another formula`);
  return said.whole();
}

function checked(text: string): string {
  if (text.length >= longest)
    throw new NotSaid(`it would take ${text.length} characters, and a cell holds ${longest - 1}`);
  const young = tokensOf(text).find(
    (token) => isFunction(token) && filedModernName(token.value) !== undefined,
  );
  if (young) throw new NotSaid(`${young.value} is unknown to older programs`);
  return text;
}
