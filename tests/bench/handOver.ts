/**
 * How long a copy takes that needs no add-in, beside calculating the same workbook and saving it. Half of
 * the 10,000 formulas convert one reading each; the others take a whole run of 50, and some of those are fits.
 */
import type { BookModel, CellModel, SheetModel } from '../../workbook/engine/engine';
import { calculate } from '../../workbook/engine/univer/headless';
import { handOver } from '../../workbook/handover/handOver';
import { recalculate } from '../../workbook/commands/recalculate';
import { createWorkbook } from '../../workbook/xlsx/create';
import { columnName } from '../../functions/address';

const plates = 20;
const runs = 10;
const points = 50;

function plate(number: number): SheetModel {
  const cells: CellModel[] = [];
  for (let row = 0; row < points; row++) {
    const time = row * 5; // s
    cells.push({ row, column: 0, value: time });
    for (let run = 0; run < runs; run++) {
      const k = 0.02 * (1 + (number * runs + run) / (plates * runs)); // 1/s
      const value = Math.round((3 + 40 * Math.exp(-k * time)) * 100) / 100;
      const readings = columnName(run + 1);
      const formula = formulaFor(
        run,
        `${readings}${row + 1}`,
        `A${row + 1}`,
        `${readings}$1:${readings}$${points}`,
      );
      cells.push({ row, column: run + 1, value }, { row, column: run + runs + 2, value: null, formula });
    }
  }
  return { name: `Plate ${number + 1}`, cells };
}

function formulaFor(run: number, reading: string, time: string, readings: string): string {
  const pair = `$A$1:$A$${points},${readings}`;
  if (run < 5) return `PACE.CONVERSION(${reading},43,3)`;
  if (run === 5) return `PACE.TANGENT(${pair},${time})`;
  if (run === 6) return `PACE.TANGENT(${pair},${time},7)`;
  if (run === 7) return `PACE.BETWEEN(${pair},0,${time}+10)`;
  return run === 8 ? `PACE.COEFFICIENT(${pair},1,3)` : `PACE.HALFLIFE(${pair},1,3)`;
}

async function seconds(job: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await job();
  return (performance.now() - start) / 1000;
}

export async function benchHandOver(): Promise<void> {
  const book: BookModel = { sheets: Array.from({ length: plates }, (_, n) => plate(n)), names: [] };
  const bytes = createWorkbook(book, await calculate(book));
  const peer = await seconds(() => recalculate(bytes));
  const copy = await seconds(() => handOver(bytes, { version: 'bench', date: '2026-12-01' }));
  console.log(`a workbook with ${plates * runs * points} formulas`);
  console.log(`${'calculated and saved'.padEnd(38)}${peer.toFixed(1).padStart(7)} s`);
  console.log(
    `${'handed over'.padEnd(38)}${copy.toFixed(1).padStart(7)} s         ${(copy / peer).toFixed(1).padStart(7)} × calculated and saved`,
  );
}
