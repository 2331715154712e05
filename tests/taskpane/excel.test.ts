import { blanksIn, excelPort } from '../../taskpane/excel';
import { parseArea } from '../../functions/address';
import { allSupport, supportOf } from '../../taskpane/excel/support';
import type { CellToWrite } from '../../taskpane/port';
import { fakeExcel } from './fakeExcel';
import { fakeOffice } from './fakeOffice';
import { portContract, portErrorCells, type BenchSheets, type PortBench } from './portContract';

function open(sheets: BenchSheets): PortBench {
  const { select, numberFormat } = fakeExcel(sheets);
  return { port: excelPort(), select, numberFormat };
}

portContract('Excel', open);
portContract('Excel without spilling formulas', (sheets) => {
  const fake = fakeExcel(sheets);
  return { port: excelPort({ ...allSupport, spills: false }), ...fake };
});
portErrorCells('Excel', open);

test('a selection in several pieces is no selection', async () => {
  open({ 'Gas run': [[1, 2]] });
  const run = Excel.run;
  Object.assign(Excel, {
    run: (batch: (context: object) => Promise<unknown>) =>
      run(async (context) => {
        const refusing = Object.assign(Object.create(context), {
          sync: () => Promise.reject(new Error('InvalidSelection')),
        });
        return batch(refusing);
      }),
  });
  expect(await excelPort().selection()).toBeNull();
});

test('blanksIn tells a blank from a zero', async () => {
  open({
    'Gas run': [
      [0, null],
      [null, 3],
    ],
  });
  expect(await blanksIn("'Gas run'!A1:B2")).toEqual([
    [false, true],
    [true, false],
  ]);
  expect(await blanksIn("'[Week 3.xlsx]Gas run'!A1")).toEqual([[false]]);
  await expect(blanksIn('not a place')).rejects.toThrow('not a place');
});

const formulasIn = (reference: string): Promise<unknown[][]> =>
  Excel.run(async (context) => {
    const { row, column, rows, columns } = parseArea(reference)!;
    const range = context.workbook.worksheets.getItem('Run').getRangeByIndexes(row, column, rows, columns);
    range.load({ formulas: true });
    await context.sync();
    return range.formulas;
  });

const table: CellToWrite = {
  area: { sheet: 'Run', row: 0, column: 0, rows: 1, columns: 1 },
  content: { formula: '=PACE.ALONG(F1:F2,G1:G2)' },
  spills: { rows: 2, columns: 1 },
};

test('undo puts a formula that had spilled into its own cell alone, so that it can spill again', async () => {
  const { spill } = fakeExcel({ Run: [] });
  spill('Run!A1:A3', '=SEQUENCE(3)');
  const port = excelPort();
  const receipt = await port.write([table], { overwrite: true, description: 'a test' });
  expect(await formulasIn('A1')).toEqual([['=PACE.ALONG(F1:F2,G1:G2)']]);
  await port.undo(receipt);
  expect(await formulasIn('A1:A2')).toEqual([['=SEQUENCE(3)'], ['']]);
});

test('where no formula spills, each cell gets its own, and the person is told', async () => {
  fakeExcel({ Run: [] });
  const port = excelPort({ ...allSupport, spills: false });
  const receipt = await port.write([table], { overwrite: false, description: 'a test' });
  expect(await formulasIn('A1:A2')).toEqual([
    ['=INDEX(PACE.ALONG(F1:F2,G1:G2),1,1)'],
    ['=INDEX(PACE.ALONG(F1:F2,G1:G2),2,1)'],
  ]);
  await port.undo(receipt);
  expect(await formulasIn('A1:A2')).toEqual([[''], ['']]);
  expect(port.remark).toContain('Ctrl+Shift+Enter');
  expect(excelPort().remark).toBeUndefined();
});

test('what Excel can do is asked of it once, set by set', () => {
  fakeExcel({ Run: [] });
  fakeOffice({ lacks: ['ExcelApi 1.12', 'CompressedFile 1.1', 'Settings 1.1'] });
  expect(supportOf('Excel')).toEqual({
    name: 'Excel',
    spills: false,
    charts: true,
    files: false,
    memory: false,
  });
});
