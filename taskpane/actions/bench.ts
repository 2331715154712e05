/** What every action works with. */
import type { WorkbookPort } from '../port';
import type { Notice, Store } from '../store';

export interface Bench {
  readonly store: Store;
  readonly port: WorkbookPort;
  notify(tone: Notice['tone'], words: string): void;
}

const said = (error: unknown): string => (error instanceof Error ? error.message : String(error));

export function benchOf(store: Store, port: WorkbookPort): Bench {
  return { store, port, notify: (tone, words) => store.change({ notice: { tone, words } }) };
}

/** What goes wrong on the way to the workbook is said, not thrown into the void. */
export const guardedBy =
  ({ notify }: Bench) =>
  <A extends unknown[]>(action: (...given: A) => Promise<void>) =>
  async (...given: A): Promise<void> => {
    try {
      await action(...given);
    } catch (error) {
      notify('bad', said(error));
    }
  };
