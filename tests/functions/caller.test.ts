import { sharingCaller } from '../../functions/caller';
import { CellError, type CellResult } from '../../functions/cell';
import { defineFunction, type CellFunction } from '../../functions/define';
import type { LongWork } from '../../functions/longWork';
import { number, optional, readings } from '../../functions/parameters';
import { Call } from '../../functions/sameCall';
import { callIn } from '../support/literal';

/** A function that counts how often it is worked out: it answers its first number. */
function counting(isLong?: CellFunction['isLong']): { f: CellFunction; times(): number } {
  let times = 0;
  const f = defineFunction({
    name: 'COUNTED',
    family: 'rate',
    summary: '',
    method: '',
    parameters: { x: readings({ help: '' }), y: optional(number({ help: '' })) },
    result: { unit: '1', shape: 'one value' },
    example: { formula: '', equals: 0 },
    uncertainty: '',
    reference: '',
    seeAlso: [],
    ...(isLong === undefined ? {} : { isLong }),
    run: ({ x }) => {
      times++;
      return x.numbers[0];
    },
  });
  return { f, times: () => times };
}

/** Another place where work is done: it ends when it is told to, in any order. */
function elsewhere() {
  const jobs: { args: readonly unknown[]; stop?: AbortSignal; end(result: CellResult): void }[] = [];
  const longWork: LongWork = {
    run: (_, args, stop) => new Promise((end) => jobs.push({ args, stop, end })),
  };
  return { jobs, caller: sharingCaller(longWork) };
}

const run = (): number[][] => [[1], [2], [3]];

describe('calls with equal arguments are one', () => {
  const same = (a: string, b: string): boolean => {
    const [one, other] = [callIn(a), callIn(b)].map(({ f, args }) => new Call(f, args));
    return one.equals(other) && one.print === other.print;
  };
  test.each([
    ['=PACE.EVENT({40;25})', '=PACE.EVENT({40;25})'],
    ['=PACE.EVENT({40;"a";;TRUE;#N/A},2)', '=PACE.EVENT({40;"a";;TRUE;#N/A},2)'],
    ['=PACE.EVENT({0;1})', '=PACE.EVENT({-0;1})'],
  ])('%s is %s', (a, b) => expect(same(a, b)).toBe(true));
  test.each([
    ['=PACE.EVENT({40;25})', '=PACE.EVENT({40;26})'],
    ['=PACE.EVENT({40;25})', '=PACE.EVENT({40,25})'],
    ['=PACE.EVENT({40;25})', '=PACE.EVENT({40;"25"})'],
    ['=PACE.EVENT({40;1})', '=PACE.EVENT({40;TRUE})'],
    ['=PACE.EVENT({40;})', '=PACE.EVENT({40;0})'],
    ['=PACE.EVENT({40;#N/A})', '=PACE.EVENT({40;#REF!})'],
    ['=PACE.EVENT({40;#N/A})', '=PACE.EVENT({40;"#N/A"})'],
    ['=PACE.EVENT({40;25},,-1)', '=PACE.EVENT({40;25},-1)'],
    ['=PACE.HALVINGS({1;2},{3;4})', '=PACE.CHECK({1;2},{3;4})'],
  ])('%s is not %s', (a, b) => expect(same(a, b)).toBe(false));
});

test('what was just asked is not worked out again', () => {
  const { f, times } = counting();
  const caller = sharingCaller();
  expect([caller.call(f, [run()]), caller.call(f, [run()]), caller.call(f, [run(), 2])]).toEqual([1, 1, 1]);
  expect(times()).toBe(2);
});

test('an error is an answer, too', () => {
  const { f } = counting();
  const caller = sharingCaller();
  const refused = caller.call(f, [run(), 'x']);
  expect(refused).toMatchObject({ code: '#VALUE!' });
  expect(caller.call(f, [run(), 'x'])).toBe(refused);
});

test('all is let go when nobody has asked for a while, and while somebody asks nothing is', () => {
  jest.useFakeTimers();
  try {
    const { f, times } = counting();
    const caller = sharingCaller();
    for (let second = 0; second < 60; second++) {
      caller.call(f, [run()]);
      jest.advanceTimersByTime(1_000);
    }
    expect(times()).toBe(1);
    jest.advanceTimersByTime(10_000);
    expect(jest.getTimerCount()).toBe(0);
    caller.call(f, [run()]);
    expect(times()).toBe(2);
  } finally {
    jest.useRealTimers();
  }
});

test('what is kept is bounded: many large calls push earlier ones out', () => {
  const { f, times } = counting();
  const caller = sharingCaller();
  const large = (first: number): number[][] => Array.from({ length: 30_000 }, (_, i) => [first + i]);
  for (let first = 0; first < 10; first++) caller.call(f, [large(first)]);
  caller.call(f, [large(0)]);
  expect(times()).toBe(11);
  caller.call(f, [large(0)]);
  expect(times()).toBe(11);
});

describe('long work', () => {
  const { f } = counting(true);

  test('is done elsewhere, once for all who ask while it lasts and for those who ask after', async () => {
    const { caller, jobs } = elsewhere();
    const asked = [caller.call(f, [run()]), caller.call(f, [run()])];
    expect(jobs).toHaveLength(1);
    jobs[0].end([[7]]);
    expect(await Promise.all(asked)).toEqual([[[7]], [[7]]]);
    expect(caller.call(f, [run()])).toEqual([[7]]);
    expect(jobs).toHaveLength(1);
  });

  test('may end in any order', async () => {
    const { caller, jobs } = elsewhere();
    const [first, second] = [caller.call(f, [[[1]]]), caller.call(f, [[[2]]])];
    jobs[1].end(22);
    expect(await second).toBe(22);
    jobs[0].end(11);
    expect(await first).toBe(11);
  });

  test('goes on while one of those who asked still waits, and is stopped with the last', async () => {
    const { caller, jobs } = elsewhere();
    const stops = [new AbortController(), new AbortController()];
    const asked = stops.map(({ signal }) => caller.call(f, [run()], signal));
    stops[0].abort();
    expect(await asked[0]).toMatchObject({ code: '#N/A', message: expect.stringContaining('stopped') });
    expect(jobs[0].stop!.aborted).toBe(false);
    stops[1].abort();
    expect(await asked[1]).toMatchObject({ code: '#N/A' });
    expect(jobs[0].stop!.aborted).toBe(true);
    const again = caller.call(f, [run()]); // nobody gets the answer of work that was stopped
    expect(jobs).toHaveLength(2);
    jobs[0].end(new CellError('#N/A', 'stopped'));
    jobs[1].end(5);
    expect(await again).toBe(5);
  });

  test('that failed is tried anew', async () => {
    const { caller, jobs } = elsewhere();
    const first = caller.call(f, [run()]);
    jobs[0].end(new CellError('#N/A', 'stopped'));
    expect(await first).toBeInstanceOf(CellError);
    void caller.call(f, [run()]);
    expect(jobs).toHaveLength(2);
  });

  test('that nobody wants any more never starts', async () => {
    const { caller, jobs } = elsewhere();
    expect(await caller.call(f, [run()], AbortSignal.abort())).toBeInstanceOf(CellError);
    expect(jobs).toHaveLength(0);
  });

  test('can depend on how many cells come in', () => {
    const { caller, jobs } = elsewhere();
    const grows = counting({ fromCells: 3 });
    expect(caller.call(grows.f, [[[1], [2]]])).toBe(1);
    expect(caller.call(grows.f, [run()])).toBeInstanceOf(Promise);
    expect(jobs).toHaveLength(1);
    expect([caller.mayBePromise(grows.f), caller.mayBePromise(counting().f)]).toEqual([true, false]);
    expect(sharingCaller().mayBePromise(grows.f)).toBe(false);
  });
});
