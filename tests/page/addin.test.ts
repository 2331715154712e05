/** The add-in in a real browser: what Excel loads, with a stand-in for Excel itself. */
import { catalogue } from '../../functions/catalogue';
import { readWorkbook } from '../../workbook/xlsx/read';
import { createWorkbook } from '../../workbook/xlsx/create';
import { demoWorkbook } from '../../workbook/demo/demo';
import { calculate } from '../../workbook/engine/univer/headless';
import { startAddin, type AddinBench, type AddinPage } from './addinBench';
import { longestStart } from './bench';
import { violations } from './suites/access';

jest.setTimeout(120_000);

let bench: AddinBench;
beforeAll(async () => {
  bench = await startAddin();
}, longestStart);
afterAll(() => bench?.close());

const press = (addin: AddinPage, label: string): Promise<void> =>
  addin.page.getByRole('button', { name: label }).click();

const times = [0, 10, 20, 30, 40, 50];
const fading = { Run: [['t / min', 'A'], ...times.map((t) => [t, 0.8 * 0.5 ** (t / 10)])] };

test('the functions are there at once, and the pane finds the run', async () => {
  const addin = await bench.open({ sheets: fading });
  const names = await addin.page.evaluate(() => [...window.standIn.functions.keys()]);
  expect(names).toEqual(catalogue.map(({ name }) => name));
  await addin.page.locator('#run .where', { hasText: 'Run!A1:B7' }).waitFor();
  await press(addin, 'Order');
  await addin.page.locator('#order .result .value', { hasText: '0.06931' }).waitFor();
  expect(addin.complaints).toEqual([]);
  await addin.close();
});

test('the workbook is handed over in Excel’s own page: the spreadsheet engine comes with it, from nowhere else', async () => {
  const demo = demoWorkbook();
  const file = createWorkbook(demo, await calculate(demo));
  const addin = await bench.open({ sheets: fading, file });
  await press(addin, 'Hand over');
  await press(addin, 'Make the copy');
  await addin.page.locator('#hand-over .counts').waitFor({ timeout: 90_000 });
  expect(await addin.page.locator('#hand-over .counts').innerText()).toMatch(/^\d+\s+live/);
  await press(addin, 'Open the copy');
  await addin.page.locator('.notice.good').waitFor();
  const [opened] = await addin.page.evaluate(() => window.standIn.office.opened);
  const copy = readWorkbook(new Uint8Array(Buffer.from(opened, 'base64')));
  expect(copy.sheets.map(({ name }) => name)).toEqual([
    ...demo.sheets.map(({ name }) => name),
    'Method',
    'Workings',
  ]);
  const formulas = copy.sheets.flatMap(({ cells }) => cells.flatMap(({ formula }) => formula ?? []));
  expect(formulas.length).toBeGreaterThan(100);
  expect(formulas.filter((formula) => formula.includes('PACE'))).toEqual([]);
  expect(addin.complaints).toEqual([]);
  await addin.close();
});

const pages = [
  { name: 'dark, 320 px wide', width: 320, options: { colorScheme: 'dark' } },
  { name: 'light, 480 px wide', width: 480, options: { colorScheme: 'light' } },
  { name: 'colours of the system’s own, 320 px wide', width: 320, options: { forcedColors: 'active' } },
] as const;

test.each(pages)('every step holds to the rules of accessibility: $name', async ({ width, options }) => {
  const addin = await bench.open({ sheets: fading }, { viewport: { width, height: 700 }, ...options });
  await addin.page.locator('#run .where', { hasText: 'Run!A1:B7' }).waitFor();
  const steps = await addin.page.locator('nav button').all();
  expect(steps.length).toBe(7);
  for (const step of steps) {
    await step.click();
    const name = await step.innerText();
    await addin.page.mouse.move(0, 0);
    await faded(addin);
    expect([name, await violations(addin, ['#pane'])]).toEqual([name, []]);
    expect([name, await widthTaken(addin)]).toEqual([name, width]);
  }
  expect(addin.complaints).toEqual([]);
  await addin.close();
});

test('enlarged to twice its size in 320 px, no step is cut off at the side', async () => {
  const addin = await bench.open({ sheets: fading }, { viewport: { width: 160, height: 350 } });
  for (const step of await addin.page.locator('nav button').all()) {
    await step.click();
    expect([await step.innerText(), await widthTaken(addin)]).toEqual([await step.innerText(), 160]);
  }
  await addin.close();
});

test('colours follow Office, also against the system', async () => {
  const brightness = (addin: AddinPage): Promise<number> =>
    addin.page.evaluate(() => {
      const { backgroundColor } = getComputedStyle(document.querySelector('.flaskpace')!);
      return Math.max(...backgroundColor.match(/\d+/g)!.map(Number));
    });
  const black = { theme: { isDarkTheme: true } };
  const grey = { theme: { bodyBackgroundColor: '#262626' } };
  const white = { theme: { bodyBackgroundColor: '#FFFFFF' } };
  for (const [setting, colorScheme, isDark] of [
    [black, 'light', true],
    [grey, 'light', true],
    [white, 'dark', false],
    [{}, 'dark', true],
    [{}, 'light', false],
  ] as const) {
    const addin = await bench.open({ sheets: fading, setting }, { colorScheme });
    expect((await brightness(addin)) < 128).toBe(isDark);
    await addin.close();
  }
});

/** Colours fade from one to the other. */
const faded = ({ page }: AddinPage): Promise<void> =>
  page.evaluate(async () => void (await Promise.all(document.getAnimations().map((one) => one.finished))));

const widthTaken = ({ page }: AddinPage): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth);
