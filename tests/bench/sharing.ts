/** What sharing saves where cells ask the same, and what it costs where none do. */
import { callFunction } from '../../functions/call';
import { sharingCaller, type Caller } from '../../functions/caller';
import { functionNamed } from '../../functions/catalogue';
import { series } from './fits';

const alone: Pick<Caller, 'call'> = { call: (f, args) => callFunction(f, args) };
const asCells = (numbers: Iterable<number>): number[][] => Array.from(numbers, (number) => [number]);
const runs = series.map(({ times, values }) => [asCells(times), asCells(values)] as const);

interface Asked {
  readonly name: string;
  /** After times and values. */
  readonly rest: readonly (number | string)[];
}

/** The quickest of five rounds in which so many cells ask of each run. */
function secondsFor({ name, rest }: Asked, askers: number, makeCaller: () => Pick<Caller, 'call'>): number {
  const f = functionNamed(name)!;
  let best = Infinity;
  for (let round = 0; round < 5; round++) {
    const caller = makeCaller();
    const start = performance.now();
    for (const run of runs) {
      for (let asker = 0; asker < askers; asker++) void caller.call(f, [...run, ...rest]);
    }
    best = Math.min(best, (performance.now() - start) / 1000);
  }
  return best;
}

const asked: readonly Asked[] = [
  { name: 'COEFFICIENT', rest: [1, 'free'] },
  { name: 'NORMALTIME', rest: [1] },
];

export function benchSharing(): void {
  for (const call of asked) {
    for (const askers of [20, 1]) {
      const ratio = secondsFor(call, askers, () => alone) / secondsFor(call, askers, () => sharingCaller());
      const who = `PACE.${call.name}, ${askers} cells asking of each run`;
      console.log(`${who.padEnd(52)}${ratio.toFixed(1).padStart(5)} × as fast as each for itself`);
    }
  }
}
