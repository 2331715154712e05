/** Every example of the catalogue, typed into an empty cell of a real sheet, gives what it says. */
import { catalogue } from '../../../functions/catalogue';
import { isRange, type CellRange } from '../../../functions/cell';
import { typedName } from '../../../functions/define';
import type { CalculatedBook } from '../../../workbook/engine/engine';
import { calculate } from '../../../workbook/engine/univer/headless';
import { formulaPluginConfig } from '../../../workbook/engine/univer/register';

let calculated: CalculatedBook;

/** A sheet each, so that none stands in another's way. */
beforeAll(async () => {
  calculated = await calculate({
    sheets: catalogue.map((f) => ({
      name: f.name,
      cells: [{ row: 0, column: 0, value: null, formula: f.example.formula.replace(/^=/, '') }],
    })),
    names: [],
  });
}, 60_000);

test.each(catalogue.map((f) => [f.example.formula, f] as const))('%s', (_, f) => {
  const { equals } = f.example;
  const expected: CellRange = isRange(equals) ? equals : [[equals]];
  expected.forEach((row, r) =>
    row.forEach((value, c) => {
      const shown = calculated.shown(f.name, r, c);
      if (typeof value === 'number' && value !== 0) expect(Number(shown) / value).toBeCloseTo(1, 4);
      else expect(shown).toEqual(value);
    }),
  );
});

test('each has help for every argument, and says which can be left out', () => {
  const { description } = formulaPluginConfig();
  expect(description.map(({ functionName }) => functionName)).toEqual(catalogue.map(typedName));
  for (const { functionParameter } of description) {
    for (const { name, detail, require } of functionParameter) {
      expect({ name, detail }).toEqual({
        name: expect.stringMatching(/./),
        detail: expect.stringMatching(/.{8}/),
      });
      expect([0, 1]).toContain(require);
    }
  }
});
