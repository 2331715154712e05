/** The pane beside the sheet: from a run that is seen to a rate that stands in a cell. */
import { waitUntil, type BenchPage } from '../bench';

/** V = 3 t − 0.01 t²: its slope is 3 − 0.02 t, and a parabola is what a tangent of degree 2 fits exactly. */
const volume = (t: number): number => 3 * t - 0.01 * t * t;
const times = Array.from({ length: 11 }, (_, place) => 10 * place);
const run = [['t / s', 'V / mL'], ...times.map((t) => [t, volume(t)])];

export function paneSuite(sheet: () => BenchPage): void {
  const pane = (selector: string) => sheet().page.locator(`#pane ${selector}`);
  const press = (label: RegExp | string): Promise<void> =>
    sheet().page.getByRole('complementary').getByRole('button', { name: label }).click();

  beforeAll(async () => {
    await sheet().show(run);
    await sheet().select("'Gas run'!A2");
  });

  test('the run around the active cell is found and plotted', async () => {
    await pane('#run .where')
      .filter({ hasText: "'Gas run'!A1:B12" })
      .or(pane('#run button'))
      .first()
      .waitFor();
    if (!(await pane('#run .where').innerText()).includes('A1:B12')) await press(/^Use 'Gas run'!A1:B12/);
    await pane('#run .where').filter({ hasText: "'Gas run'!A1:B12" }).waitFor();
    await pane('svg.plot .readings').first().waitFor();
  });

  test('a tangent is read off, drawn, and written as a formula with its value', async () => {
    await pane('#kind-tangent').check();
    await pane('#rate-time').fill('30');
    await pane('.result .value')
      .filter({ hasText: /^2\.4\d* .*mL\/s$/ })
      .waitFor();
    await pane('svg.plot .rate-line').waitFor();
    await press('Put it in');
    await pane('.notice.good').filter({ hasText: 'written: rate at 30 s' }).waitFor();
    const [[heading], [rate]] = await sheet().cells("'Gas run'!C1:C2");
    expect(heading).toBe('rate at 30 s / (mL/s)');
    expect(rate).toBeCloseTo(3 - 0.02 * 30, 10);
    await sheet().page.locator('#cell-line code', { hasText: '=PACE.TANGENT(' }).waitFor();
  });

  test('the rate follows an edit of a reading', async () => {
    const rate = async (): Promise<number> => Number((await sheet().cells("'Gas run'!C2"))[0][0]);
    const before = await rate();
    await sheet().type("'Gas run'!B6", String(volume(40) + 1));
    await waitUntil(async () => (await rate()) !== before);
    expect(await rate()).toBeGreaterThan(before); // a later reading pulled up makes the tangent steeper
  });

  test('undo takes it back, heading and all', async () => {
    await press(/^Undo: rate at 30 s/);
    await pane('.notice.good').filter({ hasText: 'taken back' }).waitFor();
    expect(await sheet().cells("'Gas run'!C1:C2")).toEqual([[null], [null]]);
  });

  test('a whole column of rates spills beside its run', async () => {
    await pane('#kind-column').check();
    await press('Put it in');
    await pane('.notice.good').filter({ hasText: 'written' }).waitFor();
    const rates = (await sheet().cells("'Gas run'!C2:C12")).flat();
    expect(rates).toHaveLength(11);
    expect(rates.every((rate) => typeof rate === 'number')).toBe(true);
    await press(/^Undo: rate in/);
  });
}
