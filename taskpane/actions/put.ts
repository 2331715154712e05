/** Putting a formula into the sheet, and taking it back. */
import { currentInsertion } from '../insertions/current';
import { firstFree } from '../place';
import { planFor } from '../plan';
import { CellsInUse, type SheetArea } from '../port';
import type { Bench } from './bench';
import { reread } from './look';

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
    const { table, put } = store.state;
    if (!table || !insertion) return;
    const plan = planFor(insertion, table.sheet, put);
    if (typeof plan === 'string') return notify('bad', plan);
    try {
      const receipt = await port.write(plan.cells, { overwrite, description: plan.description });
      store.change({ receipts: [...store.state.receipts, receipt] });
      notify('good', `written: ${plan.description}`);
      store.choose('put', { question: null, isOwn: false });
      await port.reveal(plan.target);
      await settle();
    } catch (error) {
      if (!(error instanceof CellsInUse)) throw error;
      store.choose('put', { question: error.areas, inUse: error.areas });
    }
  }

  async function undoLast(): Promise<void> {
    const receipt = store.state.receipts[store.state.receipts.length - 1];
    if (!receipt) return;
    await port.undo(receipt);
    store.change({ receipts: store.state.receipts.slice(0, -1) });
    notify('good', `taken back: ${receipt.description}`);
    await settle();
  }

  return { settle, putIn, undoLast };
}
