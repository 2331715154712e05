/**
 * A mechanism and its runs as a problem of least squares, in the logarithms of its coefficients.
 *
 * Derivatives are the forward sensitivities ∂c/∂ln k, integrated beside the concentrations. Factors of
 * signals enter linearly and are projected out (L. Kaufman, BIT 15 (1975) 49, doi:10.1007/BF01932995), so
 * that only coefficients are searched.
 */
import { InvalidInput, NotDetermined } from '../errors';
import type { LeastSquaresModel } from '../numerics/leastSquares';
import type { Tell } from '../progress';
import { trajectoryOf } from './course';
import { readingsOf, type Experiment, type Reading } from './experiment';
import type { Scheme } from './scheme';

/** Work on all courses of one fit and its limits, in the integration's unit: some seconds. */
const mostWork = 4e8;

/** How far the search may go from its start, in ln k: a factor of 10²⁶ either way. */
const reach = 60;

export interface MechanismProblem {
  readonly scheme: Scheme;
  readonly experiments: readonly Experiment[];
  /** Start values, above 0; those of coefficients that are not searched stay. */
  readonly start: Float64Array;
  readonly tolerance?: number;
  /** Called now and then; may throw to end the work. */
  readonly watch?: (time: number, steps: number) => void;
  /** Takes what is being done; how far the search is nobody knows. */
  readonly tell?: Tell;
  /** What has been done so far; one object for all that belongs to a fit. */
  readonly work?: { done: number };
}

/** A factor of signals at its best value. */
export interface FittedFactor {
  readonly name: string;
  value: number;
  /** Places of its readings among all. */
  readonly rows: readonly number[];
  /** Σ m² over them, m being the reading that the factor 1 would give. */
  squares: number;
  /** d(factor)/d ln k of each coefficient that is searched. */
  readonly slopes: Float64Array;
}

export class MechanismModel implements LeastSquaresModel {
  readonly parameters: number;
  readonly residuals: number;
  /** Beside the scatter of readings, less than this share of the sum means nothing. */
  readonly noise = 1e-7;
  readonly readings: readonly Reading[];
  readonly factors: readonly FittedFactor[];

  private readonly work: { done: number };
  private readonly expected: Float64Array;
  private readonly columns: Float64Array[];
  /** Where the values above belong. */
  private at: Float64Array | undefined;

  /** @param searched places of the coefficients that are searched */
  constructor(
    readonly problem: MechanismProblem,
    readonly searched: readonly number[],
  ) {
    this.readings = readingsOf(problem.scheme, problem.experiments);
    this.parameters = searched.length;
    this.residuals = this.readings.length;
    this.expected = new Float64Array(this.residuals);
    this.columns = searched.map(() => new Float64Array(this.residuals));
    this.work = problem.work ?? { done: 0 };
    this.factors = factorsOf(this.readings, searched.length);
  }

  /** Whether a fit has had all the work that it may take. */
  get isExhausted(): boolean {
    return this.work.done > mostWork;
  }

  /** ln k of what is searched, at the start. */
  get start(): Float64Array {
    return Float64Array.from(this.searched, (place) => Math.log(this.problem.start[place]));
  }

  /** All coefficients, those searched at the given ln k. */
  coefficientsAt(parameters: Float64Array): Float64Array {
    const coefficients = this.problem.start.slice();
    this.searched.forEach((place, j) => (coefficients[place] = Math.exp(parameters[j])));
    return coefficients;
  }

  residualsAt(parameters: Float64Array, residuals: Float64Array): void {
    if (!this.evaluate(parameters)) {
      residuals.fill(NaN); // the search takes a shorter step
      return;
    }
    this.readings.forEach(({ value }, i) => (residuals[i] = value - this.expected[i]));
  }

  derivativesAt(parameters: Float64Array, columns: readonly Float64Array[]): void {
    this.follow(parameters);
    columns.forEach((column, j) => column.set(this.columns[j]));
  }

  /** Sum of the squared residuals at ln k; `Infinity` where the course breaks off. */
  squaresAt(parameters: Float64Array): number {
    const residuals = new Float64Array(this.residuals);
    this.residualsAt(parameters, residuals);
    const squares = residuals.reduce((sum, r) => sum + r * r, 0);
    return Number.isNaN(squares) ? Infinity : squares;
  }

  /**
   * Works out the courses at ln k, so that all else is at hand.
   *
   * @throws InvalidInput or NotDetermined in the words of a course that breaks off
   */
  follow(parameters: Float64Array): void {
    if (this.at?.every((value, j) => value === parameters[j])) return;
    this.at = undefined;
    this.integrate(this.coefficientsAt(parameters));
    for (const factor of this.factors) this.project(factor);
    this.at = parameters.slice();
  }

  /** @returns false where there is no course at these coefficients */
  private evaluate(parameters: Float64Array): boolean {
    const { start } = this;
    if (parameters.some((value, j) => !(Math.abs(value - start[j]) <= reach))) return false;
    if (this.isExhausted) {
      throw new NotDetermined('the fit takes too much work: better start values, or fewer steps, may help');
    }
    try {
      this.follow(parameters);
      return true;
    } catch (error) {
      if (error instanceof InvalidInput || error instanceof NotDetermined) return false;
      throw error;
    }
  }

  private integrate(coefficients: Float64Array): void {
    const { scheme, experiments, tolerance, watch } = this.problem;
    const options = { tolerance, watch, sensitivities: this.searched, workLimit: mostWork / 20 };
    const courses = experiments.map(({ initial, times }) => {
      this.work.done += options.workLimit; // should the course break off
      const course = trajectoryOf(scheme, coefficients, initial, times, options);
      this.work.done += course.work - options.workLimit;
      return course;
    });
    this.readings.forEach(({ experiment, place, signal: { weights } }, i) => {
      const { states, sensitivities } = courses[experiment];
      this.expected[i] = combined(weights, states[place]);
      for (let j = 0; j < this.parameters; j++) {
        this.columns[j][i] = combined(weights, sensitivities[place][j]);
      }
    });
  }

  /** Puts a factor to its best value and takes from each column what the factor could make up for. */
  private project(factor: FittedFactor): void {
    const { rows } = factor;
    let product = 0;
    let squares = 0;
    for (const i of rows) {
      product += this.expected[i] * this.readings[i].value;
      squares += this.expected[i] ** 2;
    }
    factor.value = squares > 0 ? product / squares : 0;
    factor.squares = squares;
    this.columns.forEach((column, j) => {
      let along = 0;
      for (const i of rows) along += column[i] * this.expected[i];
      const share = squares > 0 ? along / squares : 0;
      factor.slopes[j] = -factor.value * share;
      for (const i of rows) column[i] = factor.value * (column[i] - share * this.expected[i]);
    });
    for (const i of rows) this.expected[i] *= factor.value;
  }
}

const combined = (weights: ArrayLike<number>, values: Float64Array): number => {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += weights[i] * values[i];
  return sum;
};

function factorsOf(readings: readonly Reading[], parameters: number): FittedFactor[] {
  const rows = new Map<string, number[]>();
  readings.forEach(({ signal: { factor } }, i) => {
    if (factor === undefined) return;
    if (!rows.has(factor)) rows.set(factor, []);
    rows.get(factor)!.push(i);
  });
  return [...rows].map(([name, places]) => ({
    name,
    value: 1,
    rows: places,
    squares: 0,
    slopes: new Float64Array(parameters),
  }));
}
