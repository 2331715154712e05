/** @jest-environment jsdom */
/** The pane's whole way through Office.js: what Excel is told, and what it would then hold. */
import { parseArea } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { excelPort } from '../../taskpane/excel';
import { fakeExcel } from './fakeExcel';
import { openPaneOver, type PaneHands } from './paneBench';

let pane: PaneHands;
let select: (reference: string) => void;
afterEach(() => pane.close());

async function open(rows: readonly (readonly CellValue[])[]): Promise<void> {
  ({ select } = fakeExcel({ Run: rows }));
  select('Run!A2');
  pane = await openPaneOver(excelPort());
  await pane.settled();
}

/** What Excel would hold, whoever reads it. */
const holds = (reference: string): Promise<unknown> =>
  Excel.run(async (context) => {
    const { row, column, rows, columns } = parseArea(reference)!;
    const range = context.workbook.worksheets.getItem('Run').getRangeByIndexes(row, column, rows, columns);
    range.load({ formulas: true });
    await context.sync();
    return range.formulas[0][0];
  });

const times = [0, 10, 20, 30, 40, 50];
const fading = [['t / min', 'A'], ...times.map((t) => [t, 0.8 * 0.5 ** (t / 10)])];

test('order: the coefficient goes in under its heading, and comes out again', async () => {
  await open(fading);
  await pane.tick('#task-order');
  expect(pane.text('#order .result .value')).toBe('0.06931 min⁻¹');
  await pane.press('Put it in');
  expect(await holds('C1')).toBe('rate coefficient, order 1 / min⁻¹');
  expect(await holds('C2')).toBe('=PACE.COEFFICIENT(Run!A2:A7,Run!B2:B7,1)');
  await pane.press('Undo');
  expect([await holds('C1'), await holds('C2')]).toEqual(['', '']);
});

test('reading: the run goes on with the converted column while Excel still calculates', async () => {
  await open(fading);
  await pane.tick('#task-reading');
  await pane.type('#reading-absorptivity', '2000');
  await pane.press('Put it in and go on');
  expect(await holds('C1')).toBe('c / (mol/L)');
  expect(pane.find<HTMLSelectElement>('#reading-column').selectedOptions[0].textContent).toBe(
    'C: c / (mol/L)',
  );
  await pane.tick('#task-rate');
  await pane.tick('#kind-average');
  await pane.type('#rate-from', '0');
  await pane.type('#rate-to', '10');
  expect(pane.text('.result .value')).toMatch(/^\(2\.00 ± 0\.\d+\) × 10⁻⁵ \(mol\/L\)\/min$/); // half of 0.8/2000 in 10 min
});

test('many runs: what stands in the way is named, and nothing is written', async () => {
  await open(
    fading.map((row, r) => [...row, r === 0 ? 'A' : Number(row[1]) / 2, null, r === 3 ? 'mine' : null]),
  );
  await pane.tick('#task-many');
  expect(pane.text('#formula')).toBe('=PACE.SURVEY(Run!A2:A7,Run!B2:C7,1)');
  await pane.type('#target', 'E2');
  await pane.press('Put it in');
  expect(pane.text('.question')).toContain('E4');
  expect(await holds('E2')).toBe('');
});

test('temperature: a table over temperature is known as one', async () => {
  await open([
    ['θ / °C', 'k / d⁻¹'],
    [25, 1],
    [35, 2],
  ]);
  // twice as fast 10 °C warmer: R ln 2/(1/298.15 − 1/308.15)
  expect(pane.text('#temperature .result .value')).toBe('52.95 kJ/mol');
  await pane.press('Put it in');
  expect(await holds('C2')).toBe('=PACE.ARRHENIUS(Run!A2:A3,Run!B2:B3)');
});

test('runs in rows: formulas take rows, and the answers stand below', async () => {
  await open([
    ['t / min', ...times],
    ['A1', ...times.map((t) => 0.8 * 0.5 ** (t / 10))],
    ['A2', ...times.map((t) => 0.8 * 0.5 ** (t / 20))],
  ]);
  await pane.tick('#task-many');
  expect(pane.text('#formula')).toBe('=PACE.SURVEY(Run!B1:G1,Run!B2:G3,1)');
  await pane.tick('#task-rate');
  await pane.tick('#kind-column');
  await pane.press('Put it in');
  expect(await holds('A4')).toBe('rate (reading unit per min)');
  expect(await holds('B4')).toBe('=PACE.ALONG(Run!B1:G1,Run!B2:G2)');
  await pane.press('Undo');
  expect([await holds('A4'), await holds('B4')]).toEqual(['', '']);
});

test('runs under each other: a formula each, beside the first', async () => {
  const rows = (name: string, halfLife: number): CellValue[][] =>
    times.map((t) => [name, t, 0.8 * 0.5 ** (t / halfLife)]);
  await open([['well', 't / min', 'A'], ...rows('A1', 10), ...rows('A2', 20)]);
  await pane.choose('#run-name', '7');
  await pane.tick('#task-order');
  expect(pane.text('#order .result .value')).toBe('0.03466 min⁻¹');
  await pane.tick('#task-many');
  await pane.press('Put it in');
  expect(await holds('D3')).toBe('A2');
  expect(await holds('E3')).toBe('=PACE.COEFFICIENT(Run!B8:B13,Run!C8:C13,1)');
});
