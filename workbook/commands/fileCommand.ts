/** What every command from IN.xlsx to OUT.xlsx has in common: arguments, exit codes, reasons in one line. */
import { cellName, quotedSheet } from '../../functions/address';
import type { CellError, ErrorCode } from '../../functions/cell';
import type { CalculatedBook } from '../engine/engine';
import { NotAWorkbook } from '../xlsx/notAWorkbook';
import { FileTrouble, readInput, requireNameOfKind, requireOutput, writeWhole } from './files';

export const exitCode = { done: 0, someErrors: 1, notDone: 2 } as const;

export interface FileResult {
  readonly bytes: Uint8Array;
  /** For the output, after the name of the file: what was done. */
  readonly summary: string;
  /** For the output, below that. */
  readonly details?: readonly string[];
  /** Cells that are errors, each a line of the error output. */
  readonly errors: readonly string[];
}

/** @param usage shown for `--help`, and where nothing is given */
export async function runFileCommand(
  args: readonly string[],
  usage: string,
  make: (bytes: Uint8Array) => Promise<FileResult>,
): Promise<number> {
  if (args.includes('--help') || args.includes('-h')) {
    process.stdout.write(usage);
    return exitCode.done;
  }
  if (args.length !== 2) {
    process.stderr.write(
      args.length === 0 ? usage : `two files are needed, IN.xlsx and OUT.xlsx: got ${args.length}\n`,
    );
    return exitCode.notDone;
  }
  const [input, output] = args;
  try {
    const bytes = await readInput(input);
    await requireOutput(output, input);
    const { bytes: made, summary, details = [], errors } = await make(bytes);
    requireNameOfKind(output, made);
    await writeWhole(output, made);
    for (const line of errors) process.stderr.write(`${line}\n`);
    process.stdout.write([`${output}: ${summary}`, ...details, ''].join('\n'));
    return errors.length > 0 ? exitCode.someErrors : exitCode.done;
  } catch (error) {
    process.stderr.write(`${whyNot(error, input)}\n`);
    return exitCode.notDone;
  }
}

/** What a built-in function has no words for, and a person may not know. */
const meanings: Partial<Record<ErrorCode, string>> = {
  '#SPILL!': 'the result has no room: other cells stand where it would go',
  '#NAME?': 'no function or name here is called that',
};

/** `'Gas run'!B1  #VALUE!  times must be above 0: row 1 (0)`. */
export const errorLines = (errors: CalculatedBook['errors']): string[] =>
  errors.map(({ sheet, row, column, error }) =>
    errorLine(`${quotedSheet(sheet)}!${cellName(row, column)}`, error),
  );

function errorLine(cell: string, { code, message }: CellError): string {
  const words = message || meanings[code];
  return words ? `${cell}  ${code}  ${words}` : `${cell}  ${code}`;
}

export const counted = (count: number, one: string, many: string): string =>
  `${count} ${count === 1 ? one : many}`;

function whyNot(error: unknown, input: string): string {
  if (error instanceof FileTrouble) return error.message;
  if (error instanceof NotAWorkbook) return `${input}: ${error.message}`;
  const words = error instanceof Error ? error.message : String(error);
  return `${input}: the calculation broke off, which is a fault of this program: ${words}`.replace(
    /\s*\n\s*/g,
    ' ',
  );
}
