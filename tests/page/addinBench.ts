/**
 * The add-in as Excel loads it: packaged, served with exactly the headers that its folder asks for, in a real browser,
 * with a stand-in where Excel's own Office.js would be.
 */
import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build, type Plugin } from 'esbuild';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { packageListener } from '../../scripts/package/serve';
import type { OfficeSetting } from '../taskpane/fakeOffice';
import type { BenchSheets } from '../taskpane/portContract';
import { launchBrowser } from './browser';
import type { StandIn } from './standIn';

const root = join(__dirname, '..', '..');

declare global {
  interface Window {
    readonly standIn: StandIn;
  }
}

/** The workbook that Excel is to have open. */
export interface Opened {
  readonly sheets: BenchSheets;
  readonly file?: Uint8Array;
  readonly setting?: OfficeSetting;
}

export interface AddinBench {
  readonly browser: Browser;
  readonly address: string;
  open(workbook: Opened, options?: BrowserContextOptions): Promise<AddinPage>;
  close(): Promise<void>;
}

export interface AddinPage {
  readonly page: Page;
  /** What went wrong in it so far, and what it asked of other addresses. */
  readonly complaints: readonly string[];
  close(): Promise<void>;
}

export async function startAddin(): Promise<AddinBench> {
  const folder = mkdtempSync(join(tmpdir(), 'addin-'));
  const words = ['package', '--url', 'https://localhost:3000', join(folder, 'made')];
  execFileSync(process.execPath, [join(root, 'scripts', 'run.mjs'), ...words], { cwd: root, stdio: 'pipe' });
  const office = await officeScript();
  const server = createServer(packageListener(join(folder, 'made')));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const address = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const browser = await launchBrowser();

  async function open(
    { sheets, file, setting = {} }: Opened,
    options?: BrowserContextOptions,
  ): Promise<AddinPage> {
    const context = await browser.newContext({
      viewport: { width: 320, height: 900 },
      ...options,
    });
    const page = await context.newPage();
    const complaints: string[] = [];
    page.on('pageerror', (error) => complaints.push(`error: ${error.message}`));
    page.on('console', (message) => {
      if (['error', 'warning'].includes(message.type())) complaints.push(message.text());
    });
    await context.route(
      (url) => url.origin !== address,
      (route) => {
        const { href } = new URL(route.request().url());
        if (href === officeAddress) return route.fulfill({ contentType: 'text/javascript', body: office });
        complaints.push(`asked for ${href}`);
        return route.abort();
      },
    );
    const left = { sheets, setting, file: Buffer.from(file ?? []).toString('base64') };
    await page.addInitScript((given) => Object.assign(window, { left: given }), left);
    await page.goto(`${address}/taskpane.html`);
    await page.locator('#pane .flaskpace').waitFor();
    return { page, complaints, close: () => context.close() };
  }

  return {
    browser,
    address,
    open,
    async close() {
      await browser.close();
      server.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

const officeAddress = 'https://appsforoffice.microsoft.com/lib/1/hosted/office.js';

async function officeScript(): Promise<string> {
  const { outputFiles } = await build({
    entryPoints: [join(__dirname, 'standIn.ts')],
    bundle: true,
    write: false,
    format: 'iife',
    target: 'es2022',
    plugins: [withoutManifest],
    logLevel: 'silent',
  });
  return outputFiles[0].text;
}

/** Of the mock only its object is wanted; its door also leads to a reader of manifests, which needs Node. */
const withoutManifest: Plugin = {
  name: 'without-manifest',
  setup({ onResolve, onLoad }) {
    onResolve({ filter: /^office-addin-mock$/ }, () => ({
      path: join(root, 'node_modules', 'office-addin-mock', 'lib', 'officeMockObject.js'),
    }));
    onResolve({ filter: /^office-addin-manifest$/ }, ({ path }) => ({ path, namespace: 'none' }));
    onLoad({ filter: /./, namespace: 'none' }, () => ({ contents: 'exports.OfficeApp = {};' }));
  },
};
