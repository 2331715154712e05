/** Linear least squares, by the QR of the design with the readings beside it. */
import { ExactSum } from './doubleDouble';
import { factorQr, type QrFactor } from './qr';

export interface LinearFit {
  readonly coefficients: Float64Array;
  readonly residualSumOfSquares: number;
  /** Of the design alone, for variances: see {@link combinationVariance}. */
  readonly factor: QrFactor;
}

/**
 * The coefficients β of least ‖y − Xβ‖².
 *
 * What the factor's rounding leaves wrong is mended by a few corrections δ with RᵀRδ = Xᵀ(y − Xβ), the right
 * side in twice the precision, as long as they shrink.
 *
 * @param columns of X, each as long as `readings`; more readings than columns, or as many
 * @returns `factor.isDeficient` tells that the columns are not independent: then nothing else means anything
 * @see Å. Björck, Numerical Methods for Least Squares Problems (1996), 2.4 and 6.6.5 (corrected seminormal equations)
 * @example fitLinear([Float64Array.of(1, 1, 1), Float64Array.of(0, 1, 2)], Float64Array.of(1, 3, 5)).coefficients // Float64Array [1, 2]
 */
export function fitLinear(columns: readonly Float64Array[], readings: Float64Array): LinearFit {
  const { coefficients, factor } = fitLinearOnce(columns, readings);
  if (factor.isDeficient) return { coefficients, factor, residualSumOfSquares: 0 };
  let before = Infinity;
  for (let pass = 0; pass < 5; pass++) {
    const correction = correctionOf(columns, readings, coefficients, factor);
    const size = correction.reduce((most, d, j) => Math.max(most, Math.abs(d * factor.scales[j])), 0);
    if (!(size < before / 2)) break;
    correction.forEach((d, j) => (coefficients[j] += d));
    before = size;
  }
  const residuals = residualsOf(columns, readings, coefficients);
  return { coefficients, factor, residualSumOfSquares: residuals.reduce((sum, r) => sum + r * r, 0) };
}

function correctionOf(
  columns: readonly Float64Array[],
  readings: Float64Array,
  coefficients: Float64Array,
  { r, scales }: QrFactor,
): Float64Array {
  const n = columns.length;
  const residuals = residualsOf(columns, readings, coefficients);
  const step = new Float64Array(n);
  for (let j = 0; j < n; j++) {
    const sum = new ExactSum();
    for (let i = 0; i < residuals.length; i++) sum.addProduct(columns[j][i], residuals[i]);
    step[j] = sum.value / scales[j];
  }
  for (let j = 0; j < n; j++) {
    for (let i = 0; i < j; i++) step[j] -= r[i * n + j] * step[i];
    step[j] /= r[j * n + j];
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let j = i + 1; j < n; j++) step[i] -= r[i * n + j] * step[j];
    step[i] /= r[i * n + i];
  }
  return step.map((value, j) => value / scales[j]);
}

function residualsOf(
  columns: readonly Float64Array[],
  readings: Float64Array,
  coefficients: Float64Array,
): Float64Array {
  return readings.map((y, i) => {
    const rest = new ExactSum().add(y);
    for (let j = 0; j < columns.length; j++) rest.addProduct(columns[j][i], -coefficients[j]);
    return rest.value;
  });
}

/**
 * As {@link fitLinear} without its corrections: enough for a step of a search, at a third of the cost.
 *
 * @example fitLinearOnce([Float64Array.of(1, 1, 1), Float64Array.of(0, 1, 2)], Float64Array.of(1, 3, 5)).coefficients // Float64Array [1, 2]
 */
export function fitLinearOnce(
  columns: readonly Float64Array[],
  readings: Float64Array,
): Omit<LinearFit, 'residualSumOfSquares'> {
  const rows = readings.length;
  const n = columns.length;
  const augmented = new Float64Array(rows * (n + 1));
  columns.forEach((column, j) => augmented.set(column, j * rows));
  augmented.set(readings, n * rows);
  const { r, scales } = factorQr(augmented, rows, n + 1);
  const own = new Float64Array(n * n);
  let isDeficient = rows < n;
  for (let i = 0; i < n; i++) {
    for (let j = i; j < n; j++) own[i * n + j] = r[i * (n + 1) + j];
    if (Math.abs(own[i * n + i]) < 1e-14) isDeficient = true;
  }
  const coefficients = new Float64Array(n);
  if (!isDeficient) {
    for (let i = n - 1; i >= 0; i--) {
      let sum = r[i * (n + 1) + n];
      for (let j = i + 1; j < n; j++) sum -= own[i * n + j] * coefficients[j];
      coefficients[i] = sum / own[i * n + i];
    }
    for (let j = 0; j < n; j++) coefficients[j] *= scales[n] / scales[j];
  }
  return {
    coefficients,
    factor: { r: own, scales: scales.slice(0, n), columns: n, isDeficient },
  };
}
