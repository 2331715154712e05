import { runsTest } from '../../../src/numerics/runsTest';

/** Every way to put `ups` plus signs on `places` places. */
function* arrangements(places: number, ups: number): Generator<number[]> {
  if (places === 0) {
    yield [];
    return;
  }
  if (ups > 0) for (const rest of arrangements(places - 1, ups - 1)) yield [1, ...rest];
  if (ups < places) for (const rest of arrangements(places - 1, ups)) yield [-1, ...rest];
}

const runsIn = (signs: readonly number[]): number => signs.filter((sign, i) => sign !== signs[i - 1]).length;

/** Twice the smaller tail, counted. */
function counted(signs: readonly number[]): number {
  const ups = signs.filter((sign) => sign > 0).length;
  const all = [...arrangements(signs.length, ups)].map(runsIn);
  const few = all.filter((runs) => runs <= runsIn(signs)).length / all.length;
  const many = all.filter((runs) => runs >= runsIn(signs)).length / all.length;
  return Math.min(1, 2 * Math.min(few, many));
}

test.each([4, 5, 6, 7, 8, 9])('runsTest equals the count over all arrangements of %d signs', (places) => {
  for (let ups = 2; ups <= places - 2; ups++) {
    for (const signs of arrangements(places, ups)) expect(runsTest(signs)).toBeCloseTo(counted(signs), 12);
  }
});

test('runsTest: 4 runs among 10 and 10 signs, and far out in either tail', () => {
  // F. S. Swed and C. Eisenhart, Ann. Math. Stat. 14 (1943) 66: P(at most 4 runs | 10, 10) = 0.001
  const blocks = [
    ...Array(5).fill(1),
    ...Array(5).fill(-1),
    ...Array(5).fill(1),
    ...Array(5).fill(-1),
  ] as number[];
  expect(runsTest(blocks)! / 2).toBeCloseTo(0.001, 3);
  // two runs, or as many as there are signs: 2 of the C(2n, n) arrangements each
  for (const [n, ways] of [
    [20, 137846528820],
    [50, 1.0089134454556417e29],
  ]) {
    const alternating = Array.from({ length: 2 * n }, (_, i) => (-1) ** i);
    const halves = Array.from({ length: 2 * n }, (_, i) => (i < n ? 1 : -1));
    expect(runsTest(alternating)! / (4 / ways)).toBeCloseTo(1, 10);
    expect(runsTest(halves)! / (4 / ways)).toBeCloseTo(1, 10);
  }
});

test('runsTest passes over zeros, does not mind the size, and is silent with nothing to judge', () => {
  expect(runsTest([3, 0, 1e-9, -2, 0, -1])).toBe(runsTest([1, 1, -1, -1]));
  expect(runsTest([1, 1, 1, 1, -1])).toBeNull();
  expect(runsTest([1, 1, 1])).toBeNull();
  expect(runsTest([])).toBeNull();
  expect(runsTest(Float64Array.of(1, 1, -1, -1))).toBeCloseTo(2 / 3, 14);
});
