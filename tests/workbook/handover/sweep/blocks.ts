/** Calls laid out as blocks of a workbook, one a fault: the arguments side by side, then the call. */
import { areaName, cellName } from '../../../../functions/address';
import { valueText } from '../../../../functions/builtIn/text';
import { asRange, type CellRange, type CellResult } from '../../../../functions/cell';
import { typedName } from '../../../../functions/define';
import { callIn } from '../../../../functions/literal';
import type { BookModel } from '../../../../workbook/engine/engine';
import { book, type Typed } from '../../engine/book';
import { faultsOf, type Fault } from './faults';

export interface Block {
  /** `=PACE.EVENT(40), times: zero`. */
  readonly title: string;
  readonly fault: Fault;
  /** One a function, and another for what is mended. */
  readonly sheet: string;
  /** Of its formula. */
  readonly row: number;
  readonly column: number;
  /** What is typed on the day of the copy, and what is typed over it afterwards. */
  readonly before: Typed;
  readonly after: Typed;
}

interface Laid {
  readonly name: string;
  readonly cells: CellRange;
  readonly column: number;
}

/** These words are read in the formula alone. */
const isWritten = (argument: CellResult): boolean => /^(?:first|relative)$/.test(String(argument));

/** Rows that a result may take beyond those of the arguments. */
const room = 5;

/** @param isMended whether the copy is made while the fault is there */
export function blocksOf(calls: readonly string[], isMended: boolean): Block[] {
  const next = new Map<string, number>();
  return calls.flatMap((call) => {
    const { f, args } = callIn(call);
    const names = Object.keys(f.parameters);
    const laid = laidOut(args, names);
    const last = laid.at(-1)!;
    const column = last.column + last.cells[0].length;
    const height = Math.max(...laid.map(({ cells }) => cells.length)) + room;
    const formulaAt = (row: number): string => {
      const spelled = names.map((name, n) => {
        const own = laid.find((one) => one.name === name);
        return own ? placeOf(own, row) : args[n] === undefined ? '' : valueText(args[n] as string);
      });
      return `=${typedName(f)}(${spelled.slice(0, args.length).join(',')})`;
    };
    return laid.flatMap((argument) =>
      faultsOf(f.parameters[argument.name], argument.cells).map((fault): Block => {
        const row = next.get(f.name) ?? 0;
        next.set(f.name, row + height);
        const good: Typed = Object.assign({}, ...laid.map((one) => typed(workedOut(one), row)));
        const bad = { ...good, ...typed({ ...argument, cells: fault.cells }, row) };
        const formula = { [cellName(row, column)]: formulaAt(row) };
        const [before, after] = isMended ? [bad, good] : [good, bad];
        return {
          title: `${call}, ${argument.name}: ${fault.what}${isMended ? ', mended' : ''}`,
          fault,
          sheet: isMended ? `${f.name} mended` : f.name,
          row,
          column,
          before: { ...before, ...formula },
          after,
        };
      }),
    );
  });
}

/** Side by side, from the first column on. */
function laidOut(args: readonly (CellResult | undefined)[], names: readonly string[]): Laid[] {
  const laid: Laid[] = [];
  args.forEach((argument, n) => {
    if (argument === undefined || isWritten(argument)) return;
    const before = laid.at(-1);
    const column = before ? before.column + before.cells[0].length : 0;
    laid.push({ name: names[n], cells: asRange(argument)!, column });
  });
  return laid;
}

const placeOf = ({ cells, column }: Laid, row: number): string =>
  areaName({ row, column, rows: cells.length, columns: cells[0].length });

/** A single number is the result of a formula, as conditions often are: to some programs that is another kind of cell. */
const workedOut = (one: Laid): Laid =>
  one.cells.flat().length === 1 && typeof one.cells[0][0] === 'number'
    ? { ...one, cells: [[`=${one.cells[0][0]}`]] }
    : one;

const typed = ({ cells, column }: Laid, row: number): Typed =>
  Object.fromEntries(
    cells.flatMap((line, r) => line.map((cell, c) => [cellName(row + r, column + c), cell])),
  );

/** The blocks as a workbook. @param contents what of each stands in it */
export function bookOf(blocks: readonly Block[], contents: (block: Block) => Typed): BookModel {
  const sheets: Record<string, Record<string, Typed[string]>> = {};
  for (const block of blocks) Object.assign((sheets[block.sheet] ??= {}), contents(block));
  return book(sheets);
}
