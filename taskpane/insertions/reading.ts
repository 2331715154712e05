import { convertedHeading, readingFormula } from '../calls/reading';
import type { Run, Table } from '../runs';
import { functionOf } from '../signals';
import type { State } from '../store';
import { alongRun, headingsFor, oneFormula, type Insertion } from './insertion';
import { readsOf } from './rate';

/** The converted column; nothing where the readings stand as they are. */
export function readingInsertion(
  table: Table,
  run: Run,
  { reading, pointedAt }: Pick<State, 'reading' | 'pointedAt'>,
): Insertion | null {
  const f = functionOf(reading.what);
  if (!f) return null;
  const { text, unit } = convertedHeading(f, table, run);
  const formula = readingFormula(f, table, run, reading, { sheet: table.sheet, pointedAt });
  return alongRun(table, {
    name: text,
    ...oneFormula(formula, { rows: run.lastRow - run.firstRow + 1, columns: 1 }),
    headings: headingsFor(text, unit, false),
    reads: readsOf(table, run),
    hasDetail: false,
    becomesReadings: true,
  });
}
