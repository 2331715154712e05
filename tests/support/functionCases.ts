/** Calls of every function that a sheet can make of its example: as it stands, and with one cell of each range changed. */
import { catalogue } from '../../functions/catalogue';
import { CellError, isRange, type CellResult } from '../../functions/cell';
import { typedName, type CellFunction } from '../../functions/define';
import { callIn } from './literal';

export interface FunctionCase {
  readonly f: CellFunction;
  readonly args: readonly (CellResult | undefined)[];
  readonly title: string;
}

/** The same call with one cell of each range changed: the last but one, where there are three or more. */
export const withCell = (args: FunctionCase['args'], cell: CellResult): FunctionCase['args'] =>
  args.map((argument) => {
    if (argument === undefined || !isRange(argument) || argument.length < 3) return argument;
    const place = argument.length - 2;
    return argument.map((row, r) => (r === place ? row.map(() => cell as never) : row));
  });

/** A reference to a cell that holds nothing, where one number is wanted. */
const blankForNumbers = (args: FunctionCase['args']): FunctionCase['args'] =>
  args.map((argument) => (typeof argument === 'number' ? [[null]] : argument));

export const functionCases: readonly FunctionCase[] = catalogue.flatMap((f) => {
  const { args } = callIn(f.example.formula);
  const cases: readonly [string, FunctionCase['args']][] = [
    ['its example', args],
    ['a blank cell in every range', withCell(args, null)],
    ['a true zero in every range', withCell(args, 0)],
    ['words in every range', withCell(args, 'n/a')],
    ['an error cell in every range', withCell(args, new CellError('#DIV/0!'))],
    ['a blank cell for each single number', blankForNumbers(args)],
    ['nothing at all', []],
  ];
  return cases.map(([title, given]) => ({ f, args: given, title: `${typedName(f)}: ${title}` }));
});
