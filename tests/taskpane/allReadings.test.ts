/** @jest-environment jsdom */
/** The step Reading on all runs of a table at once. */
import type { CellValue } from '../../functions/cell';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

/** At 0 °C and 100 kPa an ideal gas takes 22.710 954 64 L/mol (CODATA 2022). */
const millimole = 22.71095464; // mL
const counts = [0, 1, 2, 3, 4];
const other = counts.map((n) => n / 2);
const volumes = (moles: readonly number[]): number[] => moles.map((n) => n * millimole);
const long: CellValue[][] = [
  ['run', 't / s', 'V / mL'],
  ...counts.map((n, i) => ['A', 10 * i, n * millimole]),
  ...other.map((n, i) => ['B', 20 * i, n * millimole]),
];
/** Millimoles of a column of cells. */
const millimoles = (column: string, first: number): number[] =>
  counts.map((_, i) => 1000 * Number(pane.book.valueAt(`${column}${first + i}`)));
const expectMillimoles = (column: string, first: number, expected: readonly number[]): void =>
  expected.forEach((n, i) => expect(millimoles(column, first)[i]).toBeCloseTo(n, 8));

async function open(rows: readonly (readonly CellValue[])[], at = 'A2'): Promise<void> {
  pane = await openPane({ Run: rows }, at);
  await pane.tick('#task-reading');
  await pane.type('#reading-temperature', '273.15 K');
  await pane.type('#reading-pressure', '1 bar');
}

describe('runs under each other', () => {
  test('are converted in one column, which all of them go on with, and taken back in one step', async () => {
    await open(long);
    await pane.choose('#run-name', '6'); // whichever is chosen
    expect(pane.text('#put-in .where')).toBe('Run!D1:D11');
    await pane.press('Put it in and go on');
    expect(pane.book.formulaAt('D2')).toMatch(/^=PACE\.GASVOLUME\(Run!C2:C6,/);
    expect(pane.book.formulaAt('D7')).toMatch(/^=PACE\.GASVOLUME\(Run!C7:C11,/);
    expect(pane.book.valueAt('D1')).toBe('n(gas) / mol');
    expectMillimoles('D', 2, counts);
    expectMillimoles('D', 7, other);
    expect(pane.find<HTMLSelectElement>('#reading-column').value).toBe('3');
    expect(pane.find<HTMLSelectElement>('#run-name').selectedOptions[0].textContent).toBe('B');
    await pane.tick('#task-many');
    await pane.choose('#many-answer', 'order');
    expect(pane.text('#formula')).toContain('Run!D2:D6');
    await pane.press('Undo: n(gas) of 2 runs');
    expect(pane.book.valueAt('D1')).toBeNull();
    expect(pane.book.valueAt('D11')).toBeNull();
    expect(pane.find<HTMLSelectElement>('#reading-column').value).toBe('2');
  });

  test('can stand side by side, each with its times, apart from the table', async () => {
    await open(long);
    await pane.tick('#reading-layout-pairs');
    expect(pane.text('#put-in .where')).toBe('Run!E1:H6');
    await pane.press('Put it in');
    expect(['E', 'F', 'G', 'H'].map((column) => pane.book.valueAt(`${column}1`))).toEqual([
      't / s',
      'A: n(gas) / mol',
      't / s',
      'B: n(gas) / mol',
    ]);
    expect(pane.book.formulaAt('G2')).toBe('=Run!B7:B11');
    expect(pane.book.valueAt('G6')).toBe(80);
    expectMillimoles('F', 2, counts);
    expectMillimoles('H', 2, other);
    pane.book.select('F3');
    await pane.settled();
    await pane.press('Use Run!E1:H6 instead');
    expect(pane.find<HTMLSelectElement>('#reading-column').selectedOptions[0].textContent).toContain(
      'A: n(gas)',
    );
  });

  test('one of them alone, where that is said', async () => {
    await open(long);
    await pane.tick('#reading-runs-this');
    expect(pane.text('#put-in .where')).toBe('Run!D1:D6');
    expect(pane.root.querySelector('#reading-layout-pairs')).toBeNull();
  });

  test('a run that is refused is named', async () => {
    await open(long.map((row, r) => (r === 8 ? ['B', 40, -3] : row)));
    expect(pane.text('#reading .result .problem')).toMatch(/^B: volumes must be 0 or more/);
  });
});

describe('runs side by side', () => {
  const shared: CellValue[][] = [
    ['t / s', 'A / mL', 'B / mL'],
    ...counts.map((n, i) => [10 * i, n * millimole, other[i] * millimole]),
  ];

  test('are converted one by one unless all are meant, a column each', async () => {
    await open(shared, 'B2');
    await pane.choose('#reading-what', 'GASVOLUME');
    await pane.type('#reading-temperature', '273.15 K');
    await pane.type('#reading-pressure', '1 bar');
    expect(pane.text('#put-in .where')).toBe('Run!D1:D6');
    await pane.tick('#reading-runs-all');
    expect(pane.text('#put-in .where')).toBe('Run!D1:E6');
    await pane.press('Put it in and go on');
    expect(pane.book.valueAt('E1')).toBe('B: n(gas) / mol');
    expectMillimoles('E', 2, other);
    expect(pane.find<HTMLSelectElement>('#reading-column').value).toBe('3');
    await pane.tick('#task-many');
    expect(pane.text('#many [role=status]')).toBe('2 of 4 runs picked');
  });

  test('with times of their own each is put in with its times', async () => {
    const own = shared.map(([t, a, b], r) => [t, a, r === 0 ? 't / s' : 2 * Number(t), b]);
    await open(own, 'B2');
    await pane.tick('#reading-runs-all');
    expect(pane.text('#put-in .where')).toBe('Run!F1:I6');
    await pane.press('Put it in');
    expect(pane.book.formulaAt('H2')).toBe('=Run!C2:C6');
    expectMillimoles('I', 2, other);
  });
});

test('runs in rows become rows', async () => {
  await open(
    [
      ['t / s', ...counts.map((_, i) => 10 * i)],
      ['A / mL', ...volumes(counts)],
      ['B / mL', ...volumes(other)],
    ],
    'B2',
  );
  await pane.tick('#reading-runs-all');
  expect(pane.text('#put-in .where')).toBe('Run!A4:F5');
  await pane.press('Put it in and go on');
  expect(pane.book.valueAt('A5')).toBe('B: n(gas) / mol');
  expect(1000 * Number(pane.book.valueAt('F5'))).toBeCloseTo(2, 8);
  expect(pane.find<HTMLSelectElement>('#reading-column').value).toBe('3');
});
