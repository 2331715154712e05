/** The copy for someone who installs nothing, made in the page and saved from it. */
import { readFile } from 'node:fs/promises';
import { readWorkbook } from '../../../workbook/xlsx/read';
import type { BenchPage } from '../bench';
import { handsOn } from '../hands';

export function handOverSuite(sheet: () => BenchPage): void {
  const step = (selector: string) => sheet().page.locator(`#hand-over ${selector}`);
  const { press } = handsOn(sheet);

  beforeAll(async () => {
    await sheet().show([
      ['t / s', 'V / mL', 'slope', 'k'],
      [0, 0, '=PACE.BETWEEN(A2:A6,B2:B6,0,20)', '=PACE.COEFFICIENT(A2:A6,B2:B6,1,60)'],
      [10, 20, '=PACE.EVENT(-1)', null],
      [20, 33],
      [30, 42],
      [40, 48],
    ]);
    await press('Hand over');
  });

  test('it is told what stays live, what is frozen and why, and what was an error', async () => {
    await press('Make the copy');
    await step('.counts').waitFor({ timeout: 60_000 });
    expect((await step('.counts').innerText()).replace(/\s+/g, ' ')).toBe(
      '1 live: they follow their inputs 2 frozen to their value 1 showed an error before, and still do',
    );
    expect(await step('details').first().textContent()).toContain("'Gas run'!D2");
  });

  test('the copy is saved beside the workbook, which stays as it is', async () => {
    const [download] = await Promise.all([sheet().page.waitForEvent('download'), press('Save the copy…')]);
    expect(download.suggestedFilename()).toMatch(/ handed over\.xlsx$/);
    const copy = readWorkbook(new Uint8Array(await readFile(await download.path())));
    expect(copy.sheets.map(({ name }) => name)).toEqual(['Gas run', 'Method', 'Workings']);
    const formulas = copy.sheets.flatMap(({ cells }) => cells.flatMap(({ formula }) => formula ?? []));
    expect(formulas.filter((formula) => /PACE/.test(formula))).toEqual([]);
    const [[slope]] = await sheet().cells("'Gas run'!C2");
    const copied = copy.sheets[0].cells.find(({ row, column }) => row === 1 && column === 2)!;
    expect(slope).toBeCloseTo(33 / 20, 12); // both times have readings of their own
    expect(copied.value).toBeCloseTo(33 / 20, 12);
    expect(copied.formula).toBeDefined();
    await press('Rate');
  });
}
