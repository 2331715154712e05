/** All that the pane knows, in one place. Views draw it, actions change it. */
import type { CellRange } from '../functions/cell';
import type { Surveyed } from './calls/many';
import { firstChoices, type Choices, type Task } from './choices';
import type { HandedCopy } from './copying';
import type { RangeReading, SheetArea, WriteReceipt } from './port';
import type { Run, Table } from './runs';

export interface Notice {
  readonly tone: 'good' | 'bad';
  readonly words: string;
}

/** Long work under way. */
export interface Progress {
  readonly what: string;
  readonly done: number;
  readonly of: number;
}

/** What a survey in the pane has found so far. */
export interface Survey {
  readonly rows: readonly Surveyed[];
  readonly isWhole: boolean;
}

/** The copy for someone who installs nothing: on its way, or made. */
export type Copying =
  | { readonly kind: 'making'; readonly doing: string }
  | { readonly kind: 'made'; readonly copy: HandedCopy; readonly at: Date };

/** What was written at one go, and what the pane was about before: both can be brought back. */
export interface Deed {
  readonly description: string;
  /** All that it filled. */
  readonly area: SheetArea;
  readonly receipts: readonly WriteReceipt[];
  readonly before: Pick<State, 'table' | 'run' | 'reading'>;
}

/** A formula of ours in the active cell, or being typed there. */
export interface Chosen {
  readonly formula: string;
  readonly at: SheetArea;
}

export interface State extends Choices {
  readonly table: Table | null;
  readonly run: Run | null;
  /** A block in the sheet that could become the run, and is not yet. */
  readonly proposal: RangeReading | null;
  /** Why what is selected is no run; empty when there is nothing to say. */
  readonly hint: string;
  readonly chosen: Chosen | null;
  readonly task: Task;
  /** What stands in the cells that fields point at, by their full names: `'Gas run'!E3`. */
  readonly pointedAt: ReadonlyMap<string, CellRange>;
  readonly survey: Survey | null;
  readonly progress: Progress | null;
  readonly copying: Copying | null;
  readonly deeds: readonly Deed[];
  readonly notice: Notice | null;
}

export const firstState: State = {
  ...firstChoices,
  table: null,
  run: null,
  proposal: null,
  hint: '',
  chosen: null,
  task: 'rate',
  pointedAt: new Map(),
  survey: null,
  progress: null,
  copying: null,
  deeds: [],
  notice: null,
};

export interface Store {
  readonly state: State;
  change(part: Partial<State>): void;
  /** Changes some of the choices made at one step. */
  choose<Step extends keyof Choices>(step: Step, part: Partial<Choices[Step]>): void;
  /** @returns a function that stops watching */
  watch(watcher: (state: State) => void): () => void;
}

export function createStore(initial: State = firstState): Store {
  let state = initial;
  const watchers = new Set<(state: State) => void>();
  const change = (part: Partial<State>): void => {
    state = { ...state, ...part };
    for (const watcher of watchers) watcher(state);
  };
  return {
    get state() {
      return state;
    },
    change,
    choose: (step, part) => change({ [step]: { ...state[step], ...part } }),
    watch(watcher) {
      watchers.add(watcher);
      return () => watchers.delete(watcher);
    },
  };
}
