import { CellError, type CellValue } from '../../functions/cell';
import { checkRun, type Check } from '../../taskpane/findings';
import { findTable } from '../../taskpane/findTable';
import { proposeRun, type Table } from '../../taskpane/runs';

/** Halved every 10 s from 64, in rows 6 to 14 of the sheet; readings can be put in place of others. */
function checked(odd: Readonly<Record<number, CellValue>> = {}): Check {
  const rows = Array.from({ length: 9 }, (_, i): CellValue[] => [10 * i, odd[i] ?? 64 * 0.5 ** i]);
  const cells: CellValue[][] = [['t / s', 'c / (mmol/L)'], ...rows];
  const table = findTable({
    area: { sheet: 'Runs', row: 4, column: 2, rows: 10, columns: 2 },
    cells,
  }) as Table;
  return checkRun(table, proposeRun(table));
}

test('checkRun has nothing against a clean run, and says what it looked for', () => {
  const { concerns, clean } = checked();
  expect(concerns).toEqual([]);
  expect(clean).toMatch(/^nothing found in 9 pairs: looked for/);
});

test('checkRun names the row of the sheet, not that of the range', () => {
  const { concerns, clean } = checked({ 2: '16,0' });
  expect(concerns[0]).toMatchObject({ where: 'row 8' });
  expect(concerns[0].finding).toContain('"16,0"');
  expect(clean).toBe('');
});

test('checkRun puts what spoils a result first at the top', () => {
  const { concerns } = checked({ 1: 'spilt', 3: new CellError('#DIV/0!') });
  expect(concerns.map(({ where }) => where).slice(0, 2)).toEqual(['row 9', 'row 7']);
});

test('checkRun names the columns of the sheet where a run stands in rows, and speaks of no row', () => {
  const odd: Readonly<Record<number, CellValue>> = { 2: '16,0', 4: new CellError('#DIV/0!'), 6: 'spilt' };
  const places = Array.from({ length: 9 }, (_, i) => i);
  const cells: CellValue[][] = [
    ['t / s', ...places.map((i) => 10 * i)],
    ['c / (mmol/L)', ...places.map((i) => odd[i] ?? 64 * 0.5 ** i)],
  ];
  const table = findTable({
    area: { sheet: 'Runs', row: 4, column: 2, rows: 2, columns: 10 },
    cells,
  }) as Table;
  const { concerns } = checkRun(table, proposeRun(table));
  // readings begin in column D
  expect(concerns.map(({ where }) => where)).toEqual(
    expect.arrayContaining(['column F', 'column H', 'column J']),
  );
  const words = concerns.flatMap(({ finding, meaning, advice }) => [finding, meaning, advice]);
  expect(words.filter((said) => /\brows?\b/.test(said))).toEqual([]);
});
