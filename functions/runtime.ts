/** The cell functions inside Excel: its arguments → ours, our results → its own. */
import { callFunction } from './call';
import { catalogue } from './catalogue';
import { CellError, isRange, type CellRange, type CellResult, type CellValue, type ErrorCode } from './cell';
import type { CellFunction } from './define';

/** The part of Excel's global that is used, so that it can be absent and can be stood in for. */
export interface CustomFunctionsHost {
  associate(id: string, handler: (...args: unknown[]) => unknown): void;
  readonly Error: new (code: string, message?: string) => object;
}

interface Globals {
  readonly CustomFunctions?: CustomFunctionsHost;
  readonly Office?: {
    readonly addin?: { setStartupBehavior(behaviour: string): Promise<void> };
    readonly StartupBehavior?: { readonly load: string };
  };
}

/** Only beside these two does Excel show words of ours; with another code it refuses a message. */
const speaking: ReadonlySet<ErrorCode> = new Set(['#VALUE!', '#N/A']);

/** The codes that a custom function may answer; any other error of ours becomes #VALUE!. */
const allowed: ReadonlySet<ErrorCode> = new Set([
  '#VALUE!',
  '#N/A',
  '#DIV/0!',
  '#NUM!',
  '#NULL!',
  '#NAME?',
  '#REF!',
]);

/** Does nothing where Excel is not: Office.js did not load, or this is another page. */
export function associateAll(globals: object): void {
  const host = (globals as Globals).CustomFunctions;
  if (!host || typeof host.associate !== 'function') return;
  for (const f of catalogue) host.associate(f.name, excelHandler(f, host));
}

/** A workbook saved with our formulas wakes the functions when it is opened. Does nothing where that is unknown. */
export async function keepLoadedWithWorkbook(globals: object): Promise<void> {
  const { Office } = globals as Globals;
  if (!Office?.addin?.setStartupBehavior) return;
  try {
    await Office.addin.setStartupBehavior(Office.StartupBehavior?.load ?? 'Load');
  } catch {
    // a host without shared runtime; the functions work in this session all the same
  }
}

/** @returns what Excel calls: it hands over every declared argument, null where left out, then its own context object */
export function excelHandler(f: CellFunction, host: CustomFunctionsHost): (...args: unknown[]) => unknown {
  const count = Object.keys(f.parameters).length;
  return (...args) =>
    forExcel(
      callFunction(
        f,
        args.slice(0, count).map((argument) => fromExcel(argument, host)),
      ),
      host,
    );
}

function fromExcel(argument: unknown, host: CustomFunctionsHost): CellResult | undefined {
  if (argument === null || argument === undefined) return undefined;
  if (!Array.isArray(argument)) return cellFromExcel(argument, host);
  return argument.map((row: unknown[]) => row.map((cell) => cellFromExcel(cell, host)));
}

/** A blank inside a range can arrive as "" or null; as 0 it cannot be told from a zero here. */
function cellFromExcel(cell: unknown, host: CustomFunctionsHost): CellValue {
  if (cell === null || cell === undefined || cell === '') return null;
  if (typeof cell === 'number' || typeof cell === 'string' || typeof cell === 'boolean') return cell;
  if (cell instanceof host.Error) return errorFromExcel(cell);
  return String(cell);
}

function errorFromExcel(error: { readonly code?: string; readonly message?: string }): CellError {
  return new CellError((error.code as ErrorCode | undefined) ?? '#VALUE!', error.message ?? '');
}

/** @throws Excel's own error object where the whole result is an error */
function forExcel(result: CellResult, host: CustomFunctionsHost): unknown {
  if (isRange(result)) return (result as CellRange).map((row) => row.map((cell) => cellForExcel(cell, host)));
  if (result instanceof CellError) throw errorForExcel(result, host);
  return result;
}

const cellForExcel = (cell: CellValue, host: CustomFunctionsHost): unknown =>
  cell instanceof CellError ? errorForExcel(cell, host) : (cell ?? '');

function errorForExcel({ code, message }: CellError, host: CustomFunctionsHost): object {
  if (!allowed.has(code)) return new host.Error('#VALUE!', `an input shows ${code}`);
  return speaking.has(code) && message !== '' ? new host.Error(code, message) : new host.Error(code);
}
