/** Every fault that a check of a run knows, as someone's sheet would hold it. */
import { CellError, type CellValue, type ErrorCode } from '../../functions/cell';
import type { RawCell } from '../../src/series/check/rawRun';
import { cells } from '../src/series/check/faults/cells';
import { course } from '../src/series/check/faults/course';
import { clean, type Fault } from '../src/series/check/faults/fault';
import { readings } from '../src/series/check/faults/readings';
import { times } from '../src/series/check/faults/times';
import { tens } from '../support/invented';

const cellOf = (cell: RawCell): CellValue => {
  if (typeof cell !== 'object' || cell === null) return cell;
  return 'text' in cell ? cell.text : new CellError(cell.error as ErrorCode);
};

export interface FaultySheet {
  readonly kind: Fault['kind'];
  readonly name: string;
  /** Headings, then the run. */
  readonly rows: readonly (readonly CellValue[])[];
  /** What the pane says of it, as a sentence. */
  readonly says: RegExp;
}

/** Without a single pair there is no run that could be checked. */
const faults = [...cells, ...times, ...readings, ...course].filter(({ kind }) => kind !== 'no pairs');

export const faultySheets: readonly FaultySheet[] = faults.map(
  ({ kind, name, says, times: at = tens, values = clean }) => ({
    kind,
    name,
    rows: [['t / s', 'A'], ...at.map((time, row) => [cellOf(time), cellOf(values[row])])],
    says: new RegExp(says.source.replace(/^\^|\$$/g, ''), 'i'),
  }),
);

export const oneOfEachKind = faultySheets.filter(
  ({ kind }, place) => faultySheets.findIndex((one) => one.kind === kind) === place,
);
