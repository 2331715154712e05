/** Looking at the sheet: which block is the run, and what stands in it now. */
import { rises } from '../calls/order';
import { firstChoices, type RateChoice } from '../choices';
import { findTable } from '../findTable';
import { withHeadings } from '../place';
import type { RangeReading } from '../port';
import {
  blockOf,
  headingOf,
  limitsOf,
  pointsOf,
  proposeRun,
  timeColumnFor,
  type Corrections,
  type Run,
  type Table,
} from '../runs';
import { functionOf, knownInputs, signalFor } from '../signals';
import { unnamed } from '../turned';
import type { Bench } from './bench';
import { keptConditions } from './conditions';

export async function selectedBlock({ port }: Bench): Promise<RangeReading | null> {
  const selection = await port.selection();
  const isBlock = selection && selection.area.rows > 1;
  return isBlock ? withHeadings(port, selection) : port.regionAroundActiveCell();
}

/** @returns why the block is no run; empty when it has become the run */
export function take(bench: Bench, block: RangeReading): string {
  const table = findTable(block);
  if (typeof table === 'string') return table;
  beginWith(bench, table);
  return '';
}

/** The same cells, read as the person says. */
export function correctTable(bench: Bench, part: Corrections): void {
  const { store } = bench;
  const { table, run } = store.state;
  if (!table || !run) return;
  // columns named before are others once the table is turned
  const corrections = part.isTurned === undefined ? { ...table.corrections, ...part } : part;
  const found = findTable(blockOf(table), corrections);
  if (typeof found === 'string') return store.change({ hint: found });
  if (part.units === undefined) return beginWith(bench, found);
  const before = headingOf(table, run.readingColumn).quantity;
  store.change({ table: found, survey: null });
  if (headingOf(found, run.readingColumn).quantity !== before) chooseSignal(bench, suitingSignal(found, run));
}

/** The table's first run, and what each step begins with on it. */
function beginWith(bench: Bench, table: Table): void {
  const { store } = bench;
  const run = proposeRun(table);
  store.change({ table, run, survey: null, proposal: null, hint: '', notice: null });
  store.choose('put', { isOwn: false, question: null });
  // readings used and the rest were meant for the run before
  const { points, degree, coefficient } = firstChoices.rate;
  store.choose('rate', { points, degree, coefficient, ...startingTimes(table, run) });
  store.choose('many', { picked: null });
  // runs below each other make no block that one formula could survey
  if (table.stretches.length > 0 && store.state.many.answer === 'survey')
    store.choose('many', { answer: 'order' });
  store.choose('temperature', { temperatures: null, coefficients: null, uncertainties: null, at: '' });
  const over = headingOf(table, run.timeColumn).quantity;
  if (over === 'temperature') store.change({ task: 'temperature' });
  else if (over === 'time' && store.state.task === 'temperature') store.change({ task: 'rate' });
  store.choose('order', { endpointKind: rises(table, run) ? 'free' : 'zero', endpoint: '' });
  chooseSignal(bench, suitingSignal(table, run));
}

const suitingSignal = (table: Table, run: Run): string =>
  signalFor(headingOf(table, run.readingColumn), rises(table, run));

/** What was measured, with what the heading says of it. */
export function chooseSignal({ store, port }: Bench, what: string): void {
  const { table, run } = store.state;
  const f = functionOf(what);
  const inputs =
    table && run && f
      ? { ...keptConditions({ port }, what), ...knownInputs(f, headingOf(table, run.readingColumn)) }
      : {};
  store.choose('reading', { what, inputs });
}

/** The readings may have been edited since, the headings too, or another workbook been opened. */
export async function reread({ store, port }: Bench): Promise<void> {
  const { table, run } = store.state;
  if (!table || !run) return;
  const fresh = await port.read(table.area).catch(() => null);
  if (store.state.table?.area !== table.area || (fresh && isSameCells(fresh, table))) return;
  const { corrections, isTurned } = table;
  const found = fresh && findTable(fresh, { ...corrections, isTurned });
  if (found === null || typeof found === 'string')
    store.change({ table: null, run: null, survey: null, proposal: null });
  else {
    const { cells, stretches, apart } = found;
    store.change({
      table: { ...table, cells, stretches, apart, columns: renewed(table, found) },
      survey: null,
    });
  }
}

/** Columns stay what they are, under the headings that stand above them now; what has come since is added. */
function renewed(table: Table, found: Table): Table['columns'] {
  const known = table.columns.map((one) => {
    const now = found.columns.find(({ column }) => column === one.column);
    return now && now.heading.text !== unnamed(one.column, table.isTurned) ? now : one;
  });
  const added = found.columns.filter(({ column }) => known.every((one) => one.column !== column));
  return [...known, ...added].sort((a, b) => a.column - b.column);
}

function isSameCells({ cells }: RangeReading, table: Table): boolean {
  const { cells: known } = blockOf(table);
  return (
    cells.length === known.length &&
    cells.every((row, r) => row.every((cell, c) => Object.is(cell, known[r][c])))
  );
}

export async function lookForProposal(bench: Bench): Promise<void> {
  const { store } = bench;
  const block = await selectedBlock(bench);
  const found = block && findTable(block);
  const { table } = store.state;
  if (!table) {
    if (block && typeof found === 'object') take(bench, block);
    else store.change({ hint: typeof found === 'string' ? found : '' });
    return;
  }
  const isNew = found && typeof found === 'object' && !isSameBlock(found, table);
  store.change({ proposal: isNew ? block : null, hint: '' });
}

/** A block that begins where the run's does and is as long is the run, grown by what was written beside it. */
const isSameBlock = ({ area: a }: Table, { area: b, isTurned }: Table): boolean =>
  a.sheet === b.sheet &&
  a.row === b.row &&
  a.column === b.column &&
  (isTurned ? a.columns === b.columns : a.rows === b.rows);

/** Times to begin with: the whole run for an average, the middle reading for a tangent. */
function startingTimes(table: Table, run: Run): Partial<RateChoice> {
  const times = pointsOf(table, run)
    .map(({ time }) => time)
    .sort((a, b) => a - b);
  if (times.length === 0) return {};
  const at = (share: number): string => String(times[Math.round(share * (times.length - 1))]);
  return { from: at(0), to: at(1), time: at(0.5) };
}

/** A change to the run, with what follows from it: each reading column has its own times. */
export function changeRun(bench: Bench, part: Partial<Run>): void {
  const { store } = bench;
  const { table, run } = store.state;
  if (!table || !run) return;
  const next = settledRun(table, run, part);
  store.change({ run: next, survey: null, notice: null });
  if (next.readingColumn !== run.readingColumn) chooseSignal(bench, suitingSignal(table, next));
  const turned = rises(table, next) !== rises(table, run);
  if (turned) store.choose('order', { endpointKind: rises(table, next) ? 'free' : 'zero', endpoint: '' });
}

function settledRun(table: Table, run: Run, part: Partial<Run>): Run {
  const next = { ...run, ...part };
  const timeColumn =
    part.readingColumn !== undefined && part.timeColumn === undefined
      ? timeColumnFor(table, part.readingColumn)
      : next.timeColumn;
  const limits = limitsOf(table, next.firstRow);
  const within = (row: number): number => Math.min(Math.max(row, limits.firstRow), limits.lastRow);
  const firstRow = within(next.firstRow);
  return { ...next, timeColumn, firstRow, lastRow: Math.max(within(next.lastRow), firstRow) };
}
