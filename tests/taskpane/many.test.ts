/** @jest-environment jsdom */
import { longWork } from '../../taskpane/actions/longWork';
import { createStore } from '../../taskpane/store';
import { openPane, type PaneBench } from './paneBench';

let pane: PaneBench;
afterEach(() => pane?.close());

const times = [0, 10, 20, 30, 40, 50, 60];
/** Each halved in its own time: k = ln 2 / half life. */
const plate = (halfLives: readonly number[]): (string | number)[][] => [
  ['t / min', ...halfLives.map((_, i) => `A${i + 1}`)],
  ...times.map((t) => [t, ...halfLives.map((halfLife) => 0.8 * 0.5 ** (t / halfLife))]),
];

async function open(rows: readonly (readonly (string | number)[])[] = plate([10, 20, 15])): Promise<void> {
  pane = await openPane({ Plate: rows }, 'A2');
  await pane.tick('#task-many');
}

const surveyRows = (): string[] =>
  [...pane.root.querySelectorAll('.survey tbody tr:not(.flags)')].map((row) => row.textContent!);

test('every run is a small plot, and all are picked', async () => {
  await open();
  expect(pane.root.querySelectorAll('.stamps li svg')).toHaveLength(3);
  expect(pane.text('#many [role=status]')).toBe('3 of 3 runs picked');
  expect(pane.text('#formula')).toBe('=PACE.SURVEY(Plate!A2:A8,Plate!B2:D8,1)');
});

test('a survey is seen in the pane before it is written', async () => {
  await open();
  await pane.press('Survey these 3 runs here');
  for (let wait = 0; wait < 200 && surveyRows().length === 0; wait++) await pane.settled();
  expect(surveyRows()).toEqual(['A110.0693110', 'A210.0346620', 'A310.0462115']);
  expect(pane.text('#many [role=status]')).toBe('3 of 3 runs picked; survey below, no runs with a remark');
  expect(pane.text('.survey thead')).toContain('half life / min');
  await pane.tick('#run-2');
  expect(pane.root.querySelector('.survey')).toBeNull();
});

test('one PACE.SURVEY for runs side by side, its place known before it is written', async () => {
  await open();
  expect(pane.text('#put-in .where')).toBe('Plate!E2:L5');
  await pane.press('Put it in');
  expect(pane.book.valueAt('F4')).toBe(1); // order of the second run
  expect(pane.book.valueAt('I4')).toBeCloseTo(20, 9); // its half life
  await pane.press('Undo: survey of 3 runs');
  expect(pane.book.formulaAt('E2')).toBeUndefined();
});

test('runs that stand apart are not surveyed by one formula, and the pane says why', async () => {
  await open();
  await pane.tick('#run-2');
  expect(pane.text('#many .problem')).toMatch(/side by side/);
  await pane.choose('#many-answer', 'order');
  expect(pane.text('#put-in .where')).toBe('Plate!E1:F3');
});

test('a formula a run, with its name and its limits', async () => {
  await open();
  await pane.choose('#many-answer', 'order');
  await pane.tick('#with-detail');
  await pane.press('Put it in');
  expect(pane.book.valueAt('E1')).toBe('run');
  expect(pane.book.valueAt('F1')).toBe('rate coefficient, order 1 / min⁻¹');
  expect(['E2', 'E3', 'E4'].map(pane.book.valueAt)).toEqual(['A1', 'A2', 'A3']);
  expect(pane.book.formulaAt('F4')).toBe('=PACE.COEFFICIENT(Plate!A2:A8,Plate!D2:D8,1,,,TRUE)');
  expect(pane.book.valueAt('F4')).toBeCloseTo(Math.LN2 / 15, 9);
});

test('columns of rates stand beside each other, each under the name of its run', async () => {
  await open();
  await pane.tick('#task-rate');
  await pane.tick('#kind-column');
  await pane.tick('#task-many');
  await pane.choose('#many-answer', 'rate');
  await pane.press('Put it in');
  expect(pane.book.valueAt('G1')).toMatch(/^A3: rate/);
  expect(pane.book.formulaAt('G2')).toBe('=PACE.ALONG(Plate!A2:A8,Plate!D2:D8)');
});

test('96 formulas go in bit by bit, all of them or none where something stands in the way', async () => {
  await open(plate(Array.from({ length: 96 }, (_, i) => 5 + (i % 12))));
  await pane.choose('#many-answer', 'order');
  pane.book.set('CU50', 'mine'); // column 99, row 50: amid the place proposed
  await pane.type('#target', 'CT2');
  await pane.press('Put it in');
  expect(pane.text('.question')).toContain('CU50');
  expect(pane.book.valueAt('CT2')).toBeNull();
  await pane.press('Keep it');
  pane.book.set('CU50', null);
  await pane.press('Put it in');
  for (let wait = 0; wait < 200 && !pane.text('.notice').startsWith('written'); wait++) await pane.settled();
  expect(pane.book.valueAt('CU97')).toBeCloseTo(Math.LN2 / 16, 9);
  await pane.press('Undo');
  expect(pane.book.valueAt('CU97')).toBeNull();
  expect(pane.book.valueAt('CT1')).toBeNull();
}, 30_000);

test('longWork shows how far it is, and ends when it is stopped', async () => {
  const store = createStore();
  const work = longWork({ store });
  const seen: number[] = [];
  store.watch(({ progress }) => progress && seen.push(progress.done));
  const done: number[] = [];
  const slow = async (thing: number): Promise<void> => {
    const end = performance.now() + 30;
    while (performance.now() < end);
    done.push(thing);
    if (thing === 4) work.stop();
  };
  expect(await work.through('counting', [0, 1, 2, 3, 4, 5, 6], slow)).toBe(false);
  expect(done).toEqual([0, 1, 2, 3, 4]);
  expect(seen.length).toBeGreaterThan(1);
  expect(store.state.progress).toBeNull();
  expect(await work.through('counting', [0, 1], slow)).toBe(true);
});
