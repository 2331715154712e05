/** @jest-environment jsdom */
import { catalogue, functionNamed } from '../../functions/catalogue';
import { signature } from '../../functions/define';
import { exampleSize } from '../../taskpane/examples';
import { families, lookUp } from '../../taskpane/lookup';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

const open = async (): Promise<void> => {
  pane = await openPane({ Empty: [], Notes: [['mine']] }, 'B3');
  await pane.tick('#task-lookUp');
};

test('without a run every function is there, by family', async () => {
  await open();
  expect(pane.root.querySelectorAll('.functions li')).toHaveLength(catalogue.length);
  expect(families.map(([family]) => family)).toEqual([...new Set(catalogue.map(({ family }) => family))]);
});

test('a name or words find it, and its help comes from its definition', async () => {
  await open();
  await pane.type('#look-up-words', 'activation energy');
  expect(pane.text('#look-up .functions li')).toContain('PACE.ARRHENIUS');
  await pane.press('PACE.ARRHENIUS');
  const f = functionNamed('ARRHENIUS')!;
  expect(pane.text('.signature')).toBe(
    'PACE.ARRHENIUS(temperatures, coefficients, [uncertainties], [detail])',
  );
  for (const { help } of Object.values(f.parameters)) expect(pane.text('#look-up dl')).toContain(help);
  expect(pane.text('#look-up')).toContain(f.reference);
  await pane.press('All functions');
  expect(pane.find<HTMLInputElement>('#look-up-words').value).toBe('activation energy');
});

test('its equations are typeset, each with its line for who listens', async () => {
  await open();
  await pane.press('PACE.GASVOLUME');
  const equations = [...pane.root.querySelectorAll('#look-up .typeset math[display="block"]')];
  const { lines, where } = functionNamed('GASVOLUME')!.equations!;
  expect(equations.map((one) => one.getAttribute('alttext'))).toEqual(lines);
  expect(equations[0].querySelector('mfrac')).not.toBeNull();
  expect(pane.root.querySelectorAll('#look-up .typeset dt math')).toHaveLength(Object.keys(where).length);
  await pane.press('All functions');
});

test('what nobody speaks of is said', async () => {
  await open();
  await pane.type('#look-up-words', 'zeppelin');
  expect(pane.text('#look-up [role=status]')).toMatch(/^no function/);
});

test('the example goes to the active cell, and never over what stands there', async () => {
  await open();
  await pane.press('PACE.ORDERS');
  expect(pane.text('#put-in .where')).toBe('Empty!B3:J10');
  pane.book.select('Notes!A1');
  await pane.settled();
  expect(pane.find<HTMLInputElement>('#target').value).toBe('Notes!A1');
  await pane.press('Put it in');
  expect(pane.text('.question')).toContain('A1');
  await pane.press('Keep it');
  pane.book.select('Notes!C3');
  await pane.settled();
  await pane.press('Put it in');
  expect(pane.book.formulaAt('Notes!C3')).toBe(functionNamed('ORDERS')!.example.formula);
  expect(pane.book.valueAt('Notes!C3')).toBe('order');
});

test('lookUp puts the name before the summary before the rest', () => {
  expect(lookUp('halflife')[0].name).toBe('HALFLIFE');
  expect(lookUp('=PACE.TANG')[0].name).toBe('TANGENT');
  expect(lookUp('half life').map(({ name }) => name)).toContain('HALVINGS');
});

test.each(catalogue.map((f) => [f.name, f] as const))(
  'the example of %s: its room holds its answer',
  (_, f) => {
    const { equals } = f.example;
    const known = Array.isArray(equals) ? equals : [[equals]];
    const { rows, columns } = exampleSize(f);
    expect(rows).toBeGreaterThanOrEqual(known.length);
    expect(columns).toBeGreaterThanOrEqual(Math.max(...known.map((row: readonly unknown[]) => row.length)));
  },
);

test('signature puts what need not be given in brackets', () =>
  expect(signature(functionNamed('TIMETO')!)).toBe('PACE.TIMETO(fraction, coefficient, order, [initial])'));
