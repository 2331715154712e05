/**
 * Excel's side of a custom function, as documented: every declared argument is handed over, null where it was left
 * out; a blank cell inside a range as 0; errors as objects of its own; the place of each range beside them.
 */
import { CellError, isRange, type CellResult, type CellValue } from '../../functions/cell';
import type { CellFunction } from '../../functions/define';
import { excelHandler, type Backing, type CustomFunctionsHost } from '../../functions/runtime';

/** Excel refuses words beside other codes than these two. */
const speaking = ['#VALUE!', '#N/A'];
const codes = [...speaking, '#DIV/0!', '#NUM!', '#NULL!', '#NAME?', '#REF!'];

class ExcelError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {
    if (!codes.includes(code)) throw new Error(`unknown code ${code}`);
    if (message !== undefined && !speaking.includes(code)) throw new Error(`${code} carries no words`);
  }
}

const host: CustomFunctionsHost = { associate: () => undefined, Error: ExcelError };

const handedOver = (cell: CellValue): unknown =>
  cell === null ? 0 : cell instanceof CellError ? new ExcelError(cell.code) : cell;

/** Calls a function as Excel would, each range standing somewhere in a sheet that can be looked at. */
export async function throughExcel(
  f: CellFunction,
  args: readonly (CellResult | undefined)[],
): Promise<unknown> {
  const names = Object.keys(f.parameters);
  const sheet = new Map<string, CellResult | undefined>(
    args.map((argument, place) => [`Sheet1!A${place + 1}`, argument] as const),
  );
  const given = names.map((_, place) => {
    const argument = args[place];
    if (argument === undefined || argument === null) return null;
    return isRange(argument) ? argument.map((row) => row.map(handedOver)) : argument;
  });
  const invocation = {
    parameterAddresses: names.map((_, place) =>
      isRange(args[place] ?? null) ? `Sheet1!A${place + 1}` : null,
    ),
  };
  const backing: Backing = {
    blanksIn: async (address) => {
      const range = sheet.get(address);
      return isRange(range ?? null)
        ? (range as CellValue[][]).map((row) => row.map((cell) => cell === null))
        : [];
    },
  };
  try {
    return await excelHandler(f, host, backing)(...given, invocation);
  } catch (error) {
    return error;
  }
}

/** What Excel should then show for a result of ours. */
export function asShownByExcel(result: CellResult): unknown {
  if (isRange(result)) return result.map((row) => row.map(asExcelCell));
  return asExcelCell(result);
}

function asExcelCell(cell: CellValue): unknown {
  if (!(cell instanceof CellError)) return cell ?? '';
  if (!codes.includes(cell.code)) return new ExcelError('#VALUE!', `an input shows ${cell.code}`);
  return speaking.includes(cell.code) && cell.message
    ? new ExcelError(cell.code, cell.message)
    : new ExcelError(cell.code);
}
