/**
 * Least squares by Householder QR with column scaling, for a handful of columns. Normal equations, which
 * square the condition number, are never formed.
 *
 * @see G. H. Golub and C. F. Van Loan, Matrix Computations, 4th ed. (2013), 5.2
 */
export interface QrFactor {
  /** Upper triangle of the scaled columns, row by row, n × n. */
  readonly r: Float64Array;
  /** Lengths by which the columns were divided. */
  readonly scales: Float64Array;
  readonly columns: number;
  /** Whether some column is, to working precision, a combination of those before it. */
  readonly isDeficient: boolean;
}

/**
 * Factors a design given column by column.
 *
 * @param design n columns of m rows, each contiguous; overwritten
 * @example factorQr(Float64Array.of(1, 2, 3, 2, 4, 6), 3, 2).isDeficient // true
 */
export function factorQr(design: Float64Array, rows: number, columns: number): QrFactor {
  const scales = new Float64Array(columns);
  for (let j = 0; j < columns; j++) {
    const length = lengthOf(design.subarray(j * rows, (j + 1) * rows)) || 1;
    scales[j] = length;
    for (let i = 0; i < rows; i++) design[j * rows + i] /= length;
  }
  const r = new Float64Array(columns * columns);
  let isDeficient = rows < columns;
  for (let j = 0; j < Math.min(columns, rows); j++) {
    const diagonal = reflect(design, rows, columns, j);
    for (let k = j + 1; k < columns; k++) r[j * columns + k] = design[k * rows + j];
    r[j * columns + j] = diagonal;
    if (Math.abs(diagonal) < 1e-14) isDeficient = true;
  }
  return { r, scales, columns, isDeficient };
}

/** Euclidean length, without overflow. A loop: a long column does not fit into one call's arguments. */
function lengthOf(column: Float64Array): number {
  let largest = 0;
  for (let i = 0; i < column.length; i++) largest = Math.max(largest, Math.abs(column[i]));
  if (largest === 0) return 0;
  let sum = 0;
  for (let i = 0; i < column.length; i++) sum += (column[i] / largest) ** 2;
  return largest * Math.sqrt(sum);
}

/** One Householder reflection: column j below its diagonal becomes 0. Returns the diagonal. */
function reflect(design: Float64Array, rows: number, columns: number, j: number): number {
  const own = j * rows;
  const length = lengthOf(design.subarray(own + j, own + rows));
  if (length === 0) return 0;
  const diagonal = design[own + j] > 0 ? -length : length;
  const head = design[own + j] - diagonal;
  design[own + j] = head;
  let norm = 0;
  for (let i = j; i < rows; i++) norm += design[own + i] ** 2;
  for (let k = j + 1; k < columns; k++) {
    let product = 0;
    for (let i = j; i < rows; i++) product += design[own + i] * design[k * rows + i];
    const share = (2 * product) / norm;
    for (let i = j; i < rows; i++) design[k * rows + i] -= share * design[own + i];
  }
  return diagonal;
}

/**
 * Variance of a linear combination Σ gⱼβⱼ of the coefficients, in units of the readings' variance:
 * gᵀ(XᵀX)⁻¹g = ‖R⁻ᵀg‖².
 *
 * @example combinationVariance(factorQr(Float64Array.of(1, 1, 1, 1), 4, 1), [1]) // 0.25
 */
export function combinationVariance({ r, scales, columns }: QrFactor, g: readonly number[]): number {
  const z = new Float64Array(columns);
  let variance = 0;
  for (let j = 0; j < columns; j++) {
    let sum = g[j] / scales[j];
    for (let i = 0; i < j; i++) sum -= r[i * columns + j] * z[i];
    z[j] = sum / r[j * columns + j];
    variance += z[j] * z[j];
  }
  return variance;
}
