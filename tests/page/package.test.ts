/** The packaged folder in a real browser: what its headers let in and keep out. Office.js itself cannot be had here. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { startAddin, type AddinBench, type AddinPage } from './addinBench';
import { longestStart } from './bench';

jest.setTimeout(120_000);

let bench: AddinBench;
let addin: AddinPage;

beforeAll(async () => {
  bench = await startAddin();
  addin = await bench.open({ sheets: { Run: [['t / s', 'V / mL']] } });
}, longestStart);
afterAll(() => bench?.close());

test('a long function is done on a thread of its own, whose script lies beside the page', async () => {
  const started = addin.page.waitForEvent('worker');
  const rows = await addin.page.evaluate(async () => {
    const answer = await window.standIn.functions.get('PLAN')!(1, 0.1, 1, 0.01, 1, null, {});
    return (answer as unknown[][]).length;
  });
  expect(new URL((await started).url()).origin).toBe(bench.address);
  expect(rows).toBeGreaterThan(1);
});

test('a workbook that is saved will wake the add-in', async () =>
  expect(await addin.page.evaluate(() => window.standIn.office.startups)).toEqual(['Load']));

test('help is there to read and to search', async () => {
  const help = await addin.page.context().newPage();
  const heard: string[] = [];
  help.on('console', (message) => heard.push(message.text()));
  await help.goto(`${bench.address}/help/index.html`);
  const shown = (): Promise<number> => help.locator('a:visible').count();
  const before = await shown();
  await help.getByRole('searchbox').fill('half life of a run');
  expect(await shown()).toBeLessThan(before);
  expect(await help.getByRole('link', { name: 'PACE.HALFLIFE' }).first().isVisible()).toBe(true);
  expect(heard).toEqual([]);
  await help.close();
});

test('through all of it nothing was refused', () => expect(addin.complaints).toEqual([]));

test('a script from elsewhere, and what would send something away, is refused', async () => {
  const other = await bench.open({ sheets: { Run: [] } });
  const refused = await other.page.evaluate(
    () =>
      new Promise<string[]>((resolve) => {
        const directives: string[] = [];
        addEventListener('securitypolicyviolation', ({ effectiveDirective }) => {
          directives.push(effectiveDirective);
          if (directives.length === 2) resolve(directives.sort());
        });
        const src = 'https://example.org/x.js';
        document.head.append(Object.assign(document.createElement('script'), { src }));
        fetch('https://example.org/').catch(() => undefined);
      }),
  );
  expect(refused).toEqual(['connect-src', 'script-src-elem']);
  await other.close();
});

test('no page but Excel’s may show it inside itself', async () => {
  const stranger = createServer((_, response) => {
    response.writeHead(200, { 'Content-Type': 'text/html' });
    response.end(`<iframe src="${bench.address}/taskpane.html"></iframe>`);
  });
  await new Promise<void>((resolve) => stranger.listen(0, '127.0.0.1', resolve));
  const around = await bench.browser.newPage();
  const refused = around.waitForEvent('console', (message) => message.text().includes('frame-ancestors'));
  await around.goto(`http://127.0.0.1:${(stranger.address() as AddressInfo).port}/`);
  expect((await refused).type()).toBe('error');
  await around.close();
  stranger.close();
});

test('what changes its name with its content is kept, all else asked for each time', async () => {
  const html = await (await fetch(`${bench.address}/taskpane.html`)).text();
  const script = /src="(built\/addin\.[0-9a-f]{12}\.js)"/.exec(html)![1];
  const kept = async (name: string): Promise<string | null> =>
    (await fetch(`${bench.address}/${name}`)).headers.get('cache-control');
  expect(await kept(script)).toMatch(/immutable/);
  for (const name of [
    'taskpane.html',
    'functions.json',
    'manifest.xml',
    'help/index.html',
    'assets/icon-32.png',
  ])
    expect(await kept(name)).toBe('no-cache');
  const functions = await fetch(`${bench.address}/functions.json`);
  expect(functions.headers.get('access-control-allow-origin')).toBe('*');
});
