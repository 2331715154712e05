/** The copy worked out by programs that owe us nothing, before and after someone changes its inputs. */
import { cellName } from '../../../functions/address';
import { CellError, type CellValue } from '../../../functions/cell';
import type { BookModel, CalculatedBook } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { handOver, type HandedOver } from '../../../workbook/handover/handOver';
import { asFitted, fitsOtherwise, startsOtherwise } from '../../../functions/builtIn/fitState';
import { changed, unchanged, unwatched } from '../../../workbook/handover/inputWatch';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { book, type Typed } from '../engine/book';
import { cases } from './cases/cases';
import { otherEngines, type Shown } from './otherEngines';
import { withTyped } from './withTyped';

const titles = Object.keys(cases);
const bookOf = (typed: (title: string) => Typed): BookModel =>
  book(Object.fromEntries(titles.map((title) => [sheetOf(title), typed(title)])));

/** A sheet's name is at most 31 characters long. */
const sheetOf = (title: string): string => title.slice(0, 31);

let copy: HandedOver;
let before: CalculatedBook;
let after: CalculatedBook;
let changedCopy: Uint8Array;

beforeAll(async () => {
  const model = bookOf((title) => cases[title].typed);
  before = await calculate(model);
  copy = await handOver(createWorkbook(model, before), { version: '1.2.3', date: '2026-12-01' });
  after = await calculate(bookOf((title) => ({ ...cases[title].typed, ...cases[title].changed })));
  changedCopy = withTyped(
    copy.bytes,
    bookOf((title) => cases[title].changed),
  );
}, 600_000);

test.each(titles)('%s: every formula is handed over as it should be', (title) => {
  const formulas = copy.formulas.filter(({ sheet }) => sheet === sheetOf(title));
  expect(formulas.length).toBeGreaterThan(0);
  for (const { why, said } of formulas)
    expect({ why, live: said !== undefined }).toEqual({
      why: cases[title].becomes === 'live' ? undefined : expect.any(String),
      live: cases[title].becomes === 'live',
    });
});

for (const engine of otherEngines) {
  (engine.isInstalled ? describe : describe.skip)(engine.name, () => {
    let shown: Shown;
    let shownAfter: Shown;
    beforeAll(() => {
      shown = engine.recalculated(copy.bytes);
      shownAfter = engine.recalculated(changedCopy);
    }, 240_000);

    test.each(titles)('%s: all values are ours', (title) => {
      for (const { place, value } of resultsIn(title, before))
        expectSame(shown.get(place) ?? null, value, place);
    });

    test.each(titles)('%s: the copy follows its inputs, or says that it does not', (title) => {
      const { becomes, then } = cases[title];
      const values = resultsIn(title, becomes === 'live' ? after : before);
      for (const { place, value } of values) {
        const theirs = shownAfter.get(place) ?? null;
        if (then === 'error') expect({ place, theirs }).toEqual({ place, theirs: expect.any(CellError) });
        else expectSame(theirs, value, place);
      }
    });

    test('a frozen fit is watched: its sum of squares is that of the day, until its readings change', () => {
      const states = [...shown].filter(([place, value]) => /^Workings!/.test(place) && value === asFitted);
      expect(states.length).toBeGreaterThan(10);
      expect([...shown.values()]).not.toContain(fitsOtherwise);
      const raised = states.filter(([place]) =>
        [fitsOtherwise, startsOtherwise].includes(shownAfter.get(place) as string),
      );
      expect([...shownAfter.values()]).toContain(startsOtherwise);
      // the curves keep their readings; the fits do not
      expect(raised.length).toBeGreaterThan(10);
      expect(raised.length).toBeLessThan(states.length);
    });

    test('flags are down before a change, and up after it', () => {
      const firstRow = 1 + headingsRow(shown);
      const watched = copy.formulas.flatMap((formula, n) =>
        formula.said && formula.ofTheDay === undefined ? [] : [{ formula, cell: `Method!C${n + firstRow}` }],
      );
      expect(watched.length).toBeGreaterThan(0);
      for (const { formula, cell } of watched) {
        const title = titles.find((one) => sheetOf(one) === formula.sheet)!;
        const { unwatched: isUnwatched, changed: changes, flagStaysDown } = cases[title];
        const [down, up] = isUnwatched ? [unwatched, unwatched] : [unchanged, changed];
        const isUp = Object.keys(changes).length > 0 && !flagStaysDown;
        expect([title, shown.get(cell)]).toEqual([title, down]);
        expect([title, shownAfter.get(cell)]).toEqual([title, isUp ? up : down]);
      }
    });
  });
}

/** Above the formulas, on the sheet "Method". */
function headingsRow(shown: Shown): number {
  const place = [...shown].find(([at, value]) => /^Method!C\d+$/.test(at) && value === 'State')![0];
  return Number(place.replace('Method!C', ''));
}

/** The cells that the formulas of a sheet cover, with what they show. */
function resultsIn(title: string, calculated: CalculatedBook): { place: string; value: CellValue }[] {
  return copy.formulas
    .filter(({ sheet }) => sheet === sheetOf(title))
    .flatMap(({ sheet, row, column, area }) =>
      Array.from({ length: area.rows * area.columns }, (_, n) => {
        const [r, c] = [row + Math.floor(n / area.columns), column + (n % area.columns)];
        return { place: `${sheet}!${cellName(r, c)}`, value: calculated.shown(sheet, r, c) };
      }),
    );
}

function expectSame(theirs: CellValue, ours: CellValue, place: string): void {
  if (typeof ours === 'number' && typeof theirs === 'number') {
    const off = ours === 0 ? Math.abs(theirs) : Math.abs(theirs / ours - 1);
    expect({ place, theirs, ours, isNear: off < 1e-9 }).toEqual({ place, theirs, ours, isNear: true });
  } else if (ours instanceof CellError) {
    expect({ place, theirs }).toEqual({ place, theirs: expect.objectContaining({ code: ours.code }) });
  } else expect({ place, theirs: theirs ?? '' }).toEqual({ place, theirs: ours ?? '' });
}
