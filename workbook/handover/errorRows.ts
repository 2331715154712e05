/** What the errors of a copy mean, for the sheet "Method". */
import { headingRow } from '../../functions/builtIn/workings';
import type { SheetCell } from './newSheet';
import { labelled } from './labelled';

const codes: readonly (readonly [string, string])[] = [
  [
    '#VALUE!',
    'An input is not what the formula takes. Below, each function says what it refuses, with an example of the value seen.',
  ],
  ['#N/A', 'The inputs are sound, but cannot tell what was asked for.'],
  ['any other', 'It stands among the inputs and is passed on.'],
];

/** Each is held by a test that changes inputs one by one (tests/workbook/handover/sweep/departures.ts). */
const departures: readonly string[] = [
  'Words, units, TRUE or FALSE, the degree of a tangent and the place of a first reading are built into a formula, and the orders 0 to 3 in halves into that of PACE.UNIT. When such a cell is changed it shows #VALUE!, even where PACE has an answer.',
  'So it does when a cell that held an optional value is emptied, when a number is typed as text, and when several readings of one time lie at the edge of a tangent’s window.',
  'Where each reading has a temperature or pressure of its own, a wrong one is refused beside that reading alone; PACE refuses the column.',
  'A result keeps its number of cells: one that has no answer any more shows #N/A.',
  'LibreOffice takes TRUE for 1 and FALSE for 0 wherever a number is asked for; elsewhere they are none, as in PACE.',
];

export const errorRows = (): SheetCell[][] => [
  headingRow('When a cell shows an error'),
  ...codes.flatMap(([code, meaning]) => labelled(code, meaning)),
  ...departures.flatMap((text, n) => labelled(n === 0 ? 'unlike PACE' : null, text)),
];
