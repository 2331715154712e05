/** @jest-environment jsdom */
/** The pane on runs in rows, and on runs under each other. */
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

const times = [0, 10, 20, 30, 40, 50, 60];
/** Halved in its own time: k = ln 2 / half life. */
const fading = (halfLife: number): number[] => times.map((t) => 0.8 * 0.5 ** (t / halfLife));

describe('runs in rows', () => {
  const plate = [
    ['t / min', ...times],
    ['A1', ...fading(10)],
    ['A2', ...fading(20)],
  ];
  const gas = [
    ['t / s', ...times],
    ['V / mL', ...times.map((t) => 3 * t - 0.01 * t * t)],
  ];

  test('formulas take rows, and one value goes below, its heading above it', async () => {
    pane = await openPane({ Run: gas }, 'B2');
    await pane.type('#rate-time', '30');
    expect(pane.text('#formula')).toBe('=PACE.TANGENT(Run!B1:H1,Run!B2:H2,30)');
    expect(pane.text('#put-in .where')).toBe('Run!A4:A5');
    await pane.press('Put it in');
    expect(pane.book.valueAt('A4')).toBe('rate at 30 s / (mL/s)');
    expect(pane.book.valueAt('A5')).toBeCloseTo(3 - 0.02 * 30, 10); // the slope of the parabola
  });

  test('a whole row of rates spills below its readings, its heading at the left', async () => {
    pane = await openPane({ Run: gas }, 'B2');
    await pane.tick('#kind-column');
    expect(pane.text('#put-in .where')).toBe('Run!A3:H3');
    await pane.press('Put it in');
    expect(pane.book.valueAt('A3')).toBe('rate / (mL/s)');
    times.forEach((t, i) => expect(pane.book.valueAt(`${'BCDEFGH'[i]}3`)).toBeCloseTo(3 - 0.02 * t, 10));
    await pane.press('Undo: rate');
    await pane.tick('#with-detail');
    await pane.press('Put it in');
    expect(['A3', 'A4', 'A7'].map(pane.book.valueAt)).toEqual([
      'rate / (mL/s)',
      'standard uncertainty / (mL/s)',
      'degrees of freedom',
    ]);
    expect(pane.book.valueAt('C3')).toBeCloseTo(2.8, 10);
  });

  test('a converted row becomes the readings, and is taken back', async () => {
    pane = await openPane({ Run: gas }, 'B2');
    await pane.tick('#task-reading');
    await pane.type('#reading-temperature', '273.15 K');
    await pane.type('#reading-pressure', '1 bar');
    await pane.press('Put it in and go on');
    expect(pane.book.formulaAt('B3')).toMatch(/^=PACE\.GASVOLUME\(Run!B2:H2,/);
    const reading = (): string =>
      pane.find<HTMLSelectElement>('#reading-column').selectedOptions[0].textContent!;
    expect(reading()).toBe('3: n(gas) / mol');
    await pane.press('Undo: n(gas)');
    expect(reading()).toBe('2: V / mL');
    expect(pane.book.valueAt('C3')).toBeNull();
  });

  test('all runs are the rows, surveyed by one formula', async () => {
    pane = await openPane({ Plate: plate }, 'B2');
    await pane.tick('#task-many');
    expect(pane.text('#formula')).toBe('=PACE.SURVEY(Plate!B1:H1,Plate!B2:H3,1)');
    await pane.press('Put it in');
    expect([pane.book.valueAt('E7'), pane.book.valueAt('E8')]).toEqual([
      expect.closeTo(10, 9),
      expect.closeTo(20, 9),
    ]);
  });

  test('what is odd is told by the letters of its columns', async () => {
    pane = await openPane({ Run: [gas[0], gas[1].map((cell, i) => (i === 3 ? 'spilt' : cell))] }, 'B2');
    expect(pane.text('.findings')).toContain('(column D)');
    expect(pane.text('#run')).toContain('1 column without a pair of numbers is skipped');
  });

  test('the other way can be chosen, and what cannot be read so is said', async () => {
    pane = await openPane({ Run: gas }, 'B2');
    expect(pane.find<HTMLSelectElement>('#runs-stand-in').value).toBe('rows');
    await pane.choose('#runs-stand-in', 'columns');
    expect(pane.text('#formula')).toContain('Run!B1:B2,Run!C1:C2');
    await pane.choose('#runs-stand-in', 'rows');
    expect(pane.text('#formula')).toContain('Run!B1:H1,Run!B2:H2');
  });

  test('selected numbers find the headings left of them', async () => {
    pane = await openPane({ Empty: [], Run: gas }, 'A1');
    pane.book.select('Run!B1:F2');
    await pane.settled();
    expect(pane.text('#run .where')).toBe('Run!A1:F2');
  });
});

describe('runs under each other', () => {
  const long = [
    ['well', 't / min', 'A'],
    ...times.map((t, i) => ['A1', t, fading(10)[i]]),
    ...times.map((t, i) => ['A2', t, fading(20)[i]]),
  ];

  test('each has its name and its own rows', async () => {
    pane = await openPane({ Long: long }, 'A2');
    await pane.tick('#task-order');
    expect(pane.text('#formula')).toBe('=PACE.COEFFICIENT(Long!B2:B8,Long!C2:C8,1)');
    await pane.choose('#run-name', '8');
    expect(pane.text('#formula')).toBe('=PACE.COEFFICIENT(Long!B9:B15,Long!C9:C15,1)');
    expect(pane.text('#put-in .where')).toBe('Long!D8:D9');
    await pane.choose('#last-row', '12');
    expect(pane.text('#formula')).toContain('Long!B9:B13');
    expect(pane.find('#first-row').children).toHaveLength(7);
  });

  test('all of them at once: a formula each, beside the first', async () => {
    pane = await openPane({ Long: long }, 'A2');
    await pane.tick('#task-many');
    expect(pane.text('#many [role=status]')).toBe('2 of 2 runs picked');
    await pane.press('Put it in');
    expect(['D1', 'D2', 'D3'].map(pane.book.valueAt)).toEqual(['run', 'A1', 'A2']);
    expect(pane.book.formulaAt('E3')).toBe('=PACE.COEFFICIENT(Long!B9:B15,Long!C9:C15,1)');
    expect(pane.book.valueAt('E3')).toBeCloseTo(Math.LN2 / 20, 9);
    await pane.press('Undo');
    await pane.tick('#task-rate');
    await pane.tick('#kind-column');
    await pane.tick('#task-many');
    await pane.choose('#many-answer', 'rate');
    expect(pane.text('#put-in .where')).toBe('Long!D1:D15');
    await pane.press('Put it in');
    expect(pane.book.formulaAt('D9')).toBe('=PACE.ALONG(Long!B9:B15,Long!C9:C15)');
    expect(pane.book.valueAt('D1')).toBe('rate / (1/min)');
  });

  test('rows that are mixed are said to be, with what to do', async () => {
    const sorted = long.slice(1).sort((a, b) => Number(a[1]) - Number(b[1]));
    pane = await openPane({ Long: [long[0], ...sorted] }, 'A2');
    expect(pane.text('#run .problem')).toMatch(/run “A1” and of 1 more do not .*: sort the table by run$/);
    await pane.choose('#names-column', '');
    expect(pane.root.querySelector('#run > .problem')).toBeNull();
  });
});

test('a unit that no heading names is asked for, and stands in what is written', async () => {
  pane = await openPane({ Run: [['t', 'gas'], ...times.map((t) => [t, 2 * t])] }, 'A2');
  expect(pane.text('.result .unit')).toBe('reading unit per time unit');
  await pane.type('#time-unit', 's');
  await pane.type('#reading-unit', 'mL');
  expect(pane.text('.result .unit')).toBe('mL/s');
  expect(pane.find<HTMLInputElement>('#time-unit').value).toBe('s');
  await pane.press('Put it in');
  expect(pane.book.valueAt('C1')).toBe('rate at 30 s / (mL/s)');
});

test('readings used for one table are not carried to another', async () => {
  const run = [['t / s', 'V / mL'], ...times.map((t) => [t, 2 * t])];
  pane = await openPane({ Run: run.map((row) => [...row, null, ...row]) }, 'A2');
  await pane.type('#rate-points', '7');
  pane.book.select('D3');
  await pane.settled();
  await pane.press('Use Run!D1:E8');
  expect(pane.find<HTMLInputElement>('#rate-points').value).toBe('');
});
