import { callFunction } from '../../functions/call';
import { CellError, type CellRange, type CellValue } from '../../functions/cell';
import { functionNamed } from '../../functions/catalogue';
import { placesInWords } from '../../functions/series/places';
import { errorOf } from '../support/literal';
import { fading, replaced, tens, wobbling } from '../support/invented';

const check = functionNamed('CHECK')!;
const clean: CellValue[] = wobbling(fading);
const down = (cells: readonly CellValue[]): CellRange => cells.map((cell) => [cell]);
const checked = (values: readonly CellValue[], times: readonly CellValue[] = tens): CellRange =>
  callFunction(check, [down(times), down(values)]) as CellRange;

test('PACE.CHECK: a clean run gives one sentence that says what was looked for', () => {
  const [[words], ...more] = checked(clean);
  expect(more).toEqual([]);
  expect(words).toMatch(/^nothing found in 20 pairs: looked for error cells, .*outliers.*holes$/);
});

test('PACE.CHECK: a short clean run says what could not be looked for', () => {
  const [[words]] = checked([64, 32, 16, 8, 4, 2], [0, 1, 2, 3, 4, 5]);
  expect(words).toMatch(/^nothing found in 6 pairs: .*; outliers, .* need 7 different times$/);
});

test('PACE.CHECK: a table with a header row, one finding a row', () => {
  const [header, ...rows] = checked(replaced(clean, [4, '0,5'], [8, 0]));
  expect(header).toEqual(['finding', 'where', 'what it means', 'what to do']);
  expect(rows.map(([finding, where]) => [finding, where])).toEqual([
    ['one reading is exactly 0 among readings that are not: at time 80', 'row 9'],
    ['one pair holds a number stored as text: "0,5"', 'row 5'],
  ]);
  expect(rows.every((row) => row.length === 4)).toBe(true);
});

test('PACE.CHECK: an error cell is a finding, not the answer', () => {
  const [, row] = checked(
    replaced(clean, [3, new CellError('#REF!')]),
    replaced<CellValue>(tens, [5, new CellError('#N/A')]),
  );
  expect(row[0]).toBe('2 pairs show an error: #REF! and #N/A');
  expect(row[1]).toBe('rows 4 and 6');
});

test('PACE.CHECK: text that every other function refuses is a finding here', () => {
  const values = replaced(clean, [3, '1,234']);
  expect(callFunction(functionNamed('TANGENT')!, [down(tens), down(values), 50])).toBeInstanceOf(CellError);
  const [, row] = checked(values);
  expect(row.slice(0, 2)).toEqual(['one pair holds text that looks like a number: "1,234"', 'row 4']);
});

test('PACE.CHECK: a run in a row is counted in columns, and a truth value is only a word', () => {
  const [, [finding, where]] = callFunction(check, [[tens], [replaced(clean, [7, true])]]) as CellRange;
  expect([finding, where]).toEqual(['one gap: no reading at time 70 ("TRUE")', 'column 8']);
});

test('PACE.CHECK: a blank is a gap, and a finding about the run as a whole says so', () => {
  const values = clean.map((cell, row) => (row === 2 ? null : row === 3 ? ' ' : cell));
  expect(checked(values)[1].slice(0, 2)).toEqual(['2 gaps: no reading at times 20 and 30', 'rows 3 and 4']);
  expect(checked([0.8, 0.4, 0.2], [0, 60, 120])[1][1]).toBe('the whole run');
});

test('PACE.CHECK: what cannot be a run is refused in words', () => {
  expect(errorOf('=PACE.CHECK({0;1;2},{3;4})')).toBe(
    '#VALUE! times and values must be of one length: got 3 times and 2 values',
  );
  expect(errorOf('=PACE.CHECK({0,1;2,3},{3;4})')).toBe(
    '#VALUE! times must be one column or one row: got 2 rows of 2 cells',
  );
});

test.each<[readonly number[], string]>([
  [[], 'the whole run'],
  [[6], 'row 7'],
  [[2, 4], 'rows 3 and 5'],
  [[3, 4], 'rows 4 and 5'],
  [[2, 4, 8, 9, 10, 13], 'rows 3, 5, 9 to 11 and 14'],
  [[0, 2, 4, 6, 8, 10, 12, 14, 16, 18], 'rows 1, 3, 5, 7, 9, 11, 13, 15 and more'],
])('placesInWords(%j) is "%s"', (places, words) => {
  expect(placesInWords(places, { rows: 20, columns: 1 })).toBe(words);
});
