import { excelPort } from '../../taskpane/excel';
import { fakeExcel } from './fakeExcel';
import { portContract, portErrorCells, type BenchSheets, type PortBench } from './portContract';

function open(sheets: BenchSheets): PortBench {
  const { select } = fakeExcel(sheets);
  return { port: excelPort(), select };
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
