/**
 * The folder that Excel would load, in a real browser, with exactly the headers that it asks of its server. Office.js
 * itself cannot be had here: a stand-in lies at its address.
 */
import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { buildSync } from 'esbuild';
import type { Browser, Page } from 'playwright-core';
import { catalogue } from '../../functions/catalogue';
import { packageListener } from '../../scripts/package/serve';
import { longestStart } from './bench';
import { launchBrowser } from './browser';
import type { ExcelSide } from './officeStandIn';

declare global {
  interface Window {
    readonly excelSide: ExcelSide;
  }
}

const root = path.join(__dirname, '..', '..');
const folder = mkdtempSync(path.join(tmpdir(), 'package-page-'));
let server: Server;
let address: string;
let browser: Browser;
let page: Page;
/** What the browser refused, and what went wrong. */
const complaints: string[] = [];

beforeAll(async () => {
  const words = ['package', '--url', 'https://localhost:3000', path.join(folder, 'out')];
  execFileSync(process.execPath, [path.join(root, 'scripts', 'run.mjs'), ...words], {
    cwd: root,
    stdio: 'pipe',
  });
  server = createServer(packageListener(path.join(folder, 'out')));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  address = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  browser = await launchBrowser();
  page = await open('/taskpane.html', complaints);
}, longestStart);

afterAll(async () => {
  await browser?.close();
  server?.close();
  rmSync(folder, { recursive: true, force: true });
});

const officeJs = buildSync({
  entryPoints: [path.join(__dirname, 'officeStandIn.ts')],
  bundle: true,
  write: false,
  platform: 'browser',
  alias: { 'office-addin-manifest': path.join(__dirname, 'officeApps.ts') },
}).outputFiles[0].text;

async function open(at: string, heard: string[]): Promise<Page> {
  const opened = await browser.newPage({ viewport: { width: 340, height: 800 } });
  opened.on('pageerror', (error) => heard.push(`error: ${error.message}`));
  opened.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') heard.push(message.text());
  });
  await opened.route('https://appsforoffice.microsoft.com/**', (route) =>
    route.fulfill({ contentType: 'text/javascript', body: officeJs }),
  );
  await opened.goto(address + at);
  return opened;
}

test('the pane shows the run beside it', async () => {
  await page.getByRole('combobox').first().waitFor();
  await page.waitForFunction(() => document.body.textContent?.includes('V / mL'));
  await page.waitForSelector('svg');
});

test('every function is there for Excel to call', async () => {
  const names = await page.evaluate(() => [...window.excelSide.handlers.keys()]);
  expect(names).toEqual(catalogue.map(({ name }) => name));
});

test('a long function is done on a thread of its own', async () => {
  const started = page.waitForEvent('worker');
  const rows = await page.evaluate(async () => {
    const answer = await window.excelSide.handlers.get('PLAN')!(1, 0.1, 1, 0.01, 1, null, {});
    return (answer as unknown[][]).length;
  });
  expect(new URL((await started).url()).origin).toBe(address);
  expect(rows).toBeGreaterThan(1);
});

test('a workbook that is saved will wake the add-in', async () => {
  expect(await page.evaluate(() => window.excelSide.startupBehaviours)).toEqual(['Load']);
});

test('help is there to read and to search', async () => {
  const help = await open('/help/index.html', complaints);
  await help.getByRole('searchbox').fill('half life of a run');
  expect(await help.getByRole('link', { name: 'PACE.HALFLIFE' }).isVisible()).toBe(true);
  expect(await help.getByRole('link', { name: 'PACE.CLOCK' }).isVisible()).toBe(false);
  await help.close();
});

test('through all of it nothing was refused', () => expect(complaints).toEqual([]));

test('a script from elsewhere, and what would send something away, is refused', async () => {
  const heard: string[] = [];
  const other = await open('/taskpane.html', heard);
  const refused = await other.evaluate(
    () =>
      new Promise<string[]>((resolve) => {
        const directives: string[] = [];
        addEventListener('securitypolicyviolation', ({ effectiveDirective }) => {
          directives.push(effectiveDirective);
          if (directives.length === 2) resolve(directives.sort());
        });
        document.head.append(
          Object.assign(document.createElement('script'), { src: 'https://example.org/x.js' }),
        );
        fetch('https://example.org/').catch(() => undefined);
      }),
  );
  expect(refused).toEqual(['connect-src', 'script-src-elem']);
  await other.close();
});

test('no page but Excel’s may show it inside itself', async () => {
  const stranger = createServer((_, response) => {
    response.writeHead(200, { 'Content-Type': 'text/html' });
    response.end(`<iframe src="${address}/taskpane.html"></iframe>`);
  });
  await new Promise<void>((resolve) => stranger.listen(0, '127.0.0.1', resolve));
  const around = await browser.newPage();
  const refused = around.waitForEvent('console', (message) => message.text().includes('frame-ancestors'));
  await around.goto(`http://127.0.0.1:${(stranger.address() as AddressInfo).port}/`);
  expect((await refused).type()).toBe('error');
  await around.close();
  stranger.close();
});

test('what changes its name with its content is kept, all else asked for each time', async () => {
  const html = await (await fetch(`${address}/taskpane.html`)).text();
  const script = /src="(built\/addin\.[0-9a-f]{12}\.js)"/.exec(html)![1];
  const kept = async (name: string): Promise<string | null> =>
    (await fetch(`${address}/${name}`)).headers.get('cache-control');
  expect(await kept(script)).toMatch(/immutable/);
  for (const name of [
    'taskpane.html',
    'functions.json',
    'manifest.xml',
    'help/index.html',
    'assets/icon-32.png',
  ])
    expect(await kept(name)).toBe('no-cache');
  expect((await fetch(`${address}/functions.json`)).headers.get('access-control-allow-origin')).toBe('*');
});
