import { checkRun, type Check } from './findings';
import { answerFor, type Answer } from './rateCall';
import type { State } from './store';

/** What the steps draw: the state, and what follows from it, worked out when a step asks for it. */
export interface Scene {
  readonly state: State;
  /** Each is `null` while there is no run. */
  readonly check: Check | null;
  readonly rate: Answer | null;
}

/** One for each pane: what rests on unchanged parts of the state is not calculated again. */
export function createScenes(): (state: State) => Scene {
  const check = remembered(checkRun);
  const rate = remembered(answerFor);
  return (state) => {
    const { table, run } = state;
    return {
      state,
      get check() {
        return table && run && check(table, run);
      },
      get rate() {
        return table && run && rate(table, run, state.rate);
      },
    };
  };
}

/** Asks again only when something that the answer rests on is another. */
export function remembered<On extends readonly unknown[], A>(ask: (...on: On) => A): (...on: On) => A {
  let last: { readonly on: On; readonly answer: A } | null = null;
  return (...on) => {
    const isKnown = last?.on.every((one, place) => one === on[place]);
    if (!last || !isKnown) last = { on, answer: ask(...on) };
    return last.answer;
  };
}
