/** Putting a formula into the sheet, and taking it back. */
import { areaName } from '../../functions/address';
import { convertedRuns } from '../calls/readings';
import { currentInsertion } from '../insertions/current';
import type { Insertion } from '../insertions/insertion';
import { firstFree } from '../place';
import { finished, planFor, type Plan, type PlannedCell } from '../plan';
import { CellsInUse, type SheetArea, type WriteReceipt } from '../port';
import type { Deed, State } from '../store';
import { turnedArea } from '../turned';
import type { Bench } from './bench';
import { adoptColumns } from './adopt';
import { keepConditions } from './conditions';
import type { LongWork } from './longWork';
import { changeRun, reread } from './look';

export interface Putting {
  /** Proposes a place, unless the person has named one, and sees what stands there. */
  settle(): Promise<void>;
  putIn(overwrite: boolean): Promise<void>;
  undoLast(): Promise<void>;
}

export function putting(bench: Bench, work: LongWork): Putting {
  const { store, port, notify } = bench;
  let question = 0; // only the newest look at the sheet counts

  async function settle(): Promise<void> {
    const mine = ++question;
    const insertion = currentInsertion(store.state);
    if (!insertion) return;
    if (!store.state.put.isOwn) {
      const target = await placeFor(insertion);
      if (mine !== question) return;
      store.choose('put', { target });
    }
    const plan = planFor(insertion, sheetOf(store.state), store.state.put);
    const inUse = typeof plan === 'string' ? [] : await occupied(plan.area);
    if (mine === question) store.choose('put', { inUse });
  }

  async function placeFor(insertion: Insertion): Promise<string> {
    const { table, run } = store.state;
    if (!insertion.isAtActiveCell && table && run) return firstFree(port, table, run, insertion);
    const cell = await port.activeCell();
    return cell ? areaName(cell) : '';
  }

  /** Another sheet may have been named that does not exist: then writing will say so. */
  const occupied = (area: SheetArea): Promise<readonly string[]> => port.occupied(area).catch(() => []);

  async function putIn(overwrite: boolean): Promise<void> {
    await reread(bench);
    const insertion = currentInsertion(store.state);
    if (!insertion) return;
    const plan = planFor(insertion, sheetOf(store.state), store.state.put);
    if (typeof plan === 'string') return notify('bad', plan);
    try {
      const isWhole = await write(plan, overwrite);
      if (!isWhole) {
        notify('bad', `stopped: ${plan.description} is not complete`);
        return settle();
      }
      store.choose('put', { question: null, isOwn: false });
      if (store.state.task === 'reading') void keepConditions(bench, store.state.reading);
      const goesOn = insertion.becomesReadings && (await goOnWith(plan, insertion));
      notify('good', `written: ${plan.description}${goesOn ? ', now the readings of this run' : ''}`);
      await port.reveal(plan.target);
      await settle();
    } catch (error) {
      if (!(error instanceof CellsInUse)) throw error;
      store.choose('put', { question: error.areas, inUse: error.areas });
    }
  }

  /** All or nothing where it is little; bit by bit, so that it can be stopped, where it is much. */
  async function write({ cells, area, chart, description }: Plan, overwrite: boolean): Promise<boolean> {
    const { table, run, reading, deeds } = store.state;
    const bits = inBits(cells);
    const inUse = overwrite || bits.length === 1 ? [] : await port.occupied(area);
    if (inUse.length > 0) throw new CellsInUse(inUse);
    const receipts: WriteReceipt[] = [];
    const one = async (bit: readonly PlannedCell[]): Promise<void> => {
      const withChart = port.canChart && bit === bits[bits.length - 1] ? { chart } : {};
      receipts.push(await port.write(bit.map(finished), { overwrite, description, ...withChart }));
    };
    try {
      if (bits.length > 1) return await work.through('writing', bits, one);
      await one(bits[0]);
      return true;
    } finally {
      const deed = { description, area, receipts, before: { table, run, reading } };
      if (receipts.length > 0) store.change({ deeds: [...deeds, deed] });
    }
  }

  /** @returns whether the run now has the column just written as its readings */
  async function goOnWith(plan: Plan, insertion: Insertion): Promise<boolean> {
    const { table, run, reading, pointedAt } = store.state;
    if (!table || !run) return false;
    const converted = convertedRuns(table, run, reading, { sheet: table.sheet, pointedAt });
    const readingColumn = await adoptColumns(bench, plan, insertion, converted);
    if (readingColumn === null) return false;
    changeRun(bench, { readingColumn, timeColumn: run.timeColumn });
    return true;
  }

  async function undoLast(): Promise<void> {
    const { deeds, run } = store.state;
    const deed = deeds[deeds.length - 1];
    if (!deed) return;
    for (const receipt of [...deed.receipts].reverse()) await port.undo(receipt);
    const wentOn = run !== deed.before.run && meansWritten(deed, store.state);
    store.change({ deeds: deeds.slice(0, -1), ...(wentOn ? deed.before : {}) });
    notify('good', `taken back: ${deed.description}`);
    await settle();
  }

  return { settle, putIn, undoLast };
}

/** Where a cell named without its sheet is meant to be. */
const sheetOf = ({ table }: State): string => table?.sheet ?? '';

/** So many cells are written at one go. */
const bitSize = 24;

const inBits = (cells: readonly PlannedCell[]): (readonly PlannedCell[])[] =>
  Array.from({ length: Math.ceil(cells.length / bitSize) }, (_, i) =>
    cells.slice(i * bitSize, (i + 1) * bitSize),
  );

/** The run has gone on with the column that is taken away. */
function meansWritten({ area }: Deed, { table, run }: State): boolean {
  if (!table || !run || area.sheet !== table.sheet) return false;
  const { column, columns } = table.isTurned ? turnedArea(area) : area;
  return run.readingColumn >= column && run.readingColumn < column + columns;
}
