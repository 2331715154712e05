/** Looking at the sheet: which block is the run, and what stands in it now. */
import { rises } from '../calls/order';
import { columnName } from '../../functions/address';
import type { RateChoice } from '../choices';
import { withHeadingsAbove } from '../place';
import type { RangeReading, SheetArea } from '../port';
import { findTable, headingOf, pointsOf, proposeRun, timeColumnFor, type Run, type Table } from '../runs';
import { functionOf, knownInputs, signalFor } from '../signals';
import type { Bench } from './bench';

export async function selectedBlock({ port }: Bench): Promise<RangeReading | null> {
  const selection = await port.selection();
  const isBlock = selection && selection.area.rows > 1;
  return isBlock ? withHeadingsAbove(port, selection) : port.regionAroundActiveCell();
}

/** @returns why the block is no run; empty when it has become the run */
export function take({ store }: Bench, block: RangeReading): string {
  const table = findTable(block);
  if (typeof table === 'string') return table;
  const run = proposeRun(table);
  store.change({ table, run, survey: null, proposal: null, hint: '', notice: null });
  beginWith({ store }, table, run);
  store.choose('put', { isOwn: false, question: null });
  return '';
}

/** What each step begins with on another run. */
function beginWith({ store }: Pick<Bench, 'store'>, table: Table, run: Run): void {
  store.choose('rate', startingTimes(table, run));
  store.choose('many', { picked: null });
  store.choose('temperature', { temperatures: null, coefficients: null, uncertainties: null, at: '' });
  if (headingOf(table, run.timeColumn).quantity === 'temperature') store.change({ task: 'temperature' });
  store.choose('order', { endpointKind: rises(table, run) ? 'free' : 'zero', endpoint: '' });
  chooseSignal({ store }, signalFor(headingOf(table, run.readingColumn)));
}

/** What was measured, with what the heading says of it. */
export function chooseSignal({ store }: Pick<Bench, 'store'>, what: string): void {
  const { table, run } = store.state;
  const f = functionOf(what);
  const inputs = table && run && f ? knownInputs(f, headingOf(table, run.readingColumn)) : {};
  store.choose('reading', { what, inputs });
}

/** The readings may have been edited since, the headings too, or another workbook been opened. */
export async function reread({ store, port }: Bench): Promise<void> {
  const { table, run } = store.state;
  if (!table || !run) return;
  const fresh = await port.read(table.area).catch(() => null);
  if (store.state.table?.area !== table.area || (fresh && isSameCells(fresh, table))) return;
  const found = fresh && findTable(fresh);
  if (found === null || typeof found === 'string')
    store.change({ table: null, run: null, survey: null, proposal: null });
  else
    store.change({ table: { ...table, cells: found.cells, columns: renewed(table, found) }, survey: null });
}

/** Columns stay what they are, under the headings that stand above them now. */
const renewed = (table: Table, found: Table): Table['columns'] =>
  table.columns.map((one) => {
    const now = found.columns.find(({ column }) => column === one.column);
    return now && now.heading.text !== `column ${columnName(one.column)}` ? now : one;
  });

const isSameCells = ({ cells }: RangeReading, table: Table): boolean =>
  cells.length === table.cells.length &&
  cells.every((row, r) => row.every((cell, c) => Object.is(cell, table.cells[r][c])));

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
  const isNew = found && typeof found === 'object' && !isSameBlock(found.area, table.area);
  store.change({ proposal: isNew ? block : null, hint: '' });
}

/** A block that begins where the run's does and reaches as far down is the run, grown by what was written beside it. */
const isSameBlock = (a: SheetArea, b: SheetArea): boolean =>
  a.sheet === b.sheet && a.row === b.row && a.column === b.column && a.rows === b.rows;

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
export function changeRun({ store }: Bench, part: Partial<Run>): void {
  const { table, run } = store.state;
  if (!table || !run) return;
  const next = settledRun(table, run, part);
  store.change({ run: next, survey: null, notice: null });
  if (next.readingColumn !== run.readingColumn)
    chooseSignal({ store }, signalFor(headingOf(table, next.readingColumn)));
  const turned = rises(table, next) !== rises(table, run);
  if (turned) store.choose('order', { endpointKind: rises(table, next) ? 'free' : 'zero', endpoint: '' });
}

function settledRun(table: Table, run: Run, part: Partial<Run>): Run {
  const next = { ...run, ...part };
  const timeColumn =
    part.readingColumn !== undefined && part.timeColumn === undefined
      ? timeColumnFor(table, part.readingColumn)
      : next.timeColumn;
  const within = (row: number): number => Math.min(Math.max(row, table.firstRow), table.lastRow);
  const firstRow = within(next.firstRow);
  return { ...next, timeColumn, firstRow, lastRow: Math.max(within(next.lastRow), firstRow) };
}
