/** The README's worked example, typed into a workbook and calculated: it must show what it says. */
import { readFileSync } from 'node:fs';
import { parseArea } from '../../functions/address';
import type { CellModel } from '../../workbook/engine/engine';
import { calculate } from '../../workbook/engine/univer/headless';

const readme = readFileSync('README.md', 'utf8');

/** Rows of the table between two markers, without its head. */
function tableNamed(name: string): string[][] {
  const part = readme.split(`<!-- ${name} -->`)[1].split(`<!-- end of ${name} -->`)[0];
  const rows = part.split('\n').filter((line) => line.startsWith('|'));
  return rows.slice(2).map((row) =>
    row
      .split('|')
      .slice(1, -1)
      .map((cell) => cell.trim()),
  );
}

const readings = tableNamed('example readings');
const formulas = tableNamed('example formulas').map(([cell, formula, shows]) => ({
  place: parseArea(cell)!,
  formula: formula.replace(/^`=|`$/g, ''),
  shows,
}));

test('the worked example shows what it says', async () => {
  const cells: CellModel[] = [
    ...readings.flatMap((row, r) => row.map((text, column) => ({ row: r + 1, column, value: Number(text) }))),
    ...formulas.map(({ place, formula }) => ({ row: place.row, column: place.column, value: null, formula })),
  ];
  const book = await calculate({ sheets: [{ name: 'Example', cells }], names: [] });
  expect(book.errors).toEqual([]);
  for (const { place, shows } of formulas) {
    const numbers = shows.split(/, | … /);
    expect(numbers.length).toBeGreaterThan(0);
    numbers.forEach((text, i) => {
      // a column is shown by its first and last cell, a row by all of them
      const isColumn = shows.includes('…');
      const row = isColumn && i > 0 ? readings.length : place.row;
      const shown = book.shown('Example', row, place.column + (isColumn ? 0 : i));
      if (Number(text) === 0) return expect(shown).toBe(0);
      const digits = text.replace(/E.*/, '').replace(/^-?0*\.?0*|\./g, '').length;
      expect(Number((shown as number).toPrecision(Math.max(1, digits)))).toBe(Number(text));
    });
  }
});
