/** Every error path of some functions: a copy, one input of each call changed in it, and other programs' word for it. */
import { cellName } from '../../../../functions/address';
import { catalogue } from '../../../../functions/catalogue';
import { CellError, type CellValue } from '../../../../functions/cell';
import type { Family } from '../../../../functions/define';
import { callIn } from '../../../../functions/literal';
import type { CalculatedBook } from '../../../../workbook/engine/engine';
import { calculate } from '../../../../workbook/engine/univer/headless';
import type { HandedFormula } from '../../../../workbook/handover/handed';
import { handOver } from '../../../../workbook/handover/handOver';
import { createWorkbook } from '../../../../workbook/xlsx/create';
import { otherEngines, type Shown } from '../otherEngines';
import { withTyped } from '../withTyped';
import { blocksOf, bookOf, type Block } from './blocks';
import { calls } from './calls';
import { isDeparture } from './departures';

export function sweep(...families: readonly Family[]): void {
  const own = calls.filter((call) => families.includes(callIn(call).f.family));
  const blocks = [...blocksOf(own, false), ...blocksOf(fullestOf(own), true)];
  const sheets = [...new Set(blocks.map(({ sheet }) => sheet))];
  let after: CalculatedBook;
  let copy: readonly HandedFormula[];
  let changed: Uint8Array;

  beforeAll(async () => {
    const model = bookOf(blocks, (block) => block.before);
    const handed = await handOver(createWorkbook(model, await calculate(model)), {
      version: '1.2.3',
      date: '2026-12-01',
    });
    copy = handed.formulas;
    after = await calculate(bookOf(blocks, (block) => ({ ...block.before, ...block.after })));
    changed = withTyped(
      handed.bytes,
      bookOf(blocks, (block) => block.after),
    );
  }, 600_000);

  const formulaOf = ({ sheet, row, column }: Block): HandedFormula =>
    copy.find((one) => one.sheet === sheet && one.row === row && one.column === column)!;

  test('every function that follows its inputs is called', () => {
    // one that looks at none of its arguments only says why it cannot be said
    const live = catalogue.filter((f) => f.builtIn?.length && !f.fits && families.includes(f.family));
    expect([...new Set(own.map((call) => callIn(call).f.name))].sort()).toEqual(
      live.map((f) => f.name).sort(),
    );
  });

  test('what is answered on the day of the copy is live in it', () => {
    const frozen = blocksOf(own, false)
      .map(formulaOf)
      .filter(({ said }) => !said);
    expect(frozen.map(({ original, why }) => [original, why])).toEqual([]);
  });

  for (const engine of otherEngines) {
    (engine.isInstalled ? describe : describe.skip)(engine.name, () => {
      let shown: Shown;
      beforeAll(() => {
        shown = engine.recalculated(changed);
      }, 300_000);

      test.each(sheets)('%s: a change for worse or better shows as PACE shows it', (sheet) => {
        const judged = blocks.filter((block) => block.sheet === sheet);
        expect(judged.flatMap((block) => differencesIn(block, engine.name, shown))).toEqual([]);
      });
    });
  }

  function differencesIn(block: Block, engine: string, shown: Shown): string[] {
    const formula = formulaOf(block);
    if (!formula.said) return [];
    const { sheet, row, column, area } = formula;
    const [first, outcome] = [after.shown(sheet, row, column), after.formula(sheet, row, column)];
    const { rows, columns } = outcome?.spill ?? { rows: 1, columns: 1 };
    const isError = first instanceof CellError && rows * columns === 1;
    const cells = Array.from({ length: area.rows * area.columns }, (_, n) => {
      const [r, c] = [row + Math.floor(n / area.columns), column + (n % area.columns)];
      const theirs = shown.get(`${sheet}!${cellName(r, c)}`) ?? null;
      return { ours: isError ? first : after.shown(sheet, r, c), theirs };
    });
    const all = cells.map(({ theirs }) => theirs);
    const size = Math.max(...cells.map(({ ours }) => (typeof ours === 'number' ? Math.abs(ours) : 0)));
    return cells
      .filter(({ ours, theirs }) => !isSame(ours, theirs, size))
      .filter((cell) => !isDeparture({ block, formula, engine, shown: all, ...cell }))
      .map(({ ours, theirs }) => `${block.title}: ${inWords(theirs)} for ${inWords(ours)}`);
  }
}

/** Of each function the last call, which has the most arguments. */
const fullestOf = (some: readonly string[]): string[] => [
  ...new Map(some.map((call) => [callIn(call).f.name, call])).values(),
];

/** @param size the largest number of a result: a 0 among them can come out as their rounding */
function isSame(ours: CellValue, theirs: CellValue, size: number): boolean {
  if (typeof ours === 'number' && typeof theirs === 'number')
    return Math.abs(ours - theirs) <= 1e-9 * Math.max(Math.abs(ours), size / 1000);
  if (ours instanceof CellError) return theirs instanceof CellError && theirs.code === ours.code;
  return (ours ?? '') === (theirs ?? '');
}

const inWords = (cell: CellValue): string =>
  cell instanceof CellError ? `${cell.code} ${cell.message}`.trim() : JSON.stringify(cell);
