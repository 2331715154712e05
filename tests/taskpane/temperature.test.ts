/** @jest-environment jsdom */
import { functionNamed } from '../../functions/catalogue';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane.close());

/** CODATA 2022, J/(mol K). */
const R = 8.314462618;
const energy = 80; // kJ/mol
/** k = A exp(−Ea/RT) with A chosen so that k is 0.001 per day at 25 °C. */
const coefficientAt = (celsius: number): number =>
  0.001 * Math.exp((-energy * 1000 * (1 / (celsius + 273.15) - 1 / 298.15)) / R);
const table = [
  ['θ / °C', 'k / d⁻¹', 'half life / d'],
  ...[40, 50, 60, 70].map((t) => [t, coefficientAt(t), Math.LN2 / coefficientAt(t)]),
];

const open = async (): Promise<void> => {
  pane = await openPane({ Store: table }, 'A2');
};

test('a table over temperature opens the temperature step, and is not checked as a run', async () => {
  await open();
  expect(pane.find('#task-temperature').getAttribute('aria-current')).toBe('step');
  expect(pane.root.querySelector('.findings')).toBeNull();
  expect(pane.find<HTMLSelectElement>('#coefficients').selectedOptions[0].textContent).toBe('B: k / d⁻¹');
});

test('where no heading names a temperature, none is taken for granted', async () => {
  pane = await openPane({ Store: [['no.', 'k / d⁻¹'], ...table.slice(1).map(([t, k]) => [t, k])] }, 'A2');
  await pane.press('Temperature');
  expect(pane.text('#temperature .warning')).toBe(
    'No heading names a temperature: choose the column that holds it.',
  );
  await pane.choose('#temperatures', '0');
  expect(pane.root.querySelector('#temperature .warning')).toBeNull();
  expect(pane.text('#formula')).toBe('=PACE.ARRHENIUS(Store!A2:A5,Store!B2:B5)');
});

test('of a run in time nothing is worked out until a column is chosen', async () => {
  pane = await openPane({ Run: [['t / d', 'b'], ...table.slice(1).map(([t, k]) => [t, k])] }, 'A2');
  await pane.tick('#task-temperature');
  expect(pane.root.querySelector('#temperature .result, #temperature svg, #formula')).toBeNull();
  expect(pane.text('#temperature [role=status].warning')).toContain('choose the column');
  await pane.choose('#temperatures', '0');
  expect(pane.text('.result .value')).toBe('80 kJ/mol');
  expect(pane.text('#formula')).toBe('=PACE.ARRHENIUS(Run!A2:A5,Run!B2:B5)');
});

test('the activation energy, its plot and its formula', async () => {
  await open();
  expect(pane.text('.result .value')).toBe('80 kJ/mol');
  expect(pane.text('#formula')).toBe('=PACE.ARRHENIUS(Store!A2:A5,Store!B2:B5)');
  expect(pane.find('#temperature svg').getAttribute('aria-label')).toBe(
    'ln(k / d⁻¹) against 1000 K / T: 4 temperatures with the line through them',
  );
});

test('a coefficient at another temperature is marked as extrapolated, with its caution', async () => {
  await open();
  await pane.type('#temperature-at', '25');
  const [, predicted] = [...pane.root.querySelectorAll('#temperature .result')];
  expect(predicted.querySelector('.value')!.textContent).toBe('0.001 d⁻¹');
  expect(predicted.querySelector('.warning')!.textContent).toMatch(/^Extrapolated/);
  expect(predicted.querySelector('.caution')!.textContent).toBe(functionNamed('COEFFICIENTAT')!.caution);
  expect(pane.root.querySelector('svg .touch')!.getAttribute('d')).not.toBe('');
  await pane.type('#temperature-at', '55 degC');
  expect(pane.root.querySelector('#temperature .warning')).toBeNull();
});

test('what cannot be a temperature is told at its field', async () => {
  await open();
  await pane.type('#temperature-at', '-400');
  expect(pane.text('#temperature-at-problem')).toMatch(/^temperature must be above -273.15/);
});

test('energy with limits: two named rows; a coefficient: one', async () => {
  await open();
  await pane.tick('#with-detail');
  await pane.press('Put it in');
  expect(['D2', 'D3', 'E1'].map(pane.book.valueAt)).toEqual(['Ea / (kJ/mol)', 'ln A', 'value']);
  expect(pane.book.formulaAt('E2')).toBe('=PACE.ARRHENIUS(Store!A2:A5,Store!B2:B5,,TRUE)');
  expect(pane.book.valueAt('E2')).toBeCloseTo(80, 6);
  await pane.type('#temperature-at', '25');
  await pane.choose('#temperature-answer', 'coefficient');
  await pane.press('Put it in');
  const target = pane.text('.notice').match(/Store!([A-Z]+2)/)![1];
  expect(pane.book.formulaAt(target)).toBe('=PACE.COEFFICIENTAT(Store!A2:A5,Store!B2:B5,25,,TRUE)');
  expect(pane.book.valueAt(target)).toBeCloseTo(0.001, 9);
});

test('coefficients that cannot be are refused in words', async () => {
  pane = await openPane({ Store: table.map((row, r) => (r === 2 ? [row[0], -1, 3] : row)) }, 'A2');
  expect(pane.text('.result .problem')).toMatch(/^coefficients must be above 0: row 2/);
  expect(pane.find<HTMLButtonElement>('#put-in button.main').disabled).toBe(true);
});

test('temperatures written with their unit are taken as what they are, in kelvin too', async () => {
  const written = [40, 50, 60, 70].map((t, i) => [
    ['40 °C', '50.0 degC', '333.15 K', '70 degC'][i],
    coefficientAt(t),
  ]);
  pane = await openPane({ Store: [['bath', 'k / d⁻¹'], ...written] }, 'A2');
  await pane.tick('#task-temperature');
  expect(pane.text('.result .value')).toBe('80 kJ/mol');
  expect(pane.text('#formula')).toBe('=PACE.ARRHENIUS(Store!A2:A5,Store!B2:B5)');
  expect(pane.find('#temperature svg').getAttribute('aria-label')).toContain('4 temperatures');
  await pane.press('Put it in');
  expect(pane.book.valueAt('C2')).toBeCloseTo(80, 8);
});

test('a run in time beside it brings back the rate', async () => {
  const run = [0, 1, 2, 3, 4].map((t) => [t, 8 - t]);
  const beside = [['t / d', 'V / mL'], ...run];
  pane = await openPane(
    { Store: beside.map((row, r) => [...(table[r] ?? [null, null, null]), null, ...row]) },
    'A2',
  );
  expect(pane.find('#task-temperature').getAttribute('aria-current')).toBe('step');
  pane.book.select('E3');
  await pane.settled();
  await pane.press('Use Store!E1:F6');
  expect(pane.find('#task-rate').getAttribute('aria-current')).toBe('step');
});
