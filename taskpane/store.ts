/** All that the pane knows, in one place. Views draw it, actions change it. */
import type { RangeReading, WriteReceipt } from './port';
import type { Run, Table } from './runs';

export type RateKind = 'average' | 'tangent' | 'column';

/** What was chosen for the rate, as typed: an empty field is an argument left out. */
export interface RateChoice {
  readonly kind: RateKind;
  readonly from: string;
  readonly to: string;
  readonly time: string;
  readonly points: string;
  readonly degree: string;
  readonly coefficient: string;
}

export interface PutChoice {
  /** As typed: `'Gas run'!E3`. */
  readonly target: string;
  /** Once the person has typed a target, the pane stops proposing others. */
  readonly isOwn: boolean;
  readonly withHeading: boolean;
  readonly withDetail: boolean;
  /** Cells to be filled that hold something now. */
  readonly inUse: readonly string[];
  /** The person has asked to write: say yes or no to these cells. */
  readonly question: readonly string[] | null;
}

export interface Notice {
  readonly tone: 'good' | 'bad';
  readonly words: string;
}

export interface State {
  readonly table: Table | null;
  readonly run: Run | null;
  /** A block in the sheet that could become the run, and is not yet. */
  readonly proposal: RangeReading | null;
  /** Why what is selected is no run; empty when there is nothing to say. */
  readonly hint: string;
  readonly rate: RateChoice;
  readonly put: PutChoice;
  readonly receipts: readonly WriteReceipt[];
  readonly notice: Notice | null;
}

export const firstState: State = {
  table: null,
  run: null,
  proposal: null,
  hint: '',
  rate: { kind: 'tangent', from: '', to: '', time: '', points: '', degree: '', coefficient: '' },
  put: { target: '', isOwn: false, withHeading: true, withDetail: false, inUse: [], question: null },
  receipts: [],
  notice: null,
};

export interface Store {
  readonly state: State;
  change(part: Partial<State>): void;
  changeRate(part: Partial<RateChoice>): void;
  changePut(part: Partial<PutChoice>): void;
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
    changeRate: (part) => change({ rate: { ...state.rate, ...part } }),
    changePut: (part) => change({ put: { ...state.put, ...part } }),
    watch(watcher) {
      watchers.add(watcher);
      return () => watchers.delete(watcher);
    },
  };
}
