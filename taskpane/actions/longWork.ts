/** Work on many things, one after another: the pane stays alive between them, and it can be stopped. */
import type { Bench } from './bench';

export interface LongWork {
  /** @returns whether it came to its end */
  through<T>(what: string, things: readonly T[], each: (thing: T) => void | Promise<void>): Promise<boolean>;
  stop(): void;
}

/** So long may a stretch of work keep the pane from answering. */
const longestStretch = 40; // ms

export function longWork({ store }: Pick<Bench, 'store'>): LongWork {
  let mine = 0; // a stop, or other long work, ends what was under way
  const breathe = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));
  return {
    async through(what, things, each) {
      const turn = ++mine;
      const show = (done: number): void => store.change({ progress: { what, done, of: things.length } });
      show(0);
      let since = performance.now();
      try {
        for (const [place, thing] of things.entries()) {
          if (performance.now() - since > longestStretch) {
            show(place);
            await breathe();
            since = performance.now();
          }
          if (turn !== mine) return false;
          await each(thing);
        }
        return true;
      } finally {
        if (turn === mine || store.state.progress?.what === what) store.change({ progress: null });
      }
    },
    stop: () => void mine++,
  };
}
