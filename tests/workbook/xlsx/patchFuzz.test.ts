/** Workbooks made up at random: whatever stands beside whatever, a copy reads back as what was calculated. */
import * as XLSX from '@e965/xlsx';
import { cellName } from '../../../functions/address';
import { CellError } from '../../../functions/cell';
import type { CalculatedBook } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { handOver } from '../../../workbook/handover/handOver';
import { filedErrors } from '../../../workbook/xlsx/cellXml';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { madeUp, type MadeUp } from './madeUp';
import { partsOf, rowsOf, textOf, zipped } from './package';
import { recalculated } from './patched';

/** As a library reads it that owes us nothing. */
const sheetOf = (bytes: Uint8Array): XLSX.WorkSheet =>
  XLSX.read(bytes, { type: 'array', cellFormula: true }).Sheets.Run;

const path = 'xl/worksheets/sheet1.xml';
const inSheet = (bytes: Uint8Array, change: (xml: string) => string): Uint8Array =>
  zipped({ ...partsOf(bytes), [path]: change(textOf(bytes, path)) });

/** The library passes over formulas that have no value yet. */
const withValues = (bytes: Uint8Array): Uint8Array =>
  inSheet(bytes, (xml) => xml.replace(/(<\/f>|<f [^>]*\/>)(?!<v>)/g, '$1<v>0</v>'));

/** Errors younger than the format stand as #VALUE!. */
const filed = ({ code }: CellError): string => (filedErrors.has(code) ? code : '#VALUE!');

const calls = (formula: string | undefined): boolean => /PACE/.test(formula ?? '');

/** What is wrong with a copy: values, other people's formulas, merged cells, notes. */
function faultsOf({ bytes, rows, columns }: MadeUp, copy: Uint8Array, expected: CalculatedBook): string[] {
  const [before, after] = [sheetOf(withValues(bytes)), sheetOf(copy)];
  const faults: string[] = [];
  const compare = (what: string, was: unknown, is: unknown): void => {
    const [wanted, found] = [was, is].map((value) => JSON.stringify(value ?? null));
    if (wanted !== found) faults.push(`${what}: ${found} for ${wanted}`);
  };
  for (let r = 0; r < rows + 3; r++) {
    for (let c = 0; c < columns + 3; c++) {
      const name = cellName(r, c);
      const [was, is] = [before, after].map((sheet) => sheet[name] as XLSX.CellObject | undefined);
      const shown = expected.shown('Run', r, c);
      compare(name, shown instanceof CellError ? filed(shown) : shown, is?.t === 'e' ? is.w : is?.v);
      if (!calls(was?.f) && expected.formula('Run', r, c)) compare(`formula of ${name}`, was?.f, is?.f);
    }
  }
  compare('merged cells', before['!merges'], after['!merges']);
  const table = 'xl/tables/table1.xml';
  const bare = (file: Uint8Array): string | undefined =>
    partsOf(file)[table] && textOf(file, table).replace(/<calculatedColumnFormula>_xl.*?<\/.*?>/, '');
  compare('table', bare(bytes), bare(copy));
  return faults;
}

const notesOf = (bytes: Uint8Array): string =>
  partsOf(bytes)['xl/comments1.xml'] ? textOf(bytes, 'xl/comments1.xml') : '';

const seeds = (count: number): number[] => Array.from({ length: count }, (_, i) => i + 1);

test.each(seeds(60))('recalculated: seed %d', async (seed) => {
  const book = madeUp(seed);
  const copy = await recalculated(book.bytes);
  expect(faultsOf(book, copy, await calculate(readWorkbook(book.bytes)))).toEqual([]);
  const [was, is] = [partsOf(book.bytes), partsOf(copy)];
  for (const path of Object.keys(was).filter((one) => /comments|drawing|table/.test(one)))
    expect([path, Buffer.from(is[path]).equals(was[path])]).toEqual([path, true]);
});

test.each(seeds(30))('handed over: seed %d', async (seed) => {
  const book = madeUp(seed);
  const { bytes: copy } = await handOver(book.bytes, { version: '1.2.3', date: '2026-12-01' });
  expect(faultsOf(book, copy, await calculate(readWorkbook(book.bytes)))).toEqual([]);
  expect(rowsOf(copy).match(/<f[^>]*>[^<]*PACE[^<]*/g)).toBeNull();
  for (const name of book.merged)
    expect(rowsOf(copy)).not.toMatch(new RegExp(`<c r="${name}"[^>]*><f t="array"[^>]*>(?!SEQUENCE)`));
  expect(notesOf(copy)).toContain(/<comment .*?<\/comment>/.exec(notesOf(book.bytes))?.[0] ?? '');
});

describe('a planted fault is found:', () => {
  let copies: { book: MadeUp; copy: Uint8Array; expected: CalculatedBook }[];
  beforeAll(async () => {
    copies = await Promise.all(
      seeds(40).map(async (seed) => {
        const book = madeUp(seed);
        const [copy, expected] = [await recalculated(book.bytes), await calculate(readWorkbook(book.bytes))];
        return { book, copy, expected };
      }),
    );
  }, 120_000);

  test.each<[string, (xml: string) => string]>([
    ['a value', (xml) => xml.replace(/<\/f><v>[^<]*</, '</f><v>7.5<')],
    ['a cell that is gone', (xml) => xml.replace(/<c r="[A-Z]\d+"><v>[^<]*<\/v><\/c>/, '')],
    ['a formula of the workbook’s own', (xml) => xml.replace('<f>1+1</f>', '<f>2+0</f>')],
    ['merged cells', (xml) => xml.replace(/<mergeCell [^>]*>/, '<mergeCell ref="H1:H2"/>')],
    [
      'a shared formula that is another',
      (xml) => xml.replace(/(<f t="shared" ref="[^"]*" si="\d">)(?!_xl)[^<]*/, '$10'),
    ],
  ])('%s', (_, fault) => {
    const found = copies
      .map(({ copy, ...rest }) => ({ ...rest, copy, spoilt: inSheet(copy, fault) }))
      .filter(({ copy, spoilt }) => textOf(copy, path) !== textOf(spoilt, path))
      .map(({ book, spoilt, expected }) => faultsOf(book, spoilt, expected).length > 0);
    expect(found.length).toBeGreaterThan(5);
    expect(found).not.toContain(false);
  });
});
