/** LU factors against products made by hand, and what they refuse. */
import { factorLu, solveLu } from '../../../src/numerics/lu';
import { uniform } from '../../support/random';

function solved(rows: number[][], right: number[]): Float64Array | undefined {
  const size = rows.length;
  const matrix = Float64Array.from(rows.flat());
  const pivots = new Int32Array(size);
  return factorLu(matrix, size, pivots) ? solveLu(matrix, size, pivots, Float64Array.from(right)) : undefined;
}

test('a system that needs its rows exchanged', () =>
  expect([
    ...solved(
      [
        [0, 2, 1],
        [4, 0, 0],
        [0, 1, 3],
      ],
      [7, 4, 11],
    )!,
  ]).toEqual([1, 2, 3]));

test.each([1, 2, 3, 8, 20])('A x = b gives x back for a random matrix of %d', (size) => {
  const next = uniform(size);
  const rows = Array.from({ length: size }, () => Array.from({ length: size }, () => next() - 0.5));
  const wanted = Array.from({ length: size }, () => next() - 0.5);
  const right = rows.map((row) => row.reduce((sum, a, j) => sum + a * wanted[j], 0));
  solved(rows, right)!.forEach((x, j) => expect(Math.abs(x - wanted[j])).toBeLessThan(1e-11));
});

test('a singular matrix, and one that is not finite, are refused', () => {
  expect(
    solved(
      [
        [1, 2],
        [2, 4],
      ],
      [1, 2],
    ),
  ).toBeUndefined();
  expect(
    solved(
      [
        [NaN, 2],
        [2, 4],
      ],
      [1, 2],
    ),
  ).toBeUndefined();
  expect(
    solved(
      [
        [Infinity, 2],
        [2, 4],
      ],
      [1, 2],
    ),
  ).toBeUndefined();
});

test('the right side may stand anywhere in a longer list', () => {
  const matrix = Float64Array.of(2, 0, 0, 4);
  const pivots = new Int32Array(2);
  factorLu(matrix, 2, pivots);
  expect([...solveLu(matrix, 2, pivots, Float64Array.of(9, 2, 4, 9), 1)]).toEqual([9, 1, 1, 9]);
});
