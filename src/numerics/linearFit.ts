/** Linear least squares, by the QR of the design with the readings beside it. */
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
 * A second pass fits what the first left over, which wins back digits where columns are nearly alike.
 *
 * @param columns of X, each as long as `readings`; more readings than columns, or as many
 * @returns `factor.isDeficient` tells that the columns are not independent: then nothing else means anything
 * @see Å. Björck, Numerical Methods for Least Squares Problems (1996), 2.4 and 2.9
 * @example fitLinear([Float64Array.of(1, 1, 1), Float64Array.of(0, 1, 2)], Float64Array.of(1, 3, 5)).coefficients // Float64Array [1, 2]
 */
export function fitLinear(columns: readonly Float64Array[], readings: Float64Array): LinearFit {
  const first = onePass(columns, readings);
  if (first.factor.isDeficient) return first;
  const left = residualsOf(columns, readings, first.coefficients);
  const second = onePass(columns, left);
  const coefficients = first.coefficients.map((value, j) => value + second.coefficients[j]);
  const residuals = residualsOf(columns, readings, coefficients);
  return {
    coefficients,
    residualSumOfSquares: residuals.reduce((sum, r) => sum + r * r, 0),
    factor: first.factor,
  };
}

function residualsOf(
  columns: readonly Float64Array[],
  readings: Float64Array,
  coefficients: Float64Array,
): Float64Array {
  return readings.map((y, i) => {
    let rest = y;
    for (let j = 0; j < columns.length; j++) rest -= columns[j][i] * coefficients[j];
    return rest;
  });
}

function onePass(columns: readonly Float64Array[], readings: Float64Array): LinearFit {
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
  const residual = rows > n ? r[n * (n + 1) + n] * scales[n] : 0;
  return {
    coefficients,
    residualSumOfSquares: residual * residual,
    factor: { r: own, scales: scales.slice(0, n), columns: n, isDeficient },
  };
}
