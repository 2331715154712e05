/** A formula of ours in the active cell: what it reads is numbered and outlined in the sheet. */
import { markColour } from '../../../taskpane/markColours';
import { waitUntil, type BenchPage } from '../bench';
import { handsOn } from '../hands';

const run = [
  ['t / s', 'V / mL', null, '=PACE.TANGENT(A2:A8,B2:B8,30)'],
  ...[0, 10, 20, 30, 40, 50, 60].map((t) => [t, 3 * t - 0.01 * t * t]),
];

export function chosenSuite(sheet: () => BenchPage): void {
  const { pane, says } = handsOn(sheet);

  /** How many pixels of the grid have the colour of this number. */
  const coloured = (number: number): Promise<number> =>
    sheet().page.evaluate(
      (colour) => {
        const [red, green, blue] = [1, 3, 5].map((at) => parseInt(colour.slice(at, at + 2), 16));
        const canvases = [...document.querySelectorAll<HTMLCanvasElement>('#grid canvas')];
        return canvases
          .filter(({ width, height }) => width * height > 0)
          .map((canvas) => {
            const { width, height } = canvas;
            const copy = Object.assign(document.createElement('canvas'), { width, height });
            const pixels = copy.getContext('2d', { willReadFrequently: true })!;
            pixels.drawImage(canvas, 0, 0);
            return pixels.getImageData(0, 0, width, height).data;
          })
          .reduce((sum, data) => {
            let count = 0;
            for (let i = 0; i < data.length; i += 4)
              if (data[i] === red && data[i + 1] === green && data[i + 2] === blue) count++;
            return sum + count;
          }, 0);
      },
      markColour(number - 1),
    );
  /** More than a number in its square: its outline too. */
  const isOutlined = async (number: number): Promise<boolean> => (await coloured(number)) > 400;

  beforeAll(async () => {
    await sheet().show(run);
    await sheet().select("'Gas run'!A2");
  });

  test('nothing is marked while no formula is chosen', async () => {
    await waitUntil(async () => (await coloured(2)) === 0);
    expect(await coloured(2)).toBe(0);
    expect(await pane('.chosen section').count()).toBe(0);
  });

  test('the cells that it reads have a number and an outline', async () => {
    await sheet().select("'Gas run'!D1");
    await says('#in-cell', 'In cell D1');
    await waitUntil(() => isOutlined(2));
    expect(await isOutlined(2)).toBe(true);
  });

  test('they can be shown, and stay marked', async () => {
    await pane('#in-cell .reads button').first().click();
    await waitUntil(async () => (await selected()) === 'A2:7');
    expect(await selected()).toBe('A2:7');
    expect(await isOutlined(2)).toBe(true);
    await says('#in-cell', 'In cell D1');
  });

  const selected = (): Promise<string> =>
    sheet().page.evaluate(async () => {
      const area = (await window.flaskpace.port.selection())?.area;
      return area ? `${'ABCDE'[area.column]}${area.row + 1}:${area.rows}` : '';
    });

  test('a formula is followed while it is typed', async () => {
    await sheet().select("'Gas run'!E3");
    expect(await pane('.chosen section').count()).toBe(0);
    await sheet().page.keyboard.type('=PACE.START(A2:A8,B2:B8');
    await says('#formula-in-cell', '=PACE.START(A2:A8,B2:B8');
    expect(await pane('#in-cell .reads button').allInnerTexts()).toEqual(['1 times', '2 values']);
    await sheet().page.keyboard.press('Escape');
    await waitUntil(async () => (await pane('.chosen section').count()) === 0);
    expect(await pane('.chosen section').count()).toBe(0);
  });
}
