/** `npm run recalc -- IN.xlsx OUT.xlsx` */
import { counted, errorLines, runFileCommand } from './fileCommand';
import { recalculate } from './recalculate';

const usage = `Calculates every formula of IN.xlsx and writes the values into a copy, OUT.xlsx.

  npm run recalc -- IN.xlsx OUT.xlsx

Formulas are taken as typed (PACE.TANGENT) and as Excel stores them. IN is never changed; OUT appears,
or is replaced, only when it is complete. All else in the file stays as it was, byte for byte.

Exit code  0  done
           1  done, and some cells are errors: one a line on the error output, sheet!cell, error, why;
              #N/A within a table that a formula answers is no error
           2  not done: the error output says why, and nothing was written
`;

void runFileCommand(process.argv.slice(2), usage, async (input) => {
  const { bytes, formulas, kept, errors } = await recalculate(input);
  const others = `${counted(kept, 'formula keeps its value', 'formulas keep their values')}, since another workbook or add-in, or dates from 1904, would be needed`;
  return {
    bytes,
    summary: `${counted(formulas, 'formula', 'formulas')} calculated${kept > 0 ? `; ${others}` : ''}`,
    errors: errorLines(errors),
  };
}).then((code) => {
  process.exitCode = code;
});
