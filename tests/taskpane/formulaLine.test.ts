/** @jest-environment jsdom */
import { catalogue } from '../../functions/catalogue';
import { formulaParts } from '../../taskpane/formulaParts';
import { openPane, type PaneBench } from './paneBench';

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
