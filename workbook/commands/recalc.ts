/** `npm run recalc -- IN.xlsx OUT.xlsx` */
import type { CellError, ErrorCode } from '../../functions/cell';
import { NotAWorkbook } from '../xlsx/notAWorkbook';
import { FileTrouble, readInput, requireOutput, writeWhole } from './files';
import { recalculate } from './recalculate';

const exitCode = { done: 0, someErrors: 1, notDone: 2 } as const;

const usage = `Calculates every formula of IN.xlsx and writes the values into a copy, OUT.xlsx.

  npm run recalc -- IN.xlsx OUT.xlsx

Formulas are taken as typed (PACE.TANGENT) and as Excel stores them. IN is never changed; OUT appears,
or is replaced, only when it is complete. All else in the file stays as it was, byte for byte.

Exit code  0  done
           1  done, and some cells are errors: one a line on the error output, sheet!cell, error, why;
              #N/A within a table that a formula answers is no error
           2  not done: the error output says why, and nothing was written
`;

async function main(args: readonly string[]): Promise<number> {
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
    const result = await recalculate(bytes);
    await writeWhole(output, result.bytes);
    for (const { cell, error } of result.errors) process.stderr.write(`${errorLine(cell, error)}\n`);
    process.stdout.write(`${output}: ${counted(result.formulas, 'formula', 'formulas')} calculated\n`);
    return result.errors.length > 0 ? exitCode.someErrors : exitCode.done;
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

function errorLine(cell: string, { code, message }: CellError): string {
  const words = message || meanings[code];
  return words ? `${cell}  ${code}  ${words}` : `${cell}  ${code}`;
}

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

function whyNot(error: unknown, input: string): string {
  if (error instanceof FileTrouble) return error.message;
  if (error instanceof NotAWorkbook) return `${input}: ${error.message}`;
  const words = error instanceof Error ? error.message : String(error);
  return `${input}: the calculation broke off, which is a fault of this program: ${words}`.replace(
    /\s*\n\s*/g,
    ' ',
  );
}

void main(process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
