/** Whole jobs done in the pane, from readings to answers that the sheet has worked out itself. */
import { waitUntil, type BenchPage } from '../bench';
import { handsOn } from '../hands';
import { violations } from './access';

/** At 0 °C and 100 kPa an ideal gas takes 22.710 954 64 L/mol (CODATA 2022). */
const millilitresPerMole = 22710.95464;
const times = Array.from({ length: 13 }, (_, i) => 5 * i);
/** 10 mmol in the end, half of it every 10 s. */
const gasRun = [
  ['t / s', 'V / mL'],
  ...times.map((t) => [t, 0.01 * millilitresPerMole * (1 - 0.5 ** (t / 10))]),
];
const plateTimes = Array.from({ length: 60 }, (_, i) => i);
const halfLifeOf = (run: number): number => 6 + (run % 12);
/** 96 runs that fade, each with the half life of its column. */
const plate = [
  ['t / min', ...Array.from({ length: 96 }, (_, run) => `A${run + 1}`)],
  ...plateTimes.map((t) => [
    t,
    ...Array.from({ length: 96 }, (_, run) => 0.8 * 0.5 ** (t / halfLifeOf(run))),
  ]),
];
/** k = 0.001 d⁻¹ at 25 °C and 80 kJ/mol, with R of CODATA 2022. */
const coefficientAt = (celsius: number): number =>
  0.001 * Math.exp((-80_000 * (1 / (celsius + 273.15) - 1 / 298.15)) / 8.314462618);
const store = [['θ / °C', 'k / d⁻¹'], ...[40, 50, 60, 70].map((t) => [t, coefficientAt(t)])];

export function journeysSuite(sheet: () => BenchPage): void {
  const { pane, press, says, cell } = handsOn(sheet);
  /** Shows a table and makes it the run. */
  async function work(rows: readonly (readonly (number | string)[])[]): Promise<void> {
    await sheet().show(rows);
    await sheet().select("'Gas run'!A2");
    await press(/^Use 'Gas run'/);
    await says('#run .where', /A1/);
  }
  const numbers = async (reference: string): Promise<number[]> =>
    (await sheet().cells(`'Gas run'!${reference}`)).flat().filter((one) => typeof one === 'number');

  test('a gas run: volumes become amounts, and these an order, a coefficient and a half life', async () => {
    await work(gasRun);
    await press('Reading');
    await pane('#reading-temperature').fill('273.15 K');
    await pane('#reading-pressure').fill('1 bar');
    await press('Put it in and go on with it');
    await says('.notice.good', 'now the readings of this run');
    expect(await cell('C1')).toBe('n(gas) / mol');
    await waitUntil(async () => (await numbers('C2:C14')).length === 13);
    const amounts = await numbers('C2:C14');
    amounts.forEach((amount, i) => expect(amount).toBeCloseTo(0.01 * (1 - 0.5 ** (times[i] / 10)), 11));

    await press('Order');
    await says('#order .result .value', /0\.06931.*s⁻¹/);
    await says('#order .verdicts', 'fits best');
    await press('Put it in');
    await says('.notice.good', 'written: rate coefficient, order 1');
    await waitUntil(async () => typeof (await cell('D2')) === 'number');
    expect(await cell('D2')).toBeCloseTo(Math.LN2 / 10, 9);
    await press(/^Undo: rate coefficient/);
    await press(/^Undo: n\(gas\)/);
    await says('#run', '13 readings');
    expect(await cell('C2')).toBeNull();
  });

  test('a plate of 96 runs: surveyed in the pane, then put in by one formula', async () => {
    await work(plate);
    await press('All runs');
    await says('#many [role=status]', '96 of 96 runs picked');
    await press('Survey these 96 runs here');
    await pane('.survey caption')
      .filter({ hasText: /^Survey$/ })
      .waitFor({ timeout: 30_000 });
    expect(await pane('.survey tbody tr:not(.flags)').count()).toBe(96);
    await press('Put it in');
    await says('.notice.good', 'written: survey of 96 runs');
    await waitUntil(async () => (await numbers('CX3:CX98')).length === 96, 30_000);
    (await numbers('CX3:CX98')).forEach((halfLife, run) => expect(halfLife).toBeCloseTo(halfLifeOf(run), 8));
    await press(/^Undo: survey/);
  });

  // 100 ms are meant, on a machine that has nothing else to do
  test.each([
    { step: 'Order', act: ['#order-2', 'click'], watch: '#order .result .value' },
    { step: 'Order', act: ['#order-free', 'click'], watch: '#order .result .value' },
    { step: 'Rate', act: ['#rate-points', '9'], watch: '#formula' },
    { step: 'All runs', act: ['#run-5', 'click'], watch: '#many [role=status]' },
  ] as const)('among 96 runs a change at $step shows at once: $act', async ({ step, act, watch }) => {
    await press(step);
    const shownAfter = await sheet().page.evaluate(
      async ([[control, deed], place]) => {
        const shown = (): string => document.querySelector(`#pane ${place}`)?.textContent ?? '';
        const [before, start] = [shown(), performance.now()];
        const input = document.querySelector<HTMLInputElement>(`#pane ${control}`)!;
        if (deed === 'click') input.click();
        else {
          input.value = deed;
          input.dispatchEvent(new Event('input'));
        }
        while (shown() === before && performance.now() - start < 5000)
          await new Promise((resolve) => setTimeout(resolve, 1));
        return performance.now() - start;
      },
      [act, watch] as const,
    );
    expect(shownAfter).toBeLessThan(1000);
  });

  test('a temperature series: activation energy, and a coefficient that is called extrapolated', async () => {
    await work(store);
    await says('#temperature .result .value', /80.* kJ\/mol/);
    await pane('#temperature-at').fill('25');
    await says('#temperature .warning', /^Extrapolated/);
    await pane('#temperature-answer').selectOption('coefficient');
    await press('Put it in');
    await says('.notice.good', 'written: k at 25 °C');
    await waitUntil(async () => typeof (await cell('C2')) === 'number');
    expect(await cell('C2')).toBeCloseTo(0.001, 9);
    await press(/^Undo: k at/);
  });

  test('faults in a run are told with the rows of the sheet', async () => {
    const faulty = gasRun.map((row, r) => (r === 4 ? [row[0], 'spilt'] : r === 8 ? [row[0], 900] : row));
    await work([['my burette'], [''], ...faulty].map((row) => [...row]));
    await says('.findings', 'row 7');
    await says('.findings', 'row 11');
  });

  test('every function can be looked up, and its example answers in the sheet', async () => {
    await press('Look up');
    await pane('#look-up-words').fill('half life');
    await press('PACE.HALFLIFE');
    await pane('#how-halflife summary').click();
    // a fraction that is set stands one part above the other
    const [over, under] = await Promise.all(
      [0, 1].map((part) => pane('#how-halflife mfrac > *').nth(part).boundingBox()),
    );
    expect(over!.y + over!.height).toBeLessThanOrEqual(under!.y + 1);
    await sheet().select("'Gas run'!H3");
    await pane('#target').waitFor();
    await waitUntil(async () => (await pane('#target').inputValue()).endsWith('H3'));
    await press('Put it in');
    await says('.notice.good', 'written: example of PACE.HALFLIFE');
    await waitUntil(async () => typeof (await cell('H3')) === 'number');
    await press(/^Undo: example/);
    await press('All functions');
    await pane('#look-up-words').fill('');
  });

  test.each(['Reading', 'Rate', 'Order', 'All runs', 'Temperature', 'Look up'])(
    'the step %s holds to the rules of accessibility, and is reached by keyboard',
    async (name) => {
      const step = sheet().page.getByRole('complementary').getByRole('button', { name, exact: true });
      await step.focus();
      await sheet().page.keyboard.press('Enter');
      await pane('nav [aria-current]').filter({ hasText: name }).waitFor();
      expect(await violations(sheet(), ['#pane'])).toEqual([]);
      await sheet().page.emulateMedia({ colorScheme: 'dark' });
      await sheet().page.waitForTimeout(200);
      expect(await violations(sheet(), ['#pane'], ['color-contrast'])).toEqual([]);
      await sheet().page.emulateMedia({ colorScheme: 'light' });
    },
  );
}
