/** The sheet "Method": what each formula was and is now, how it is worked out, with which constants. */
import { areaName } from '../../functions/address';
import { headingRow } from '../../functions/builtIn/workings';
import { CellError } from '../../functions/cell';
import { signature, typedName, type CellFunction } from '../../functions/define';
import { howInWords } from '../../functions/documented';
import { refusalsOf } from '../../functions/refusals';
import {
  avogadroConstant,
  boltzmannConstant,
  celsiusZero,
  elementaryCharge,
  gasConstant,
  planckConstant,
  standardGravity,
  vacuumPermittivity,
} from '../../src/constants';
import { elsewherePlace } from './elsewhere';
import { errorRows } from './errorRows';
import { labelled, lineLength } from './labelled';
import type { HandedFormula } from './handed';
import type { HandedOver } from './handOver';
import type { NewSheet, SheetCell } from './newSheet';
import { changed, InputWatch } from './inputWatch';
import type { World } from './world';
import { wrapped } from './wrapped';

/** Said of the copy itself. */
export interface Origin {
  readonly version: string;
  /** Day of the copy, such as `2026-12-01`. */
  readonly date: string;
}

const codata = 'CODATA 2022';
const constants: readonly (readonly [string, number, string, string])[] = [
  ['molar gas constant', gasConstant, 'J/(mol K)', `exact; ${codata}`],
  ['Boltzmann constant', boltzmannConstant, 'J/K', `exact; ${codata}`],
  ['Planck constant', planckConstant, 'J s', `exact; ${codata}`],
  ['Avogadro constant', avogadroConstant, '1/mol', `exact; ${codata}`],
  ['elementary charge', elementaryCharge, 'C', `exact; ${codata}`],
  ['vacuum electric permittivity', vacuumPermittivity, 'F/m', codata],
  ['0 °C', celsiusZero, 'K', 'exact; SI Brochure, 9th ed. (2019), 2.3.1'],
  ['standard acceleration of free fall', standardGravity, 'm/s²', 'exact; 3rd CGPM (1901)'],
];

export function methodSheet(
  name: string,
  { formulas, names, elsewhere }: Pick<HandedOver, 'formulas' | 'names' | 'elsewhere'>,
  world: World,
  { version, date }: Origin,
): NewSheet {
  const rows: SheetCell[][] = [
    headingRow('Method'),
    [`A copy that needs no add-in, made by Flaskpace ${version} on ${date}.`],
    ...wrapped(
      'What calls of PACE functions could be said in built-in functions is live and follows its inputs. The rest is frozen to the value it had; the column State tells whether its inputs are still those of that day. What needs more than one cell stands on the sheet Workings.',
      lineLength,
    ).map((line): SheetCell[] => [line]),
    [],
    headingRow(
      'Sheet',
      'Cells',
      'State',
      'Formula as it was',
      'What became of it',
      'Inputs then',
      'Inputs now',
    ),
  ];
  const fixedRows = rows.length;
  const watch = new InputWatch(world);
  for (const formula of formulas) rows.push(formulaRow(formula, rows.length, watch));
  for (const { name: own, refersTo, value } of names)
    rows.push(['a name', own, 'frozen', `=${refersTo}`, `frozen: it stands for ${value}`]);
  for (const call of elsewhere)
    rows.push([
      elsewherePlace(call),
      null,
      'as it was',
      `=${call.formula}`,
      `left as it was: without the add-in ${call.loss}`,
    ]);
  rows.push([], ...errorRows());
  for (const f of functionsOf(formulas)) rows.push([], ...functionRows(f));
  rows.push([], headingRow('Constant', '', 'Value', 'Unit', 'Source'));
  rows.push(
    ...constants.map(([what, value, unit, source]): SheetCell[] => [what, null, value, unit, source]),
  );
  return { name, rows, columns, fixedRows, warnings: [changed] };
}

/** Where the column "Inputs then" stands. */
const inputsColumn = 5;

/** As they are headed. The formulas and what became of them are the long ones. */
const columns = [
  { width: 20, wraps: true },
  { width: 12 },
  { width: 21, isExact: true },
  { width: 46, wraps: true },
  { width: 46, wraps: true },
  { width: 13 },
  { width: 13 },
];

const functionsOf = (formulas: readonly HandedFormula[]): CellFunction[] => [
  ...new Set(formulas.flatMap(({ functions }) => functions)),
];

function functionRows(f: CellFunction): SheetCell[][] {
  return [
    [{ heading: typedName(f) }, null, f.summary],
    ...labelled('typed as', signature(f)),
    ...labelled('unit', f.result.unit),
    ...labelled('worked out by', howInWords(f)),
    ...labelled('source', f.reference),
    ...refusalsOf(f).flatMap(({ error: { code, message } }) => labelled(code, message)),
  ];
}

/** @param row counted from 0 */
function formulaRow(formula: HandedFormula, row: number, watch: InputWatch): SheetCell[] {
  const { sheet, original, said, why, ofTheDay, fits, area } = formula;
  const place: SheetCell[] = [sheet, areaName(area)];
  if (!isOfTheDay(formula)) return [...place, 'live', `=${original}`, 'said in built-in functions'];
  const now = said
    ? `said in built-in functions, but as on the day of the copy: ${ofTheDay?.what}`
    : `frozen: ${why}`;
  const where = fits ? `; what was fitted stands from ${fits.join(' and ').replace(/\$/g, '')} on` : '';
  const [state, ...inputs] = watch.cells(formula, row, inputsColumn);
  return [...place, state, `=${original}`, now + where, ...inputs];
}

/** Whether it stays, in whole or in part, as it was on the day of the copy: it is watched, and has a note. */
export const isOfTheDay = ({ said, ofTheDay }: HandedFormula): boolean => !said || ofTheDay !== undefined;

/** The words beside a cell that is frozen, or live but for something. */
export function noteText(
  { original, why, ofTheDay, functions, values }: HandedFormula,
  { version, date }: Origin,
): string {
  const first = values[0][0];
  const error =
    first instanceof CellError && first.message ? [`It showed ${first.code}: ${first.message}`] : [];
  const method = functions.map((f) => `${typedName(f)}: ${howInWords(f)}`);
  return [
    ofTheDay === undefined
      ? `Frozen on ${date} by Flaskpace ${version}: ${why}.`
      : `Live, but as on ${date} (Flaskpace ${version}): ${ofTheDay.what}.`,
    `It was =${original}`,
    ...error,
    ...method,
  ].join('\n');
}
