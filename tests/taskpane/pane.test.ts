/** @jest-environment jsdom */
import { mountPane } from '../../taskpane/pane';
import { memoryWorkbook, type MemoryWorkbook } from './memoryPort';

/** V = 3 t − 0.01 t²: its slope is 3 − 0.02 t, and a parabola is what a tangent of degree 2 fits exactly. */
const volume = (t: number): number => 3 * t - 0.01 * t * t;
const times = Array.from({ length: 11 }, (_, i) => 10 * i);
const gasRun = [['t / s', 'V / mL'], ...times.map((t) => [t, volume(t)])];

let book: MemoryWorkbook;
let unmount: () => void;
const root = document.createElement('main');
document.body.append(root);

function open(
  sheets: Parameters<typeof memoryWorkbook>[0] = { 'Gas run': gasRun },
  at = 'A2',
): Promise<void> {
  book = memoryWorkbook(sheets);
  book.select(at);
  unmount = mountPane(root, book.port);
  return settled();
}

afterEach(() => unmount());

const settled = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 5));
const find = <E extends HTMLElement>(selector: string): E => root.querySelector<E>(selector)!;
const text = (selector: string): string => find(selector).textContent ?? '';

async function type(selector: string, typed: string): Promise<void> {
  const input = find<HTMLInputElement>(selector);
  input.value = typed;
  input.dispatchEvent(new Event('input', { bubbles: true }));
  await settled();
}

async function choose(selector: string, value: string): Promise<void> {
  const select = find<HTMLSelectElement>(selector);
  select.value = value;
  select.dispatchEvent(new Event('change', { bubbles: true }));
  await settled();
}

async function press(label: string): Promise<void> {
  const button = [...root.querySelectorAll('button')].find((one) => one.textContent!.startsWith(label));
  if (!button)
    throw new Error(
      `no button "${label}" among: ${[...root.querySelectorAll('button')].map((b) => b.textContent).join(', ')}`,
    );
  button.click();
  await settled();
}

async function tick(selector: string): Promise<void> {
  find(selector).click();
  await settled();
}

test('an empty sheet: the pane says what to do next', async () => {
  await open({ Empty: [] });
  expect(text('#run .hint')).toMatch(/^Click a cell in your table/);
  expect(text('#rate')).toContain('Choose a run first');
  await press('Use the selected cells');
  expect(text('#run .problem')).toMatch(/^select the columns of a run/);
});

test('the whole way: choose, tangent, put in, undo', async () => {
  await open();
  expect(text('#run .where')).toBe("'Gas run'!A1:B12");
  await type('#rate-time', '30');
  expect(text('.result .value')).toMatch(/^2\.4(0*)? .*mL\/s$/);
  expect(text('#formula')).toBe("=PACE.TANGENT('Gas run'!A2:A12,'Gas run'!B2:B12,30)");
  expect(find<HTMLInputElement>('#target').value).toBe("'Gas run'!C2");
  expect(text('#put-in .hint')).toContain("'Gas run'!C1:C2");

  await press('Put it in');
  expect(book.formulaAt('C2')).toBe("=PACE.TANGENT('Gas run'!A2:A12,'Gas run'!B2:B12,30)");
  expect(book.valueAt('C1')).toBe('rate at 30 s / (mL/s)');
  expect(text('.notice')).toBe("written: rate at 30 s in 'Gas run'!C2");
  expect(find<HTMLInputElement>('#target').value).toBe("'Gas run'!D2");

  await press('Undo: rate at 30 s');
  expect([book.valueAt('C1'), book.formulaAt('C2')]).toEqual([null, undefined]);
  expect(text('.notice')).toMatch(/^taken back/);
  expect(root.textContent).not.toContain('Undo:');
});

test('filled cells are never overwritten unasked', async () => {
  await open({ 'Gas run': gasRun.map((row, r) => [...row, null, r === 1 ? 'mine' : null]) });
  await type('#target', 'D2');
  expect(text('#put-in .warning')).toBe('Not empty now: D2');
  await press('Put it in');
  expect(book.valueAt('D2')).toBe('mine');
  expect(text('.question')).toContain('Something stands in D2. Replace it?');
  await press('Keep it');
  expect(root.querySelector('.question')).toBeNull();
  expect(book.valueAt('D2')).toBe('mine');

  await press('Put it in');
  await press('Replace it');
  expect(book.formulaAt('D2')).toMatch(/^=PACE\.TANGENT/);
  await press('Undo');
  expect(book.valueAt('D2')).toBe('mine');
});

test('a place is proposed where nothing stands in the way', async () => {
  await open({ 'Gas run': gasRun.map((row, r) => [...row, null, null, r === 5 ? 'note' : null]) }, 'A2');
  await tick('#kind-column');
  expect(find<HTMLInputElement>('#target').value).toBe("'Gas run'!C2");
  await tick('#with-detail');
  // a blank column stays between it and the note
  expect(find<HTMLInputElement>('#target').value).toBe("'Gas run'!G2");
});

test('the active cell can be the target', async () => {
  await open();
  book.select('H7');
  await press('Use the active cell');
  expect(find<HTMLInputElement>('#target').value).toBe("'Gas run'!H7");
  expect(text('#run .where')).toBe("'Gas run'!A1:B12");
});

test('a target among its own readings is refused in words', async () => {
  await open();
  await type('#target', 'B4');
  expect(text('#target-problem')).toMatch(/would cover its own readings in 'Gas run'!B2:B12/);
  expect(find<HTMLButtonElement>('#put-in button.main').disabled).toBe(true);
  await type('#target', 'somewhere');
  expect(text('#target-problem')).toMatch(/^a cell is written like E3/);
});

test("the function's own words stand at the field they speak of", async () => {
  await open();
  await type('#rate-time', '400');
  const field = find<HTMLInputElement>('#rate-time');
  expect(field.getAttribute('aria-invalid')).toBe('true');
  expect(text(`#${field.getAttribute('aria-describedby')}`)).toMatch(/time must lie within the run.*400/);
  expect(find<HTMLButtonElement>('#put-in button.main').disabled).toBe(true);
  await type('#rate-time', 'soon');
  expect(text('#rate-time-problem')).toContain('"soon"');
});

test('the average: from, to, value and formula; a decimal comma is read', async () => {
  await open();
  await tick('#kind-average');
  await type('#rate-from', '0');
  await type('#rate-to', '50,0');
  expect(text('.result .value')).toMatch(/^2\.5/); // (150 − 25) / 50
  expect(text('#formula')).toBe("=PACE.BETWEEN('Gas run'!A2:A12,'Gas run'!B2:B12,0,50)");
});

test('the whole column: as many rates as readings, in a table too', async () => {
  await open();
  await tick('#kind-column');
  expect(root.querySelectorAll('.result tbody tr')).toHaveLength(11);
  expect(text('.result .what')).toBe('largest rate, at 0 s');
  expect(text('.result .value')).toMatch(/^3/);
  await press('Put it in');
  expect(book.formulaAt('C2')).toBe("=PACE.ALONG('Gas run'!A2:A12,'Gas run'!B2:B12)");
});

test('rows and columns can be corrected', async () => {
  await open({ 'Gas run': gasRun.map((row, r) => [...row, r === 0 ? 'm / g' : 100 - Number(row[0]) / 10]) });
  await choose('#reading-column', '2');
  await choose('#first-row', '3');
  expect(text('#formula')).toContain("'Gas run'!A4:A12,'Gas run'!C4:C12");
  expect(text('.result .unit')).toBe('g/s');
});

test('an edited reading changes the rate when the pane looks again', async () => {
  await open();
  await tick('#kind-average');
  const before = text('.result .value');
  book.set('B12', 500);
  book.select('B12');
  await settled();
  expect(text('.result .value')).not.toBe(before);
});

test('another block is offered, not taken', async () => {
  await open({ 'Gas run': gasRun.map((row) => [...row, null, ...row]) });
  expect(text('#run .where')).toBe("'Gas run'!A1:B12");
  book.select('D3');
  await settled();
  expect(text('#run .where')).toBe("'Gas run'!A1:B12");
  await press("Use 'Gas run'!D1:E12 instead");
  expect(text('#run .where')).toBe("'Gas run'!D1:E12");
});

test('selected numbers find the headings above them', async () => {
  await open({ Empty: [], 'Gas run': gasRun }, 'A1');
  book.select("'Gas run'!A4:B9");
  await settled();
  await press('Use the selected cells');
  expect(text('#formula')).toContain("'Gas run'!A4:A9");
});

test('what fails in the workbook is said', async () => {
  await open();
  await type('#target', 'Elsewhere!C2');
  await press('Put it in');
  expect(text('.notice.bad')).toContain('Elsewhere');
});

test('typing keeps the field and its caret', async () => {
  await open();
  const field = find<HTMLInputElement>('#rate-time');
  field.focus();
  await type('#rate-time', '45');
  expect(document.activeElement).toBe(field);
  expect(find('#rate-time')).toBe(field);
});

test('every control has a name, every id stands once', async () => {
  await open();
  for (const control of root.querySelectorAll<HTMLInputElement>('input, select')) {
    expect(control.labels?.length ?? 0).toBeGreaterThan(0);
  }
  const ids = [...root.querySelectorAll('[id]')].map(({ id }) => id);
  expect(new Set(ids).size).toBe(ids.length);
  for (const plot of root.querySelectorAll('svg')) {
    expect(plot.getAttribute('role')).toBe('img');
    expect(plot.getAttribute('aria-label')).toMatch(/V \/ mL against t \/ s: 11 points, times 0 to 100 s/);
  }
});

test('a hundred moves of the selection are not a hundred looks at the sheet', async () => {
  await open();
  const look = jest.spyOn(book.port, 'selection');
  for (let row = 1; row <= 100; row++) book.select(`A${row}`);
  await settled();
  expect(look.mock.calls.length).toBeLessThanOrEqual(2);
});

test('an unmounted pane leaves nothing and listens no more', async () => {
  await open();
  unmount();
  expect(root.children).toHaveLength(0);
  book.select('A5');
  await settled();
  expect(root.children).toHaveLength(0);
});

const faults: Readonly<Record<number, unknown>> = { 2: '16,0', 4: 'spilt', 6: 0, 7: '<0.1', 8: 900 };
const faultyRun = times.map((t, i) => [t, faults[i] ?? 100 * 0.9 ** i] as [number, number]);

test('what could spoil a result stands at the run: three at once, the rest on demand', async () => {
  await open({ Faulty: [['t / s', 'c / (mmol/L)'], ...faultyRun] });
  const count = Number(/^(\d+) things to look at$/.exec(text('.findings .count'))![1]);
  expect(count).toBeGreaterThan(3);
  expect(root.querySelectorAll('.findings > ul > li')).toHaveLength(3);
  expect(text('.findings > details > summary')).toBe(`and ${count - 3} more`);
  expect(root.querySelectorAll('.findings li')).toHaveLength(count);
  expect(text('.findings')).toContain('(row 10)'); // where 900 stands
});

test('a clean run is called so, quietly', async () => {
  await open({ Clean: [['t / s', 'c / (mmol/L)'], ...times.map((t, i) => [t, 100 * 0.6 ** i])] });
  expect(text('.findings .count')).toBe('nothing found in 11 pairs');
  expect(root.querySelector('.findings li')).toBeNull();
});

test('an edited heading gives its unit at once', async () => {
  await open();
  book.set('B1', 'V / L');
  book.select('B1');
  await settled();
  expect(text('.result .unit')).toBe('L/s');
});

test('a run that is gone is forgotten, and what stands there now is looked at', async () => {
  await open();
  for (let row = 1; row <= 12; row++) ['A', 'B'].forEach((column) => book.set(`${column}${row}`, null));
  book.select('F20');
  await settled();
  expect(text('#run .hint')).toMatch(/^Click a cell in your table/);
});

test('a time can be pointed at: the formula names the cell, the drawing and the value follow it', async () => {
  await open({ 'Gas run': gasRun.map((row, r) => [...row, null, r === 0 ? 30 : null]) });
  book.select('D1');
  await settled();
  find('#rate-time').parentElement!.querySelector('button')!.click();
  await settled();
  expect(text('#formula')).toBe("=PACE.TANGENT('Gas run'!A2:A12,'Gas run'!B2:B12,'Gas run'!D1)");
  expect(text('.result .value')).toMatch(/^2\.4/);
  expect(find('.plot .rate-line').getAttribute('d')).toMatch(/L/);
  book.set('D1', 80);
  book.select('D1');
  await settled();
  expect(text('.result .value')).toMatch(/^1\.4/);
});
