/** @jest-environment jsdom */
import { catalogue } from '../../functions/catalogue';
import { cellsRead, formulaParts } from '../../taskpane/formulaParts';
import { parseArea } from '../../functions/address';
import type { SheetArea } from '../../taskpane/port';
import { memoryWorkbook } from './memoryPort';
import { openPane, openPaneOver, type PaneBench, type PaneHands } from './paneBench';

let pane: PaneBench | undefined;
afterEach(() => pane?.close());

test.each(catalogue.map(({ name, example }) => [name, example.formula]))(
  'formulaParts of the example of %s are the formula to the letter, each argument explained',
  (name, formula) => {
    const parts = formulaParts(formula);
    expect(parts.map(({ text }) => text).join('')).toBe(formula);
    const [own, ...explained] = parts.filter(({ says }) => says);
    expect(own.text).toBe(`PACE.${name}`);
    const f = catalogue.find((one) => one.name === name)!;
    const [firstName, first] = Object.entries(f.parameters)[0];
    expect(explained[0].says).toContain(`${firstName}: ${first.help}`);
    // what says nothing of itself is punctuation
    for (const { text, says } of parts) if (!says) expect(text).toMatch(/^[=(),]$/);
  },
);

test('a call within a call says what it is to the outer one, and commas in words cut nothing', () => {
  const parts = formulaParts(
    `=PACE.COEFFICIENT('a,b'!A1:A3,B1:B3,PACE.ORDER('a,b'!A1:A3,B1:B3),"free",,TRUE)`,
  );
  expect(parts.filter(({ says }) => says).map(({ text }) => text)).toEqual([
    'PACE.COEFFICIENT',
    "'a,b'!A1:A3",
    'B1:B3',
    'PACE.ORDER',
    "'a,b'!A1:A3",
    'B1:B3',
    '"free"',
    'TRUE',
  ]);
  expect(parts.find(({ text }) => text === 'PACE.ORDER')!.says).toMatch(
    /^order: n .* Here worked out by PACE\.ORDER\(/,
  );
  expect(parts.find(({ text }) => text === 'TRUE')!.says).toMatch(/^detail: /);
});

test('the parts are reached by arrows, say what they are, and keep saying it through a redraw', async () => {
  pane = await openPane({ Run: [['t / s', 'V / mL'], ...[0, 10, 20, 30, 40].map((t) => [t, 2 * t])] }, 'A2');
  const parts = [...pane.root.querySelectorAll<HTMLElement>('#formula .part')];
  expect(parts.map(({ textContent }) => textContent)).toEqual([
    'PACE.TANGENT',
    'Run!A2:A6',
    'Run!B2:B6',
    '20',
  ]);
  expect(parts.map(({ tabIndex }) => tabIndex)).toEqual([0, -1, -1, -1]);
  const press = (key: string): boolean =>
    document.activeElement!.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true }));
  const says = (): string => pane!.text('.formula .says');
  parts[0].focus();
  expect(says()).toContain('PACE.TANGENT(times, values, time, [points]');
  press('ArrowRight');
  expect(document.activeElement).toBe(parts[1]);
  expect(says()).toBe('times: times of the run; unit time');
  press('End');
  expect(says()).toMatch(/^time: /);
  await pane.tick('#with-detail');
  expect(says()).toMatch(/^time: /);
  expect(document.activeElement).toBe(parts[3]);
  expect(document.activeElement!.getAttribute('aria-describedby')).toBe(pane.find('.formula .says').id);
  parts[1].dispatchEvent(new Event('mouseenter'));
  expect(says()).toMatch(/^times: /);
  await pane.tick('#kind-average');
  expect(says()).toBe('Point at a part to see what it is.');
});

test('cellsRead: each area once, in the order of the formula, on the sheet that is meant', () => {
  const parts = formulaParts('=PACE.COEFFICIENT(A1:A3,Dye!B1:B3,PACE.ORDER($A$1:$A$3,Dye!B1:B3),C9,,TRUE)');
  const column = { rows: 3, columns: 1 };
  expect(cellsRead(parts, 'Run')).toEqual([
    { name: 'times', area: { sheet: 'Run', row: 0, column: 0, ...column } },
    { name: 'values', area: { sheet: 'Dye', row: 0, column: 1, ...column } },
    { name: 'endpoint', area: { sheet: 'Run', row: 8, column: 2, rows: 1, columns: 1 } },
  ]);
});

test.each([
  '=PACE.TANGENT(A1:A9,',
  '=pace.tangent(A1:A9,B1:B9',
  '=PACE.TANGENT(PACE.CLOCK(A1:A9)',
  '=PACE.EVENT(1,2,3,4,5)',
])('formulaParts of %s, as it is typed, are what is typed', (typed) => {
  const parts = formulaParts(typed);
  expect(parts.map(({ text }) => text).join('')).toBe(typed);
  expect(parts[1].says).toMatch(/^PACE\.(TANGENT|EVENT)\(/);
});

describe('a formula of ours in the active cell', () => {
  const marked: (readonly SheetArea[])[] = [];
  let hands: PaneHands;
  const { port, select } = memoryWorkbook({
    Run: [['t / s', 'V / mL'], ...[0, 10, 20, 30, 40].map((t) => [t, 2 * t])],
  });
  const put = (reference: string, formula: string): Promise<unknown> =>
    port.write([{ area: { sheet: 'Run', ...parseArea(reference)! }, content: { formula } }], {
      overwrite: true,
      description: '',
    });
  const at = async (reference: string): Promise<void> => {
    select(reference);
    await hands.settled();
  };
  const words = (): string => hands.text('.chosen');

  beforeAll(async () => {
    await put('D2', '=PACE.TANGENT(A2:A6,B2:B6,20)');
    await put('D3', '=SUM(B2:B6)');
    hands = await openPaneOver({ ...port, mark: (areas) => marked.push(areas) });
  });
  afterAll(() => hands.close());

  test('is explained, and what it reads is numbered here and in the sheet', async () => {
    await at('D2');
    expect(words()).toContain('In cell D2');
    expect(hands.text('#formula-in-cell')).toBe('=PACE.TANGENT(A2:A6,B2:B6,20)');
    const numbers = [...hands.root.querySelectorAll<HTMLElement>('#formula-in-cell .part')].map(
      ({ dataset }) => dataset.number,
    );
    expect(numbers).toEqual([undefined, '1', '2', undefined]);
    expect(marked.at(-1)).toEqual([
      { sheet: 'Run', ...parseArea('A2:A6') },
      { sheet: 'Run', ...parseArea('B2:B6') },
    ]);
  });

  test('stays chosen while its cells are shown', async () => {
    await hands.press('2 values');
    expect((await port.selection())?.area).toEqual({ sheet: 'Run', ...parseArea('B2:B6') });
    expect(words()).toContain('In cell D2');
    expect(marked.at(-1)).toHaveLength(2);
  });

  test.each(['D3', 'A2'])('is gone where another stands, or none: %s', async (other) => {
    await at('D2');
    await at(other);
    expect(words()).toBe('');
    expect(marked.at(-1)).toEqual([]);
  });
});
