/** @jest-environment jsdom */
/** A chart beside what is put in, as Excel is told to draw it. */
import { excelPort } from '../../taskpane/excel';
import { allSupport } from '../../taskpane/excel/support';
import { fakeExcel, type FakeExcel } from './fakeExcel';
import { openPaneOver, type PaneHands } from './paneBench';

let excel: FakeExcel;
let pane: PaneHands;
afterEach(() => pane.close());

async function open(charts = true): Promise<void> {
  const times = [0, 10, 20, 30, 40, 50];
  excel = fakeExcel({ Run: [['t / min', 'A'], ...times.map((t) => [t, 0.8 * 0.5 ** (t / 10)])] });
  excel.select('Run!A2');
  pane = await openPaneOver(excelPort({ ...allSupport, charts }));
  await pane.settled();
}

const points = { name: 'A', x: 'Run!A2:A7', y: 'Run!B2:B7', chartType: 'XYScatter' };

test('unasked, nothing is drawn', async () => {
  await open();
  await pane.press('Put it in');
  expect(excel.charts).toEqual([]);
});

test('a rate has the readings beside it, with their names and units on the axes', async () => {
  await open();
  await pane.tick('#with-chart');
  await pane.press('Put it in');
  const [chart] = excel.charts;
  expect(chart.series).toMatchObject([points]);
  expect([chart.axes.categoryAxis.title.text, chart.axes.valueAxis.title.text]).toEqual(['t / min', 'A']);
  expect(chart.title.text).toBe('A');
  expect(chart.legend.visible).toBe(false);
  expect(chart.position).toBe('Run!E1 to Run!K16'); // a column clear of the answer in C
});

test('a fit is a line through them, over the cells it is written to; undo takes cells and chart away', async () => {
  await open();
  await pane.tick('#task-order');
  await pane.choose('#order-answer', 'curve');
  await pane.tick('#with-chart');
  await pane.press('Put it in');
  expect(excel.charts[0].series).toMatchObject([
    points,
    { name: 'fit, order 1', x: 'Run!A2:A7', y: 'Run!C2:C7', chartType: 'XYScatterSmoothNoMarkers' },
  ]);
  expect(excel.charts[0].title.text).toBe('A: fit, order 1');
  expect(excel.charts[0].legend.visible).toBe(true);
  await pane.press('Undo');
  expect(excel.charts).toEqual([]);
  await pane.press('Put it in'); // what a person has taken away by hand is not missed
  (excel.charts as unknown[]).length = 0;
  await pane.press('Undo');
  expect(pane.text('.notice')).toContain('taken back');
});

test('where none can be drawn, none is offered', async () => {
  await open(false);
  expect(pane.root.querySelector('#with-chart')).toBeNull();
});
