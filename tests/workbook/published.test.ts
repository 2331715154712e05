/**
 * Two measured runs of an open textbook, typed into a workbook by a library that is not ours, recalculated as
 * `npm run recalc` does, and read back by that library: the cells must show the answers in print.
 */
import * as XLSX from '@e965/xlsx';
import published from '../reference/published-runs.json';
import { recalculate } from '../../workbook/commands/recalculate';

const typed = (formulas: Readonly<Record<string, string>>, times: number[], values: number[]): Uint8Array => {
  const rows = times.map((time, i) => [time, values[i]]);
  const sheet = XLSX.utils.aoa_to_sheet([['t', 'c'], ...rows]);
  for (const [cell, f] of Object.entries(formulas)) sheet[cell] = { t: 'n', f };
  sheet['!ref'] = 'A1:N20';
  const book = XLSX.utils.book_new(sheet, 'Run');
  return new Uint8Array(XLSX.write(book, { type: 'array', bookType: 'xlsx' }) as ArrayBuffer);
};

async function recalculated(bytes: Uint8Array): Promise<(cell: string) => unknown> {
  const result = await recalculate(bytes);
  expect(result.errors).toEqual([]);
  const sheet = XLSX.read(result.bytes, { type: 'array' }).Sheets.Run;
  return (cell) => (sheet[cell] as XLSX.CellObject | undefined)?.v;
}

const [t, c] = ['A2:A6', 'B2:B6'];

test('decomposition of hydrogen peroxide: average rates, rate coefficient, half life and order as printed', async () => {
  const { times, values, published: printed } = published.cases[0];
  const shown = await recalculated(
    typed(
      {
        D1: `PACE.BETWEEN(${t},${c},0,6)`,
        D2: `PACE.BETWEEN(${t},${c},18,24)`,
        D3: `PACE.COEFFICIENT(${t},${c},1)`,
        D4: `PACE.HALFLIFE(${t},${c},1)`,
        F1: `PACE.ORDERS(${t},${c})`,
      },
      times,
      values,
    ),
  );
  // OpenStax, Chemistry 2e, 12.1: 0.0833 and 0.010 mol/(L h)
  expect(shown('D1')).toBeCloseTo(0.0833, 4);
  expect(shown('D2')).toBeCloseTo(0.01, 3);
  expect(Math.abs((shown('D3') as number) - printed.rateCoefficient)).toBeLessThan(printed.lastDigit);
  expect(shown('D4')).toBeCloseTo(printed.halfLife!, 9);
  // the row of order 1 carries the verdict
  expect(shown('F4')).toBe(printed.order);
  expect(shown('N4')).toBe('fits best');
});

test('dimerisation of butadiene: rate coefficient and order as printed', async () => {
  const { times, values, published: printed } = published.cases[1];
  const shown = await recalculated(
    typed({ D1: `PACE.COEFFICIENT(${t},${c},2)`, F1: `PACE.ORDERS(${t},${c})` }, times, values),
  );
  expect(Math.abs((shown('D1') as number) - printed.rateCoefficient)).toBeLessThan(printed.lastDigit);
  expect(shown('F6')).toBe(printed.order);
  expect(shown('N6')).toMatch(/^fits best|best of these/);
});
