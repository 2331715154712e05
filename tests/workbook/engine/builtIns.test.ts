/** A workbook's own formulas come to the same here as in programs that share no code with the engine here. */
import { CellError, type CellValue } from '../../../functions/cell';
import { calculate } from '../../../workbook/engine/univer/headless';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { otherEngines } from '../handover/otherEngines';
import { book } from './book';
import { builtIns, readings } from './builtIns';

/** Relative. The engine's t distribution holds 10 digits, and it rounds differences to 12. */
const tolerance = 1e-9;

/** `EXP(1E-10)-1` is all rounding: 10 digits here, 8 in the others. */
const loosely = 1e-7;

/** A cell that holds TRUE counts as 1 there. */
const otherwise: Readonly<Record<string, readonly string[]>> = {
  LibreOffice: ['SUM(A1:C8)', 'MAX(C1:C8)', 'TYPE(C7)'],
};

const model = book({
  Run: { ...readings, ...Object.fromEntries(builtIns.map((formula, at) => [`H${at + 1}`, `=${formula}`])) },
});

function isSame(formula: string, ours: CellValue, theirs: CellValue): boolean {
  if (ours instanceof CellError) return theirs instanceof CellError; // which of the errors, programs disagree on
  if (typeof ours !== 'number' || typeof theirs !== 'number') return ours === theirs;
  const near = /^7-7|^EXP\(1E/.test(formula) ? loosely : tolerance;
  return Math.abs(ours - theirs) <= near * Math.max(Math.abs(ours), Math.abs(theirs));
}

for (const { name, isInstalled, recalculated } of otherEngines) {
  (isInstalled ? test : test.skip)(
    `${builtIns.length} formulas show what ${name} shows`,
    async () => {
      const calculated = await calculate(model);
      const theirs = recalculated(createWorkbook(model, calculated));
      const off = builtIns.flatMap((formula, at) => {
        const here = calculated.shown('Run', at, 7);
        const there = theirs.get(`Run!H${at + 1}`) ?? null;
        const agrees = otherwise[name]?.includes(formula) || isSame(formula, here, there);
        return agrees ? [] : [`${formula}: ${String(here)} here, ${String(there)} there`];
      });
      expect(off).toEqual([]);
    },
    120_000,
  );
}
