/** How much of a workbook stays live in its copy: every function's example, and every sheet of the demo. */
import { catalogue } from '../../../functions/catalogue';
import { demoWorkbook } from '../../../workbook/demo/demo';
import type { BookModel } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import type { HandedFormula } from '../../../workbook/handover/handed';
import { handOver } from '../../../workbook/handover/handOver';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { book } from '../engine/book';

async function handed(model: BookModel): Promise<readonly HandedFormula[]> {
  const bytes = createWorkbook(model, await calculate(model));
  return (await handOver(bytes, { version: '1.2.3', date: '2026-12-01' })).formulas;
}

/** Fits, simulations and searches: no built-in formula repeats them. */
const noCounterpart = [
  'ORDERS',
  'ORDER',
  'COEFFICIENT',
  'HALFLIFE',
  'OVERLAYORDER',
  'SURVEY',
  'FITCOURSE',
  'PLAN',
  'CHECK',
];

const frozenFunctions = (formulas: readonly HandedFormula[]): string[] => [
  ...new Set(formulas.filter(({ said }) => !said).map(({ functions }) => functions[0].name)),
];

test('every example is live, but for fits, simulations and searches', async () => {
  const examples = Object.fromEntries(catalogue.map(({ name, example }) => [name, { A1: example.formula }]));
  expect(frozenFunctions(await handed(book(examples)))).toEqual(noCounterpart);
}, 120_000);

test('on every sheet of the demo all else is live, and each frozen fit has its numbers aside', async () => {
  const formulas = await handed(demoWorkbook());
  const sheets = new Set(formulas.map(({ sheet }) => sheet));
  expect(sheets.size).toBeGreaterThan(5);
  expect(frozenFunctions(formulas).filter((name) => !noCounterpart.includes(name))).toEqual([]);
  const fits = formulas.filter(({ said, functions }) => !said && functions[0].fits);
  expect(fits.length).toBeGreaterThan(10);
  expect(fits.filter((formula) => formula.fits === undefined)).toEqual([]);
}, 120_000);
