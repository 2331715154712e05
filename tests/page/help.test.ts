/** The help pages as anyone can read them: from a folder, with no server and no network. */
import axe from 'axe-core';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { catalogue } from '../../functions/catalogue';
import { helpFiles } from '../../functions/help/files';
import { launchBrowser } from './browser';

jest.setTimeout(60_000);

const folder = mkdtempSync(join(tmpdir(), 'flaskpace-help-'));
const files = helpFiles(catalogue);
const some = ['index.html', 'gasvolume.html', 'tangent.html', 'eyring.html', 'errors.html', 'pictures.html'];
let browser: Browser;
let page: Page;
const complaints: string[] = [];

beforeAll(async () => {
  for (const [name, content] of files) writeFileSync(join(folder, name), content);
  browser = await launchBrowser();
  page = await browser.newPage();
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => message.type() === 'error' && complaints.push(message.text()));
  page.on('request', (request) => {
    if (!request.url().startsWith('file:')) complaints.push(`asked for ${request.url()}`);
  });
});
afterAll(async () => {
  await browser?.close();
  rmSync(folder, { recursive: true });
});

const show = (name: string): Promise<unknown> => page.goto(`${pathToFileURL(folder).href}/${name}`);

describe.each(['light', 'dark'] as const)('in the %s', (colorScheme) => {
  test.each(some)('%s holds to the rules of accessibility', async (name) => {
    await page.emulateMedia({ colorScheme });
    await show(name);
    await page.evaluate(axe.source);
    const found = await page.evaluate(async () => {
      const { violations } = await (window as unknown as { axe: typeof axe }).axe.run({ preload: false });
      return violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html}`));
    });
    expect(found).toEqual([]);
  });
});

test('no page is wider than a narrow window, and none than paper', async () => {
  const width = (): Promise<number> => page.evaluate(() => document.documentElement.scrollWidth);
  for (const name of [...files.keys()].filter((one) => one.endsWith('.html'))) {
    await page.setViewportSize({ width: 320, height: 640 });
    await show(name);
    expect([name, await width()]).toEqual([name, 320]);
  }
  await page.setViewportSize({ width: 680, height: 960 });
  await show('everything.html');
  await page.emulateMedia({ media: 'print' });
  const printed = [await width(), await page.getByRole('navigation').isVisible()];
  await page.emulateMedia({ media: 'screen' });
  expect(printed).toEqual([680, false]);
});

test('equations are set by the browser: the bar of a fraction lies between its parts', async () => {
  await show('gasvolume.html');
  const boxes = await page
    .locator('math[display] mfrac')
    .first()
    .evaluate((fraction) =>
      [...fraction.children]
        .map((part) => part.getBoundingClientRect())
        .map(({ top, bottom }) => ({ top, bottom })),
    );
  expect(boxes).toHaveLength(2);
  expect(boxes[0].bottom).toBeLessThanOrEqual(boxes[1].top + 1);
});

test.each([
  ['balance', 'PACE.MASSLOSS'],
  ['shelf life', 'PACE.TIMETO'],
  ['rate constant', 'PACE.COEFFICIENT'],
  ['half lives', 'PACE.HALFLIFE'],
  ['VERDICT', 'PACE.ORDERS'],
  ['=pace.eyr', 'PACE.EYRING'],
])('who looks for "%s" finds %s', async (words, title) => {
  await show('index.html');
  await page.keyboard.press('/');
  await page.keyboard.type(words);
  await page.locator('#found a', { hasText: new RegExp(`^${title.replace('.', '\\.')}$`) }).waitFor();
  expect(await page.locator('#ways').isHidden()).toBe(true);
  await page.keyboard.press('Escape');
  expect(await page.locator('#ways').isVisible()).toBe(true);
});

test('the first that is found opens with Enter, and nothing found is said', async () => {
  await show('index.html');
  await page.locator('#look-for').fill('xyzzy');
  await page.getByRole('status').filter({ hasText: 'No page speaks of that' }).waitFor();
  await page.locator('#look-for').fill('mean kinetic');
  await page.keyboard.press('Enter');
  await page.waitForURL('**/meantemp.html');
  await page.getByRole('heading', { name: 'PACE.MEANTEMP', level: 1 }).waitFor();
});

test('through all of it nothing complained, and nothing was asked of a network', () =>
  expect(complaints).toEqual([]));
