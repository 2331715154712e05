import type { CellValue } from '../../functions/cell';
import type { RangeReading } from '../../taskpane/port';
import { findTable } from '../../taskpane/findTable';
import { areaOf, columnOf, pointsOf, proposeRun, timeColumnFor, type Table } from '../../taskpane/runs';

const block = (...cells: CellValue[][]): RangeReading => ({
  area: { sheet: 'Runs', row: 4, column: 1, rows: cells.length, columns: cells[0].length },
  cells,
});

function tableOf(reading: RangeReading): Table {
  const table = findTable(reading);
  if (typeof table === 'string') throw new Error(table);
  return table;
}

test('findTable reads headings and the rows of numbers below them', () => {
  const table = tableOf(block(['t / s', 'V / mL'], [0, 0], [10, 4.2], [20, 7.7]));
  expect(table.columns.map(({ column, heading }) => [column, heading.quantity, heading.unit])).toEqual([
    [1, 'time', 's'],
    [2, 'volume', 'mL'],
  ]);
  expect([table.firstRow, table.lastRow]).toEqual([5, 7]);
});

test('findTable passes over a title and conditions above the headings', () => {
  const table = tableOf(
    block(['Fizz run 3', null], ['temperature', 22], ['t / s', 'V / mL'], [0, 0], [10, 4.2]),
  );
  expect([table.firstRow, table.lastRow]).toEqual([7, 8]);
  expect(table.columns[1].heading.text).toBe('V / mL');
});

test('findTable joins a row of names and a row of units', () => {
  const table = tableOf(block(['time', 'gas'], ['(min)', 'mL'], [0, 0], [1, 4.2]));
  expect(table.columns.map(({ heading }) => heading.unit)).toEqual(['min', 'mL']);
});

test('findTable leaves out columns of words and empty ones', () => {
  const table = tableOf(
    block(
      ['t / s', 'remark', null, 'm / g'],
      [0, 'start', null, 9],
      [10, 'fizz', null, 8],
      [20, 'x', null, 7],
    ),
  );
  expect(table.columns.map(({ column }) => column)).toEqual([1, 4]);
});

test('findTable says in words why there is no run', () => {
  expect(findTable(block(['a'], ['b']))).toBe('a run is made of numbers: Runs!B5:B6 holds none');
  expect(findTable(block([1], [2]))).toMatch(/^a run needs a column of times and a column of readings/);
  expect(findTable(block(['t', 'V'], [1, 2]))).toMatch(/^a run needs/);
});

test('without headings the first column holds the times', () => {
  const table = tableOf(block([0, 1], [10, 2], [20, 3]));
  expect(proposeRun(table)).toEqual({ timeColumn: 1, readingColumn: 2, firstRow: 4, lastRow: 6 });
  expect(table.columns[0].heading.text).toBe('column B');
});

test('readings before the times still find them', () => {
  const table = tableOf(block(['V / mL', 't / s'], [0, 0], [4, 10]));
  expect(proposeRun(table)).toMatchObject({ timeColumn: 2, readingColumn: 1 });
});

test('one time column is shared; in pairs each reading has its own', () => {
  const shared = tableOf(block(['t / s', 'V1 / mL', 'V2 / mL'], [0, 0, 0], [1, 2, 3]));
  expect([2, 3].map((column) => timeColumnFor(shared, column))).toEqual([1, 1]);
  const pairs = tableOf(block(['t / s', 'V / mL', 't / s', 'V / mL'], [0, 0, 0, 0], [1, 2, 1, 3]));
  expect([2, 4].map((column) => timeColumnFor(pairs, column))).toEqual([1, 3]);
});

test('pointsOf skips rows that are no pair of numbers, columnOf keeps them', () => {
  const table = tableOf(block(['t / s', 'V / mL'], [0, 0], [10, null], ['late', 9], [30, 12]));
  const run = proposeRun(table);
  expect(pointsOf(table, run)).toEqual([
    { time: 0, value: 0 },
    { time: 30, value: 12 },
  ]);
  expect(columnOf(table, 2, run)).toEqual([[0], [null], [9], [12]]);
  expect(areaOf(table, 2, run)).toEqual({ sheet: 'Runs', row: 5, column: 2, rows: 4, columns: 1 });
});

test('pointsOf takes a number stored as text as the functions do, and leaves out what could mean two', () => {
  const table = tableOf(block(['t / s', 'V / mL'], [0, 0], [10, '16,0'], [20, '1,234'], ['30', 12]));
  expect(pointsOf(table, proposeRun(table))).toEqual([
    { time: 0, value: 0 },
    { time: 10, value: 16 },
    { time: 30, value: 12 },
  ]);
});
