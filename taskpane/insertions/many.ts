import { areaName } from '../../functions/address';
import { isOneBlock, pickedRuns, surveyLaw, type OneOfMany } from '../calls/many';
import { columnArgument, type Argument } from '../calls/argument';
import { askForRows, formulaText } from '../calls/call';
import { nameOf } from '../headers';
import { everyRow, tableColumns, type NumberFormats } from '../numberFormats';
import { areaOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import { oneFormula, type Insertion, type Part } from './insertion';
import { orderInsertion } from './order';
import { rateInsertion, readsOf } from './rate';

/** Of the table that PACE.SURVEY answers. */
const surveyColumns = 8;

/** The same question put to every picked run; nothing while none is picked. */
export function manyInsertion(table: Table, run: Run, state: State): Insertion | null {
  const runs = pickedRuns(table, run, state.many);
  if (runs.length === 0) return null;
  if (state.many.answer === 'survey') return surveyInsertion(table, runs, state);
  const each = runs.map((one) => insertionOf(table, one.run, state));
  if (!each[0].isAlongRun) return inRows(table, runs, each);
  return table.stretches.length > 0 ? inStretches(table, runs, each) : inLines(table, runs, each);
}

function insertionOf(table: Table, run: Run, state: State): Insertion {
  const { withDetail } = state.put;
  if (state.many.answer === 'rate') return rateInsertion(table, run, state, withDetail);
  // a table of orders a run would be a sheet of its own
  const answer = state.order.answer === 'orders' ? 'coefficient' : state.order.answer;
  return orderInsertion(table, run, { ...state, order: { ...state.order, answer } }, withDetail);
}

const readsOfAll = (table: Table, runs: readonly OneOfMany[]): Insertion['reads'] =>
  runs.flatMap(({ run }) => readsOf(table, run));

/** `a survey of 12 runs`. */
export const counted = (name: string, count: number): string =>
  `${name} of ${count} ${count === 1 ? 'run' : 'runs'}`;

/** Where runs stand apart or have times of their own there is no block to survey. */
function surveyInsertion(
  table: Table,
  runs: readonly OneOfMany[],
  { order, pointedAt }: State,
): Insertion | null {
  if (!isOneBlock(runs)) return null;
  const [{ run }] = runs;
  const area = areaOf(table, run.readingColumn, run, runs.length);
  const block = { value: undefined, text: areaName(area) };
  const law = surveyLaw(order, { sheet: table.sheet, pointedAt });
  const args = [columnArgument(table, run, run.timeColumn), block, ...law];
  return {
    name: counted('survey', runs.length),
    ...oneFormula(formulaText('SURVEY', args), { rows: runs.length + 1, columns: surveyColumns }, () =>
      surveyFormats(table, runs, law),
    ),
    headings: [],
    reads: readsOfAll(table, runs),
    hasDetail: false,
  };
}

/** So many runs are surveyed to see how large the numbers are. */
const mostSampled = 8;

function surveyFormats(table: Table, runs: readonly OneOfMany[], law: readonly Argument[]): NumberFormats {
  const step = Math.ceil(runs.length / mostSampled);
  const sampled = runs.filter((_, place) => place % step === 0);
  const surveyed = sampled.map(({ run }) =>
    askForRows('SURVEY', [
      columnArgument(table, run, run.timeColumn),
      columnArgument(table, run, run.readingColumn),
      ...law,
    ]),
  );
  const headings = surveyed[0][0].map(String);
  if (headings.length < surveyColumns) return [];
  const columns = tableColumns(
    headings,
    surveyed.flatMap((rows) => rows.slice(1)),
  );
  return [headings.map(() => null), ...everyRow(columns, runs.length)];
}

/** One row a run: its name, then its answer. */
function inRows(table: Table, runs: readonly OneOfMany[], each: readonly Insertion[]): Insertion {
  const [{ name, headings, hasDetail, size }] = each;
  return {
    name: counted(name, runs.length),
    parts: each.flatMap(({ parts }, row): Part[] => [
      { down: row, right: 0, content: { value: runs[row].heading.text } },
      ...parts.map((part) => ({ ...part, down: part.down + row, right: part.right + 1 })),
    ]),
    size: { rows: each.length, columns: size.columns + 1 },
    headings: ['run', ...headings],
    reads: readsOfAll(table, runs),
    hasDetail,
    beside: runs[0].run,
  };
}

/** Columns beside each other, under the name of each run; rows below each other where runs stand in rows. */
export function inLines(table: Table, runs: readonly OneOfMany[], each: readonly Insertion[]): Insertion {
  const [{ size }] = each;
  const { isTurned } = table;
  return {
    ...each[0],
    chart: undefined,
    name: counted(each[0].name, runs.length),
    parts: each.flatMap(({ parts }, place) =>
      parts.map((part) => moved(part, isTurned ? [place * size.rows, 0] : [0, place * size.columns])),
    ),
    size: isTurned
      ? { ...size, rows: size.rows * each.length }
      : { ...size, columns: size.columns * each.length },
    headings: each.flatMap(({ headings }, place) =>
      headings.map((heading) => `${nameOf(runs[place].heading)}: ${heading}`),
    ),
    reads: readsOfAll(table, runs),
  };
}

/** One column through all runs, each answer in the rows of its own run. */
export function inStretches(table: Table, runs: readonly OneOfMany[], each: readonly Insertion[]): Insertion {
  const top = runs[0].run.firstRow;
  const { lastRow } = runs[runs.length - 1].run;
  const { isTurned } = table;
  const [{ size }] = each;
  const rows = lastRow - top + 1;
  return {
    ...each[0],
    chart: undefined,
    name: counted(each[0].name, runs.length),
    parts: each.flatMap(({ parts }, place) => {
      const below = runs[place].run.firstRow - top;
      return parts.map((part) => moved(part, isTurned ? [0, below] : [below, 0]));
    }),
    size: isTurned ? { ...size, columns: rows } : { ...size, rows },
    reads: readsOfAll(table, runs),
    beside: runs[0].run,
  };
}

export const moved = (part: Part, [down, right]: readonly [number, number]): Part => ({
  ...part,
  down: part.down + down,
  right: part.right + right,
});
