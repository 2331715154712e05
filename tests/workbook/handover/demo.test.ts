/** The whole demo workbook, handed over and worked out by other programs. */
import { CellError, type CellValue } from '../../../functions/cell';
import { demoWorkbook } from '../../../workbook/demo/demo';
import { calculate } from '../../../workbook/engine/univer/headless';
import { handOver, type HandedOver } from '../../../workbook/handover/handOver';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { otherEngines, shownIn } from './otherEngines';

let copy: HandedOver;
beforeAll(async () => {
  const model = demoWorkbook();
  const bytes = createWorkbook(model, await calculate(model));
  copy = await handOver(bytes, { version: '1.2.3', date: '2026-12-01' });
}, 120_000);

/** Numbers to nine digits, or nothing where a sum leaves its rounding; errors by their code. */
function isNear(theirs: CellValue, ours: CellValue): boolean {
  if (typeof ours === 'number' && typeof theirs === 'number')
    return (
      Math.max(Math.abs(theirs), Math.abs(ours)) < 1e-12 || Math.abs(theirs - ours) <= 1e-9 * Math.abs(ours)
    );
  if (ours instanceof CellError) return theirs instanceof CellError && theirs.code === ours.code;
  return (theirs ?? '') === (ours ?? '');
}

test('most of what it asks of a run stays live', () => {
  const live = copy.formulas.filter(({ said }) => said);
  expect(live.length).toBeGreaterThan(copy.formulas.length / 3);
  expect(live.some(({ original }) => original.includes('GASVOLUME'))).toBe(true);
});

for (const engine of otherEngines) {
  (engine.isInstalled ? test : test.skip)(
    `${engine.name} shows every cell as it is here`,
    () => {
      const shown = engine.recalculated(copy.bytes);
      const ours = [...shownIn(copy.bytes)];
      expect(ours.length).toBeGreaterThan(1000);
      const off = ours.filter(([place, value]) => !isNear(shown.get(place) ?? null, value));
      expect(off.map(([place, value]) => [place, value, shown.get(place)])).toEqual([]);
    },
    120_000,
  );
}
