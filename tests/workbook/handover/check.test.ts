/** Built-in formulas that come to something else than we did must not be believed. */
import { functionNamed } from '../../../functions/catalogue';
import { calculate } from '../../../workbook/engine/univer/headless';
import { checked } from '../../../workbook/handover/check';
import type { HandedFormula } from '../../../workbook/handover/handed';
import { WorkingsSheet } from '../../../workbook/handover/workings';
import { World } from '../../../workbook/handover/world';
import { book, column } from '../engine/book';

const times = Array.from({ length: 200 }, (_, n) => n + 1);
const readings = [...times, 'x'];

/** 1/t of the reading in this row, beside it. */
const handed = (row: number, said: string): HandedFormula => ({
  sheet: 'Run',
  row,
  column: 1,
  original: `PACE.EVENT(A${row + 1})`,
  functions: [functionNamed('EVENT')!],
  area: { row, column: 1, rows: 1, columns: 1 },
  values: [[row < times.length ? 1 / times[row] : '']],
  said: [[said]],
});

async function frozenAmong(formulas: readonly HandedFormula[]): Promise<HandedFormula[]> {
  const typed = column(
    'B1',
    readings.map((_, n) => `=PACE.EVENT(A${n + 1})`),
  );
  const model = book({ Run: { ...column('A1', readings), ...typed } });
  const world = new World(model, await calculate(model));
  const all = await checked(formulas, world, new WorkingsSheet('Workings'));
  return all.formulas.filter(({ said }) => !said);
}

test('all are right: all stay live', async () => {
  expect(await frozenAmong(times.map((_, n) => handed(n, `1/A${n + 1}`)))).toEqual([]);
});

test('one of the first is wrong: every one that is, is frozen, and no other', async () => {
  const wrong = [0, 101, 150];
  const frozen = await frozenAmong(
    times.map((_, n) => handed(n, wrong.includes(n) ? `2/A${n + 1}` : `1/A${n + 1}`)),
  );
  expect(frozen.map(({ row }) => row)).toEqual(wrong);
  expect(frozen[1].why).toBe('built-in functions give 0.0196078431372549 for 0.00980392156862745');
});

test('a formula that reads another kind of cell is judged by itself', async () => {
  const all = times.map((_, n) => handed(n, `1/A${n + 1}`));
  all.splice(1, 0, handed(times.length, `1/A${times.length + 1}`)); // at a place that is passed over
  expect((await frozenAmong(all)).map(({ row }) => row)).toEqual([times.length]);
});

test('a slope of 0 may come out as the rounding of what it was read from, and as no more', async () => {
  const level = (said: string): HandedFormula => ({ ...handed(4, said), values: [[0]] }); // of a reading of 5
  expect(await frozenAmong([level('4E-12')])).toEqual([]);
  const [frozen] = await frozenAmong([level('6E-12')]);
  expect(frozen.why).toBe('built-in functions give 6e-12 for 0');
});

test('among larger ones alike, a number that is all rounding need not agree with another rounding', async () => {
  const small = (said: string): HandedFormula => ({ ...handed(4, said), values: [[3e-14]] });
  const others = times.slice(10).map((_, n) => handed(n + 10, `1/A${n + 11}`)); // the largest is 1/11
  expect(await frozenAmong([small('1E-14'), ...others])).toEqual([]);
  expect(await frozenAmong([small('1E-14')])).toHaveLength(1);
});
