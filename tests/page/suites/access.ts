/** The page without a mouse, by ear, in the dark and in little room. */
import axe from 'axe-core';
import type { BenchPage } from '../bench';

/** Our own parts. The grid (0.25.1) is a picture with controls of its own that we can name but not mend. */
const ours = ['#strip', '#cell-line', '#pane'];

export function accessSuite(sheet: () => BenchPage): void {
  const focusIsIn = (part: string): Promise<boolean> =>
    sheet().page.evaluate(
      (selector) => document.querySelector(selector)!.contains(document.activeElement),
      part,
    );
  const press = (key: string): Promise<void> => sheet().page.keyboard.press(key);

  test('F6 goes from strip to sheet to pane and round, Shift+F6 back', async () => {
    await sheet().select("'Gas run'!A5");
    expect(await focusIsIn('#sheet')).toBe(true);
    await press('F6');
    expect(await focusIsIn('#pane')).toBe(true);
    await press('F6');
    expect(await focusIsIn('#strip')).toBe(true);
    await press('F6');
    expect(await focusIsIn('#sheet')).toBe(true);
    await press('Shift+F6');
    expect(await focusIsIn('#strip')).toBe(true);
    await press('F6');
    await press('ArrowDown');
    await sheet().page.locator('#cell-line .where', { hasText: 'A6' }).waitFor();
  });

  test('our own parts hold to the rules of accessibility', async () => {
    expect(await violations(sheet(), ours)).toEqual([]);
  });

  test('every control of the grid has a name', async () => {
    expect(await violations(sheet(), ['#grid'], ['button-name', 'aria-input-field-name', 'label'])).toEqual(
      [],
    );
  });

  test('in the dark all of our words can be read', async () => {
    await sheet().page.emulateMedia({ colorScheme: 'dark' });
    await sheet().page.waitForTimeout(300); // colours fade from one to the other
    expect(await violations(sheet(), ours, ['color-contrast'])).toEqual([]);
    const ground = await sheet().page.evaluate(() => getComputedStyle(document.body).backgroundColor);
    expect(brightness(ground)).toBeLessThan(60);
    await sheet().page.emulateMedia({ colorScheme: 'light' });
  });

  test.each([
    { width: 1024, height: 700 },
    { width: 620, height: 900 },
  ])('nothing is cut off at $width × $height', async (size) => {
    await sheet().page.setViewportSize(size);
    for (const part of ['#strip', '#grid', '#cell-line', '#pane']) {
      const box = (await sheet().page.locator(part).boundingBox())!;
      expect(box.height).toBeGreaterThan(20);
      expect(box.x).toBeGreaterThanOrEqual(0);
      expect(box.x + box.width).toBeLessThanOrEqual(size.width);
      expect(box.y + box.height).toBeLessThanOrEqual(size.height);
    }
    await sheet().page.setViewportSize({ width: 1280, height: 800 });
  });
}

export async function violations(
  { page }: Pick<BenchPage, 'page'>,
  include: readonly string[],
  rules?: readonly string[],
): Promise<string[]> {
  const isThere = await page.evaluate(() => 'axe' in window);
  if (!isThere) await page.evaluate(axe.source);
  const found = await page.evaluate(
    async ([parts, only]) => {
      const { axe: checker } = window as unknown as { axe: typeof axe };
      const options = only ? { runOnly: { type: 'rule' as const, values: [...only] } } : {};
      const { violations: all } = await checker.run({ include: [...parts] }, options);
      return all.flatMap(({ id, nodes }) =>
        nodes.map(({ html, failureSummary }) => `${id}: ${html} ${failureSummary}`),
      );
    },
    [include, rules] as const,
  );
  return found;
}

const brightness = (colour: string): number =>
  Math.max(...(colour.match(/\d+/g) ?? ['255']).slice(0, 3).map(Number));
