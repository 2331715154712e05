/** The cell functions inside Excel: its arguments → ours, our results → its own. */
import { sharingCaller, type Caller } from './caller';
import { catalogue } from './catalogue';
import { CellError, isRange, type CellRange, type CellResult, type CellValue, type ErrorCode } from './cell';
import { canSpill, type CellFunction } from './define';

/** The part of Excel's global that is used, so that it can be absent and can be stood in for. */
export interface CustomFunctionsHost {
  associate(id: string, handler: (...args: unknown[]) => unknown): void;
  readonly Error: new (code: string, message?: string) => object;
}

interface Globals {
  readonly CustomFunctions?: CustomFunctionsHost;
  readonly Office?: {
    readonly addin?: {
      getStartupBehavior?(): Promise<string>;
      setStartupBehavior(behaviour: string): Promise<void>;
    };
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

/** Looks into the sheet: which cells of `'Gas run'!B2:B9` are blank, row by row. */
export type BlanksIn = (address: string) => Promise<readonly (readonly boolean[])[]>;

/** What stands behind the functions in Excel. */
export interface Backing {
  readonly blanksIn?: BlanksIn;
  readonly caller?: Caller;
}

/** Does nothing where Excel is not: Office.js did not load, or this is another page. */
export function associateAll(globals: object, { blanksIn, caller = sharingCaller() }: Backing = {}): void {
  const host = (globals as Globals).CustomFunctions;
  if (!host || typeof host.associate !== 'function') return;
  const backing = { blanksIn: blanksIn && sharingLooks(blanksIn), caller };
  for (const f of catalogue) host.associate(f.name, excelHandler(f, host, backing));
}

/** Twenty formulas over one run look at it once: those that ask while the answer is on its way share it. */
function sharingLooks(blanksIn: BlanksIn): BlanksIn {
  const underway = new Map<string, ReturnType<BlanksIn>>();
  return (address) => {
    const looking = underway.get(address) ?? blanksIn(address).finally(() => underway.delete(address));
    underway.set(address, looking);
    return looking;
  };
}

/**
 * A workbook saved with our formulas wakes the functions when it is opened. It is told so once, since that changes
 * the workbook. Does nothing where the host does not know of it.
 */
export async function keepLoadedWithWorkbook(globals: object): Promise<void> {
  const { Office } = globals as Globals;
  if (!Office?.addin?.setStartupBehavior) return;
  const load = Office.StartupBehavior?.load ?? 'Load';
  try {
    if ((await Office.addin.getStartupBehavior?.()) === load) return;
    await Office.addin.setStartupBehavior(load);
  } catch {
    // a host without shared runtime; the functions work in this session all the same
  }
}

interface Invocation {
  /** Where each argument stands in the sheet; nothing for one that is not a reference. */
  readonly parameterAddresses?: readonly (string | null | undefined)[];
  /** Called when the answer is no longer wanted. */
  onCanceled?: () => void;
}

/**
 * @returns what Excel calls: it hands over every declared argument, null where left out, then its own context
 *   object. The answer comes at once, or as a promise where a zero had to be looked at in the sheet.
 */
export function excelHandler(
  f: CellFunction,
  host: CustomFunctionsHost,
  { blanksIn, caller = sharingCaller() }: Backing = {},
): (...args: unknown[]) => unknown {
  const count = Object.keys(f.parameters).length;
  const answerTo = (args: readonly unknown[], stop?: AbortSignal): unknown => {
    const cells = args.map((argument) => fromExcel(argument, host));
    const result = caller.call(f, cells, stop);
    return result instanceof Promise
      ? result.then((late) => forExcel(f, late, host))
      : forExcel(f, result, host);
  };
  return (...all) => {
    const args = all.slice(0, count);
    const invocation = all[count] as Invocation | undefined;
    const stop = invocation && caller.mayBePromise(f) ? stopOf(invocation) : undefined;
    const addresses = invocation?.parameterAddresses ?? [];
    const doubtful = args.some((argument, place) => addresses[place] && hasDoubtfulZero(argument));
    if (!blanksIn || !doubtful) return answerTo(args, stop);
    return Promise.all(args.map((argument, place) => withBlanks(argument, addresses[place], blanksIn))).then(
      (looked) => answerTo(looked, stop),
    );
  };
}

/** From the first moment on, since Excel may lose interest while a zero is being looked at. */
function stopOf(invocation: Invocation): AbortSignal {
  const stop = new AbortController();
  invocation.onCanceled = () => stop.abort();
  return stop.signal;
}

/** Excel hands a blank cell over as 0, by itself or within a range, which would count as a reading. */
const hasDoubtfulZero = (argument: unknown): boolean =>
  Array.isArray(argument) ? argument.some((row: unknown[]) => row.includes(0)) : argument === 0;

/** The argument as rows, with null for each zero that is a blank cell; as it came where the sheet cannot be read. */
async function withBlanks(
  argument: unknown,
  address: string | null | undefined,
  blanksIn: BlanksIn,
): Promise<unknown> {
  if (!address || !hasDoubtfulZero(argument)) return argument;
  try {
    const blanks = await blanksIn(address);
    const rows = (Array.isArray(argument) ? argument : [[argument]]) as unknown[][];
    return rows.map((row, r) => row.map((cell, c) => (cell === 0 && blanks[r]?.[c] ? null : cell)));
  } catch {
    return argument;
  }
}

function fromExcel(argument: unknown, host: CustomFunctionsHost): CellResult | undefined {
  if (argument === null || argument === undefined) return undefined;
  if (!Array.isArray(argument)) return cellFromExcel(argument, host);
  return argument.map((row: unknown[]) => row.map((cell) => cellFromExcel(cell, host)));
}

/** A blank inside a range can arrive as "" or null, too. */
function cellFromExcel(cell: unknown, host: CustomFunctionsHost): CellValue {
  if (cell === null || cell === undefined || cell === '') return null;
  if (typeof cell === 'number' || typeof cell === 'string' || typeof cell === 'boolean') return cell;
  if (cell instanceof host.Error) return errorFromExcel(cell);
  return String(cell);
}

function errorFromExcel(error: { readonly code?: string; readonly message?: string }): CellError {
  return new CellError((error.code as ErrorCode | undefined) ?? '#VALUE!', error.message ?? '');
}

/**
 * What is declared to spill is handed over as rows, even where it is one cell.
 *
 * @throws Excel's own error object where the whole result is an error
 */
function forExcel(f: CellFunction, result: CellResult, host: CustomFunctionsHost): unknown {
  if (isRange(result)) return (result as CellRange).map((row) => row.map((cell) => cellForExcel(cell, host)));
  if (result instanceof CellError) throw errorForExcel(result, host);
  const cell = cellForExcel(result, host);
  return canSpill(f) ? [[cell]] : cell;
}

const cellForExcel = (cell: CellValue, host: CustomFunctionsHost): unknown =>
  cell instanceof CellError ? errorForExcel(cell, host) : (cell ?? '');

function errorForExcel({ code, message }: CellError, host: CustomFunctionsHost): object {
  if (!allowed.has(code)) return new host.Error('#VALUE!', `an input shows ${code}`);
  return speaking.has(code) && message !== '' ? new host.Error(code, message) : new host.Error(code);
}
