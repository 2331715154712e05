/** @jest-environment jsdom */
import { overlayFor } from '../../taskpane/plots/overlay';
import { runPlot } from '../../taskpane/plots/runPlot';
import { linearScale, roundRange, ticks } from '../../functions/drawing/scale';
import { readHeading } from '../../taskpane/headers';
import { firstState } from '../../taskpane/store';

const parabola = Array.from({ length: 11 }, (_, i) => ({
  time: 10 * i,
  value: 3 * (10 * i) - 0.01 * (10 * i) ** 2,
}));
const slope = ([a, b]: readonly { x: number; y: number }[]): number => (b.y - a.y) / (b.x - a.x);

test('ticks are round and within the range', () => {
  expect(ticks(0, 1, 5)).toEqual([0, 0.2, 0.4, 0.6, 0.8, 1]);
  expect(ticks(-3, 12, 4)).toEqual([0, 5, 10]);
  expect(ticks(0, 0.0003, 3)).toEqual([0, 0.0001, 0.0002, 0.0003]);
});

test('roundRange holds every value, and has room when all are the same', () => {
  expect(roundRange([0.3, 47.2], 4)).toEqual([0, 60]);
  const [low, high] = roundRange([5, 5], 4);
  expect(low < 5 && high > 5).toBe(true);
  expect(roundRange([], 4)).toEqual([0, 1]);
});

test('a scale puts its ends where they belong', () => {
  const { place } = linearScale([0, 10], [100, 0]);
  expect([0, 5, 10].map(place)).toEqual([100, 50, 0]);
});

test('the tangent drawn has the slope of the parabola, and touches it', () => {
  const { line, marks, window } = overlayFor(parabola, {
    ...firstState.rate,
    kind: 'tangent',
    time: '30',
    points: '5',
  });
  expect(slope(line)).toBeCloseTo(3 - 0.02 * 30, 10);
  expect(marks).toEqual([{ x: 30, y: expect.closeTo(81, 10) }]);
  expect(window.map(({ x }) => x)).toEqual([10, 20, 30, 40, 50]);
});

test('the chord joins the run at both times, between readings too', () => {
  const { line } = overlayFor(parabola, { ...firstState.rate, kind: 'average', from: '0', to: '55' });
  expect(line).toEqual([
    { x: 0, y: 0 },
    { x: 55, y: expect.closeTo((125 + 144) / 2, 10) },
  ]);
});

test.each([
  { kind: 'tangent', time: '' },
  { kind: 'tangent', time: '101' },
  { kind: 'tangent', time: '30', points: '2' },
  { kind: 'tangent', time: '30', degree: 'two' },
  { kind: 'average', from: '0', to: '0' },
  { kind: 'average', from: '-1', to: '20' },
  { kind: 'column' },
] as const)('nothing is drawn that the run does not carry: %j', (choice) => {
  expect(overlayFor(parabola, { ...firstState.rate, ...choice }).line).toEqual([]);
});

test('a plot says what it shows, and cuts its line at the axes', () => {
  const plot = runPlot({
    points: parabola,
    time: readHeading('t / s'),
    reading: readHeading('V / mL'),
    overlay: {
      line: [
        { x: -50, y: -100 },
        { x: 150, y: 500 },
      ],
      marks: [],
      curve: [],
      window: [],
    },
    says: 'rate at 30 s: 2.4 mL/s',
  });
  expect(plot.getAttribute('aria-label')).toBe(
    'V / mL against t / s: 11 points, times 0 to 100 s, values 0 to 200 mL; rate at 30 s: 2.4 mL/s',
  );
  const drawn = plot
    .querySelector('.rate-line')!
    .getAttribute('d')!
    .match(/-?[\d.]+/g)!
    .map(Number);
  for (const [x, y] of [drawn.slice(0, 2), drawn.slice(2)]) {
    expect(x >= 46 && x <= 290 && y >= 20 && y <= 152).toBe(true);
  }
});
