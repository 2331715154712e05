import { convertedHeading, readingAnswer, readingFormula } from '../calls/reading';
import { columnFormat, everyRow, numbersIn, type NumberFormats } from '../numberFormats';
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
  const pointing = { sheet: table.sheet, pointedAt };
  const formula = readingFormula(f, table, run, reading, pointing);
  const rows = run.lastRow - run.firstRow + 1;
  const formats = (): NumberFormats => {
    const answer = readingAnswer(table, run, reading, pointing);
    return answer.kind === 'column' ? everyRow([columnFormat(numbersIn(answer.cells))], rows) : [];
  };
  return alongRun(table, {
    name: text,
    ...oneFormula(formula, { rows, columns: 1 }, formats),
    headings: headingsFor(text, unit, false),
    reads: readsOf(table, run),
    hasDetail: false,
    becomesReadings: true,
  });
}
