/**
 * The local workbook in a real browser, from the command that serves it to the file that is saved. One
 * page for all, since loading it is what takes the time; each part begins with a book of its own.
 */
import { longestStart, startBench, type BenchPage, type PageBench } from './bench';
import { accessSuite } from './suites/access';
import { chosenSuite } from './suites/chosen';
import { filesSuite } from './suites/files';
import { handOverSuite } from './suites/handOver';
import { helpSuite } from './suites/help';
import { journeysSuite } from './suites/journeys';
import { paneSuite } from './suites/pane';
import { portSuite } from './suites/port';
import { sheetSuite } from './suites/sheet';
import { startSuite } from './suites/start';
import { tablesSuite } from './suites/tables';

let bench: PageBench;
let sheet: BenchPage;

beforeAll(async () => {
  bench = await startBench();
  sheet = await bench.open();
}, longestStart);
afterAll(() => bench?.close());

describe('the sheet', () => sheetSuite(() => sheet));
describe('files', () => filesSuite(() => sheet));
describe('the pane', () => paneSuite(() => sheet));
describe('a chosen formula', () => chosenSuite(() => sheet));
describe('whole jobs in the pane', () => journeysSuite(() => sheet));
describe('handing over', () => handOverSuite(() => sheet));
describe('tables of any kind', () =>
  tablesSuite(
    () => sheet,
    () => bench,
  ));
describe('the port', () => portSuite(() => sheet));
describe('help', () => helpSuite(() => sheet));
describe('everyone', () => accessSuite(() => sheet));
describe('the start', () => startSuite(() => bench));

test('through all of it nothing complained, and nothing was asked of another address', () =>
  expect(sheet.complaints).toEqual([]));
