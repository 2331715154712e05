/** The pane: draws the steps whenever something changes, and listens to the workbook. */
import { createActions, type Actions } from './actions';
import { h } from './h';
import type { CopyMaker } from './copying';
import { keepingFocus } from './keepFocus';
import { drawn } from './later';
import { patch } from './patch';
import type { WorkbookPort } from './port';
import type { Task } from './choices';
import { handOverStep } from './steps/handOver';
import { inCell } from './steps/inCell';
import { lookUpStep } from './steps/lookUp';
import { manyStep } from './steps/many';
import { orderStep } from './steps/order';
import { putInStep } from './steps/putIn';
import { rateStep } from './steps/rate';
import { readingStep } from './steps/reading';
import { runStep } from './steps/run';
import { temperatureStep } from './steps/temperature';
import { taskBar } from './steps/tasks';
import { createScenes, type Scene } from './scene';
import { createStore, type State } from './store';

export interface PaneOptions {
  /** Left out where nobody can make one. */
  readonly makeCopy?: CopyMaker;
  /** Shows a notice in the host's own way as well. */
  readonly notify?: (words: string, tone: 'good' | 'bad') => void;
}

/** @returns a function that takes the pane away again */
export function mountPane(
  root: HTMLElement,
  port: WorkbookPort,
  { makeCopy, notify }: PaneOptions = {},
): () => void {
  const store = createStore();
  const actions = createActions(store, port, makeCopy);
  const sceneOf = createScenes();
  const draw = (state: State): HTMLElement => view(sceneOf(state), actions, port);
  const pane = drawn(draw(store.state));
  root.replaceChildren(pane);

  let shown = store.state.notice;
  let isMounted = true;
  const redraw = onceSoon(() => {
    if (isMounted) keepingFocus(pane, () => patch(pane, draw(store.state)));
  });
  const stopWatching = store.watch((state) => {
    redraw();
    if (state.notice && state.notice !== shown) notify?.(state.notice.words, state.notice.tone);
    shown = state.notice;
  });
  const refresh = oneAtATime(() => actions.refresh());
  const stops = [port.onSelectionChange(refresh), port.onActiveCell(actions.follow)];
  window.addEventListener('focus', refresh);
  refresh();

  return () => {
    isMounted = false;
    stopWatching();
    stops.forEach((stop) => stop());
    window.removeEventListener('focus', refresh);
    root.replaceChildren();
  };
}

/** However many changes come at one go, what follows from them is done once, before anything is shown. */
function onceSoon(act: () => void): () => void {
  let isDue = false;
  return () => {
    if (isDue) return;
    isDue = true;
    queueMicrotask(() => {
      isDue = false;
      act();
    });
  };
}

/** While one look at the sheet is under way, however many are asked for make one more. */
function oneAtATime(look: () => Promise<void>): () => void {
  let isLooking = false;
  let isAskedAgain = false;
  return async function ask(): Promise<void> {
    isAskedAgain = isLooking;
    if (isLooking) return;
    isLooking = true;
    await look();
    isLooking = false;
    if (isAskedAgain) await ask();
  };
}

/** What the views show of the workbook's host; they ask nothing of it. */
type Host = Pick<WorkbookPort, 'host' | 'remark' | 'files' | 'canChart'>;

type Step = (scene: Scene, actions: Actions, host: Host) => HTMLElement;

const steps: Readonly<Record<Task, Step>> = {
  reading: readingStep,
  rate: rateStep,
  order: orderStep,
  many: manyStep,
  temperature: temperatureStep,
  handOver: ({ state }, actions, { files }) => handOverStep(state, files, actions),
  lookUp: lookUpStep,
};

export function view(scene: Scene, actions: Actions, host: Host): HTMLElement {
  const { notice, task } = scene.state;
  return h(
    'div',
    { className: 'flaskpace' },
    h('header', {}, h('h1', {}, 'Flaskpace'), h('p', {}, host.host)),
    host.remark !== undefined && h('p', { className: 'hint' }, host.remark),
    inCell(scene.state.chosen, actions),
    runStep(scene, actions),
    taskBar(task, actions),
    steps[task](scene, actions, host),
    task !== 'handOver' && putInStep(scene, actions, host.canChart),
    h('p', { className: `notice ${notice?.tone ?? ''}`, role: 'status' }, notice?.words ?? ''),
  );
}
