/** When two calls are one: the same function on equal arguments, cell for cell. */
import { CellError, isRange, type CellResult, type CellValue } from './cell';
import type { CellFunction } from './define';

/** As a function is handed them; `undefined` where left out. */
export type Arguments = readonly (CellResult | undefined)[];

/** One call, to be looked up. */
export class Call {
  /** Equal for equal calls, seldom for others. */
  readonly print: number;

  constructor(
    readonly f: CellFunction,
    readonly args: Arguments,
  ) {
    this.print = printOf(f, args);
  }

  equals({ print, f, args }: Call): boolean {
    return (
      this.print === print &&
      this.f === f &&
      this.args.length === args.length &&
      this.args.every((argument, place) => isSame(argument, args[place]))
    );
  }
}

/** Something for each of many calls. */
export class CallTable<T> {
  private readonly byPrint = new Map<number, { readonly call: Call; readonly value: T }[]>();

  find(call: Call): T | undefined {
    return this.byPrint.get(call.print)?.find((entry) => entry.call.equals(call))?.value;
  }

  set(call: Call, value: T): void {
    this.byPrint.set(call.print, [...this.others(call), { call, value }]);
  }

  delete(call: Call): void {
    const others = this.others(call);
    if (others.length > 0) this.byPrint.set(call.print, others);
    else this.byPrint.delete(call.print);
  }

  clear(): void {
    this.byPrint.clear();
  }

  private others(call: Call): { readonly call: Call; readonly value: T }[] {
    return (this.byPrint.get(call.print) ?? []).filter((entry) => !entry.call.equals(call));
  }
}

/** How many cells are handed over. */
export const cellsIn = (args: Arguments): number =>
  args.reduce<number>((sum, argument) => sum + sizeOf(argument), 0);

function sizeOf(argument: CellResult | undefined): number {
  if (isRange(argument)) return argument.length * (argument[0]?.length ?? 0);
  return argument === undefined ? 0 : 1;
}

function isSame(a: CellResult | undefined, b: CellResult | undefined): boolean {
  if (!isRange(a) || !isRange(b)) return isSameCell(a as CellValue | undefined, b as CellValue | undefined);
  return (
    a.length === b.length &&
    a.every((row, r) => row.length === b[r].length && row.every((cell, c) => isSameCell(cell, b[r][c])))
  );
}

const isSameCell = (a: CellValue | undefined, b: CellValue | undefined): boolean =>
  a instanceof CellError && b instanceof CellError ? a.code === b.code && a.message === b.message : a === b;

const float = new Float64Array(1);
const halves = new Uint32Array(float.buffer);

/** FNV-1a, a word at a time instead of a byte (Fowler, Noll, Vo; RFC 9923 has its constants). */
function printOf(f: CellFunction, args: Arguments): number {
  let print = 0x811c9dc5;
  const mix = (part: number): void => {
    print = Math.imul(print ^ part, 0x01000193);
  };
  const mixText = (text: string): void => {
    for (let i = 0; i < text.length; i++) mix(text.charCodeAt(i));
  };
  const mixCell = (cell: CellValue | undefined): void => {
    if (typeof cell === 'number') {
      float[0] = cell === 0 ? 0 : cell; // −0 is the same reading
      mix(halves[0]);
      mix(halves[1]);
    } else mixText(cell instanceof CellError ? cell.code : String(cell));
  };
  mixText(f.name);
  for (const argument of args) {
    if (isRange(argument)) for (const row of argument) row.forEach(mixCell);
    else mixCell(argument);
  }
  return print;
}
