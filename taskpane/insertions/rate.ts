import { rateAnswer, rateFormula, type RateAnswer } from '../calls/rate';
import type { RateChoice } from '../choices';
import { rateUnit } from '../headers';
import { columnsFormats, everyRow, type NumberFormats } from '../numberFormats';
import { areaOf, headingOf, type Run, type Table } from '../runs';
import type { State } from '../store';
import {
  alongRun,
  chartOf,
  detailColumns,
  estimateFormats,
  headingsFor,
  oneFormula,
  type Insertion,
  type Size,
} from './insertion';

/** `rate at 30 s`: for headings and messages. */
export function rateName(table: Table, run: Run, rate: RateChoice): string {
  const { unit } = headingOf(table, run.timeColumn);
  // of a cell it is the place that is known, and the number may change
  const withUnit = (typed: string): string =>
    [typed.trim(), /[A-Z]/i.test(typed) ? '' : unit].filter(Boolean).join(' ');
  if (rate.kind === 'average') return `average rate ${rate.from.trim()} to ${withUnit(rate.to)}`;
  return rate.kind === 'tangent' ? `rate at ${withUnit(rate.time)}` : 'rate';
}

export function rateInsertion(
  table: Table,
  run: Run,
  { rate, pointedAt }: Pick<State, 'rate' | 'pointedAt'>,
  withDetail: boolean,
): Insertion {
  const name = rateName(table, run, rate);
  const unit = rateUnit(headingOf(table, run.readingColumn), headingOf(table, run.timeColumn));
  const pointing = { sheet: table.sheet, pointedAt };
  const size = {
    rows: rate.kind === 'column' ? run.lastRow - run.firstRow + 1 : 1,
    columns: detailColumns(withDetail),
  };
  const insertion: Insertion = {
    name,
    ...oneFormula(rateFormula(table, run, rate, pointing, withDetail), size, () =>
      formatsFor(rateAnswer(table, run, rate, pointing), size),
    ),
    headings: headingsFor(name, unit, withDetail),
    reads: readsOf(table, run),
    hasDetail: true,
    ...(rate.kind !== 'column' && { chart: chartOf(table, run, false) }),
  };
  return rate.kind === 'column' ? alongRun(table, insertion) : insertion;
}

function formatsFor(answer: RateAnswer, { rows, columns }: Size): NumberFormats {
  if (answer.kind === 'column') return everyRow(columnsFormats(answer.rates).slice(0, columns), rows);
  return answer.kind === 'one' ? estimateFormats({ ok: answer.rate }, columns) : [];
}

export const readsOf = (table: Table, run: Run): Insertion['reads'] =>
  [run.timeColumn, run.readingColumn].map((column) => areaOf(table, column, run));
