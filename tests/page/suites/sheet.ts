/** The sheet on the page: every function live, typed with help, recalculated, and honest about errors. */
import { waitUntil, type BenchPage } from '../bench';

export function sheetSuite(sheet: () => BenchPage): void {
  // less to calculate than the demo, for those who need some cells and no more
  afterEach(() => sheet().show([['t / s'], [10], [20], [30], [0]]));

  const copy = async (): Promise<void> => {
    await sheet().page.keyboard.press('ControlOrMeta+c');
    await sheet().page.waitForTimeout(300); // the clipboard is filled in its own time
  };
  const line = (): Promise<string> => sheet().page.locator('#cell-line').innerText();

  test('the demo is calculated, nothing complains, and nothing is asked of another address', async () => {
    // 8.8 mL of a gas over water is some tenths of a millimole at room conditions: 24 L/mol
    const [[moles]] = await sheet().cells("'Gas run'!C6");
    expect(Number(moles)).toBeGreaterThan((0.95 * 8.8e-3) / 24.5);
    expect(Number(moles)).toBeLessThan(8.8e-3 / 24);
    const shown = (await sheet().cells("'Gas run'!A1:N40")).flat();
    expect(shown.filter((cell) => /^#(NAME|REF|VALUE|NULL|DIV)/.test(String(cell)))).toEqual([]);
    expect(sheet().complaints).toEqual([]);
    expect(await sheet().page.title()).toBe('demo.xlsx – Flaskpace');
  });

  test('a formula typed over a column spills, and follows an edit', async () => {
    await sheet().type("'Gas run'!P1", '20');
    await sheet().type("'Gas run'!P2", '25');
    await sheet().type("'Gas run'!P3", '40');
    await sheet().type("'Gas run'!Q1", '=PACE.EVENT(P1:P3)');
    await sheet().shows("'Gas run'!Q1:Q3", [[0.05], [0.04], [0.025]]);
    await sheet().type("'Gas run'!P2", '50');
    await sheet().shows("'Gas run'!Q1:Q3", [[0.05], [0.02], [0.025]]);
    expect(await sheet().page.title()).toBe('• demo.xlsx – Flaskpace');
  });

  test('a long calculation is done on another thread, and its answer spills like any other', async () => {
    await sheet().type("'Gas run'!Q3", '=ROUND(PACE.COURSE("A -> B",0.0693147180559945,{8;0},{0;10;20}),6)');
    await sheet().shows("'Gas run'!Q3:R5", [
      [8, 0],
      [4, 4],
      [2, 6],
    ]);
    expect(sheet().page.workers()).toHaveLength(1);
  });

  test('a long calculation says how far it is while it goes on', async () => {
    // runs that fade, each in its own time, and that a curve does not meet to the last digit
    const reading = (row: number, run: number): number =>
      Math.exp(-row / (20 + run)) + 0.002 * Math.sin(row * run);
    const rows = Array.from({ length: 100 }, (_, row) => row);
    await sheet().show(rows.map((row) => [row, ...rows.slice(1, 81).map((run) => reading(row, run))]));
    // it may be over before anybody looks: what the bar shows is written down as it changes
    await sheet().page.evaluate(() => {
      const place = document.querySelector('#long-work')!;
      const seen: string[] = [];
      Object.assign(window, { seen });
      new MutationObserver(() => {
        const now = place.querySelector('progress')?.getAttribute('aria-valuenow');
        if (now) seen.push(`${now} %: ${(place as HTMLElement).innerText.replace(/\s+/g, ' ')}`);
      }).observe(place, { childList: true, subtree: true, attributes: true, characterData: true });
    });
    await sheet().type("'Gas run'!CE3", '=PACE.SURVEY(A1:A100,B1:CC100)');
    const shown = async (): Promise<unknown> => (await sheet().cells("'Gas run'!CE83"))[0][0];
    await waitUntil(async () => (await shown()) === 80, 90_000);
    expect(await shown()).toBe(80);
    const seen = await sheet().page.evaluate(() => (window as unknown as { seen: string[] }).seen);
    const shares = seen.map((one) => parseInt(one, 10));
    expect(seen).not.toEqual([]); // how often a busy page is painted is not ours to say
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    for (const one of seen) expect(one).toMatch(/^\d+ %: calculating PACE\.SURVEY run \d+ of 80 Stop$/);
    expect(await sheet().page.locator('#long-work').innerText()).toBe('');
  }, 120_000);

  test('Enter puts in what was typed, whatever the list of names suggests', async () => {
    await sheet().select("'Gas run'!Q1");
    await sheet().page.keyboard.type('=PACE.EVENT');
    await sheet().page.getByText('PACE.EVENT', { exact: true }).first().waitFor();
    await sheet().page.keyboard.press('Backspace'); // PACE.EVEN: still suggested, and no name
    await sheet().page.keyboard.press('Enter');
    const shown = async (): Promise<unknown> => (await sheet().cells("'Gas run'!Q1"))[0][0];
    await waitUntil(async () => (await shown()) !== null);
    expect(await shown()).toMatchObject({ code: '#NAME?' });
  });

  test('a spill can be referred to by its first cell', async () => {
    await sheet().type("'Gas run'!Q1", '=PACE.EVENT({20;25;40})');
    await sheet().type("'Gas run'!R1", '=SUM(Q1#)');
    await sheet().shows("'Gas run'!R1", [[0.115]]);
    await sheet().select("'Gas run'!R1");
    expect(await line()).toContain('=SUM(Q1#)');
  });

  test('a function is offered while its name is typed, and its arguments explained', async () => {
    await sheet().select("'Gas run'!Q1");
    await sheet().page.keyboard.type('=PACE.EV');
    await sheet().page.getByText('Rate from a timed event, such as a colour change').first().waitFor();
    await sheet().page.keyboard.type('ENT(');
    await sheet().page.getByText('time until the event, one or many').waitFor();
    expect(await sheet().page.getByText('signed change of the species').isVisible()).toBe(false);
    await sheet().page.keyboard.type('A5,');
    await sheet().page.getByText('signed change of the species').waitFor();
    await sheet().page.keyboard.press('Escape');
  });

  test('an error speaks in our words, under the sheet and where the mouse rests', async () => {
    const words = 'times must be above 0';
    await sheet().show([['=PACE.EVENT(-3)']]);
    await sheet().select("'Gas run'!A1");
    await sheet().page.locator('#cell-line .why', { hasText: words }).waitFor();
    const [x, y] = middleOfA1(await sheet().page.locator('#grid canvas').last().boundingBox());
    const alert = sheet().page.getByText(words).nth(1);
    // the grid takes its alert away again when the mouse moves on within the cell
    await waitUntil(async () => {
      await sheet().page.mouse.move(x, y + 200);
      await sheet().page.waitForTimeout(200);
      await sheet().page.mouse.move(x, y);
      await sheet().page.waitForTimeout(500);
      return alert.isVisible();
    });
    expect(await alert.isVisible()).toBe(true);
  });

  /** Below the letters of the columns, right of the numbers of the rows. */
  const middleOfA1 = (grid: { x: number; y: number } | null): [number, number] => [
    grid!.x + 46 + 30,
    grid!.y + 20 + 10,
  ];

  test('the line under the sheet reads the active cell: where, what, and the formula', async () => {
    await sheet().select("'Gas run'!A5");
    expect(await line()).toMatch(/^A5\s+0$/);
    await sheet().select("'Gas run'!Q9");
    expect(await line()).toMatch(/^Q9\s+blank$/);
    await sheet().type("'Gas run'!Q9", '=1/4');
    await sheet().shows("'Gas run'!Q9", [[0.25]]);
    await sheet().select("'Gas run'!Q9");
    expect(await line()).toMatch(/^Q9\s+0\.25\s+=1\/4$/);
  });

  test('a long number is shown short, and stays whole when it is edited, copied and pasted', async () => {
    const whole = 0.12345678901234;
    await sheet().show([[whole]]);
    await sheet().select("'Gas run'!A1");
    await copy();
    await sheet().select("'Gas run'!A3");
    await sheet().page.keyboard.press('ControlOrMeta+v');
    await sheet().shows("'Gas run'!A3", [[whole]]);
    await sheet().select("'Gas run'!A1");
    await sheet().page.keyboard.press('F2');
    await sheet().page.keyboard.type('5');
    await sheet().page.keyboard.press('Enter');
    await sheet().shows("'Gas run'!A1", [[0.123456789012345]]);
  });

  test('a copied spill is copied as what it shows', async () => {
    await sheet().type("'Gas run'!Q1", '=PACE.EVENT({20;25;40})');
    await sheet().shows("'Gas run'!Q3", [[0.025]]);
    await sheet().select("'Gas run'!Q1:Q3");
    await copy();
    const text = await sheet().page.evaluate(() => navigator.clipboard.readText());
    expect(text.trim().split(/\r?\n/)).toEqual(['0.05', '0.04', '0.025']);
  });
}
