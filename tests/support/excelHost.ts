/**
 * Excel's side of custom functions, as documented: it knows them by the metadata that we ship, hands over every
 * declared argument, null where it was left out, a matrix as rows and a blank cell in it as 0; errors as objects of
 * its own; where the ranges stand and a way to cancel only where the metadata asks for them.
 */
import type { Caller } from '../../functions/caller';
import { catalogue } from '../../functions/catalogue';
import {
  asRange,
  CellError,
  isRange,
  type CellRange,
  type CellResult,
  type CellValue,
} from '../../functions/cell';
import type { CellFunction } from '../../functions/define';
import { functionsMetadata, type FunctionMetadata } from '../../functions/metadata';
import { associateAll } from '../../functions/runtime';

/** Excel refuses words beside other codes than these two. */
const speaking = ['#VALUE!', '#N/A'];
const codes = [...speaking, '#DIV/0!', '#NUM!', '#NULL!', '#NAME?', '#REF!'];

export class ExcelError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {
    if (!codes.includes(code)) throw new Error(`unknown code ${code}`);
    if (message !== undefined && !speaking.includes(code)) throw new Error(`${code} carries no words`);
  }
}

export type Arguments = readonly (CellResult | undefined)[];

export interface ExcelSide {
  /** As a cell calls: the rows it shows, in time. */
  call(f: CellFunction, args: Arguments): { readonly shown: Promise<unknown[][]>; cancel(): void };
}

interface Setting {
  readonly caller?: Caller;
  /** Waited for before a look into the sheet is answered. */
  readonly beforeLook?: () => Promise<void>;
}

export function excelSide({ caller, beforeLook = async () => undefined }: Setting = {}): ExcelSide {
  const metadata = new Map(functionsMetadata(catalogue).functions.map((one) => [one.id, one]));
  const handlers = new Map<string, (...args: unknown[]) => unknown>();
  const sheet = new Map<string, CellRange>();
  const CustomFunctions = {
    Error: ExcelError,
    associate(id: string, handler: (...args: unknown[]) => unknown) {
      if (!metadata.has(id) || handlers.has(id)) throw new Error(`${id} is unknown, or associated twice`);
      handlers.set(id, handler);
    },
  };
  const blanksIn = async (address: string): Promise<boolean[][]> => {
    await beforeLook();
    return sheet.get(address)!.map((row) => row.map((cell) => cell === null));
  };
  associateAll({ CustomFunctions }, { blanksIn, ...(caller ? { caller } : {}) });

  function addressOf(argument: CellResult | undefined): string | null {
    if (!isRange(argument ?? null)) return null;
    const address = `Sheet1!A${sheet.size + 1}`;
    sheet.set(address, argument as CellRange);
    return address;
  }

  return {
    call(f, args) {
      const { parameters, options, result } = metadata.get(f.name)!;
      const given = parameters.map(({ dimensionality }, place) => handedOver(args[place], dimensionality));
      let canceled = (): void => undefined;
      const invocation = {
        functionName: f.name,
        ...(options?.requiresParameterAddresses
          ? { parameterAddresses: parameters.map((_, place) => addressOf(args[place])) }
          : {}),
        set onCanceled(handler: () => void) {
          if (!options?.cancelable) throw new Error(`${f.name} is never cancelled`);
          canceled = handler;
        },
      };
      return {
        shown: shownBy(() => handlers.get(f.name)!(...given, invocation), result),
        cancel: () => canceled(),
      };
    },
  };
}

function handedOver(argument: CellResult | undefined, dimensionality: 'scalar' | 'matrix'): unknown {
  const rows = asRange(argument);
  if (rows === undefined) return null;
  const handed = rows.map((row) =>
    row.map((cell) => (cell === null ? 0 : cell instanceof CellError ? new ExcelError(cell.code) : cell)),
  );
  return dimensionality === 'matrix' || handed.length > 1 ? handed : handed[0][0];
}

async function shownBy(call: () => unknown, result: FunctionMetadata['result']): Promise<unknown[][]> {
  try {
    return requireRows(await call(), result);
  } catch (error) {
    if (error instanceof ExcelError) return [[error]]; // anything else that is thrown loses its words
    throw error;
  }
}

/** What a cell would not show is no answer: another shape than was declared, ragged rows, NaN. */
function requireRows(answer: unknown, { dimensionality }: FunctionMetadata['result']): unknown[][] {
  if (Array.isArray(answer) !== (dimensionality === 'matrix')) throw new Error(`not a ${dimensionality}`);
  const rows = Array.isArray(answer) ? (answer as unknown[][]) : [[answer]];
  const width = rows[0]?.length ?? 0;
  if (width === 0 || rows.some((row) => row.length !== width))
    throw new Error('rows of different lengths, or none');
  const strange = rows.flat().find((cell) => !isShown(cell));
  if (strange !== undefined) throw new Error(`no cell shows ${String(strange)}`);
  return rows;
}

const isShown = (cell: unknown): boolean =>
  typeof cell === 'number'
    ? Number.isFinite(cell) && !Object.is(cell, -0)
    : typeof cell === 'string' || typeof cell === 'boolean' || cell instanceof ExcelError;

/** What Excel should then show for a result of ours. */
export const asShownByExcel = (result: CellResult): unknown[][] =>
  (isRange(result) ? result : [[result]]).map((row) => row.map(asExcelCell));

function asExcelCell(cell: CellValue): unknown {
  if (!(cell instanceof CellError)) return cell ?? '';
  if (!codes.includes(cell.code)) return new ExcelError('#VALUE!', `an input shows ${cell.code}`);
  return speaking.includes(cell.code) && cell.message
    ? new ExcelError(cell.code, cell.message)
    : new ExcelError(cell.code);
}
