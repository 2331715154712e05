/** Times that a sheet keeps as clock times or dates, and the formula that makes a running time of them. */
import { columnOf, headingOf, type Run, type Table } from '../runs';
import { columnArgument, quoted } from './argument';
import { ask, formulaText } from './call';
import { isRange } from '../../functions/cell';

/** Days since 1900 as a sheet counts them: the years 1982 to 2064. */
const dates = { from: 30_000, to: 60_000 };

/** @returns the formula, in minutes; `null` where the times are a running time already, or nobody could read them */
export function runningTimeFormula(table: Table, run: Run): string | null {
  if (headingOf(table, run.timeColumn).unit !== '') return null;
  const cells = columnOf(table, run.timeColumn, run).flatMap(([cell]) => cell ?? []);
  const isClock = cells.some((cell) => typeof cell === 'string') || cells.every(isOfDays);
  if (cells.length === 0 || !isClock) return null;
  const args = [columnArgument(table, run, run.timeColumn), quoted('min'), quoted('first')];
  return isRange(ask('CLOCK', args)) ? formulaText('CLOCK', args) : null;
}

/** A date, or a part of a day. */
const isOfDays = (cell: unknown): boolean =>
  typeof cell === 'number' && ((cell >= 0 && cell < 1) || (cell >= dates.from && cell <= dates.to));
