/**
 * How a workbook calls the functions: what has just been asked with equal arguments is not worked out again, and
 * what takes long is done elsewhere. A fit that twenty cells ask for is done once.
 */
import { callFunction } from './call';
import { CellError, isRange, type CellResult } from './cell';
import type { CellFunction } from './define';
import { stopped, type LongWork } from './longWork';
import { RecentAnswers } from './recentAnswers';
import { Call, CallTable, cellsIn, type Arguments } from './sameCall';

export interface Caller {
  /**
   * @param stop ends the waiting of this asker, and the work once nobody waits for it
   * @returns the answer; where it is worked out elsewhere, a promise of it, which is always kept
   */
  call(f: CellFunction, args: Arguments, stop?: AbortSignal): CellResult | Promise<CellResult>;
  /** Whether any call of it is answered by a promise. */
  mayBePromise(f: CellFunction): boolean;
}

/** Whether any call of it can take long. */
export const mayBeLong = (f: CellFunction): boolean => f.isLong !== undefined;

const isLong = ({ isLong: from }: CellFunction, args: Arguments): boolean =>
  typeof from === 'object' ? cellsIn(args) >= from.fromCells : from === true;

/** @param longWork where long calculations are done; left out, with all others */
export function sharingCaller(longWork?: LongWork): Caller {
  const recent = new RecentAnswers();
  const underway = new CallTable<SharedWork>();

  function workElsewhere(call: Call, { run }: LongWork): SharedWork {
    const work = new SharedWork((stop) => run(call.f, call.args, stop));
    const forget = (): void => {
      if (underway.find(call) === work) underway.delete(call);
    };
    underway.set(call, work);
    work.onDeserted = forget;
    void work.answer.then((answer) => {
      forget();
      if (!(answer instanceof CellError)) recent.keep(call, answer); // an error may mean that it was stopped
    });
    return work;
  }

  return {
    mayBePromise: (f) => longWork !== undefined && mayBeLong(f),
    call(f, args, stop) {
      // where a number or two go in, looking up would take as long as working out
      if (!mayBeLong(f) && !args.some((argument) => isRange(argument))) return callFunction(f, args);
      const call = new Call(f, args);
      const known = recent.find(call);
      if (known !== undefined) return known;
      if (longWork && isLong(f, args)) {
        if (stop?.aborted) return stopped();
        return (underway.find(call) ?? workElsewhere(call, longWork)).answerFor(stop);
      }
      const answer = callFunction(f, args);
      recent.keep(call, answer);
      return answer;
    },
  };
}

/** One calculation that several cells wait for; it is stopped when the last of them has gone. */
class SharedWork {
  readonly answer: Promise<CellResult>;
  onDeserted = (): void => undefined;
  private readonly stop = new AbortController();
  private waiting = 0;

  constructor(start: (stop: AbortSignal) => Promise<CellResult>) {
    this.answer = start(this.stop.signal);
  }

  answerFor(signal: AbortSignal | undefined): Promise<CellResult> {
    this.waiting++;
    if (!signal) return this.answer;
    return new Promise((settle) => {
      const leave = (): void => {
        settle(stopped());
        this.waiting--;
        if (this.waiting > 0) return;
        this.onDeserted(); // who asks from now on begins anew
        this.stop.abort();
      };
      signal.addEventListener('abort', leave, { once: true });
      void this.answer.then((answer) => {
        signal.removeEventListener('abort', leave);
        settle(answer);
      });
    });
  }
}
