import { calculate } from '../../../workbook/engine/univer/headless';
import { plainReferences, type TableModel } from '../../../workbook/engine/tables';
import { book } from './book';

/** Gas run!B3:D8: a head, four rows, a row of totals. */
const table: TableModel = {
  name: 'Run1',
  sheet: 'Gas run',
  area: { row: 2, column: 1, rows: 6, columns: 3 },
  headRows: 1,
  totalRows: 1,
  columns: ['t / s', 'V [mL]', "Kate's #"],
};

const inRow5 = { sheet: 'Gas run', row: 4 };

test.each([
  ['SUM(Run1[V '.concat("'[mL']])"), "SUM('Gas run'!$C$4:$C$7)"],
  ['SUM(Run1[t / s])', "SUM('Gas run'!$B$4:$B$7)"],
  ['SUM(run1[T / S])', "SUM('Gas run'!$B$4:$B$7)"],
  ['Run1[]', "'Gas run'!$B$4:$D$7"],
  ['Run1[#All]', "'Gas run'!$B$3:$D$8"],
  ['Run1[#Headers]', "'Gas run'!$B$3:$D$3"],
  ['Run1[[#Totals],[t / s]]', "'Gas run'!$B$8"],
  ["Run1[[t / s]:[V '[mL']]]", "'Gas run'!$B$4:$C$7"],
  ["Run1[[#Headers],[#Data],[V '[mL']]]", "'Gas run'!$C$3:$C$7"],
  ['Run1[[#This Row],[t / s]]*2', "'Gas run'!$B$5*2"],
  ["Run1[[#This Row],[t / s]:[V '[mL']]]", "'Gas run'!$B$5:$C$5"],
  ['Run1[@[t / s]]*2', "'Gas run'!$B$5*2"],
  ["Run1[Kate''s '#]", "'Gas run'!$D$4:$D$7"],
  ['Run1[nowhere]', '#REF!'],
  ['Run2[t / s]', 'Run2[t / s]'],
  ['"Run1[t / s]"', '"Run1[t / s]"'],
  ['[2]!name+Other[x]', '[2]!name+Other[x]'],
])('%s means %s', (formula, plain) => {
  expect(plainReferences(formula, [table], inRow5)).toBe(plain);
});

test('the row of a formula beside the table is in it, that of one below is not', () => {
  expect(plainReferences('Run1[[#This Row],[t / s]]', [table], { sheet: 'Gas run', row: 7 })).toBe('#REF!');
  expect(plainReferences('Run1[[#This Row],[t / s]]', [table], { sheet: 'Other', row: 4 })).toBe('#REF!');
});

test('functions calculate with the columns of a table', async () => {
  const model = book(
    {
      'Gas run': {
        B4: 40,
        B5: 25,
        B6: 20,
        B7: 10,
        E4: '=PACE.EVENT(Run1[t / s])',
        F4: '=PACE.EVENT(Run1[[#This Row],[t / s]])',
      },
      Sum: { A1: '=SUM(Run1[t / s])', A2: '=total*2' },
    },
    [{ name: 'total', refersTo: 'SUM(Run1[t / s])' }],
  );
  const calculated = await calculate({ ...model, tables: [table] });
  expect([3, 4, 5, 6].map((row) => calculated.shown('Gas run', row, 4))).toEqual([
    1 / 40,
    1 / 25,
    1 / 20,
    1 / 10,
  ]);
  expect(calculated.shown('Gas run', 3, 5)).toBe(1 / 40);
  expect([calculated.shown('Sum', 0, 0), calculated.shown('Sum', 1, 0)]).toEqual([95, 190]);
});
