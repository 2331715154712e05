import { CellError, type CellValue } from '../../../functions/cell';
import type { BookModel, CalculatedBook } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { at, book, column, type Typed } from './book';

/** One sheet, asked by cell name. */
async function sheet(typed: Typed, names: BookModel['names'] = []) {
  return looking(await calculate(book({ Run: typed }, names)));
}

function looking(calculated: CalculatedBook, name = 'Run') {
  return {
    calculated,
    shown: (cell: string): CellValue => calculated.shown(name, at(cell).row, at(cell).column),
    spill: (cell: string) => calculated.formula(name, at(cell).row, at(cell).column)?.spill,
    words: (cell: string): string => {
      const value = calculated.shown(name, at(cell).row, at(cell).column);
      return value instanceof CellError
        ? `${value.code} ${value.message}`.trim()
        : `no error: ${String(value)}`;
    },
  };
}

describe('our functions in cells', () => {
  test('one value, a column that spills, and a formula that reads what spilled', async () => {
    const run = await sheet({
      ...column('A1', [40, 25, 0.1]),
      B1: '=PACE.EVENT(A1:A3)',
      C1: '=B2*2',
      D1: '=PACE.EVENT(A1)',
    });
    expect(['B1', 'B2', 'B3', 'C1', 'D1'].map(run.shown)).toEqual([1 / 40, 1 / 25, 10, 2 / 25, 1 / 40]);
    expect(run.spill('B1')).toEqual({ rows: 3, columns: 1 });
    expect(run.spill('D1')).toEqual({ rows: 1, columns: 1 });
  });

  test('small letters, the name that files use, and an argument left out', async () => {
    const run = await sheet({
      A1: 40,
      B1: '=pace.event(A1)',
      B2: '=_xldudf_PACE_EVENT(A1)',
      B3: '=PACE.EVENT(A1,,-2)',
    });
    expect(['B1', 'B2', 'B3'].map(run.shown)).toEqual([1 / 40, 1 / 40, -1 / 80]);
  });

  test('a blank cell is a gap, a zero is a reading', async () => {
    const run = await sheet({
      A1: 40,
      A3: 25,
      C1: 40,
      C2: 0,
      B1: '=PACE.EVENT(A1:A3)',
      D1: '=PACE.EVENT(C1:C2)',
    });
    expect(['B1', 'B2', 'B3'].map(run.shown)).toEqual([1 / 40, '', 1 / 25]);
    expect(run.words('D1')).toBe('#VALUE! times must be above 0: row 2 (0)');
  });

  test('a truth value is no number, and words are a gap', async () => {
    const run = await sheet({ A1: true, A2: 'forty', A3: 40, B1: '=PACE.EVENT(A1:A3)' });
    expect(['B1', 'B2', 'B3'].map(run.shown)).toEqual(['', '', 1 / 40]);
  });

  test('an error cell comes through a conversion in its own place', async () => {
    const run = await sheet({ A1: 40, A2: '=1/0', A3: new CellError('#N/A'), B1: '=PACE.EVENT(A1:A3)' });
    expect(run.shown('B1')).toBe(1 / 40);
    expect(['B2', 'B3'].map(run.words)).toEqual(['#DIV/0!', '#N/A']);
  });

  test('numbers reach a function with all their digits', async () => {
    const long = 12.345678901234567;
    const run = await sheet({ A1: long, B1: '=PACE.EVENT(A1)' });
    expect(run.shown('B1')).toBe(1 / long);
  });

  test('each inside the other', async () => {
    const run = await sheet({
      A1: 40,
      A2: 25,
      B1: '=PACE.EVENT(PACE.EVENT(A1:A2))',
      C1: '=SUM(PACE.EVENT(A1:A2))',
    });
    expect([run.shown('B1'), run.shown('B2')]).toEqual([40, 25]);
    expect(run.shown('C1')).toBeCloseTo(1 / 40 + 1 / 25, 15);
  });
});

test('constants in braces: words with commas, small numbers, truth values', async () => {
  const run = await sheet({
    A1: '={"16,0",1E-5;"a;b",TRUE}',
    A4: '=SUM({1,2;3,4}*{10;100})',
    D1: '=PACE.EVENT({2E-3,"x"})',
  });
  expect(['A1', 'B1', 'A2', 'B2', 'A4', 'D1', 'E1'].map(run.shown)).toEqual([
    '16,0',
    1e-5,
    'a;b',
    true,
    730,
    500,
    '',
  ]);
});

describe('words for errors', () => {
  test('a missing and a superfluous argument are told', async () => {
    const run = await sheet({ B1: '=PACE.EVENT()', B2: '=PACE.EVENT(1,2,3,4)' });
    expect(run.words('B1')).toBe('#VALUE! times is needed: nothing was given');
    expect(run.words('B2')).toBe('#VALUE! PACE.EVENT takes 3 arguments at most: got 4');
  });

  test('they come through a call around the call, and vanish where the error is caught', async () => {
    const run = await sheet({ A1: 0, B1: '=PACE.EVENT(PACE.EVENT(A1))', B2: '=IFERROR(PACE.EVENT(A1),7)' });
    expect(run.words('B1')).toBe('#VALUE! times must be above 0: row 1 (0)');
    expect(run.shown('B2')).toBe(7);
    expect(run.calculated.errors.map(({ row }) => row)).toEqual([0]);
  });

  test('errors of built-in functions have none', async () => {
    const run = await sheet({ A1: '=1/0', A2: '=NOSUCH(1)', A3: '=PACE.NOSUCH(1)', A4: '=nosuchname' });
    expect(['A1', 'A2', 'A3', 'A4'].map(run.words)).toEqual(['#DIV/0!', '#NAME?', '#NAME?', '#NAME?']);
  });

  test('the list is in reading order, sheet by sheet', async () => {
    const calculated = await calculate(
      book({ First: { B2: '=1/0', A2: '=1/0', C1: '=1/0' }, 'Second run': { A1: '=PACE.EVENT(0)' } }),
    );
    expect(calculated.errors.map(({ sheet: name, row, column: c }) => [name, row, c])).toEqual([
      ['First', 0, 2],
      ['First', 1, 0],
      ['First', 1, 1],
      ['Second run', 0, 0],
    ]);
  });

  test('a cell that an error spilled into is listed too, a typed one is not', async () => {
    const run = await sheet({ A1: 40, A2: '=1/0', A3: new CellError('#N/A'), B1: '=PACE.EVENT(A1:A2)' });
    expect(run.calculated.errors.map(({ row, column: c, error }) => [row, c, error.code])).toEqual([
      [1, 0, '#DIV/0!'],
      [1, 1, '#DIV/0!'],
    ]);
  });

  test('#N/A within a table is an answer; as the whole of one it is an error', async () => {
    const run = await sheet({ A1: '={1,#N/A}', A2: '=NA()', A3: '=SORT({3;1})/{1;0}' });
    expect([run.words('B1'), run.words('A2')]).toEqual(['#N/A', '#N/A']);
    expect(run.calculated.errors.map(({ row, error }) => [row, error.code])).toEqual([
      [1, '#N/A'],
      [3, '#DIV/0!'],
    ]);
  });

  test('a formula that feeds on itself says so, and so does one behind it; others go on', async () => {
    const run = await sheet({ A1: '=B1+1', B1: '=A1+1', C1: '=B1*2', D1: '=D1', E1: '=1+1' });
    expect(run.words('A1')).toBe('#REF! the formula depends on its own result');
    expect(run.words('C1')).toBe('#REF! the formula depends on one that depends on its own result');
    expect(run.words('D1')).toBe('#REF! the formula depends on its own result');
    expect(run.shown('E1')).toBe(2);
  });
});

describe('spills', () => {
  test('F2# is the whole of one, on its own sheet and from another', async () => {
    const calculated = await calculate(
      book({
        'Run #1': { F2: '=SEQUENCE(4)', G2: '=SUM(F2#)' },
        Sum: { A1: "=SUM('Run #1'!F2#)", A2: '="F2#"' },
      }),
    );
    expect(calculated.shown('Run #1', 1, 6)).toBe(10);
    expect(calculated.shown('Sum', 0, 0)).toBe(10);
    expect(calculated.shown('Sum', 1, 0)).toBe('F2#');
  });

  test('F2# where nothing spills is #REF!', async () => {
    const run = await sheet({ F2: 3, G2: '=SUM(F2#)' });
    expect(run.words('G2')).toBe('#REF!');
  });

  test('one that has no room is #SPILL!, and what stands in its way stays', async () => {
    const run = await sheet({ A1: '=SEQUENCE(3)', A3: 'in the way' });
    expect(['A1', 'A2', 'A3'].map((cell) => run.shown(cell))).toEqual([
      new CellError('#SPILL!'),
      null,
      'in the way',
    ]);
  });

  test('of two that would meet, one gives way', async () => {
    const run = await sheet({ A2: '=SEQUENCE(1,3)', B1: '=SEQUENCE(3)' });
    const blocked = ['A2', 'B1'].filter((cell) => run.words(cell) === '#SPILL!');
    expect(blocked).toHaveLength(1);
    expect(run.shown('B2')).toBe(2);
  });

  test('feed each other through as many steps as there are', async () => {
    const run = await sheet({
      E1: '=SEQUENCE(3)',
      D1: '=E2+SEQUENCE(3)',
      C1: '=D2+SEQUENCE(3)',
      B1: '=C2+SEQUENCE(3)',
      A1: '=B2',
    });
    // E2 = 2; D2 = 2 + 2; C2 = 4 + 2; B2 = 6 + 2
    expect(run.shown('A1')).toBe(8);
  });

  test('reach beyond a thousand rows', async () => {
    const run = await sheet({ A1: '=SEQUENCE(5000)', B1: '=SUM(A:A)' });
    expect(run.shown('A5000')).toBe(5000);
    expect(run.shown('B1')).toBe((5000 * 5001) / 2);
  });
});

describe('the rest of a workbook', () => {
  test('defined names, of the book and of one sheet', async () => {
    const calculated = await calculate(
      book({ Run: { A1: 3, A2: '=rate*2', A3: '=local+1' }, Other: { A1: 5, A2: '=local+1' } }, [
        { name: 'rate', refersTo: 'Run!$A$1' },
        { name: 'local', refersTo: 'Run!$A$1', sheet: 'Run' },
        { name: 'local', refersTo: 'Other!$A$1', sheet: 'Other' },
      ]),
    );
    expect([
      calculated.shown('Run', 1, 0),
      calculated.shown('Run', 2, 0),
      calculated.shown('Other', 1, 0),
    ]).toEqual([6, 4, 6]);
  });

  test('other sheets, by names that need quotes', async () => {
    const calculated = await calculate(
      book({ "O'Brien's run": { A1: 2 }, Sum: { A1: "='O''Brien''s run'!A1*2", A2: '=Nowhere!A1' } }),
    );
    expect(calculated.shown('Sum', 0, 0)).toBe(4);
    expect(calculated.shown('Sum', 1, 0)).toBeInstanceOf(CellError);
  });

  test('whole columns, and a reference to a blank cell shows 0', async () => {
    const run = await sheet({ A1: 1, A2: 2, B1: '=SUM(A:A)', B2: '=COUNT(A:A)', B3: '=Z99' });
    expect(['B1', 'B2', 'B3'].map(run.shown)).toEqual([3, 2, 0]);
  });

  test('what a file showed for a formula is not believed', async () => {
    const stale: BookModel = {
      sheets: [{ name: 'Run', cells: [{ row: 0, column: 0, value: 99, formula: '1+1' }] }],
      names: [],
    };
    expect((await calculate(stale)).shown('Run', 0, 0)).toBe(2);
  });

  test('words and truth values stay what they are', async () => {
    const run = await sheet({
      A1: '12',
      A2: true,
      A3: '',
      B1: '=ISTEXT(A1)',
      B2: '=A2',
      B3: '=A1&"x"',
      B4: '=TRUE',
    });
    expect(['A1', 'A2', 'B1', 'B2', 'B3', 'B4'].map(run.shown)).toEqual([
      '12',
      true,
      true,
      true,
      '12x',
      true,
    ]);
  });

  test('the same workbook gives the same, time after time, and two at once do not mix', async () => {
    const typed: Typed = { A1: 40, B1: '=PACE.EVENT(A1)', C1: '=PACE.EVENT(0)' };
    const runs = await Promise.all([sheet(typed), sheet({ ...typed, A1: 20 }), sheet(typed)]);
    expect(runs.map((run) => run.shown('B1'))).toEqual([1 / 40, 1 / 20, 1 / 40]);
    expect(runs.map((run) => run.words('C1'))).toEqual(
      Array(3).fill('#VALUE! times must be above 0: row 1 (0)'),
    );
  });

  test('an empty one is no trouble', async () => {
    expect((await calculate({ sheets: [], names: [] })).errors).toEqual([]);
    expect((await sheet({})).shown('A1')).toBeNull();
  });
});
