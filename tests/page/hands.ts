/** The hands and eyes of a person at the pane of the page. */
import type { Locator } from 'playwright-core';
import type { BenchPage } from './bench';

export interface PageHands {
  pane(selector: string): Locator;
  press(label: RegExp | string): Promise<void>;
  /** Waits until it does. */
  says(selector: string, words: RegExp | string): Promise<void>;
  /** What a cell of the first sheet shows. */
  cell(reference: string): Promise<unknown>;
}

export function handsOn(sheet: () => BenchPage): PageHands {
  const pane = (selector: string): Locator => sheet().page.locator(`#pane ${selector}`);
  return {
    pane,
    press: (label) =>
      sheet().page.getByRole('complementary').getByRole('button', { name: label, exact: true }).click(),
    says: (selector, words) => pane(selector).filter({ hasText: words }).first().waitFor(),
    cell: async (reference) => (await sheet().cells(`'Gas run'!${reference}`))[0][0],
  };
}
