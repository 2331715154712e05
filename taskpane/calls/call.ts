/** The one way the pane asks a cell function, and how it writes the same question as a formula. */
import { callFunction } from '../../functions/call';
import { functionNamed } from '../../functions/catalogue';
import { CellError, isRange, type CellRange, type CellResult } from '../../functions/cell';
import { namespace } from '../../functions/define';
import type { Argument } from './argument';

export function ask(name: string, args: readonly Argument[]): CellResult {
  const f = functionNamed(name);
  if (!f) return new CellError('#NAME?', `${namespace}.${name} is not part of this version`);
  return callFunction(
    f,
    args.map(({ value }) => value),
  );
}

/** The answer as rows, or its error as one cell. */
export function askForRows(name: string, args: readonly Argument[]): CellRange {
  const result = ask(name, args);
  return isRange(result) ? result : [[result]];
}

/** `PACE.TANGENT('Gas run'!A3:A20,'Gas run'!C3:C20,30)`, arguments left out at the end cut off. */
export function callText(name: string, args: readonly Argument[]): string {
  const texts = args.map(({ text }) => text);
  while (texts.length > 0 && texts[texts.length - 1] === '') texts.pop();
  return `${namespace}.${name}(${texts.join(',')})`;
}

/** As it is typed into a cell. */
export const formulaText = (name: string, args: readonly Argument[]): string => `=${callText(name, args)}`;

/** Why a function gave no answer. */
export const refusalOf = ({ message, code }: CellError): string =>
  message || `the readings hold the error ${code}`;
