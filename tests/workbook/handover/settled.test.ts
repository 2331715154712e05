/** Formulas are judged in a book that holds what they read, and a workbook of millions of cells need not be held twice. */
import { functionNamed } from '../../../functions/catalogue';
import { calculate } from '../../../workbook/engine/univer/headless';
import type { HandedFormula } from '../../../workbook/handover/handed';
import { settled } from '../../../workbook/handover/settled';
import { World } from '../../../workbook/handover/world';
import { book, column } from '../engine/book';

/** The cells that are left of a run with a log beside it, where this formula stands beneath. */
async function left(formula: string): Promise<Record<string, number>> {
  const run = { ...column('A1', [0, 1, 2, 3]), ...column('B1', [8, 4, 2, 1]), ...column('C1', [7, 7, 7, 7]) };
  const log = column('A1', [1, 2, 3, 4, 5, 6]);
  const names = [
    { name: 'Run', refersTo: 'Run!$B$1:$B$4' },
    { name: 'Grown', refersTo: 'OFFSET(Run!$B$1,0,0,4)' },
  ];
  const model = book({ Run: { ...run, ...column('A9', [`=${formula}`]) }, Log: log }, names);
  const asked: HandedFormula = {
    sheet: 'Run',
    row: 8,
    column: 0,
    original: formula,
    functions: [functionNamed('START')!],
    area: { row: 8, column: 0, rows: 1, columns: 1 },
    values: [[-4]],
  };
  const { sheets } = settled(new World(model, await calculate(model)), [asked]);
  return Object.fromEntries(sheets.map(({ name, cells }) => [name, cells.length]));
}

test.each([
  ['two columns', 'PACE.START(A1:A4,B1:B4)', { Run: 8, Log: 0 }],
  ['a name', 'PACE.START(A1:A4,Run)', { Run: 8, Log: 0 }],
  ['another sheet, in capitals', 'PACE.START(A1:A4,LOG!A2:A5)', { Run: 4, Log: 4 }],
  ['a whole column', 'PACE.START(A1:A4,Log!A:A)', { Run: 4, Log: 6 }],
])('%s: nothing else is kept', async (_, formula, cells) => {
  expect(await left(formula)).toEqual(cells);
});

test.each([
  ['a name that works it out', 'PACE.START(A1:A4,Grown)'],
  ['OFFSET', 'PACE.START(A1:A4,OFFSET(A1,0,1,4))'],
  ['INDIRECT', 'PACE.START(A1:A4,INDIRECT("B1:B4"))'],
  ['a range that is put together', 'PACE.START(A1:A4,B1:INDEX(B1:B4,4))'],
  ['whole rows', 'PACE.START(1:1,2:2)'],
])('%s: all is kept, since only working it out would tell', async (_, formula) => {
  expect(await left(formula)).toEqual({ Run: 13, Log: 6 });
});
