/** Tables as people make them: runs in rows, runs under each other, headings that leave something out. */
import type { CellValue } from '../../functions/cell';
import { findTable } from '../../taskpane/findTable';
import { areaOf, columnOf, proposeRun, type Corrections, type Table } from '../../taskpane/runs';

function tableOf(cells: readonly (readonly CellValue[])[], corrections?: Corrections): Table {
  const area = { sheet: 'Runs', row: 0, column: 0, rows: cells.length, columns: cells[0].length };
  const table = findTable({ area, cells }, corrections);
  if (typeof table === 'string') throw new Error(table);
  return table;
}

const headings = ({ columns }: Table): string[] => columns.map(({ heading }) => heading.text);

describe('runs in rows', () => {
  const inRows = [
    ['t / s', 0, 10, 20, 30],
    ['V / mL', 0, 4, 7, 9],
    ['m / g', 9, 8, 7, 6],
  ];

  test('are known by headings at the left, and keep their place in the sheet', () => {
    const table = tableOf(inRows);
    expect(table.isTurned).toBe(true);
    expect(headings(table)).toEqual(['t / s', 'V / mL', 'm / g']);
    const run = proposeRun(table);
    expect(areaOf(table, run.readingColumn, run)).toEqual({
      sheet: 'Runs',
      row: 1,
      column: 1,
      rows: 1,
      columns: 4,
    });
    expect(columnOf(table, 2, run)).toEqual([[9], [8], [7], [6]]);
  });

  test('are known without headings by times that rise along the first row alone', () => {
    expect(
      tableOf([
        [0, 10, 20, 30],
        [5, 4, 3, 2],
        [5, 3, 2, 1],
      ]).isTurned,
    ).toBe(true);
    expect(
      tableOf([
        [0, 5, 5, 5, 5],
        [10, 4, 3, 4, 3],
      ]).isTurned,
    ).toBe(false);
  });

  test('a row of names beside its units is one heading', () => {
    const table = tableOf([
      ['time', 'min', 0, 1, 2],
      ['volume', 'mL', 0, 3, 5],
    ]);
    expect(table.columns.map(({ heading }) => [heading.quantity, heading.unit])).toEqual([
      ['time', 'min'],
      ['volume', 'mL'],
    ]);
  });

  test('are read as the person says', () => {
    expect(tableOf(inRows, { isTurned: false }).columns.map(({ column }) => column)).toEqual([1, 2, 3, 4]);
  });
});

test('columns stay columns: with many runs, without headings, with numbers as headings', () => {
  const plate = [
    ['t / s', 1, 2, 3],
    [0, 5, 5, 5],
    [1, 4, 3, 2],
    [2, 3, 2, 1],
  ];
  const table = tableOf(plate);
  expect(table.isTurned).toBe(false);
  expect(headings(table)).toEqual(['t / s', '1', '2', '3']);
  expect([table.firstRow, table.lastRow]).toEqual([1, 3]);
});

describe('runs under each other', () => {
  const long = [
    ['tablet', 't / s', 'V / mL'],
    ['A', 0, 0],
    ['A', 10, 4],
    ['A', 20, 7],
    ['B', 0, 0],
    ['B', 10, 3],
  ];

  test('are known by names beside times that begin anew', () => {
    const table = tableOf(long);
    expect(table.names).toBe(0);
    expect(table.stretches).toEqual([
      { name: 'A', firstRow: 1, lastRow: 3 },
      { name: 'B', firstRow: 4, lastRow: 5 },
    ]);
    expect(proposeRun(table)).toEqual({ timeColumn: 1, readingColumn: 2, firstRow: 1, lastRow: 3 });
  });

  test('numbers name runs too, and are then no readings', () => {
    const table = tableOf(long.map(([name, ...row]) => [name === 'A' ? 1 : name === 'B' ? 2 : name, ...row]));
    expect(table.stretches.map(({ name }) => name)).toEqual(['1', '2']);
    expect(headings(table)).toEqual(['t / s', 'V / mL']);
  });

  test('a name written once holds for the rows below it', () => {
    const table = tableOf(
      long.map((row, r) => [r === 0 || r === 1 || r === 4 ? row[0] : null, row[1], row[2]]),
    );
    expect(table.stretches.map(({ firstRow, lastRow }) => [firstRow, lastRow])).toEqual([
      [1, 3],
      [4, 5],
    ]);
  });

  test('whose rows do not lie together are named, with what to do', () => {
    const mixed = [long[0], ['A', 0, 0], ['B', 0, 0], ['A', 10, 4], ['B', 10, 3], ['C', 0, 0], ['C', 10, 5]];
    const table = tableOf(mixed);
    expect(table.stretches.map(({ name }) => name)).toEqual(['C']);
    expect(table.apart).toBe(
      'a formula takes rows that lie together, and those of run “A” and of 1 more do not (rows 2 and 4): sort the table by run',
    );
  });

  test('remarks and constants beside one run name no runs', () => {
    const remarks = [
      ['t / s', 'V / mL', 'stirring'],
      ...[0, 10, 20, 30].map((t) => [t, t / 2, t < 15 ? 'off' : 'on']),
    ];
    expect(tableOf(remarks)).toMatchObject({ names: null, stretches: [], apart: '' });
    expect(tableOf(remarks, { names: 2 }).stretches.map(({ name }) => name)).toEqual(['off', 'on']);
    expect(tableOf(long, { names: null }).stretches).toEqual([]);
  });
});

test('a unit that the heading leaves out is the person’s to give, and goes once the heading has one', () => {
  const rows = (heading: string): CellValue[][] => [
    ['t', heading],
    [0, 5],
    [1, 4],
  ];
  const units = { 0: 'min', 1: 'mL' };
  const table = tableOf(rows('gas'), { units });
  expect(table.columns.map(({ heading }) => [heading.text, heading.unit])).toEqual([
    ['t', 'min'],
    ['gas', 'mL'],
  ]);
  expect(tableOf(rows('gas / L'), { units }).columns[1].heading.unit).toBe('L');
});

test('a heading above several names gives them its unit, as far as the next', () => {
  const table = tableOf([
    [null, 'V / mL', null, 'c / (mol/L)', null],
    ['t / d', '40 °C', '50 °C', '40 °C', '50 °C'],
    [0, 18, 18, 0.9, 0.9],
    [7, 17, 16, 0.85, 0.8],
  ]);
  expect(table.columns.map(({ heading }) => [heading.text, heading.unit])).toEqual([
    ['t / d', 'd'],
    ['40 °C', 'mL'],
    ['50 °C', 'mL'],
    ['40 °C', 'mol/L'],
    ['50 °C', 'mol/L'],
  ]);
});

test('temperatures written with their unit are a column of them', () => {
  const table = tableOf([
    ['bath', 'k / d⁻¹'],
    ['21.4 °C', 0.1],
    ['25 °C', 0.2],
    ['35,5 °C', 0.4],
  ]);
  expect(table.columns.map(({ heading }) => [heading.quantity, heading.unit])).toEqual([
    ['temperature', '°C'],
    ['coefficient', 'd⁻¹'],
  ]);
  expect([table.firstRow, table.lastRow]).toEqual([1, 3]);
});
