/** A formula that calls our functions → the same in built-in ones, one formula for each cell of its result. */
import { isFunction, isOperator } from '@borgar/fx/xlsx';
import { Given } from '../../functions/builtIn/given';
import {
  NotSaid,
  type Argument,
  type Arguments,
  type OfTheDay,
  type Said,
} from '../../functions/builtIn/said';
import { typedName } from '../../functions/define';
import { InvalidInput } from '../../src/errors';
import { applyEdits } from '../xlsx/edits';
import { filedModernName } from '../xlsx/modernFunctions';
import { argumentOf, whole } from './arguments';
import { callsIn, tokensOf, type Call, type GivenArgument } from './calls';
import type { WorkingsSheet } from './workings';
import type { Position, World } from './world';

/** A cell holds no longer formula (Excel specifications and limits). */
const longest = 8192;

/** Where a formula stands, and what it may ask for. */
export interface Scene {
  readonly sheet: string;
  readonly world: World;
  readonly workings: WorkingsSheet;
}

export interface SaidFormula {
  /** Of each cell, counted from the first. @throws NotSaid */
  readonly at: (row: number, column: number) => string;
  /** What in it stays as it was on the day of the copy. */
  readonly ofTheDay?: OfTheDay;
}

/** @throws NotSaid */
export function sayFormula(formula: string, position: Position, scene: Scene): SaidFormula {
  const text = scene.world.spelledOut(formula, position);
  const calls = callsIn(text);
  const [only] = calls;
  const isAlone =
    calls.length === 1 && text.slice(0, only.start).trim() === '' && text.slice(only.end).trim() === '';
  const said = isAlone ? sayCall(only, text, scene) : sayAround(calls, text, scene);
  const { rows, columns } = scene.world.spillAt(position);
  return {
    at: (row, column) => checked(cellText(said, row, column, rows * columns === 1)),
    ...(said.ofTheDay === undefined ? {} : { ofTheDay: said.ofTheDay }),
  };
}

function cellText({ cell, whole: all }: Said, row: number, column: number, isSingle: boolean): string {
  if (cell) return cell(row, column);
  if (!all) throw new NotSaid('its result cannot be told cell by cell');
  return isSingle ? all() : `INDEX(${all()},${row + 1},${column + 1})`;
}

/** Calls within a larger formula. */
function sayAround(calls: readonly Call[], text: string, scene: Scene): Said {
  const tokens = tokensOf(text);
  if (tokens.some((token) => isFunction(token) && /^(?:LET|LAMBDA)$/i.test(token.value)))
    throw new NotSaid('it stands within LET or LAMBDA');
  if (tokens.some((token) => isOperator(token) && token.value === '@'))
    throw new NotSaid('it stands beside an @');
  const { said: expression, ofTheDay } = withCallsSaid(text, 0, text, calls, scene);
  return { whole: () => expression, ...ofTheDay };
}

/** A stretch of a formula with the calls in it said, and what stays as it was in any of them. */
function withCallsSaid(
  stretch: string,
  start: number,
  text: string,
  calls: readonly Call[],
  scene: Scene,
): { readonly said: string; readonly ofTheDay: Pick<Said, 'ofTheDay'> } {
  const saids = calls.map((call) => sayCall(call, text, scene));
  const edits = calls.map((call, n) => ({
    start: call.start - start,
    end: call.end - start,
    text: whole(wholeOf(saids[n], call)),
  }));
  return { said: applyEdits(stretch, edits), ofTheDay: together(saids) };
}

function together(saids: readonly Said[]): Pick<Said, 'ofTheDay'> {
  const all = saids.flatMap(({ ofTheDay }) => ofTheDay ?? []);
  if (all.length === 0) return {};
  const what = [...new Set(all.map((one) => one.what))].join('; ');
  return { ofTheDay: { what, from: all.flatMap(({ from }) => from) } };
}

function sayCall(call: Call, text: string, scene: Scene): Said {
  const { f } = call;
  if (!f.builtIn) throw new NotSaid(`${typedName(f)} has no built-in counterpart`);
  const inner: Said[] = [];
  const given = givenTo(call, text, scene, (own, start, calls) => {
    const { said, ofTheDay } = withCallsSaid(own, start, text, calls, scene);
    inner.push(ofTheDay);
    return { text: whole(said) };
  });
  try {
    const said = f.builtIn(given);
    return { ...said, ...together([said, ...inner]) };
  } catch (error) {
    if (error instanceof InvalidInput) throw new NotSaid(error.message);
    throw error;
  }
}

/** @param nested what becomes of an argument with calls of ours in it */
export function givenTo(
  { f, given }: Call,
  text: string,
  { sheet, world, workings }: Scene,
  nested: (own: string, start: number, calls: readonly Call[]) => Argument,
): Given {
  const sayArgument = (argument: GivenArgument | undefined): Argument | undefined => {
    if (!argument || argument.start === argument.end) return undefined;
    const own = text.slice(argument.start, argument.end);
    return argument.calls.length === 0
      ? argumentOf(own, sheet, world)
      : nested(own, argument.start, argument.calls);
  };
  const args: Arguments = Object.fromEntries(
    Object.keys(f.parameters).map((name, place) => [name, sayArgument(given[place])]),
  );
  return new Given(f.parameters, args, workings.seenFrom(sheet));
}

function wholeOf(said: Said, { f }: Call): string {
  if (!said.whole) throw new NotSaid(`${typedName(f)} within another formula`);
  return said.whole();
}

function checked(text: string): string {
  if (text.length >= longest)
    throw new NotSaid(`it would take ${text.length} characters, and a cell holds ${longest - 1}`);
  const young = youngNames(text).find((name) => isCalled(name, text));
  if (young) throw new NotSaid(`${young} is unknown to older programs`);
  return text;
}

/** What looks like one: few texts have any, and only those need be taken apart. */
const youngNames = (text: string): string[] =>
  (text.match(/[A-Z][A-Z.\d]*(?=\()/gi) ?? []).filter((name) => filedModernName(name) !== undefined);

const isCalled = (name: string, text: string): boolean =>
  tokensOf(text).some((token) => isFunction(token) && token.value === name);
