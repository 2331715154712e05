/** @jest-environment jsdom */
import { catalogue, functionNamed } from '../../functions/catalogue';
import {
  fieldsOf,
  knownInputs,
  readingsParameter,
  signalFor,
  signals,
  unitProblem,
} from '../../taskpane/signals';
import { readHeading } from '../../taskpane/headers';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

/** At 0 °C and 100 kPa an ideal gas takes 22.710 954 64 L/mol (CODATA 2022). */
const millimole = 22.71095464; // mL
const gasRun = [['t / s', 'V / mL'], ...[0, 1, 2, 3].map((n) => [10 * n, n * millimole])];

async function open(rows: readonly (readonly (string | number)[])[] = gasRun): Promise<void> {
  pane = await openPane({ Run: rows }, 'A2');
  await pane.tick('#task-reading');
}

test('gas in glass comes with its caution at every step, mass and titres without', async () => {
  const caution = (): string | undefined =>
    pane.root.querySelector('#run .caution')?.textContent ?? undefined;
  await open(gasRun.map((row, r) => [...row, r === 0 ? 'm / g' : 100 - Number(row[0]) / 10]));
  await pane.tick('#task-rate');
  expect(caution()).toMatch(/Gas in closed glass/);
  await pane.choose('#reading-column', '2');
  expect(caution()).toBeUndefined();
  await pane.choose('#reading-column', '1');
  await pane.tick('#task-reading');
  await pane.choose('#reading-what', 'TITRE');
  await pane.tick('#task-rate');
  expect(caution()).toBeUndefined();
});

test('a gas run asks for what PACE.GASVOLUME needs, in its words', async () => {
  await open();
  expect(pane.find<HTMLSelectElement>('#reading-what').value).toBe('GASVOLUME');
  expect(pane.text('.result')).toBe('Still needed: temperature, pressure');
  expect(pane.text('label[for=reading-temperature]')).toBe('temperature / °C');
  expect(pane.text('#reading-pressure-help')).toBe(
    'of the room; one value, or one a reading; unit kPa; above 0',
  );
  expect(pane.find<HTMLInputElement>('#reading-wet').placeholder).toBe('0, a dry gas');
  expect(pane.text('#reading .caution')).toBe(functionNamed('GASVOLUME')!.caution);
  expect(pane.find<HTMLButtonElement>('#put-in button.main').disabled).toBe(true);
});

test('numbers, text with a unit and cells are all taken, and the column becomes the readings', async () => {
  await open(gasRun.map((row, r) => (r === 0 ? [...row, '', 100] : row)));
  await pane.type('#reading-temperature', '273.15 K');
  await pane.type('#reading-pressure', 'D1');
  expect(pane.text('#formula')).toBe('=PACE.GASVOLUME(Run!B2:B5,"273.15 K",Run!D1)');
  expect(pane.text('.result')).toBe('n(gas) from 0 to 0.003 mol');
  await pane.type('#reading-pressure', '');
  pane.book.select('D1');
  await pane.settled();
  pane.find('#reading-pressure').parentElement!.querySelector('button')!.click();
  await pane.settled();
  expect(pane.find<HTMLInputElement>('#reading-pressure').value).toBe('Run!D1');
  await pane.press('Put it in and go on');
  const target = pane.text('.notice').match(/Run!([A-Z]+)2/)![1];
  expect(pane.book.valueAt(`${target}1`)).toBe('n(gas) / mol');
  expect(pane.book.formulaAt(`${target}2`)).toMatch(/^=PACE\.GASVOLUME/);
  expect(pane.text('.notice')).toContain('now the readings of this run');
  expect(pane.find<HTMLSelectElement>('#reading-column').selectedOptions[0].textContent).toBe(
    `${target}: n(gas) / mol`,
  );

  await pane.tick('#task-rate');
  await pane.tick('#kind-average');
  await pane.type('#rate-from', '0');
  await pane.type('#rate-to', '30');
  expect(pane.text('.result .value')).toBe('1 × 10⁻⁴ mol/s'); // 0.003 mol in 30 s

  await pane.press('Undo: n(gas)');
  expect(pane.find<HTMLSelectElement>('#reading-column').selectedOptions[0].textContent).toBe('B: V / mL');
  expect(pane.book.valueAt(`${target}1`)).toBeNull();
});

test("a bound is told at its field, in the function's own words", async () => {
  await open();
  await pane.type('#reading-temperature', '-300');
  await pane.type('#reading-pressure', '100');
  expect(pane.text('#reading-temperature-problem')).toMatch(/^temperature must be above -273.15/);
});

test('a word that could be a cell is a word where words are expected', async () => {
  await open([
    ['t / min', 'm / g'],
    [0, 187.352],
    [1, 187.1],
    [2, 186.91191],
  ]);
  await pane.type('#reading-gas', 'CO2');
  expect(pane.text('#formula')).toBe('=PACE.MASSLOSS(Run!B2:B4,"CO2")');
  expect(pane.text('.result')).toBe('n(gas) from 0 to 0.01 mol'); // 0.44009 g at 44.009 g/mol
  await pane.type('#reading-gas', '=D4');
  expect(pane.text('#formula')).toBe('=PACE.MASSLOSS(Run!B2:B4,Run!D4)');
});

test('readings that are amounts already are left as they are', async () => {
  await open([
    ['t / s', 'c / (mol/L)'],
    [0, 1],
    [10, 0.5],
    [20, 0.25],
  ]);
  expect(pane.find<HTMLSelectElement>('#reading-what').value).toBe('');
  expect(pane.text('#put-in')).toContain('Nothing to put in here');
});

test.each([
  ['V / mL', 'GASVOLUME'],
  ['titre / mL', 'TITRE'],
  ['p / kPa', 'GASPRESSURE'],
  ['m / g', 'MASSLOSS'],
  ['pH', 'ACIDITY'],
  ['A', 'ABSORBANCE'],
  ['κ / (mS/cm)', 'CONDUCTIVITY'],
  ['c / (mol/L)', ''],
])('signalFor(%s) of readings that rise is %s', (heading, name) =>
  expect(signalFor(readHeading(heading), true)).toBe(name),
);

test('a volume that falls is a titre: a gas burette fills', () => {
  expect(signalFor(readHeading('V / mL'), false)).toBe('TITRE');
});

test('every signal has a function that takes readings, and every field a help', () => {
  for (const { functionName } of signals) {
    const f = functionNamed(functionName)!;
    expect(f.parameters[readingsParameter(f)].dimension).toBe('matrix');
    for (const { parameter } of fieldsOf(f)) expect(parameter.help).not.toBe('');
  }
  const conversions = catalogue.filter(({ family }) => family === 'reading').map(({ name }) => name);
  const offered = signals.map(({ functionName }) => functionName);
  // times, and a gas that stays dissolved, are no readings of a run
  expect(conversions.filter((name) => !offered.includes(name)).sort()).toEqual(['CLOCK', 'DISSOLVED']);
});

test('the unit of a heading is passed on, or questioned', () => {
  const [volume, mass] = [functionNamed('GASVOLUME')!, functionNamed('MASSLOSS')!];
  expect(knownInputs(volume, readHeading('V / L'))).toEqual({ unit: 'L' });
  expect(knownInputs(volume, readHeading('V / mL'))).toEqual({});
  expect(unitProblem(mass, readHeading('m / mg'))).toMatch(/takes g, and the heading says mg/);
  expect(unitProblem(mass, readHeading('m / g'))).toBe('');
});
