/** @jest-environment jsdom */
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane.close());

const times = [0, 10, 20, 30, 40, 50];
/** Halved every 10 min: k = ln 2 / 10 min⁻¹ = 0.06931, half life 10 min. */
const halved = [['t / min', 'c / (mol/L)'], ...times.map((t) => [t, 32 * 0.5 ** (t / 10)])];
/** 1/c = 1/2 + 0.05 t: order 2, k = 0.05 L mol⁻¹ min⁻¹. */
const secondOrder = [['t / min', 'c / (mol/L)'], ...times.map((t) => [t, 1 / (0.5 + 0.05 * t)])];

async function open(rows: readonly (readonly (string | number)[])[] = halved): Promise<void> {
  pane = await openPane({ Run: rows }, 'A2');
  await pane.tick('#task-order');
}

test('order 1: coefficient with unit, half life, fit and residuals, formula', async () => {
  await open();
  expect(pane.text('.result .value')).toBe('0.06931 min⁻¹');
  expect(pane.text('.result')).toContain('10 min');
  expect(pane.text('#formula')).toBe('=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,1)');
  const [fit, residuals] = pane.root.querySelectorAll('#order svg');
  expect(fit.querySelector('.rate-line')!.getAttribute('d')!.split('L')).toHaveLength(61);
  expect(fit.getAttribute('aria-label')).toContain('6 readings with the fit; rate coefficient 0.06931 min⁻¹');
  expect(residuals.querySelectorAll('.stem')).toHaveLength(6);
});

test('order 2 has its own unit, by PACE.UNIT', async () => {
  await open(secondOrder);
  await pane.tick('#order-2');
  expect(pane.text('.result .value')).toBe('0.05 L mol⁻¹ min⁻¹');
  await pane.press('Put it in');
  expect(pane.book.valueAt('C1')).toBe('rate coefficient, order 2 / (L mol⁻¹ min⁻¹)');
  expect(pane.book.formulaAt('C2')).toBe('=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,2)');
});

test('a fitted order is shown, and stands in the formula as the call that fits it', async () => {
  await open(secondOrder);
  await pane.tick('#order-free');
  expect(pane.text('.result .what')).toBe('order, fitted');
  expect(Number.parseFloat(pane.text('.result .value'))).toBeCloseTo(2, 6);
  expect(pane.text('#formula')).toBe(
    '=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,PACE.ORDER(Run!A2:A7,Run!B2:B7))',
  );
});

test('every order has its weight and its verdict', async () => {
  await open();
  const rows = [...pane.root.querySelectorAll('.verdicts tbody tr')].map((row) => row.textContent!);
  expect(rows).toHaveLength(7);
  expect(rows[2]).toMatch(/^1100 %fits best/);
  expect(rows[6]).toMatch(/^fitted: 1/);
});

test('the reading at the end: a cell counts as much as a number', async () => {
  const rows = halved.map((row, r) => (r === 0 ? [...row, '', 5] : [row[0], Number(row[1]) + 5]));
  await open(rows);
  await pane.choose('#endpoint-kind', 'given');
  await pane.type('#endpoint', '5');
  expect(pane.text('.result .value')).toBe('0.06931 min⁻¹');
  pane.book.select('D1');
  await pane.settled();
  await pane.press('Cell');
  expect(pane.find<HTMLInputElement>('#endpoint').value).toBe('Run!D1');
  expect(pane.text('.result .value')).toBe('0.06931 min⁻¹');
  expect(pane.text('#formula')).toBe('=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,1,Run!D1)');
  pane.book.set('D1', 4);
  pane.book.select('D1');
  await pane.settled();
  expect(pane.text('.result .value')).not.toBe('0.06931 min⁻¹');
});

test('an end that cannot be is refused at its field', async () => {
  await open();
  await pane.choose('#endpoint-kind', 'given');
  await pane.type('#endpoint', 'all of it');
  expect(pane.text('#endpoint-problem')).toMatch(/^endpoint must be a number or "free"/);
  expect(pane.find<HTMLButtonElement>('#put-in button.main').disabled).toBe(true);
});

test('why there is no answer is said once', async () => {
  await open([['t / min', 'c / (mol/L)'], ...times.map((t) => [t, 32 + t])]);
  await pane.choose('#endpoint-kind', 'zero');
  const refused = pane.text('#order .problem');
  expect(refused).toMatch(/endpoint/);
  expect(pane.text('#order').split(refused)).toHaveLength(2);
});

test('a rising run has its end fitted from the start', async () => {
  await open([['t / min', 'V / mL'], ...times.map((t) => [t, 40 * (1 - 0.5 ** (t / 10))])]);
  expect(pane.find<HTMLSelectElement>('#endpoint-kind').value).toBe('free');
  expect(pane.text('#formula')).toMatch(/,1,"free"\)$/);
  expect(pane.text('.result .value')).toBe('0.06931 min⁻¹');
});

test.each([
  ['coefficient', false, '=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,1)', 'Run!C1:C2'],
  ['halfLife', true, '=PACE.HALFLIFE(Run!A2:A7,Run!B2:B7,1,,,TRUE)', 'Run!C1:G2'],
  ['order', true, '=PACE.ORDER(Run!A2:A7,Run!B2:B7,,,TRUE)', 'Run!C1:G2'],
  ['curve', true, '=PACE.CURVE(Run!A2:A7,Run!B2:B7,1)', 'Run!C1:C7'],
  ['orders', true, '=PACE.ORDERS(Run!A2:A7,Run!B2:B7)', 'Run!C2:K9'],
])('put in: %s, detail %s', async (answer, detail, formula, area) => {
  await open();
  if (detail) await pane.tick('#with-detail');
  await pane.choose('#order-answer', answer);
  expect(pane.text('#formula')).toBe(formula);
  expect(pane.text('#put-in .where')).toBe(area);
  await pane.press('Put it in');
  expect(pane.book.formulaAt('C2')).toBe(formula);
});
