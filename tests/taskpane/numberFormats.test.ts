/** @jest-environment jsdom */
import { SSF } from '@e965/xlsx';
import { columnFormat, columnsFormats, numberFormat, tableFormats } from '../../taskpane/numberFormats';
import { uniform } from '../support/random';
import { openPane, type PaneBench } from './paneBench';

/** As a spreadsheet shows it, by a formatter that is not ours. */
const shown = (format: string, value: number): string => SSF.format(format, value) as string;

// the examples of JCGM 100:2008 (GUM), 7.2.2 and 7.2.6, from memory
test.each([
  [100.02147, 0.00035, '100.02147'],
  [10.05762, 0.027, '10.058'],
])('a cell shows %p with u = %p as the GUM writes it: %s', (value, uncertainty, written) =>
  expect(shown(numberFormat(value, uncertainty), value)).toBe(written),
);

test.each([
  [43.0781, 0.16078, '43.08'],
  [1.4312e-5, 3.9e-7, '1.431E-05'],
  [48231, 231, '4.823E+04'],
  [2_345_678, 8900, '2.3457E+06'],
  [0.0031, 0.0996, '0.00'],
  [12.3456, 0.996, '12.3'],
  [-0.48123, 0.00231, '-0.4812'],
])('%p with u = %p shows as %s', (value, uncertainty, written) =>
  expect(shown(numberFormat(value, uncertainty), value)).toBe(written),
);

test('for whatever value above its uncertainty the last digit shown is the second of the uncertainty', () => {
  const next = uniform(3);
  for (let turn = 0; turn < 2000; turn++) {
    const value = (next() < 0.5 ? -1 : 1) * 10 ** (14 * next() - 8);
    const uncertainty = Math.abs(value) * 10 ** (-5 * next() - 0.05);
    const place = Number(uncertainty.toExponential(1).split('e')[1]) - 1;
    const text = shown(numberFormat(value, uncertainty), value);
    const [figures, power = '0'] = text.split('E');
    const decimals = figures.split('.')[1]?.length ?? 0;
    // a value that rounds up to the next power of ten is written with one digit more before the point
    const rounded = Number(figures) === 10 || Math.abs(Number(figures)) === 1 ? [place, place + 1] : [place];
    expect(rounded).toContain(Number(power) - decimals);
    expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(0.5001 * 10 ** (place + (rounded.length - 1)));
  }
});

test('without an uncertainty a value has four digits, and so has the largest of a column', () => {
  expect(shown(numberFormat(0.481234, null), 0.481234)).toBe('0.4812');
  expect([0, 8.8, 58.6].map((one) => shown(columnFormat([0, 8.8, 58.6]), one))).toEqual([
    '0.00',
    '8.80',
    '58.60',
  ]);
  expect(shown(columnFormat([3.61e-5, 2.2e-7]), 2.2e-7)).toBe('2.200E-07');
  expect(columnFormat([])).toBe('0.000');
});

test('a column with uncertainties has one format, by the middle one', () => {
  const estimate = (value: number, uncertainty: number | null) => ({
    value,
    uncertainty,
    lower: null,
    upper: null,
    degreesOfFreedom: 7.4,
  });
  expect(columnsFormats([estimate(2.4, 0.02), null, estimate(0.3, 0.031), estimate(0.1, 0.5)])).toEqual([
    '0.000',
    '0.000',
    '0.000',
    '0.000',
    '0.0',
  ]);
});

test('in a table each coefficient follows its own uncertainty, and shares are shares', () => {
  const rows = [
    ['order', 'rate coefficient', 'standard uncertainty', 'AICc weight', 'verdict'],
    [0, 1.617e-5, 1.2e-6, 1e-30, 'no'],
    [1, 0.01609, 0.00006, 0.97, 'fits best'],
  ];
  expect(tableFormats(rows)).toEqual([
    [null, null, null, null, null],
    ['0.00', '0.00E+00', '0.0E+00', '0.000', null],
    ['0.00', '0.000000', '0.000000', '0.000', null],
  ]);
});

let pane: PaneBench;
const times = Array.from({ length: 11 }, (_, place) => 10 * place);
/** Off a straight line by a little, to and fro. */
const readings = times.map((t, place) => 3 * t + (place % 2 === 0 ? 0.4 : -0.4));
const rows = [['t / s', 'V / mL'], ...times.map((t, place) => [t, readings[place]])];

test('what is put in gets its formats: one estimate, a whole row of it, and a column', async () => {
  pane = await openPane({ Run: rows }, 'Run!A2');
  await pane.press('Put it in');
  const rate = pane.book.valueAt('Run!C2') as number;
  expect(shown(pane.book.numberFormat('Run!C2'), rate)).toBe(pane.text('.result .value').split(' ± ')[0]);
  expect(pane.book.numberFormat('Run!C1')).toBe('General');
  await pane.press('Undo');
  expect(pane.book.numberFormat('Run!C2')).toBe('General');

  await pane.tick('#with-detail');
  await pane.press('Put it in');
  const [format] = ['C2', 'D2', 'E2', 'F2'].map((cell) => pane.book.numberFormat(`Run!${cell}`));
  expect(shown(format, pane.book.valueAt('Run!D2') as number)).toMatch(/^0\.0*[1-9]\d$/); // two digits
  expect(pane.book.numberFormat('Run!G2')).toMatch(/^0(\.0)?$/);
  await pane.press('Undo');

  await pane.tick('#kind-column');
  await pane.press('Put it in');
  const column = times.map((_, place) => pane.book.numberFormat(`Run!C${place + 2}`));
  expect(new Set(column).size).toBe(1);
  expect(column[0]).toMatch(/^0\.0+$/);
  pane.close();
});
