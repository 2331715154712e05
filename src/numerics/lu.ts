/**
 * Small dense linear systems by LU factors with partial pivoting, in place and without allocation, for
 * inner loops that solve thousands of them.
 *
 * @see G. H. Golub and C. F. Van Loan, Matrix Computations, 4th ed. (2013), 3.4
 */

/**
 * Replaces a matrix by its factors.
 *
 * @param matrix n × n, row by row; overwritten
 * @param pivots n places; filled with the rows that were exchanged
 * @returns false where the matrix is singular, or holds a number that is not finite
 * @example factorLu(Float64Array.of(1, 2, 2, 4), 2, new Int32Array(2)) // false
 */
export function factorLu(matrix: Float64Array, size: number, pivots: Int32Array): boolean {
  for (let k = 0; k < size; k++) {
    let row = k;
    let largest = Math.abs(matrix[k * size + k]);
    for (let i = k + 1; i < size; i++) {
      const length = Math.abs(matrix[i * size + k]);
      if (length > largest) [row, largest] = [i, length];
    }
    if (!(largest > 0 && largest < Infinity)) return false;
    pivots[k] = row;
    if (row !== k) swapRows(matrix, size, k, row);
    const pivot = matrix[k * size + k];
    for (let i = k + 1; i < size; i++) {
      const share = matrix[i * size + k];
      if (share === 0) continue; // mechanisms couple few species
      const factor = share / pivot;
      matrix[i * size + k] = factor;
      for (let j = k + 1; j < size; j++) matrix[i * size + j] -= factor * matrix[k * size + j];
    }
  }
  return true;
}

function swapRows(matrix: Float64Array, size: number, one: number, other: number): void {
  for (let j = 0; j < size; j++) {
    const held = matrix[one * size + j];
    matrix[one * size + j] = matrix[other * size + j];
    matrix[other * size + j] = held;
  }
}

/**
 * Solves with the factors of {@link factorLu}.
 *
 * @param right at `offset` the right side, n numbers; overwritten with the solution
 * @returns that
 * @example solveLu(Float64Array.of(4), 1, Int32Array.of(0), Float64Array.of(8)) // Float64Array [2]
 */
export function solveLu(
  factors: Float64Array,
  size: number,
  pivots: Int32Array,
  right: Float64Array,
  offset = 0,
): Float64Array {
  for (let k = 0; k < size; k++) {
    const row = pivots[k];
    const held = right[offset + row];
    right[offset + row] = right[offset + k];
    right[offset + k] = held;
  }
  for (let i = 1; i < size; i++) {
    let sum = right[offset + i];
    for (let j = 0; j < i; j++) sum -= factors[i * size + j] * right[offset + j];
    right[offset + i] = sum;
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = right[offset + i];
    for (let j = i + 1; j < size; j++) sum -= factors[i * size + j] * right[offset + j];
    right[offset + i] = sum / factors[i * size + i];
  }
  return right;
}
