/** Where a copy may show something else than PACE would: what the sheet "Method" says of it, but for the last. */
import { CellError, type CellValue } from '../../../../functions/cell';
import type { HandedFormula } from '../../../../workbook/handover/handed';
import type { Block } from './blocks';

export interface Difference {
  readonly block: Block;
  readonly formula: HandedFormula;
  readonly engine: string;
  readonly ours: CellValue;
  readonly theirs: CellValue;
  /** All cells that the program shows of this result. */
  readonly shown: readonly CellValue[];
}

const isRefusal = (cell: CellValue): boolean => cell instanceof CellError && cell.code === '#VALUE!';

/** An error, although PACE has an answer. */
const notFollowed: readonly RegExp[] = [
  // the degree decides how the formula is built
  /^=PACE\.(?:TANGENT|ALONG).* degree: /,
  // orders that a list holds
  /^=PACE\.UNIT.* order: /,
  // the first reading is the one of the day
  /^=PACE\.(?:MASSLOSS\(.*,,|GASPRESSURE).* (?:masses|pressures): a gap at the start/,
  /^=PACE\.CLOCK.*"first"\), times: /,
  // readings of one time at the edge of a window
  /^=PACE\.(?:TANGENT|ALONG).* times: two alike/,
];

/** One reading is refused alone, where PACE refuses all. */
const refusedAlone =
  /^=PACE\.(?:GASVOLUME|CONDUCTIVITY).* (?:temperatures?|pressure): |^=PACE\.CLOCK.* times: /;

const departures: readonly ((difference: Difference) => boolean)[] = [
  ({ block: { fault }, theirs }) => fault.isOfAnotherKind && isRefusal(theirs),
  ({ block: { title }, theirs }) =>
    theirs instanceof CellError && notFollowed.some((known) => known.test(title)),
  ({ block: { fault, title }, ours, shown }) =>
    isRefusal(ours) && shown.some(isRefusal) && (fault.isOfAnotherKind || refusedAlone.test(title)),
  // LibreOffice takes TRUE for 1
  ({ block: { fault }, engine }) => engine === 'LibreOffice' && fault.what === 'TRUE',
  // it says of itself what in it is of the day
  ({ formula, ours, theirs }) =>
    formula.ofTheDay !== undefined && typeof ours === 'number' && typeof theirs === 'number',
  // a result keeps its number of cells
  ({ block: { title }, ours, theirs }) =>
    /PACE\.HALVINGS/.test(title) && ours === null && theirs instanceof CellError && theirs.code === '#N/A',
  // Gnumeric reckons with longer numbers, which a cell of other programs cannot hold
  ({ block: { fault }, engine, ours }) =>
    engine === 'Gnumeric' &&
    fault.what === 'far too large' &&
    ours instanceof CellError &&
    ours.code === '#N/A',
];

export const isDeparture = (difference: Difference): boolean => departures.some((holds) => holds(difference));
