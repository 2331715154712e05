/** What must hold for every definition in the catalogue. */
import { catalogue } from '../../functions/catalogue';
import { callFunction } from '../../functions/call';
import { CellError, isRange, type CellRange, type CellResult } from '../../functions/cell';
import { typedName, type CellFunction } from '../../functions/define';
import type { Bounds, Parameter } from '../../functions/parameters';
import { calculate } from '../support/literal';

const rows = (result: CellResult): CellRange => (isRange(result) ? result : [[result]]);
const each = (table: readonly CellFunction[]): [string, CellFunction][] =>
  table.map((f) => [typedName(f), f]);

describe.each(each(catalogue))('%s', (_, f) => {
  test('its example gives what it says', () => {
    const given = rows(calculate(f.example.formula));
    const expected = rows(f.example.equals);
    expect(given.length).toBe(expected.length);
    expected.forEach((row, r) =>
      row.forEach((cell, c) => {
        if (typeof cell === 'number')
          expect(relativeTo(cell, given[r][c])).toBeLessThan(f.example.within ?? 1e-9);
        else expect(given[r][c]).toEqual(cell);
      }),
    );
  });

  test('its name survives Excel’s file form and autocompletion', () => {
    expect(f.name).toMatch(/^[A-Z]{3,}$/);
  });

  test('optional parameters come last, and detail last of all', () => {
    const optional = Object.values(f.parameters).map((parameter) => parameter.optional);
    expect([...optional].sort((a, b) => Number(a) - Number(b))).toEqual(optional);
    const names = Object.keys(f.parameters);
    if (names.includes('detail')) expect(names.at(-1)).toBe('detail');
  });

  test('its words are whole sentences, and every parameter is explained', () => {
    expect(f.summary).toMatch(/^[A-Z].*\.$/);
    expect(f.method).toMatch(/\.$/);
    for (const parameter of Object.values(f.parameters)) expect(parameter.help.length).toBeGreaterThan(5);
    if (f.caution !== undefined) expect(f.caution).toMatch(/ocal rules/);
  });

  test('nothing given is refused in words', () => {
    const result = callFunction(f, []);
    expect(result).toBeInstanceOf(CellError);
    expect((result as CellError).message).toMatch(/ is needed: nothing was given$/);
  });

  test('one argument too many is refused in words', () => {
    const result = callFunction(f, new Array(Object.keys(f.parameters).length + 1).fill(1));
    expect((result as CellError).message).toMatch(/^PACE\.[A-Z]+ takes \d+ arguments at most: got \d+$/);
  });

  for (const [name, parameter] of Object.entries(f.parameters)) {
    const { bounds = {} } = parameter;
    if (Object.keys(bounds).length === 0) continue;
    test(`${name} is refused just outside its bounds, and taken just inside`, () => {
      for (const value of outside(bounds)) {
        expect(() => readOne(parameter, value, name)).toThrow(new RegExp(`^${name} must be `));
      }
      for (const value of inside(bounds)) expect(() => readOne(parameter, value, name)).not.toThrow();
    });
  }
});

const readOne = (parameter: Parameter, value: number, name: string): unknown =>
  parameter.read([[value]], name);

const step = 1e-6;

function outside({ above, atLeast, below, atMost, whole }: Bounds): number[] {
  const values: number[] = whole ? [2.5] : [];
  if (above !== undefined) values.push(above, above - step);
  if (atLeast !== undefined) values.push(whole ? atLeast - 1 : atLeast - step);
  if (below !== undefined) values.push(below, below + step);
  if (atMost !== undefined) values.push(whole ? atMost + 1 : atMost + step);
  return values;
}

function inside({ above, atLeast, below, atMost, whole }: Bounds): number[] {
  const values: number[] = [];
  if (above !== undefined) values.push(above + (whole ? 1 : step));
  if (atLeast !== undefined) values.push(atLeast);
  if (below !== undefined) values.push(below - (whole ? 1 : step));
  if (atMost !== undefined) values.push(atMost);
  return values;
}

const relativeTo = (expected: number, given: unknown): number =>
  typeof given !== 'number' ? Infinity : expected === 0 ? Math.abs(given) : Math.abs(given / expected - 1);

test('no two functions share a name', () => {
  expect(new Set(catalogue.map(({ name }) => name)).size).toBe(catalogue.length);
});
