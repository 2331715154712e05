/** `npm run handover -- IN.xlsx OUT.xlsx` */
import packageJson from '../../package.json';
import { elsewhereLine } from '../handover/elsewhere';
import type { HandedFormula } from '../handover/handed';
import { handOver, placeOf, showsError } from '../handover/handOver';
import { counted, errorLines, runFileCommand } from './fileCommand';

const usage = `Writes a copy of IN.xlsx that needs no add-in, OUT.xlsx, for someone who installs nothing.

  npm run handover -- IN.xlsx OUT.xlsx

Each call of a PACE function becomes built-in functions where these can say the same. The rest is frozen to
its value, with a note beside it; a new sheet, "Method", tells what each formula was, how it is worked out,
and whether the inputs of a frozen cell are still those it was frozen with. What no single cell can work out
stands on a new sheet "Workings". IN is never changed; OUT appears,
or is replaced, only when it is complete. All else in the file stays as it was, byte for byte.

Exit code  0  done
           1  done, and some cells are errors: one a line on the error output, sheet!cell, error, why
           2  not done: the error output says why, and nothing was written
`;

/** One line a formula that is frozen, in whole or in part: where, and why or what. */
const frozenLines = (formulas: readonly HandedFormula[]): string[] =>
  formulas.flatMap((formula) => {
    if (!formula.said) return [`  frozen  ${placeOf(formula)}  ${formula.why}`];
    return formula.ofTheDay === undefined
      ? []
      : [`  live    ${placeOf(formula)}  but as on this day: ${formula.ofTheDay.what}`];
  });

function summary(formulas: readonly HandedFormula[]): string {
  const live = formulas.filter(({ said }) => said).length;
  const failing = formulas.filter(showsError).length;
  return `${counted(formulas.length, 'formula', 'formulas')} handed over, ${live} live, ${formulas.length - live} frozen${failing > 0 ? `; ${failing} showed an error before` : ''}`;
}

const origin = { version: packageJson.version, date: new Date().toISOString().slice(0, 10) };

void runFileCommand(process.argv.slice(2), usage, async (input) => {
  const { bytes, formulas, names, elsewhere, errors } = await handOver(input, origin);
  const details = [
    ...frozenLines(formulas),
    ...names.map(({ name }) => `  frozen  the name ${name}`),
    ...elsewhere.map((call) => `  left    ${elsewhereLine(call)}`),
  ];
  return { bytes, summary: summary(formulas), details, errors: errorLines(errors) };
}).then((code) => {
  process.exitCode = code;
});
