/** The reading step on several runs at once. */
import type { ReadingChoice } from '../choices';
import { headingOf, type Run, type Table } from '../runs';
import type { Pointing } from './argument';
import { pickedRuns, type OneOfMany } from './many';
import { readingAnswer, type ReadingAnswer } from './reading';

/** The chosen run, or all that are read as it is; those under each other are one column, so all unless it is said. */
export function runsToConvert(
  table: Table,
  run: Run,
  { runs }: Pick<ReadingChoice, 'runs'>,
): readonly OneOfMany[] {
  const isAll = runs === 'all' || (runs === null && table.stretches.length > 0);
  if (isAll) return pickedRuns(table, run, { picked: null });
  return [{ key: run.readingColumn, heading: headingOf(table, run.readingColumn), run }];
}

export interface ConvertedRun {
  readonly name: string;
  readonly run: Run;
  readonly answer: ReadingAnswer;
}

export const convertedRuns = (
  table: Table,
  run: Run,
  choice: ReadingChoice,
  pointing: Pointing,
): readonly ConvertedRun[] =>
  runsToConvert(table, run, choice).map((one) => ({
    name: one.heading.text,
    run: one.run,
    answer: readingAnswer(table, one.run, choice, pointing),
  }));
