import { sharingCaller } from '../../functions/caller';
import { functionNamed } from '../../functions/catalogue';
import { CellError, type CellResult } from '../../functions/cell';
import {
  answerJob,
  ready,
  workerWork,
  type Answer,
  type Job,
  type WorkerLike,
} from '../../functions/longWork';
import { excelHandler } from '../../functions/runtime';
import type { Progress } from '../../src/progress';

/** A worker that answers when it is told to; what crosses is cloned, as between threads. */
function fakeWorkers() {
  const workers: { worker: WorkerLike; jobs: Job[]; isEnded: boolean }[] = [];
  return {
    workers,
    start(): WorkerLike {
      const entry = {
        jobs: [] as Job[],
        isEnded: false,
        worker: {
          postMessage: (job: Job) => void entry.jobs.push(structuredClone(job)),
          terminate: () => void (entry.isEnded = true),
          onmessage: null,
          onerror: null,
        } as WorkerLike,
      };
      workers.push(entry);
      return entry.worker;
    },
    answer(which = 0): void {
      const { worker, jobs } = workers[which];
      const answer = answerJob(jobs.shift()!, (howFar) =>
        worker.onmessage!({ data: structuredClone(howFar) }),
      );
      worker.onmessage!({ data: structuredClone<Answer>(answer) });
    },
  };
}

const event = functionNamed('EVENT')!;
const planned = functionNamed('PLAN')!;

test('a job crosses to the worker and its answer comes back, errors in cells with their words', async () => {
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const answer = work.run(event, [[[40], [new CellError('#DIV/0!', 'their own words')], [25]]]);
  fake.answer();
  expect(await answer).toEqual([[0.025], [new CellError('#DIV/0!', 'their own words')], [0.04]]);
});

test('an error as the whole answer keeps its words', async () => {
  const fake = fakeWorkers();
  const answer = workerWork(fake.start).run(event, [0]);
  fake.answer();
  expect(await answer).toEqual(new CellError('#VALUE!', 'times must be above 0: row 1 (0)'));
});

test('jobs wait for each other on one worker', async () => {
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const answers = [work.run(event, [40]), work.run(event, [50])];
  expect(fake.workers).toHaveLength(1);
  expect(fake.workers[0].jobs).toHaveLength(1);
  fake.answer();
  expect(await answers[0]).toEqual([[0.025]]);
  fake.answer();
  expect(await answers[1]).toEqual([[0.02]]);
});

test('a job that is stopped while it runs takes its worker with it, and the next gets a new one', async () => {
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const stop = new AbortController();
  const first = work.run(event, [40], stop.signal);
  const second = work.run(event, [50]);
  stop.abort();
  expect(await first).toMatchObject({ code: '#N/A', message: expect.stringContaining('stopped') });
  expect(fake.workers[0].isEnded).toBe(true);
  fake.answer(1);
  expect(await second).toEqual([[0.02]]);
});

test('a job that is stopped while it waits never starts', async () => {
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const stop = new AbortController();
  const first = work.run(event, [40]);
  const second = work.run(event, [50], stop.signal);
  stop.abort();
  expect(await second).toBeInstanceOf(CellError);
  fake.answer();
  expect(await first).toEqual([[0.025]]);
  expect(fake.workers[0].jobs).toHaveLength(0);
  expect(await work.run(event, [50], AbortSignal.abort())).toBeInstanceOf(CellError);
});

test('where no worker can be started, or it breaks, the work is done here', async () => {
  const refused = workerWork(() => {
    throw new Error('no workers on this page');
  });
  expect(await refused.run(event, [40])).toEqual([[0.025]]);
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const answer = work.run(event, [40]);
  fake.workers[0].worker.onerror!(new Error('script not found'));
  expect(await answer).toEqual([[0.025]]);
});

test('a job that breaks a worker which has run is an error with words, and the next gets a new worker', async () => {
  const fake = fakeWorkers();
  const work = workerWork(fake.start);
  const [first, second] = [work.run(event, [40]), work.run(event, [50])];
  fake.workers[0].worker.onmessage!({ data: ready });
  fake.workers[0].worker.onerror!(new Error('out of memory'));
  expect(await first).toMatchObject({ code: '#N/A', message: expect.stringContaining('broke off') });
  expect(fake.workers[0].isEnded).toBe(true);
  fake.answer(1);
  expect(await second).toEqual([[0.02]]);
});

test('a job that never ends is ended, and the next gets a new worker', async () => {
  jest.useFakeTimers();
  try {
    const fake = fakeWorkers();
    const work = workerWork(fake.start);
    const [first, second] = [work.run(event, [40]), work.run(event, [50])];
    jest.advanceTimersByTime(15 * 60_000);
    expect(await first).toMatchObject({
      code: '#N/A',
      message: expect.stringMatching(/^not done after 15 min/),
    });
    expect(fake.workers[0].isEnded).toBe(true);
    fake.answer(1);
    expect(await second).toEqual([[0.02]]);
    expect(jest.getTimerCount()).toBe(0);
  } finally {
    jest.useRealTimers();
  }
});

test('Excel gets a promise for a long function, and its cancelling stops the work', async () => {
  class ExcelError {
    constructor(
      readonly code: string,
      readonly message?: string,
    ) {}
  }
  const fake = fakeWorkers();
  const host = { associate: () => undefined, Error: ExcelError };
  const call = excelHandler(planned, host, { caller: sharingCaller(workerWork(fake.start)) });
  const invocation: { onCanceled?: () => void } = {};
  const first = call(1, 0.1, 1, 0.01, 1, null, invocation) as Promise<unknown>;
  fake.answer();
  expect((await first) as unknown[][]).toHaveLength(2);
  const second = call(1, 0.2, 1, 0.01, 1, null, invocation) as Promise<unknown>;
  invocation.onCanceled!();
  await expect(second).rejects.toMatchObject({ code: '#N/A' });
});

test('what is under way is told, with a way to stop it', async () => {
  const fake = fakeWorkers();
  const told: (string | null)[] = [];
  let stop = (): void => undefined;
  const work = workerWork(fake.start, (underway) => {
    told.push(underway && `${underway.name} and ${underway.waiting} more`);
    if (underway) stop = underway.stop;
  });
  const answers = [work.run(event, [40]), work.run(planned, [1, 0.1, 1, 0.01, 1])];
  fake.answer();
  stop();
  expect(await answers[1]).toMatchObject({ code: '#N/A' });
  expect(told).toEqual(['PACE.EVENT and 0 more', 'PACE.PLAN and 0 more', null]);
});

/** All that a function says of itself while it works out its answer. */
async function saidBy(name: string, args: readonly CellResult[]): Promise<(Progress | undefined)[]> {
  const fake = fakeWorkers();
  const said: (Progress | undefined)[] = [];
  const work = workerWork(fake.start, (underway) => underway && said.push(underway.progress));
  const answer = work.run(functionNamed(name)!, args);
  fake.answer();
  expect(await answer).not.toBeInstanceOf(CellError);
  return said;
}

test('a survey tells which run it is at, and the share of runs that are done', async () => {
  const times = [[0], [10], [20], [30], [40]];
  const block = times.map(([t]) => [1, 2, 3, 4].map((half) => 8 * 0.5 ** (t / (10 * half))));
  expect(await saidBy('SURVEY', [times, block, 1])).toEqual([
    undefined,
    { doing: 'run 1 of 4', share: 0 },
    { doing: 'run 2 of 4', share: 0.25 },
    { doing: 'run 3 of 4', share: 0.5 },
    { doing: 'run 4 of 4', share: 0.75 },
  ]);
});

test('a course tells the time that it has come to', async () => {
  // two species that chase each other for long
  const said = await saidBy('COURSE', [
    'X -> 2 X; X + Y -> 2 Y; Y ->',
    [[1], [1], [1]],
    [[1], [0.5]],
    [[500]],
  ]);
  const shares = said.slice(1).map((one) => one!.share!);
  expect(shares.length).toBeGreaterThan(3);
  expect(shares).toEqual([...shares].sort((a, b) => a - b));
  expect(shares[0]).toBeGreaterThan(0);
  expect(shares.at(-1)).toBeLessThan(1);
  said.slice(1).forEach((one) => expect(one!.doing).toMatch(/^at time [\d.]+ of 500$/));
  expect(Number(said.at(-1)!.doing.split(' ')[2]) / 500).toBeCloseTo(shares.at(-1)!, 2);
});

test('a search says what it does, and pretends to no share', async () => {
  const times = [[0], [5], [10], [20], [30]];
  const observed = times.map(([t], i) => [8 * Math.exp(-0.07 * t) + 0.01 * (-1) ** i, null]);
  const said = await saidBy('FITCOURSE', ['A -> B', [[0.1]], [[8], [0]], times, observed, true]);
  expect(said.slice(1).map((one) => one!.doing)).toEqual([
    'searching from the coefficients given',
    'searching from coefficients that suit the run',
    'fitting to the last digits',
    'limits of coefficient 1 of 1',
  ]);
  const planning = await saidBy('PLAN', [1, 0.1, 1, 0.01, 4, 2]);
  expect(planning[1]!.doing).toMatch(/^moving readings to where the orders differ most/);
  for (const one of [...said, ...planning]) expect(one?.share).toBeUndefined();
});
