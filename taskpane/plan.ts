/** What "Put it in" would write, worked out before anything is touched. */
import { areaName, parseArea } from '../functions/address';
import { standardRowHeadings } from '../functions/results';
import { rateUnit } from './headers';
import type { CellToWrite, SheetArea } from './port';
import { rateFormula } from './rateCall';
import { columnOf, headingOf, type Run, type Table } from './runs';
import type { PutChoice, RateChoice } from './store';

export interface Plan {
  readonly cells: readonly CellToWrite[];
  /** Everything that will be filled, as one block. */
  readonly area: SheetArea;
  /** For the undo button: `rate at 30 s in 'Gas run'!E3`. */
  readonly description: string;
}

/** Rows and columns that the formula's answer will cover. */
export function answerSize(
  run: Run,
  rate: RateChoice,
  withDetail: boolean,
): { rows: number; columns: number } {
  return {
    rows: rate.kind === 'column' ? run.lastRow - run.firstRow + 1 : 1,
    columns: withDetail ? standardRowHeadings.length : 1,
  };
}

/** `rate at 30 s`: for headings and messages. */
export function rateName(table: Table, run: Run, rate: RateChoice): string {
  const { unit } = headingOf(table, run.timeColumn);
  const withUnit = (typed: string): string => [typed.trim(), unit].filter(Boolean).join(' ');
  if (rate.kind === 'average') return `average rate ${rate.from.trim()} to ${withUnit(rate.to)}`;
  return rate.kind === 'tangent' ? `rate at ${withUnit(rate.time)}` : 'rate';
}

function headingsFor(table: Table, run: Run, rate: RateChoice, withDetail: boolean): string[] {
  const unit = rateUnit(headingOf(table, run.readingColumn), headingOf(table, run.timeColumn));
  const inUnit = /^reading unit/.test(unit) ? `(${unit})` : `/ ${/[/ ]/.test(unit) ? `(${unit})` : unit}`;
  const [, ...others] = standardRowHeadings;
  const value = `${rateName(table, run, rate)} ${inUnit}`;
  if (!withDetail) return [value];
  return [value, ...others.map((name) => (name === 'degrees of freedom' ? name : `${name} ${inUnit}`))];
}

/** @returns the cell meant, on the run's sheet unless it names another; words when it means none */
export function readTarget(table: Table, typed: string): SheetArea | string {
  if (typed.trim() === '') return 'type the cell to write to, such as E3';
  const area = parseArea(typed);
  if (!area) return `a cell is written like E3 or 'Gas run'!E3: got "${typed.trim()}"`;
  return { sheet: area.sheet ?? table.sheet, row: area.row, column: area.column, rows: 1, columns: 1 };
}

/** @returns the plan, or why there is none, in words */
export function planFor(table: Table, run: Run, rate: RateChoice, put: PutChoice): Plan | string {
  const target = readTarget(table, put.target);
  if (typeof target === 'string') return target;
  if (put.withHeading && target.row === 0)
    return 'row 1 leaves no room for a heading above: choose a lower cell, or no heading';
  const size = answerSize(run, rate, put.withDetail);
  const answer = { ...target, ...size };
  const overlapped = meets(answer, ownColumns(table, run));
  if (overlapped)
    return `the answer would cover its own readings in ${areaName(overlapped)}: choose another cell`;
  const headings = put.withHeading ? headingsFor(table, run, rate, put.withDetail) : [];
  const formula = rateFormula(table, run, rate, put.withDetail);
  const spills = size.rows * size.columns > 1 ? { spills: size } : {};
  return {
    cells: [
      ...headings.map((value, place) => ({ area: cell(target, -1, place), content: { value } })),
      { area: target, content: { formula }, ...spills },
    ],
    area: put.withHeading ? { ...answer, row: answer.row - 1, rows: answer.rows + 1 } : answer,
    description: `${rateName(table, run, rate)} in ${areaName(target)}`,
  };
}

const cell = (target: SheetArea, down: number, right: number): SheetArea => ({
  ...target,
  row: target.row + down,
  column: target.column + right,
});

const ownColumns = (table: Table, run: Run): SheetArea[] =>
  [run.timeColumn, run.readingColumn].map((column) => columnOf(table, column, run).area);

/** The first of `others` that shares a cell with the area. */
function meets(area: SheetArea, others: readonly SheetArea[]): SheetArea | undefined {
  return others.find(
    (other) =>
      other.sheet === area.sheet &&
      area.row < other.row + other.rows &&
      other.row < area.row + area.rows &&
      area.column < other.column + other.columns &&
      other.column < area.column + area.columns,
  );
}
