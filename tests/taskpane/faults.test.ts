/** @jest-environment jsdom */
/** A run with each fault that a check knows, through Office.js: the pane says so, and stands. */
import { excelPort } from '../../taskpane/excel';
import { fakeExcel } from './fakeExcel';
import { faultySheets } from './faultySheets';
import { openPaneOver, type PaneHands } from './paneBench';

let pane: PaneHands;
afterEach(() => pane.close());

test.each(faultySheets)('$name is said beside the run', async ({ rows, says }) => {
  fakeExcel({ Run: rows }).select('Run!A2');
  pane = await openPaneOver(excelPort());
  await pane.settled();
  const said = [...pane.root.querySelectorAll('.finding')].map(({ textContent }) => textContent);
  expect(said).toEqual([expect.stringMatching(says)]);
  for (const step of ['rate', 'order', 'many']) {
    await pane.tick(`#task-${step}`);
    expect(pane.root.textContent).not.toMatch(/NaN|Infinity|undefined/);
  }
});

test('without a single reading there is no run, and the pane says why', async () => {
  fakeExcel({
    Run: [
      ['t / s', 'A'],
      [0, null],
      [10, null],
    ],
  }).select('Run!A2');
  pane = await openPaneOver(excelPort());
  await pane.settled();
  expect(pane.text('#run .problem')).toBe(
    'a run needs a column of times and a column of readings, side by side: Run!A1:B3 has one column of numbers',
  );
});
