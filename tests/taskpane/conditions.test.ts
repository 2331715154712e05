/** @jest-environment jsdom */
/** Conditions that were put in once are there again, in the workbook that they belong to. */
import { excelPort } from '../../taskpane/excel';
import { supportOf } from '../../taskpane/excel/support';
import { fakeExcel } from './fakeExcel';
import { fakeOffice, type OfficeSetting } from './fakeOffice';
import { openPaneOver, type PaneHands } from './paneBench';

let pane: PaneHands;
afterEach(() => pane.close());

const gasRun = [['t / s', 'V / mL'], ...[0, 10, 20, 30].map((t) => [t, 2 * t])];

/** Anew, as when the workbook is opened on another day: all but its settings is forgotten. */
async function open(setting: OfficeSetting): Promise<void> {
  fakeExcel({ Run: gasRun }).select('Run!A2');
  fakeOffice(setting);
  pane = await openPaneOver(excelPort(supportOf('Excel')));
  await pane.tick('#task-reading');
}

async function convert(): Promise<void> {
  await pane.type('#reading-temperature', '21.4 degC');
  await pane.type('#reading-pressure', '100.6');
  await pane.press('Put it in');
}

const shown = (): string[] =>
  ['#reading-temperature', '#reading-pressure'].map((field) => pane.find<HTMLInputElement>(field).value);

test('the conditions of a conversion come back with the workbook, and leave no trace in another', async () => {
  const settings = new Map<string, unknown>();
  await open({ settings });
  expect(shown()).toEqual(['', '']);
  await convert();
  pane.close();
  await open({ settings });
  expect(shown()).toEqual(['21.4 degC', '100.6']);
  expect(pane.text('#formula')).toContain('"21.4 degC",100.6');
  pane.close();
  await open({ settings: new Map() });
  expect(shown()).toEqual(['', '']);
});

test('nothing is kept before it is put in', async () => {
  const settings = new Map<string, unknown>();
  await open({ settings });
  await pane.type('#reading-temperature', '21.4 degC');
  expect(settings.size).toBe(0);
});

test('a document that takes no settings takes the formula', async () => {
  await open({ isProtected: true });
  await convert();
  expect(pane.text('.notice.good')).toMatch(/^written: n\(gas\)/);
});

test.each(['no JSON', '[1, 2]', '{"temperature": 5}', 'null'])(
  'what stands there and is not ours is passed over: %s',
  async (words) => {
    await open({ settings: new Map([['flaskpace.conditions of GASVOLUME', words]]) });
    expect(shown()).toEqual(['', '']);
  },
);

test('a host that lacks the place is not asked for it', async () => {
  await open({ lacks: ['Settings 1.1'] });
  await convert();
  expect(pane.text('.notice.good')).toMatch(/^written: n\(gas\)/);
});
