/** What a person can do in the pane. The only file that both changes the store and asks the workbook. */
import { areaName } from '../functions/address';
import { CellsInUse, type RangeReading, type SheetArea, type WorkbookPort } from './port';
import { firstFree, withHeadingsAbove } from './place';
import { answerSize, planFor } from './plan';
import { findTable, pointsOf, proposeRun, timeColumnFor, type Run, type Table } from './runs';
import type { Notice, RateChoice, Store } from './store';

export interface Actions {
  /** Takes the selected cells, or the filled block around the active cell, as the run. */
  chooseSelection(): Promise<void>;
  chooseProposal(): Promise<void>;
  changeRun(part: Partial<Run>): Promise<void>;
  changeRate(part: Partial<RateChoice>): Promise<void>;
  changeTarget(typed: string): Promise<void>;
  targetActiveCell(): Promise<void>;
  changeOptions(part: { withHeading?: boolean; withDetail?: boolean }): Promise<void>;
  putIn(overwrite: boolean): Promise<void>;
  declineOverwrite(): void;
  undoLast(): Promise<void>;
  copy(text: string): Promise<void>;
  /** Reads the sheet again: the selection moved, or the pane came back into view. */
  refresh(): Promise<void>;
}

const said = (error: unknown): string => (error instanceof Error ? error.message : String(error));

export function createActions(store: Store, port: WorkbookPort): Actions {
  const notify = (tone: Notice['tone'], words: string): void => store.change({ notice: { tone, words } });
  /** What goes wrong on the way to the workbook is said, not thrown into the void. */
  const guarded =
    <A extends unknown[]>(action: (...given: A) => Promise<void>) =>
    async (...given: A): Promise<void> => {
      try {
        await action(...given);
      } catch (error) {
        notify('bad', said(error));
      }
    };

  async function selectedBlock(): Promise<RangeReading | null> {
    const selection = await port.selection();
    const isBlock = selection && selection.area.rows > 1;
    return isBlock ? withHeadingsAbove(port, selection) : port.regionAroundActiveCell();
  }

  function take(block: RangeReading): string {
    const table = findTable(block);
    if (typeof table === 'string') return table;
    const run = proposeRun(table);
    const rate = { ...store.state.rate, ...startingTimes(table, run) };
    store.change({ table, run, rate, proposal: null, hint: '', notice: null });
    store.changePut({ isOwn: false, question: null });
    return '';
  }

  async function chooseSelection(): Promise<void> {
    const block = await selectedBlock();
    const problem = block
      ? take(block)
      : 'select the columns of a run in the sheet: times, and readings beside them';
    if (problem) store.change({ hint: problem });
    else await settleTarget();
  }

  async function chooseProposal(): Promise<void> {
    const { proposal } = store.state;
    if (!proposal) return;
    take(proposal);
    await settleTarget();
  }

  let question = 0; // only the newest look at the sheet counts
  async function settleTarget(): Promise<void> {
    const mine = ++question;
    const { table, run, rate, put } = store.state;
    if (!table || !run) return;
    if (!put.isOwn) {
      const target = await firstFree(port, table, run, answerSize(run, rate, put.withDetail));
      if (mine !== question) return;
      store.changePut({ target });
    }
    const plan = planFor(table, run, store.state.rate, store.state.put);
    const inUse = typeof plan === 'string' ? [] : await occupied(plan.area);
    if (mine === question) store.changePut({ inUse });
  }

  /** Another sheet may have been named that does not exist: then writing will say so. */
  const occupied = (area: SheetArea): Promise<readonly string[]> => port.occupied(area).catch(() => []);

  async function putIn(overwrite: boolean): Promise<void> {
    await reread();
    const { table, run, rate, put } = store.state;
    if (!table || !run) return;
    const plan = planFor(table, run, rate, put);
    if (typeof plan === 'string') return notify('bad', plan);
    try {
      const receipt = await port.write(plan.cells, { overwrite, description: plan.description });
      store.change({ receipts: [...store.state.receipts, receipt] });
      notify('good', `written: ${plan.description}`);
      store.changePut({ question: null, isOwn: false });
      await port.reveal(plan.cells[plan.cells.length - 1].area);
      await settleTarget();
    } catch (error) {
      if (!(error instanceof CellsInUse)) throw error;
      store.changePut({ question: error.areas, inUse: error.areas });
    }
  }

  async function undoLast(): Promise<void> {
    const receipt = store.state.receipts[store.state.receipts.length - 1];
    if (!receipt) return;
    await port.undo(receipt);
    store.change({ receipts: store.state.receipts.slice(0, -1) });
    notify('good', `taken back: ${receipt.description}`);
    await settleTarget();
  }

  /** The readings may have been edited since. */
  async function reread(): Promise<void> {
    const { table, run } = store.state;
    if (!table || !run) return;
    const fresh = await port.read(table.area);
    if (store.state.table?.area === table.area) store.change({ table: { ...table, cells: fresh.cells } });
  }

  async function lookForProposal(): Promise<void> {
    const block = await selectedBlock();
    const found = block && findTable(block);
    const { table } = store.state;
    if (!table) {
      if (block && typeof found === 'object') take(block);
      else store.change({ hint: typeof found === 'string' ? found : '' });
      return;
    }
    const isNew = found && typeof found === 'object' && !isSameBlock(found.area, table.area);
    store.change({ proposal: isNew ? block : null, hint: '' });
  }

  async function refresh(): Promise<void> {
    await reread();
    await lookForProposal();
    await settleTarget();
  }

  return {
    chooseSelection: guarded(chooseSelection),
    chooseProposal: guarded(chooseProposal),
    changeRun: guarded(async (part) => {
      const { table, run } = store.state;
      if (!table || !run) return;
      store.change({ run: settledRun(table, run, part), notice: null });
      await settleTarget();
    }),
    changeRate: guarded(async (part) => {
      store.changeRate(part);
      store.changePut({ question: null });
      store.change({ notice: null });
      await settleTarget();
    }),
    changeTarget: guarded(async (target) => {
      store.changePut({ target, isOwn: target.trim() !== '', question: null });
      if (target.trim() !== '') await settleTarget();
    }),
    targetActiveCell: guarded(async () => {
      const cell = await port.activeCell();
      if (!cell) return notify('bad', 'no cell is active: click one in the sheet');
      store.changePut({ target: areaName(cell), isOwn: true, question: null });
      await settleTarget();
    }),
    changeOptions: guarded(async (part) => {
      store.changePut({ ...part, question: null });
      await settleTarget();
    }),
    putIn: guarded(putIn),
    declineOverwrite: () => store.changePut({ question: null }),
    undoLast: guarded(undoLast),
    copy: guarded(async (text) => {
      await navigator.clipboard.writeText(text);
      notify('good', 'formula copied');
    }),
    refresh: guarded(refresh),
  };
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
