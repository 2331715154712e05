/** The conversion of all runs that are read alike, at one go. */
import { areaName } from '../../functions/address';
import type { OneOfMany } from '../calls/many';
import { runsToConvert } from '../calls/readings';
import { nameOf } from '../headers';
import { areaOf, headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import { alongRun, oneFormula, type Insertion, type Part } from './insertion';
import { counted, inLines, inStretches, moved } from './many';
import { readingInsertion } from './reading';
import { readsOf } from './rate';

/** One run's column by itself; nothing where the readings stand as they are. */
export function readingsInsertion(table: Table, run: Run, state: State): Insertion | null {
  const runs = runsToConvert(table, run, state.reading);
  const each = runs.flatMap((one) => readingInsertion(table, one.run, state) ?? []);
  if (each.length < 2) return each[0] ?? null;
  if (needsPairs(runs, state)) return inPairs(table, runs, each);
  return table.stretches.length > 0 ? inStretches(table, runs, each) : inLines(table, runs, each);
}

/** Columns that stood side by side without their own times would be taken for runs of other times. */
const needsPairs = (runs: readonly OneOfMany[], { reading }: State): boolean => {
  const isBelow = runs[0].run.firstRow !== runs[1].run.firstRow;
  return isBelow
    ? reading.layout === 'pairs'
    : runs.some(({ run }) => run.timeColumn !== runs[0].run.timeColumn);
};

/** A table of its own, apart from the one that is read: each run's times, and beside them what became of its readings. */
function inPairs(table: Table, runs: readonly OneOfMany[], each: readonly Insertion[]): Insertion {
  const { isTurned } = table;
  const parts = each.flatMap(({ parts: own }, place): Part[] =>
    [...timesOf(table, runs[place].run), ...own].map((part, i) =>
      moved(part, isTurned ? [2 * place + i, 0] : [0, 2 * place + i]),
    ),
  );
  const longest = Math.max(...runs.map(({ run }) => run.lastRow - run.firstRow + 1));
  const size = { rows: longest, columns: 2 * runs.length };
  return {
    ...each[0],
    name: counted(each[0].name, runs.length),
    parts,
    size: isTurned ? { rows: size.columns, columns: size.rows } : size,
    headings: each.flatMap(({ headings }, place) => {
      const { run, heading } = runs[place];
      return [headingOf(table, run.timeColumn).text, ...headings.map((one) => `${nameOf(heading)}: ${one}`)];
    }),
    reads: runs.flatMap(({ run }) => readsOf(table, run)),
    isApart: true,
    becomesReadings: false,
  };
}

/** The times as they stand, so that they follow when one is put right. */
function timesOf(table: Table, run: Run): readonly Part[] {
  const size = { rows: run.lastRow - run.firstRow + 1, columns: 1 };
  const times = oneFormula(`=${areaName(areaOf(table, run.timeColumn, run))}`, size);
  return alongRun(table, { name: 'times', ...times, headings: [], reads: [], hasDetail: false }).parts;
}
