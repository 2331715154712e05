/** Whatever stands in the columns: an answer in words, each cause once. */
import { bySeverity } from '../../../../src/series/check/finding';
import { findings } from '../../../../src/series/check/findings';
import type { RawCell } from '../../../../src/series/check/rawRun';
import { uniform } from '../../../support/invented';

type Column = (row: number, next: () => number) => number;

const columns: Readonly<Record<string, readonly [times: Column, values: Column]>> = {
  'three levels': [(row) => row, (_, next) => Math.floor(3 * next())],
  'five times': [(_, next) => Math.floor(5 * next()), (_, next) => next()],
  'falling times, huge readings': [(row) => -row, (_, next) => (next() < 0.5 ? 0 : 1e300 * next())],
  'tiny everything': [(row) => row * 1e-300, (row) => row * 1e-310],
  'times far from 0': [(row) => 1e15 + row, (row) => (row % 2 ? 5 : -5)],
  'every tenth reading ten times too high': [
    (row) => row,
    (row, next) => Math.exp(-row / 5) * (next() < 0.1 ? 10 : 1),
  ],
};

const spoilt: readonly RawCell[] = [
  null,
  { text: 'n/a' },
  { text: '<0.1' },
  { error: '#N/A' },
  { text: '3,5', readAs: 3.5 },
];

test.each(Object.entries(columns))(
  '%s, with cells of every kind among them, in 300 columns',
  (_, [time, value]) => {
    for (let seed = 1; seed <= 300; seed++) {
      const next = uniform(seed);
      const count = 1 + Math.floor(25 * next());
      const cell = (column: Column, row: number): RawCell =>
        next() < 0.08 ? spoilt[Math.floor(spoilt.length * next())] : column(row, next);
      const rows = Array.from({ length: count }, (_, row) => row);
      const found = findings({
        times: rows.map((row) => cell(time, row)),
        values: rows.map((row) => cell(value, row)),
      });
      const kinds = found.map(({ kind }) => kind);
      expect(new Set(kinds).size).toBe(kinds.length);
      expect([...found].sort(bySeverity)).toEqual(found);
      for (const { places, ...words } of found) {
        expect(Object.values(words).join(' ')).not.toMatch(/NaN|Infinity|undefined|null/);
        expect(places.every((place) => Number.isInteger(place) && place >= 0 && place < count)).toBe(true);
      }
    }
  },
);

test('among ten thousand readings, the one outlier', () => {
  const next = uniform(5);
  const times = Array.from({ length: 10_000 }, (_, i) => i);
  const values = times.map((time) => Math.exp(-time / 3000) + 0.01 * next() + (time === 4321 ? 0.3 : 0));
  expect(findings({ times, values }).map(({ kind, places }) => [kind, places])).toEqual([
    ['outlier', [4321]],
  ]);
}, 60_000);
