/** The local workbook keeps the contract that every workbook behind the pane must keep: in the page, as it is served. */
import { CellError } from '../../../functions/cell';
import type { WorkbookPort } from '../../../taskpane/port';
import type { BookModel, CellModel } from '../../../workbook/engine/engine';
import { portContract, portErrorCells, type BenchSheets, type PortBench } from '../../taskpane/portContract';
import type { BenchPage } from '../bench';
import { portByPage } from '../portByPage';

export function portSuite(sheet: () => BenchPage): void {
  let port: WorkbookPort;

  beforeAll(async () => {
    port = await portByPage(sheet().page);
  });

  async function open(sheets: BenchSheets): Promise<PortBench> {
    await sheet().open(bookOf(sheets));
    return {
      port,
      select: (reference) => sheet().select(reference),
      numberFormat: (reference) =>
        sheet().page.evaluate((one) => window.flaskpace.numberFormat(one), reference),
    };
  }

  /** An error is put in as a formula that ends in it: nothing but plain data crosses into the page. */
  function bookOf(sheets: BenchSheets): BookModel {
    return {
      sheets: Object.entries(sheets).map(([name, rows]) => ({
        name,
        cells: rows.flatMap((row, r) =>
          row.flatMap((value, c): CellModel[] => {
            if (value === null) return [];
            const place = { row: r, column: c };
            return value instanceof CellError
              ? [{ ...place, value: null, formula: '1/0' }]
              : [{ ...place, value }];
          }),
        ),
      })),
      names: [],
    };
  }

  portContract('the local workbook', open);
  portErrorCells('the local workbook', open);

  test('an error of ours is read with our words', async () => {
    await sheet().show([['=PACE.EVENT(-3)']]);
    const { cells } = await port.read({ sheet: 'Gas run', row: 0, column: 0, rows: 1, columns: 1 });
    expect(cells[0][0]).toEqual(new CellError('#VALUE!', 'times must be above 0: row 1 (-3)'));
  });
}
