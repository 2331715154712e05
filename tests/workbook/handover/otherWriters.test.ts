/** Files that other programs wrote: read as another reader reads them, and otherwise left alone. */
import * as XLSX from '@e965/xlsx';
import { cellName } from '../../../functions/address';
import { CellError, type CellValue } from '../../../functions/cell';
import { recalculate } from '../../../workbook/commands/recalculate';
import { demoWorkbook } from '../../../workbook/demo/demo';
import { calculate } from '../../../workbook/engine/univer/headless';
import { handOver } from '../../../workbook/handover/handOver';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { partsOf } from '../xlsx/package';
import { otherEngines } from './otherEngines';

const origin = { version: '1.2.3', date: '2026-12-01' };

/** Every value of the file by `Sheet!A1`, as a library reads it that shares nothing with ours. */
function valuesByLibrary(bytes: Uint8Array): Map<string, CellValue> {
  const { Sheets } = XLSX.read(bytes, { type: 'array', cellFormula: true });
  return new Map(
    Object.entries(Sheets).flatMap(([sheet, cells]) =>
      Object.entries(cells as Record<string, XLSX.CellObject>)
        .filter(([place, { t, v }]) => !place.startsWith('!') && t !== 'z' && v !== undefined)
        .map(([place, { t, v, w }]): [string, CellValue] => [
          `${sheet}!${place}`,
          t === 'e' ? new CellError((w ?? '') as CellError['code']) : (v as CellValue),
        ]),
    ),
  );
}

const changedParts = (before: Uint8Array, after: Uint8Array): string[] => {
  const [old, now] = [partsOf(before), partsOf(after)];
  return Object.keys(old).filter((path) => !now[path] || !Buffer.from(old[path]).equals(now[path]));
};

for (const engine of otherEngines) {
  (engine.isInstalled ? describe : describe.skip)(`saved by ${engine.name}`, () => {
    let file: Uint8Array;
    let copy: Uint8Array;
    beforeAll(async () => {
      const model = demoWorkbook();
      // handed over first: without the add-in, the program itself could not keep our formulas
      copy = (await handOver(createWorkbook(model, await calculate(model)), origin)).bytes;
      file = engine.saved(copy);
    }, 240_000);

    test('every cell is read as another reader reads it', () => {
      const theirs = valuesByLibrary(file);
      const ours = readWorkbook(file).sheets.flatMap(({ name, cells }) =>
        cells
          .filter(({ value }) => value !== null)
          .map(({ row, column, value }): [string, CellValue] => [`${name}!${cellName(row, column)}`, value]),
      );
      expect(ours.length).toBeGreaterThan(1000);
      expect(ours.filter(([place, value]) => !isSame(value, theirs.get(place) ?? null))).toEqual([]);
      const read = new Set(ours.map(([place]) => place));
      expect([...theirs].filter(([place, value]) => value !== '' && !read.has(place))).toEqual([]);
    });

    test('recalculated, its sheets alone have changed; handed over, nothing has', async () => {
      const { bytes } = await recalculate(file);
      expect(
        changedParts(file, bytes).filter((path) => !/^xl\/(?:worksheets\/sheet|calcChain)/.test(path)),
      ).toEqual([]);
      const { formulas } = await handOver(file, origin);
      expect(formulas).toEqual([]);
    }, 120_000);
  });
}

const isSame = (ours: CellValue, theirs: CellValue): boolean =>
  ours instanceof CellError ? theirs instanceof CellError && theirs.code === ours.code : ours === theirs;
