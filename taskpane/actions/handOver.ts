/** The copy for someone who installs nothing: made, looked at, given. */
import { Stopped, type CopyMaker } from '../copying';
import type { Bench } from './bench';

export interface HandingOver {
  make(): Promise<void>;
  give(): Promise<void>;
  stop(): void;
}

export function handingOver({ store, port: { files }, notify }: Bench, makeCopy?: CopyMaker): HandingOver {
  let stopper: AbortController | undefined;
  const doing = (words: string): void => store.change({ copying: { kind: 'making', doing: words } });

  async function make(): Promise<void> {
    if (!files || !makeCopy || store.state.copying?.kind === 'making') return;
    stopper = new AbortController();
    const { signal } = stopper;
    store.change({ notice: null });
    try {
      doing('reading the workbook');
      const { bytes, missing } = await files.read();
      if (signal.aborted) throw new Stopped();
      doing('calculating, and putting formulas into built-in functions');
      const copy = await makeCopy(bytes, signal);
      store.change({ copying: { kind: 'made', copy, at: new Date() } });
      if (missing) notify('bad', missing);
    } catch (error) {
      store.change({ copying: null });
      if (!(error instanceof Stopped)) throw new Error(`no copy was made: ${wordsOf(error)}`);
      notify('good', 'stopped: no copy was made, and the workbook is as it was');
    }
  }

  async function give(): Promise<void> {
    const { copying } = store.state;
    if (!files || copying?.kind !== 'made') return;
    try {
      const words = await files.give(copying.copy.bytes);
      if (words) notify('good', words);
    } catch (error) {
      throw new Error(`the copy could not be given: ${wordsOf(error)}`);
    }
  }

  return { make, give, stop: () => stopper?.abort() };
}

const wordsOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));
