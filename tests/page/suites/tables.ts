/** The pane on tables as people make them, and on the demo as it opens. */
import { CellError, type CellValue } from '../../../functions/cell';
import { oneOfEachKind } from '../../taskpane/faultySheets';
import { waitUntil, type BenchPage, type PageBench } from '../bench';
import { handsOn } from '../hands';

const times = [0, 10, 20, 30, 40, 50, 60];
/** Halved in its own time: k = ln 2 / half life. */
const fading = (halfLife: number): number[] => times.map((t) => 0.8 * 0.5 ** (t / halfLife));
/** V = 3 t − 0.01 t²: its slope is 3 − 0.02 t, and a parabola is what a tangent of degree 2 fits exactly. */
const inRows = [
  ['t / s', ...times],
  ['V / mL', ...times.map((t) => 3 * t - 0.01 * t * t)],
];
const long = [
  ['well', 't / min', 'A'],
  ...times.map((t, i) => ['A1', t, fading(10)[i]]),
  ...times.map((t, i) => ['A2', t, fading(20)[i]]),
];

/** An error stands in a sheet only as what a formula answers. */
const formulas: Readonly<Record<string, string>> = { '#DIV/0!': '=1/0', '#N/A': '=NA()' };
const typed = (cell: CellValue): number | string =>
  cell instanceof CellError ? formulas[cell.code] : ((cell ?? '') as number | string);

export function tablesSuite(sheet: () => BenchPage, bench: () => PageBench): void {
  const { pane, press, says, cell } = handsOn(sheet);
  /** Shows a table in place of any other; the pane, which has no run then, takes it as one. */
  async function work(rows: readonly (readonly (number | string)[])[]): Promise<void> {
    await sheet().show([['nothing here']]);
    await sheet().select("'Gas run'!A1");
    await says('#run .hint', /^Click a cell/);
    await sheet().show(rows);
    await sheet().select("'Gas run'!B2");
    await says('#run .where', /A1/);
  }

  test('runs in rows: a rate below them, and a row of rates beneath the readings', async () => {
    await work(inRows);
    await press('Rate');
    await pane('#kind-tangent').check();
    await pane('#rate-time').fill('30');
    await says('#formula', "=PACE.TANGENT('Gas run'!B1:H1,'Gas run'!B2:H2,30)");
    await press('Put it in');
    await says('.notice.good', 'written: rate at 30 s');
    await waitUntil(async () => typeof (await cell('A5')) === 'number');
    expect(await cell('A5')).toBeCloseTo(3 - 0.02 * 30, 10);
    await press(/^Undo: rate at 30 s/);

    await pane('#kind-column').check();
    await press('Put it in');
    await says('.notice.good', 'written: rate in');
    expect(await cell('A3')).toBe('rate / (mL/s)');
    await waitUntil(async () => typeof (await cell('H3')) === 'number');
    const [rates] = await sheet().cells("'Gas run'!B3:H3");
    times.forEach((t, i) => expect(rates[i]).toBeCloseTo(3 - 0.02 * t, 10));
    await press(/^Undo: rate in/);
    await pane('#kind-tangent').check();
  });

  test('runs under each other: one of them, then a formula for each', async () => {
    await work(long);
    await pane('#run-name').selectOption('A2');
    await press('Order');
    await says('#order .result .value', /0\.03466.*min⁻¹/);
    await press('All runs');
    await says('#many [role=status]', '2 of 2 runs picked');
    await press('Put it in');
    await says('.notice.good', 'of 2 runs');
    await waitUntil(async () => typeof (await cell('E3')) === 'number');
    expect((await sheet().cells("'Gas run'!D1:D3")).flat()).toEqual(['run', 'A1', 'A2']);
    expect(await cell('E2')).toBeCloseTo(Math.LN2 / 10, 9);
    expect(await cell('E3')).toBeCloseTo(Math.LN2 / 20, 9);
    await press(/^Undo: /);
  });

  test('runs under each other are converted at one go, as they are laid out, and taken back', async () => {
    // at 0 °C and 100 kPa an ideal gas takes 22.710 954 64 L/mol (CODATA 2022)
    const gas = long.map((row, r) =>
      r === 0 ? ['run', 't / s', 'V / mL'] : [...row.slice(0, 2), 22.71095464 * r],
    );
    await work(gas);
    await press('Reading');
    await pane('#reading-temperature').fill('273.15 K');
    await pane('#reading-pressure').fill('1 bar');
    await pane('#reading-layout-pairs').check();
    await says('#put-in .where', "'Gas run'!E1:H8");
    await press('Put it in');
    await says('.notice.good', 'written: n(gas) of 2 runs');
    await waitUntil(async () => typeof (await cell('H8')) === 'number');
    expect(await sheet().cells("'Gas run'!G8:H8")).toEqual([[60, expect.closeTo(0.014, 9)]]);
    await press(/^Undo: n\(gas\) of 2 runs/);
    await pane('#reading-layout-column').check();
    await press('Put it in and go on with it');
    await says('.notice.good', 'now the readings of this run');
    await waitUntil(async () => typeof (await cell('D15')) === 'number');
    expect(await cell('D8')).toBeCloseTo(0.007, 9);
    expect(await cell('D15')).toBeCloseTo(0.014, 9);
    await press(/^Undo: n\(gas\) of 2 runs/);
    await waitUntil(async () => (await cell('D15')) === null);
    expect(await cell('D1')).toBeNull();
    await press('Rate');
  });

  test('clock times are offered a formula that makes minutes of them', async () => {
    await work([['time', 'c / mM'], ...times.map((t, i) => [46329 + (9 * 60 + t) / 1440, 8 * 0.5 ** i])]);
    await says('#clock-formula', '=PACE.CLOCK(\'Gas run\'!A2:A8,"min","first")');
    await sheet().type("'Gas run'!C1", 't / min');
    await sheet().type("'Gas run'!C2", await pane('#clock-formula').innerText());
    await waitUntil(async () => typeof (await cell('C8')) === 'number');
    expect(await cell('C8')).toBeCloseTo(60, 5);
  });

  test('rows of runs that are mixed are said to be, with what to do', async () => {
    const [headings, ...rows] = long;
    await work([headings, ...rows.sort((a, b) => Number(a[1]) - Number(b[1]))]);
    await says('#run > .problem', /sort the table by run$/);
  });

  test.each(oneOfEachKind)('$name in a run is said beside it', async ({ rows, says: words }) => {
    await work(rows.map((row) => row.map(typed)));
    await says('.finding', words);
  });

  test('a unit that no heading names is asked for, and then stands in the answer', async () => {
    await work([['t', 'gas'], ...times.map((t) => [t, 2 * t])]);
    await press('Rate');
    await says('#rate .result .unit', 'reading unit per time unit');
    await pane('#time-unit').fill('s');
    await pane('#reading-unit').fill('mL');
    await says('#rate .result .unit', 'mL/s');
  });

  test('each part of a formula says what it is, by keyboard too, and all of it is copied', async () => {
    await pane('#formula .part').first().focus();
    await says('.formula .says', /^PACE\.TANGENT\(times, values, time/);
    await sheet().page.keyboard.press('ArrowRight');
    await says('.formula .says', /^times: /);
    await press('Copy');
    await says('.notice.good', 'formula copied');
    const whole = await pane('#formula').innerText();
    expect(await sheet().page.evaluate(() => navigator.clipboard.readText())).toBe(whole);
    await pane('#formula').click();
    expect(await sheet().page.evaluate(() => String(window.getSelection()))).toBe(whole);
  });

  test('the demo, just opened: one click in the data and one in the pane lead to a rate', async () => {
    const fresh = await bench().open();
    const beside = fresh.page.getByRole('complementary');
    await fresh.select("'Gas run'!B8");
    await beside
      .locator('#rate .result .value')
      .filter({ hasText: /mL\/s$/ })
      .waitFor();
    await beside.getByRole('button', { name: 'Put it in', exact: true }).click();
    const written = beside.locator('.notice.good');
    await written.filter({ hasText: /^written: rate at/ }).waitFor();
    const [target] = /'Gas run'![A-Z]+\d+$/.exec(await written.innerText())!;
    const rate = async (): Promise<unknown> => (await fresh.cells(target))[0][0];
    await waitUntil(async () => typeof (await rate()) === 'number');
    expect(await rate()).toBeGreaterThan(0);
    await fresh.close();
  });
}
