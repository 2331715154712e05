/** Nonlinear least squares, for models that are not linear in any of their parameters. */
import { NotDetermined } from '../errors';
import { fitLinearOnce } from './linearFit';
import type { QrFactor } from './qr';

export interface LeastSquaresModel {
  readonly parameters: number;
  readonly residuals: number;
  /** Share of the sum of squares that the model's own arithmetic leaves open; none when left out. */
  readonly noise?: number;
  /** Writes reading less model, weighted, into `residuals`. */
  residualsAt(parameters: Float64Array, residuals: Float64Array): void;
  /** Writes the derivatives of the *model*, weighted, column by column into `columns`. */
  derivativesAt(parameters: Float64Array, columns: readonly Float64Array[]): void;
}

export interface LeastSquaresFit {
  readonly parameters: Float64Array;
  readonly residualSumOfSquares: number;
  /** Of the derivatives at the optimum: see {@link combinationVariance}. */
  readonly factor: QrFactor;
  readonly iterations: number;
}

const mostIterations = 2000;

/**
 * The parameters of least squares near a start, by Levenberg and Marquardt's method: each step solves
 * ‖r − Jδ‖² + λ‖Dδ‖² by QR, D being the longest that each column of J has been; λ follows how well the step
 * kept its promise (Nielsen). It ends where full steps no longer move any parameter or lower the sum.
 *
 * @param start finite; where the model has several valleys it chooses one
 * @throws NotDetermined when the model is not finite at the start, or no end is reached
 * @see J. J. Moré, Lecture Notes in Mathematics 630 (1978) 105; K. Madsen, H. B. Nielsen and O. Tingleff, Methods
 *   for Non-Linear Least Squares Problems, 2nd ed. (2004), 3.2
 * @example fitLeastSquares({ parameters: 1, residuals: 2, residualsAt: (p, r) => r.set([1 - p[0], 3 - p[0]]), derivativesAt: (p, c) => c[0].fill(1) }, [0]).parameters // Float64Array [2]
 */
export function fitLeastSquares(model: LeastSquaresModel, start: ArrayLike<number>): LeastSquaresFit {
  // an end where some parameter no longer matters is a plain that too bold a step ran into: start over, more
  // carefully
  let last: Found | undefined;
  for (const damping of [1e-3, 1, 1e3]) {
    last = searched(model, start, damping);
    if (!last.isPlain) break;
  }
  return last!;
}

interface Found extends LeastSquaresFit {
  /** Some parameter has next to no say here, though it had on the way. */
  readonly isPlain: boolean;
}

function searched(model: LeastSquaresModel, start: ArrayLike<number>, damping: number): Found {
  const search = new Search(model, Float64Array.from(start), damping);
  let iterations = 0;
  while (!search.isDone) {
    if (++iterations > mostIterations) {
      throw new NotDetermined(
        `least squares found no end in ${mostIterations} steps: another start may lead to one`,
      );
    }
    search.step();
  }
  return search.result(iterations);
}

class Search {
  isDone = false;
  private readonly residuals: Float64Array;
  private readonly trialResiduals: Float64Array;
  private readonly columns: Float64Array[];
  private readonly lengths: Float64Array;
  private squares: number;
  private growth = 2;
  private isFresh = false;

  constructor(
    private readonly model: LeastSquaresModel,
    private parameters: Float64Array,
    private damping: number,
  ) {
    this.residuals = new Float64Array(model.residuals);
    this.trialResiduals = new Float64Array(model.residuals);
    this.columns = Array.from({ length: model.parameters }, () => new Float64Array(model.residuals));
    this.lengths = new Float64Array(model.parameters);
    model.residualsAt(parameters, this.residuals);
    this.squares = sumOfSquares(this.residuals);
    if (!Number.isFinite(this.squares))
      throw new NotDetermined('least squares needs a start at which the model is finite');
  }

  step(): void {
    if (!this.isFresh) this.differentiate();
    const { step, promised } = this.damped(this.damping);
    // damping alone makes promises small
    if (promised * (1 + this.damping) < (this.model.noise ?? 0) * this.squares) return this.settle();
    const trial = this.parameters.map((p, j) => p + step[j]);
    this.model.residualsAt(trial, this.trialResiduals);
    const squares = sumOfSquares(this.trialResiduals);
    const gain = (this.squares - squares) / promised;
    if (squares < this.squares) {
      const moved = this.movedBy(step);
      const lowered = (this.squares - squares) / this.squares;
      this.accept(trial, squares);
      this.damping *= Math.max(1 / 10, 1 - (2 * gain - 1) ** 3);
      this.growth = 2;
      if (squares === 0) this.isDone = true;
      else if (moved < 1e-15) this.settle();
      else if (lowered < 1e-14 && moved < 1e-9) this.settle();
      return;
    }
    if (this.movedBy(step) < 1e-16 || !(promised > 0)) return this.settle();
    this.damping *= this.growth;
    this.growth *= 2;
    if (this.damping > 1e60) this.settle();
  }

  /**
   * Near the end the sum is flat and says nothing. Undamped steps go on, judged by their own length, as long
   * as they still shrink.
   */
  private settle(): void {
    let shortest = Infinity;
    let idle = 0;
    while (idle < 3) {
      this.differentiate();
      const { step } = this.damped(0);
      const length = this.movedBy(step);
      if (length > 1e-3 || length === 0) break;
      const trial = this.parameters.map((p, j) => p + step[j]);
      this.model.residualsAt(trial, this.trialResiduals);
      const squares = sumOfSquares(this.trialResiduals);
      if (!(squares <= this.squares * (1 + 1e-9))) break;
      this.accept(trial, squares);
      idle = length < shortest * 0.9 ? 0 : idle + 1;
      shortest = Math.min(shortest, length);
    }
    this.isDone = true;
  }

  private differentiate(): void {
    this.model.derivativesAt(this.parameters, this.columns);
    for (let j = 0; j < this.lengths.length; j++) {
      this.lengths[j] = Math.max(this.lengths[j], Math.sqrt(sumOfSquares(this.columns[j])));
    }
    this.isFresh = true;
  }

  /** The step of least ‖r − Jδ‖² + λ‖Dδ‖², and by how much the sum would fall if the model were linear. */
  private damped(damping: number): { step: Float64Array; promised: number } {
    const n = this.model.parameters;
    const m = this.model.residuals;
    const root = Math.sqrt(damping);
    const columns = this.columns.map((column, j) => {
      const longer = new Float64Array(damping === 0 ? m : m + n);
      longer.set(column);
      if (damping > 0) longer[m + j] = root * (this.lengths[j] || 1);
      return longer;
    });
    const readings = new Float64Array(columns[0].length);
    readings.set(this.residuals);
    const { coefficients, factor } = fitLinearOnce(columns, readings);
    if (factor.isDeficient) return { step: coefficients.fill(0), promised: 0 };
    let promised = 0;
    for (let i = 0; i < m; i++) {
      let change = 0;
      for (let j = 0; j < n; j++) change += this.columns[j][i] * coefficients[j];
      promised += change * (2 * this.residuals[i] - change);
    }
    return { step: coefficients, promised };
  }

  private accept(trial: Float64Array, squares: number): void {
    this.parameters = trial;
    this.squares = squares;
    this.residuals.set(this.trialResiduals);
    this.isFresh = false;
  }

  /** The longest step of a parameter as a share of it. */
  private movedBy(step: Float64Array): number {
    return step.reduce((most, s, j) => Math.max(most, Math.abs(s) / (Math.abs(this.parameters[j]) || 1)), 0);
  }

  result(iterations: number): Found {
    this.differentiate();
    const isPlain = this.columns.some(
      (column, j) => Math.sqrt(sumOfSquares(column)) <= 1e-10 * this.lengths[j],
    );
    const { factor } = fitLinearOnce(this.columns, this.residuals);
    return { parameters: this.parameters, residualSumOfSquares: this.squares, factor, iterations, isPlain };
  }
}

function sumOfSquares(values: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i] * values[i];
  return sum;
}
