/**
 * Least squares of a rate law with everything linear projected out.
 *
 * Model: y = b + A g, where g is the share left (or converted) at reduced time κt, A is always fitted
 * and b either known or fitted. For given κ and n the best A and b follow in closed form, so that only
 * ln κ (and n) must be searched: variable projection (G. H. Golub and V. Pereyra, SIAM J. Numer. Anal.
 * 10 (1973) 413, doi:10.1137/0710036).
 */
import { shareConverted, shareLeft, shareOrderSlope, shareSlope } from './law';

export interface ReducedProblem {
  /** Times counted from the first, ascending. */
  readonly times: Float64Array;
  /** Readings less what is known: the fixed endpoint, or the fixed start. */
  readonly values: Float64Array;
  /** Square roots of the weights; all 1 when equal. */
  readonly rootWeights: Float64Array;
  /** Whether b is fitted too (a free endpoint). */
  readonly offset: boolean;
  /** `left`: g = φ; `converted`: g = 1 − φ, for a run whose start is known and whose end is fitted. */
  readonly shape: 'left' | 'converted';
}

/** The outcome at one κ and n. The arrays are the problem's own scratch space: read before the next call. */
export class ReducedFit {
  residualSumOfSquares = NaN;
  /** A, the coefficient of g. */
  amplitude = NaN;
  /** b where it is fitted, else 0. */
  base = 0;
  /** d(RSS)/d ln κ at the best A and b. */
  rateGradient = NaN;
  /** Squared length of A dg/d ln κ once A and b have taken what they can: 0 when κ cannot be told. */
  rateCurvature = NaN;
  /** The same before A and b have taken anything. */
  rateLength = NaN;

  private readonly shapeColumn: Float64Array;
  private readonly residuals: Float64Array;
  private readonly offsetNorm: number;
  /** Weighted mean of the readings, and their squares about it. */
  private readonly valueMean: number;
  private readonly valueSquares: number;
  /** Where the last evaluation was. */
  private rate = NaN;
  private order = NaN;

  constructor(readonly problem: ReducedProblem) {
    const count = problem.times.length;
    this.shapeColumn = new Float64Array(count);
    this.residuals = new Float64Array(count);
    let norm = 0;
    let sum = 0;
    for (let i = 0; i < count; i++) {
      const w2 = problem.rootWeights[i] ** 2;
      norm += w2;
      sum += w2 * problem.values[i];
    }
    this.offsetNorm = norm;
    this.valueMean = this.offsetShare(sum);
    let squares = 0;
    for (let i = 0; i < count; i++)
      squares += (problem.rootWeights[i] * (problem.values[i] - this.valueMean)) ** 2;
    this.valueSquares = squares;
  }

  /** Weighted mean, the part that a fitted offset takes. */
  private offsetShare(sum: number): number {
    return this.problem.offset ? sum / this.offsetNorm : 0;
  }

  /** Evaluates the problem at ln κ and n. */
  at(logRate: number, order: number): this {
    const { norm, product, columnMean } = this.project(logRate, order);
    const amplitude = norm > 0 ? product / norm : 0;
    const base = this.valueMean - amplitude * columnMean;
    this.amplitude = amplitude;
    this.base = this.problem.offset ? base : 0;
    this.differentiate(columnMean, norm);
    return this;
  }

  /** RSS alone, from sums of squares: good enough to look where a valley lies, at a third of the cost. */
  squaresAt(logRate: number, order: number): number {
    const { norm, product } = this.project(logRate, order);
    return norm > 0 ? this.valueSquares - (product * product) / norm : this.valueSquares;
  }

  /** Fills g, and what it has in common with the readings. */
  private project(logRate: number, order: number): { norm: number; product: number; columnMean: number } {
    const { times, values, rootWeights, shape } = this.problem;
    const count = times.length;
    const rate = Math.exp(logRate);
    this.rate = rate;
    this.order = order;
    const column = this.shapeColumn;
    const share = shape === 'left' ? shareLeft : shareConverted;
    let columnSum = 0;
    for (let i = 0; i < count; i++) {
      const g = share(rate * times[i], order);
      column[i] = g;
      columnSum += rootWeights[i] ** 2 * g;
    }
    const columnMean = this.offsetShare(columnSum);
    let norm = 0;
    let product = 0;
    for (let i = 0; i < count; i++) {
      const w2 = rootWeights[i] ** 2;
      const g = column[i] - columnMean;
      norm += w2 * g * g;
      product += w2 * g * (values[i] - this.valueMean);
    }
    return { norm, product, columnMean };
  }

  private differentiate(columnMean: number, norm: number): void {
    const { times, values, rootWeights, shape } = this.problem;
    const { amplitude, base, shapeColumn, residuals, rate, order } = this;
    const sign = shape === 'left' ? 1 : -1;
    let squares = 0;
    let rateProduct = 0;
    let slopeSquares = 0;
    let slopeSum = 0;
    let slopeColumn = 0;
    for (let i = 0; i < times.length; i++) {
      const w2 = rootWeights[i] ** 2;
      const g = shapeColumn[i];
      const slope = sign * shareSlope(rate * times[i], order, shape === 'left' ? g : 1 - g);
      const r = values[i] - base - amplitude * g;
      residuals[i] = r;
      squares += w2 * r * r;
      rateProduct += w2 * r * slope;
      slopeSquares += w2 * slope * slope;
      slopeSum += w2 * slope;
      slopeColumn += w2 * slope * (g - columnMean);
    }
    const centred = slopeSquares - this.offsetShare(slopeSum) * slopeSum;
    const own = norm > 0 ? centred - (slopeColumn * slopeColumn) / norm : centred;
    this.residualSumOfSquares = squares;
    this.rateGradient = -2 * amplitude * rateProduct;
    this.rateLength = amplitude * amplitude * slopeSquares;
    this.rateCurvature = amplitude * amplitude * Math.max(0, own);
  }

  /** d(RSS)/dn where the last evaluation was, at the best A and b: worked out only when it is asked for. */
  get orderGradient(): number {
    const { times, rootWeights, shape } = this.problem;
    const { amplitude, shapeColumn, residuals, rate, order } = this;
    const sign = shape === 'left' ? 1 : -1;
    let product = 0;
    for (let i = 0; i < times.length; i++) {
      const left = shape === 'left' ? shapeColumn[i] : 1 - shapeColumn[i];
      product += rootWeights[i] ** 2 * residuals[i] * sign * shareOrderSlope(rate * times[i], order, left);
    }
    return -2 * amplitude * product;
  }

  /** Residuals of the last evaluation, in reading units, in order of time. */
  copyResiduals(): Float64Array {
    return this.residuals.slice();
  }

  /** g of the last evaluation. */
  copyShape(): Float64Array {
    return this.shapeColumn.slice();
  }
}
