/** Putting a formula into the sheet, and taking it back. */
import { readingAnswer } from '../calls/reading';
import { currentInsertion } from '../insertions/current';
import type { Insertion } from '../insertions/insertion';
import { firstFree } from '../place';
import { planFor, type Plan } from '../plan';
import { CellsInUse, type SheetArea } from '../port';
import type { Deed, State } from '../store';
import type { Bench } from './bench';
import { adoptColumn } from './adopt';
import { changeRun, reread } from './look';

export interface Putting {
  /** Proposes a place, unless the person has named one, and sees what stands there. */
  settle(): Promise<void>;
  putIn(overwrite: boolean): Promise<void>;
  undoLast(): Promise<void>;
}

export function putting(bench: Bench): Putting {
  const { store, port, notify } = bench;
  let question = 0; // only the newest look at the sheet counts

  async function settle(): Promise<void> {
    const mine = ++question;
    const { table, run, put } = store.state;
    const insertion = currentInsertion(store.state);
    if (!table || !run || !insertion) return;
    if (!put.isOwn) {
      const target = await firstFree(port, table.area, run.firstRow, insertion.size);
      if (mine !== question) return;
      store.choose('put', { target });
    }
    const plan = planFor(insertion, table.sheet, store.state.put);
    const inUse = typeof plan === 'string' ? [] : await occupied(plan.area);
    if (mine === question) store.choose('put', { inUse });
  }

  /** Another sheet may have been named that does not exist: then writing will say so. */
  const occupied = (area: SheetArea): Promise<readonly string[]> => port.occupied(area).catch(() => []);

  async function putIn(overwrite: boolean): Promise<void> {
    await reread(bench);
    const insertion = currentInsertion(store.state);
    const { put } = store.state;
    const sheet = store.state.table?.sheet;
    if (sheet === undefined || !insertion) return;
    const plan = planFor(insertion, sheet, put);
    if (typeof plan === 'string') return notify('bad', plan);
    try {
      const receipt = await port.write(plan.cells, { overwrite, description: plan.description });
      const { table, run, reading, deeds } = store.state;
      const deed = { description: plan.description, receipts: [receipt], before: { table, run, reading } };
      store.change({ deeds: [...deeds, deed] });
      store.choose('put', { question: null, isOwn: false });
      const goesOn = insertion.becomesReadings && (await goOnWith(plan, insertion));
      notify('good', `written: ${plan.description}${goesOn ? ', now the readings of this run' : ''}`);
      await port.reveal(plan.target);
      await settle();
    } catch (error) {
      if (!(error instanceof CellsInUse)) throw error;
      store.choose('put', { question: error.areas, inUse: error.areas });
    }
  }

  /** @returns whether the run now has the column just written as its readings */
  async function goOnWith(plan: Plan, { headings }: Insertion): Promise<boolean> {
    const { table, run, reading, pointedAt } = store.state;
    const answer = table && run && readingAnswer(table, run, reading, { sheet: table.sheet, pointedAt });
    if (answer?.kind !== 'column') return false;
    if (!(await adoptColumn(bench, plan, headings[0], answer.cells))) return false;
    changeRun(bench, { readingColumn: plan.target.column, timeColumn: run!.timeColumn });
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

/** The run has gone on with the column that is taken away. */
function meansWritten({ receipts }: Deed, { table, run }: State): boolean {
  return receipts.some(
    ({ area }) => area.sheet === table?.sheet && run !== null && holds(area, run.readingColumn),
  );
}

const holds = ({ column, columns }: SheetArea, other: number): boolean =>
  other >= column && other < column + columns;
