/** The pane over a workbook in memory, and the hands of a person. */
import { mountPane, type PaneOptions } from '../../taskpane/pane';
import type { WorkbookPort } from '../../taskpane/port';
import { memoryWorkbook, type MemoryWorkbook, type Sheets } from './memoryPort';

/** A person at the pane. */
export interface PaneHands {
  readonly root: HTMLElement;
  find<E extends HTMLElement>(selector: string): E;
  text(selector: string): string;
  type(selector: string, typed: string): Promise<void>;
  choose(selector: string, value: string): Promise<void>;
  /** The first button whose words begin so. */
  press(label: string): Promise<void>;
  tick(selector: string): Promise<void>;
  settled(): Promise<void>;
  close(): void;
}

export interface PaneBench extends PaneHands {
  readonly book: MemoryWorkbook;
}

const settled = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 5));

export async function openPane(sheets: Sheets, at: string): Promise<PaneBench> {
  const book = memoryWorkbook(sheets);
  book.select(at);
  return { book, ...(await openPaneOver(book.port)) };
}

export async function openPaneOver(port: WorkbookPort, options?: PaneOptions): Promise<PaneHands> {
  const root = document.createElement('main');
  document.body.append(root);
  const unmount = mountPane(root, port, options);
  await settled();

  const find = <E extends HTMLElement>(selector: string): E => {
    const found = root.querySelector<E>(selector);
    if (!found) throw new Error(`nothing is ${selector} in: ${root.textContent}`);
    return found;
  };
  const send = async (element: HTMLElement, event: string): Promise<void> => {
    element.dispatchEvent(new Event(event, { bubbles: true }));
    await settled();
  };
  return {
    root,
    find,
    text: (selector) => find(selector).textContent ?? '',
    async type(selector, typed) {
      const input = find<HTMLInputElement>(selector);
      input.value = typed;
      await send(input, 'input');
    },
    async choose(selector, value) {
      const select = find<HTMLSelectElement>(selector);
      select.value = value;
      await send(select, 'change');
    },
    async press(label) {
      const buttons = [...root.querySelectorAll('button')];
      const button = buttons.find((one) => one.textContent!.startsWith(label));
      if (!button)
        throw new Error(`no button "${label}" among: ${buttons.map((b) => b.textContent).join(', ')}`);
      button.click();
      await settled();
    },
    async tick(selector) {
      find(selector).click();
      await settled();
    },
    settled,
    close() {
      unmount();
      root.remove();
    },
  };
}
