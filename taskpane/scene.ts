import { answerFor, type Answer } from './rateCall';
import type { State } from './store';

/** What the steps draw: the state, and what follows from it. */
export interface Scene {
  readonly state: State;
  /** `null` while there is no run. */
  readonly answer: Answer | null;
}

type Question = Pick<State, 'table' | 'run' | 'rate'>;

export const answerOf = ({ table, run, rate }: Question): Answer | null =>
  table && run ? answerFor(table, run, rate) : null;

/** A redraw that leaves run and rate as they were does not calculate again. */
export function remembering(
  ask: (question: Question) => Answer | null,
): (question: Question) => Answer | null {
  let last: (Question & { readonly answer: Answer | null }) | null = null;
  return ({ table, run, rate }) => {
    const isKnown = last && last.table === table && last.run === run && last.rate === rate;
    if (!last || !isKnown) last = { table, run, rate, answer: ask({ table, run, rate }) };
    return last.answer;
  };
}
