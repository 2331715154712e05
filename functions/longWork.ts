/**
 * Long calculations on a thread of their own, so that a sheet can be scrolled and typed into meanwhile. What
 * crosses between the threads is plain data; the functions are the same on both sides.
 */
import { callFunction } from './call';
import { functionNamed } from './catalogue';
import { CellError, isRange, type CellResult, type CellValue, type ErrorCode } from './cell';
import { typedName, type CellFunction } from './define';
import type { Progress } from '../src/progress';

/** Whatever does a function's work somewhere else. */
export interface LongWork {
  /** @param stop ends it: the answer is then an error that says so */
  run(f: CellFunction, args: readonly (CellResult | undefined)[], stop?: AbortSignal): Promise<CellResult>;
}

/** A long calculation while it runs. */
export interface Underway {
  /** As it is typed. */
  readonly name: string;
  /** How many others wait for it. */
  readonly waiting: number;
  /** Nothing where the function has not said. */
  readonly progress?: Progress;
  stop(): void;
}

type PlainCell = Exclude<CellValue, CellError> | { readonly code: ErrorCode; readonly message: string };
type Plain = PlainCell | readonly (readonly PlainCell[])[];

export interface Job {
  readonly id: number;
  readonly name: string;
  readonly args: readonly (Plain | undefined)[];
}

export interface Answer {
  readonly id: number;
  readonly result: Plain;
}

/** Of a job that is under way. */
export interface HowFar {
  readonly id: number;
  readonly progress: Progress;
}

const plainCell = (cell: CellValue): PlainCell =>
  cell instanceof CellError ? { code: cell.code, message: cell.message } : cell;

const toPlain = (result: CellResult): Plain =>
  isRange(result) ? result.map((row) => row.map(plainCell)) : plainCell(result);

const cellOf = (cell: PlainCell): CellValue =>
  typeof cell === 'object' && cell !== null ? new CellError(cell.code, cell.message) : cell;

const fromPlain = (plain: Plain): CellResult =>
  Array.isArray(plain)
    ? plain.map((row: readonly PlainCell[]) => row.map(cellOf))
    : cellOf(plain as PlainCell);

/** On the other thread: does a job. */
export function answerJob({ id, name, args }: Job, tell?: (howFar: HowFar) => void): Answer {
  const f = functionNamed(name);
  const result = f
    ? callFunction(
        f,
        args.map((argument) => (argument === undefined ? undefined : fromPlain(argument))),
        tell && ((progress) => tell({ id, progress })),
      )
    : new CellError('#NAME?', `there is no function ${name}`);
  return { id, result: toPlain(result) };
}

/** What a worker says first: that its script was found and runs. */
export const ready = 'ready';

/** The part of a browser's Worker that is used. */
export interface WorkerLike {
  postMessage(job: Job): void;
  terminate(): void;
  onmessage: ((event: { readonly data: Answer | HowFar | typeof ready }) => void) | null;
  onerror: ((event: unknown) => void) | null;
}

interface Waiting {
  readonly job: Job;
  readonly f: CellFunction;
  readonly args: readonly (CellResult | undefined)[];
  settle(result: CellResult): void;
}

export const stopped = (): CellError =>
  new CellError('#N/A', 'stopped before it was done: edit the cell to start again');

const brokeOff = (): CellError =>
  new CellError('#N/A', 'the calculation broke off, perhaps for want of memory: hand over fewer cells');

const patience = 15; // min

const tookTooLong = (): CellError =>
  new CellError('#N/A', `not done after ${patience} minutes, so it was ended: hand over fewer cells`);

/**
 * One job after another on one worker, which is started when first needed. A job that is stopped while it runs
 * takes its worker with it, as does one that breaks it or never ends; where none can be started the work is done
 * here after all. Every answer comes, as an error if need be.
 *
 * @param tell what is under way, at every start and as it goes on, and `null` when nothing is any more
 */
export function workerWork(
  startWorker: () => WorkerLike,
  tell: (underway: Underway | null) => void = () => undefined,
): LongWork {
  const queue: Waiting[] = [];
  let worker: WorkerLike | undefined;
  let current: Waiting | undefined;
  let watch: ReturnType<typeof setTimeout> | undefined;
  let isUseless = false; // no worker can be had on this page
  let lastId = 0;

  function next(): void {
    if (current) return;
    current = queue.shift();
    if (!current) return tell(null);
    const waiting = current;
    say(waiting);
    if (isUseless) return doHere(waiting);
    try {
      worker ??= started();
      worker.postMessage(waiting.job);
      watch = setTimeout(() => end(waiting, tookTooLong()), patience * 60_000);
    } catch {
      isUseless = true;
      doHere(waiting);
    }
  }

  const say = (waiting: Waiting, progress?: Progress): void =>
    tell({ name: typedName(waiting.f), waiting: queue.length, progress, stop: () => stop(waiting) });

  function started(): WorkerLike {
    const fresh = startWorker();
    let isReady = false;
    fresh.onmessage = ({ data }) => {
      if (data === ready) isReady = true;
      else if (current?.job.id !== data.id) return;
      else if ('progress' in data) say(current, data.progress);
      else finish(current, fromPlain(data.result));
    };
    fresh.onerror = () => {
      if (fresh !== worker) return;
      dismiss();
      isUseless = !isReady;
      if (current && isReady) finish(current, brokeOff());
      else if (current) doHere(current);
    };
    return fresh;
  }

  const doHere = (waiting: Waiting): void => finish(waiting, callFunction(waiting.f, waiting.args));

  function dismiss(): void {
    worker?.terminate();
    worker = undefined;
  }

  function finish(waiting: Waiting, result: CellResult): void {
    clearTimeout(watch);
    if (current === waiting) current = undefined;
    waiting.settle(result);
    next();
  }

  function stop(waiting: Waiting): void {
    const place = queue.indexOf(waiting);
    if (place >= 0) {
      queue.splice(place, 1);
      waiting.settle(stopped());
    } else if (current === waiting) end(waiting, stopped());
  }

  function end(waiting: Waiting, result: CellError): void {
    dismiss();
    finish(waiting, result);
  }

  return {
    run(f, args, signal) {
      return new Promise((settle) => {
        const plain = args.map((argument) => (argument === undefined ? undefined : toPlain(argument)));
        const waiting = { job: { id: ++lastId, name: f.name, args: plain }, f, args, settle };
        if (signal?.aborted) return settle(stopped());
        signal?.addEventListener('abort', () => stop(waiting), { once: true });
        queue.push(waiting);
        next();
      });
    },
  };
}
