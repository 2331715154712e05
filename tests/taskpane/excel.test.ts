import { blanksIn, excelPort } from '../../taskpane/excel';
import { fakeExcel } from './fakeExcel';
import { portContract, portErrorCells, type BenchSheets, type PortBench } from './portContract';

function open(sheets: BenchSheets): PortBench {
  const { select, numberFormat } = fakeExcel(sheets);
  return { port: excelPort(), select, numberFormat };
}

portContract('Excel', open);
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
