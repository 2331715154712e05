/** @jest-environment jsdom */
import type { CellValue } from '../../functions/cell';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

const readings = [0, 10, 18, 24, 28, 31];
async function open(heading: string, times: readonly CellValue[]): Promise<void> {
  pane = await openPane({ Run: [[heading, 'c / mM'], ...times.map((t, i) => [t, readings[i]])] }, 'B3');
}
const offered = (): string | undefined => pane.root.querySelector('#clock-formula')?.textContent ?? undefined;

/** Half past nine on 3 November 2026 is day 46329 and 9.5/24 of it, as a sheet counts from 1900. */
const date = 46329 + 9.5 / 24;

test.each([
  ['written as text', 'time', ['9:30', '9:31', '9:32', '9:33', '9:34', '9:35']],
  ['dates', 'time', readings.map((_, i) => date + i / 1440)],
  ['parts of a day', 't', readings.map((_, i) => (9.5 + i / 60) / 24)],
])('clock times %s are offered a formula for minutes', async (_, heading, times) => {
  await open(heading, times);
  expect(offered()).toBe('=PACE.CLOCK(Run!A2:A7,"min","first")');
  // what it says is done: the new column becomes the times
  const { port } = pane.book;
  await port.write(
    [
      { area: { sheet: 'Run', row: 0, column: 2, rows: 1, columns: 1 }, content: { value: 't / min' } },
      {
        area: { sheet: 'Run', row: 1, column: 2, rows: 1, columns: 1 },
        content: { formula: offered()! },
        spills: { rows: 6, columns: 1 },
      },
    ],
    { overwrite: false, description: '' },
  );
  expect(pane.book.valueAt('C2')).toBeCloseTo(0, 8);
  expect(pane.book.valueAt('C7')).toBeCloseTo(5, 6);
  pane.book.select('A3');
  await pane.settled();
  await pane.press('Use the selected cells');
  await pane.choose('#time-column', '2');
  expect(offered()).toBeUndefined();
  expect(pane.text('#run')).toContain('6 readings');
});

test.each([
  ['a running time', 't', [0, 10, 20, 30, 40, 50]],
  ['a unit that says so', 't / d', [0, 0.1, 0.2, 0.3, 0.4, 0.5]],
])('%s is left alone', async (_, heading, times) => {
  await open(heading, times);
  expect(pane.text('#run')).toContain('6 readings');
  expect(offered()).toBeUndefined();
});

test('dates that the sheet does not know are named, with what to do', async () => {
  await open(
    'time',
    readings.map((_, i) => `2026-11-03 09:0${i}`),
  );
  expect(pane.text('#run .problem')).toMatch(
    /has one column of numbers; “2026-11-03 09:00” is text: type times/,
  );
});
