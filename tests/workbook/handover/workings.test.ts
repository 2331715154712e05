/** Values that a table of workings knows beforehand are believed only while those that are worked out agree. */
import { workingFormula, type WorkingCell } from '../../../functions/builtIn/workings';
import type { CellValue } from '../../../functions/cell';
import type { SheetModel } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { WorkingsSheet } from '../../../workbook/handover/workings';

/** 1 … 100 doubled, line by line; below the title in row 5. */
const doubled = (known: (n: number) => CellValue): WorkingCell[][] =>
  Array.from({ length: 100 }, (_, n) => [n, workingFormula(`2*A${n + 5}`, known(n))]);

async function workedOut(known: (n: number) => CellValue): Promise<{ shown: CellValue[]; asked: number[] }> {
  const sheet = new WorkingsSheet('Workings');
  sheet.seenFrom('Run').table('Doubled', () => doubled(known));
  const asked: number[] = [];
  const calculated = await sheet.workedOut((model: SheetModel) => {
    asked.push(model.cells.filter(({ formula }) => formula !== undefined).length);
    return calculate({ sheets: [model], names: [] });
  });
  const shown = sheet.values(calculated).cells.filter(({ column }) => column === 1);
  return { shown: shown.map(({ value }) => value), asked };
}

const right = Array.from({ length: 100 }, (_, n) => 2 * n);

test('values that are known are taken, and few of them worked out', async () => {
  const { shown, asked } = await workedOut((n) => 2 * n);
  expect(shown).toEqual(right);
  expect(asked).toHaveLength(1);
  expect(asked[0]).toBeLessThan(10);
});

test.each([0, 1, 99])('one that is wrong, line %i: all are worked out', async (wrong) => {
  const { shown, asked } = await workedOut((n) => (n === wrong ? 7 : 2 * n));
  expect(shown).toEqual(right);
  expect(asked).toEqual([expect.any(Number), 100]);
});
