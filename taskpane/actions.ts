/** What a person can do in the pane. Actions alone both change the store and ask the workbook. */
import { areaName } from '../functions/address';
import { benchOf, guardedBy } from './actions/bench';
import { choosing } from './actions/chosen';
import { handingOver } from './actions/handOver';
import {
  changeRun,
  chooseSignal,
  correctTable,
  lookForProposal,
  reread,
  selectedBlock,
  take,
} from './actions/look';
import { longWork } from './actions/longWork';
import { readPointedAt } from './actions/pointing';
import { putting } from './actions/put';
import { surveyRuns } from './actions/survey';
import { pickedRuns } from './calls/many';
import type {
  Choices,
  LookupChoice,
  ManyChoice,
  OrderChoice,
  RateChoice,
  ReadingChoice,
  Task,
  TemperatureChoice,
} from './choices';
import type { CopyMaker } from './copying';
import type { ActiveCell, SheetArea, WorkbookPort } from './port';
import type { Corrections, Run } from './runs';
import type { Store } from './store';

export interface Actions {
  /** Takes the selected cells, or the filled block around the active cell, as the run. */
  chooseSelection(): Promise<void>;
  chooseProposal(): Promise<void>;
  changeRun(part: Partial<Run>): Promise<void>;
  /** Reads the same cells in another way than was guessed. */
  correctTable(part: Corrections): Promise<void>;
  openTask(task: Task): Promise<void>;
  changeSignal(what: string): Promise<void>;
  changeReading(part: Partial<ReadingChoice>): Promise<void>;
  changeRate(part: Partial<RateChoice>): Promise<void>;
  changeOrder(part: Partial<OrderChoice>): Promise<void>;
  changeTemperature(part: Partial<TemperatureChoice>): Promise<void>;
  changeLookup(part: Partial<LookupChoice>): Promise<void>;
  changeMany(part: Partial<ManyChoice>): Promise<void>;
  /** One run more among those picked, or one less. */
  pickRun(key: number, isPicked: boolean): Promise<void>;
  /** Asks PACE.SURVEY of the picked runs one after another, for the pane alone. */
  surveyRuns(): Promise<void>;
  /** Ends long work; what is done by then stays. */
  stop(): void;
  /** Hands over the full name of the active cell, or of all that is selected, as a field takes it. */
  pointAt(what: 'cell' | 'selection', take: (name: string) => Promise<void>): Promise<void>;
  changeTarget(typed: string): Promise<void>;
  targetActiveCell(): Promise<void>;
  changeOptions(part: { withHeading?: boolean; withDetail?: boolean; withChart?: boolean }): Promise<void>;
  putIn(overwrite: boolean): Promise<void>;
  declineOverwrite(): void;
  undoLast(): Promise<void>;
  /** Makes a copy of the workbook that needs no add-in. */
  makeCopy(): Promise<void>;
  /** Gives the copy that was made. */
  giveCopy(): Promise<void>;
  copy(text: string): Promise<void>;
  /** Is told whenever the active cell, or its formula, is another. */
  follow(cell: ActiveCell | null): void;
  /** Selects cells that a formula reads. */
  show(area: SheetArea): Promise<void>;
  /** Reads the sheet again: the selection moved, or the pane came back into view. */
  refresh(): Promise<void>;
}

/** @param makeCopy left out where there is nobody to make one */
export function createActions(store: Store, port: WorkbookPort, makeCopy?: CopyMaker): Actions {
  const bench = benchOf(store, port);
  const guarded = guardedBy(bench);
  const work = longWork(bench);
  const { settle, putIn, undoLast } = putting(bench, work);
  const copying = handingOver(bench, makeCopy);
  const { follow, show } = choosing(bench);

  /** A choice is changed, with all that hangs on it. */
  const changing = <Step extends keyof Choices>(step: Step) =>
    guarded(async (part: Partial<Choices[Step]>) => {
      store.choose(step, part);
      store.choose('put', { question: null });
      store.change({ notice: null, survey: null });
      await readPointedAt(bench);
      await settle();
    });

  const changeMany = changing('many');

  function pickRun(key: number, isPicked: boolean): Promise<void> {
    const { table, run, many } = store.state;
    const keys = table && run ? pickedRuns(table, run, many).map((one) => one.key) : [];
    return changeMany({ picked: isPicked ? [...keys, key] : keys.filter((one) => one !== key) });
  }

  async function pointAt(what: 'cell' | 'selection', use: (name: string) => Promise<void>): Promise<void> {
    const selection = what === 'selection' ? await port.selection() : null;
    const area = selection?.area ?? (await port.activeCell());
    if (area) await use(areaName(area));
    else bench.notify('bad', 'no cell is active: click one in the sheet');
  }

  async function changeTarget(target: string): Promise<void> {
    store.choose('put', { target, isOwn: target.trim() !== '', question: null });
    if (target.trim() !== '') await settle();
  }

  return {
    chooseSelection: guarded(async () => {
      const block = await selectedBlock(bench);
      const problem = block
        ? take(bench, block)
        : 'select the columns of a run in the sheet: times, and readings beside them';
      if (problem) store.change({ hint: problem });
      else await settle();
    }),
    chooseProposal: guarded(async () => {
      const { proposal } = store.state;
      if (proposal) take(bench, proposal);
      await settle();
    }),
    changeRun: guarded(async (part) => {
      changeRun(bench, part);
      await settle();
    }),
    correctTable: guarded(async (part) => {
      correctTable(bench, part);
      await settle();
    }),
    openTask: guarded(async (task) => {
      store.change({ task, notice: null });
      store.choose('put', { isOwn: false, question: null });
      await settle();
    }),
    changeSignal: guarded(async (what) => {
      chooseSignal(bench, what);
      store.choose('put', { question: null });
      await settle();
    }),
    changeReading: changing('reading'),
    changeRate: changing('rate'),
    changeOrder: changing('order'),
    changeTemperature: changing('temperature'),
    changeLookup: changing('lookup'),
    changeMany,
    pickRun,
    surveyRuns: guarded(() => surveyRuns(bench, work)),
    stop() {
      work.stop();
      copying.stop();
    },
    pointAt: guarded(pointAt),
    changeTarget: guarded(changeTarget),
    targetActiveCell: guarded(() => pointAt('cell', changeTarget)),
    changeOptions: guarded(async (part) => {
      store.choose('put', { ...part, question: null });
      await settle();
    }),
    putIn: guarded(putIn),
    declineOverwrite: () => store.choose('put', { question: null }),
    undoLast: guarded(undoLast),
    makeCopy: guarded(copying.make),
    giveCopy: guarded(copying.give),
    copy: guarded(async (text) => {
      await navigator.clipboard.writeText(text);
      bench.notify('good', 'formula copied');
    }),
    follow,
    show: guarded(show),
    refresh: guarded(async () => {
      await reread(bench);
      await lookForProposal(bench);
      await readPointedAt(bench);
      await settle();
    }),
  };
}
