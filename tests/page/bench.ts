/** The page as people get it: built, served by the real command, shown in a real browser. */
import { execFileSync, spawn, type ChildProcess } from 'node:child_process';
import { join } from 'node:path';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { parseArea } from '../../functions/address';
import type { CellRange } from '../../functions/cell';
import { demoWorkbook } from '../../workbook/demo/demo';
import type { BookModel, CellModel } from '../../workbook/engine/engine';
import type { Scripting } from '../../workbook/page/scripting';
import { launchBrowser } from './browser';

/** A machine with much else to do takes its time. */
jest.setTimeout(60_000);

const root = join(__dirname, '..', '..');

declare global {
  interface Window {
    readonly flaskpace: Scripting;
  }
}

export interface PageBench {
  readonly address: string;
  readonly browser: Browser;
  /** A page of its own, ready to be worked with. */
  open(options?: BrowserContextOptions): Promise<BenchPage>;
  close(): Promise<void>;
}

export interface BenchPage {
  readonly page: Page;
  /** What went wrong in it so far, and what it asked of other addresses. */
  readonly complaints: readonly string[];
  cells(reference: string): Promise<CellRange>;
  /** Clicks into the cell, types, and confirms with Enter. */
  type(reference: string, typed: string): Promise<void>;
  select(reference: string): Promise<void>;
  /** Shows a book in place of the one that is open. */
  open(book: BookModel): Promise<void>;
  /** Shows the demo as it is at first, whatever was done to it. */
  showDemo(): Promise<void>;
  /** Shows these rows of a sheet "Gas run" in place of the demo, from A1 on; what begins with = is a formula. */
  show(rows: readonly (readonly (number | string | null)[])[]): Promise<void>;
  /** Waits until the cells show this. */
  shows(reference: string, expected: CellRange): Promise<void>;
  close(): Promise<void>;
}

/** The first build of a fresh checkout takes its time. */
export const longestStart = 240_000; // ms

export async function startBench(): Promise<PageBench> {
  execFileSync(process.execPath, [join(root, 'scripts', 'run.mjs'), 'build', 'page'], { stdio: 'inherit' });
  const { server, address } = await startServer('--no-open', '--port', '0');
  const browser = await launchBrowser();
  return {
    address,
    browser,
    open: (options) => openPage(browser, address, options),
    async close() {
      await browser.close();
      server.kill();
    },
  };
}

/** The command as it is built. */
export const startCommand = join(root, 'dist', 'commands', 'start.cjs');

export async function startServer(
  ...words: readonly string[]
): Promise<{ server: ChildProcess; address: string }> {
  const server = spawn(process.execPath, [startCommand, ...words], { stdio: ['ignore', 'pipe', 'inherit'] });
  const address = await new Promise<string>((resolve, reject) => {
    let said = '';
    server.stdout!.on('data', (words: Buffer) => {
      said += String(words);
      const found = /http:\/\/\S+/.exec(said);
      if (found) resolve(found[0]);
    });
    server.on('exit', () => reject(new Error(`the server ended: ${said}`)));
  });
  return { server, address };
}

async function openPage(
  browser: Browser,
  address: string,
  options: BrowserContextOptions = {},
): Promise<BenchPage> {
  const context = await browser.newContext({
    viewport: { width: 1280, height: 800 },
    permissions: ['clipboard-read', 'clipboard-write'],
    ...options,
  });
  const page = await context.newPage();
  const complaints = listenTo(page, address);
  // as in a browser that cannot ask where to save: what is saved can then be caught
  await page.addInitScript(() => Reflect.deleteProperty(window, 'showSaveFilePicker'));
  await page.goto(address, { timeout: longestStart });
  await page.waitForFunction(() => 'flaskpace' in window, null, { timeout: longestStart });

  const cells = (reference: string): Promise<CellRange> =>
    page.evaluate(async (area) => (await window.flaskpace.port.read(area)).cells, {
      sheet: 'Gas run',
      ...parseArea(reference)!,
    });
  const show = (book: BookModel): Promise<void> => page.evaluate((one) => window.flaskpace.open(one), book);
  const select = async (reference: string): Promise<void> => {
    await page.evaluate((one) => window.flaskpace.select(one), reference);
    await page.waitForTimeout(50); // the grid draws what it was told
  };
  return {
    page,
    complaints,
    cells,
    select,
    open: show,
    showDemo: () => show(demoWorkbook()),
    show: (rows) => show(bookOf(rows)),
    async type(reference, typed) {
      await select(reference);
      await page.keyboard.type(typed);
      await page.keyboard.press('Enter');
    },
    async shows(reference, expected) {
      await waitUntil(async () => JSON.stringify(await cells(reference)) === JSON.stringify(expected));
      expect(await cells(reference)).toEqual(expected);
    },
    close: () => context.close(),
  };
}

/** Gives up without a word after a while: the expectation that follows says what is there instead. */
export async function waitUntil(isTrue: () => Promise<boolean>, patience = 20_000): Promise<void> {
  const end = Date.now() + patience;
  while (!(await isTrue()) && Date.now() < end) await new Promise((resolve) => setTimeout(resolve, 50));
}

function listenTo(page: Page, address: string): string[] {
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`error: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text());
  });
  page.on('request', (request) => {
    const url = request.url();
    if (!url.startsWith(address) && !/^(data|blob):/.test(url)) complaints.push(`asked for ${url}`);
  });
  return complaints;
}

function bookOf(rows: readonly (readonly (number | string | null)[])[]): BookModel {
  const cells = rows.flatMap((row, r) =>
    row.map((typed, c): CellModel => {
      const place = { row: r, column: c };
      const isFormula = typeof typed === 'string' && typed.startsWith('=');
      return isFormula ? { ...place, value: null, formula: typed.slice(1) } : { ...place, value: typed };
    }),
  );
  return { sheets: [{ name: 'Gas run', cells }], names: [] };
}
