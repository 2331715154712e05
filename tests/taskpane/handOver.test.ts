/** @jest-environment jsdom */
/** The Hand over step, with a maker of copies that stands in for the engine. */
import { Stopped, type CopyMaker, type HandedCopy } from '../../taskpane/copying';
import { excelPort } from '../../taskpane/excel';
import { supportOf } from '../../taskpane/excel/support';
import { fakeExcel } from './fakeExcel';
import { fakeOffice, type FakeOffice, type OfficeSetting } from './fakeOffice';
import { openPaneOver, type PaneHands } from './paneBench';

/** More than one slice, and no whole number of them; every byte value in it. */
const file = Uint8Array.from({ length: 150_001 }, (_, i) => (i * 7) % 256);
const copy: HandedCopy = {
  bytes: Uint8Array.from(file).reverse(),
  live: 3,
  frozen: [
    { why: 'a fit', cells: ['A1', 'A2', 'A3', 'A4', 'A5'] },
    { why: 'another', cells: ['B1'] },
  ],
  left: [{ why: 'a validation: without the add-in it holds nothing back any more', cells: ['Run!A1'] }],
  failing: ["'Gas run'!C9"],
};

let pane: PaneHands;
let office: FakeOffice;
afterEach(() => pane.close());

async function open(makeCopy: CopyMaker, setting: OfficeSetting = { file }): Promise<void> {
  fakeExcel({ Run: [] });
  office = fakeOffice(setting);
  pane = await openPaneOver(excelPort(supportOf('Excel')), { makeCopy });
  await pane.tick('#task-handOver');
}

const until = async (isTrue: () => boolean): Promise<void> => {
  for (let turn = 0; turn < 400 && !isTrue(); turn++) await pane.settled();
};

test('the workbook’s file is read whole, its copy told of, and opened beside it', async () => {
  const makeCopy = jest.fn<ReturnType<CopyMaker>, Parameters<CopyMaker>>(async () => copy);
  await open(makeCopy);
  await pane.press('Make the copy');
  await until(() => pane.root.querySelector('.counts') !== null);
  expect(Buffer.from(makeCopy.mock.calls[0][0]).equals(Buffer.from(file))).toBe(true);
  expect(office.unclosed()).toBe(0);
  expect(pane.text('.counts')).toBe(
    '3live: they follow their inputs6frozen to their value1not in cells: these still need the add-in1showed an error before, and still do',
  );
  expect(pane.text('#hand-over')).toContain('a fit: A1, A2, A3, A4 and 1 more');
  expect(pane.text('#hand-over')).toContain('it holds nothing back any more: Run!A1');
  expect(office.opened).toEqual([]);
  await pane.press('Open the copy');
  expect(office.opened.map((text) => Buffer.from(text, 'base64').equals(Buffer.from(copy.bytes)))).toEqual([
    true,
  ]);
  expect(pane.text('.notice')).toContain('save it from there');
});

test('while it is made it can be stopped, and then nothing is given', async () => {
  await open(
    (_, stop) =>
      new Promise((_resolve, reject) => stop.addEventListener('abort', () => reject(new Stopped()))),
  );
  await pane.press('Make the copy');
  await until(() => pane.text('#hand-over [role=status]').startsWith('calculating'));
  await pane.press('Stop');
  expect(pane.text('.notice')).toContain('no copy was made');
  expect(pane.root.querySelector('.counts, progress')).toBeNull();
  await pane.press('Make the copy'); // and it can be tried again
  await pane.press('Stop');
});

test('the keyboard keeps its place when the button under it has gone', async () => {
  await open(async () => copy);
  pane.find<HTMLButtonElement>('#hand-over button.main').focus();
  await pane.press('Make the copy');
  await until(() => pane.root.querySelector('.counts') !== null);
  expect(document.activeElement).toBe(pane.find('#hand-over-title'));
});

test('what goes wrong is said: with the file, and with the copy', async () => {
  await open(async () => copy, { refusal: 'the document is protected' });
  await pane.press('Make the copy');
  await until(() => pane.text('.notice') !== '');
  expect(pane.text('.notice')).toBe('no copy was made: the document is protected');

  pane.close();
  await open(() => Promise.reject(new Error('it is no workbook')));
  await pane.press('Make the copy');
  await until(() => pane.text('.notice') !== '');
  expect(pane.text('.notice')).toBe('no copy was made: it is no workbook');
  expect(office.unclosed()).toBe(0);
});

test('a workbook without formulas of ours is said to be one', async () => {
  await open(async () => ({ ...copy, live: 0, frozen: [], left: [], failing: [] }));
  await pane.press('Make the copy');
  await until(() => pane.text('#hand-over [role=status]').startsWith('No formula'));
  expect(pane.text('#hand-over [role=status]')).toContain('No formula of ours');
});

test('a workbook whose only calls stand in no cell is said to need the add-in still', async () => {
  await open(async () => ({ ...copy, live: 0, frozen: [], failing: [] }));
  await pane.press('Make the copy');
  await until(() => pane.root.querySelector('.counts') !== null);
  expect(pane.text('.counts')).toBe('1not in cells: these still need the add-in');
  expect(pane.text('#hand-over [role=status]')).not.toContain('No formula of ours');
});

test('where Excel keeps the file to itself, the other ways are told', async () => {
  await open(async () => copy, { file, lacks: ['ExcelApi 1.8'] });
  expect(pane.text('#hand-over')).toContain('npm run handover');
  await expect(pane.press('Make the copy')).rejects.toThrow('no button');
});
