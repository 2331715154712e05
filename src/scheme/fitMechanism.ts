/** The rate coefficients of a mechanism, fitted to readings of one run or of several at once. */
import { InvalidInput, shown } from '../errors';
import { fitLeastSquares } from '../numerics/leastSquares';
import { determine, type Determinations } from './determination';
import { MechanismModel, type MechanismProblem } from './mechanismModel';
import { lowestPlace } from './mechanismSearch';
import { reactionInWords } from './scheme';

export interface MechanismFitProblem extends Omit<MechanismProblem, 'start'> {
  /** Where the search starts: one a reaction, above 0. */
  readonly start: ArrayLike<number>;
  /** Places of coefficients that are known and stay as they are. */
  readonly held?: readonly number[];
}

export interface FittedCoefficient {
  readonly value: number;
  /** `null` where it was held, cannot be told, or there is no scatter to judge by. */
  readonly standardUncertainty: number | null;
  /** Why the readings cannot tell it, or nothing: the value then means nothing. */
  readonly why: string;
}

export interface MechanismFit {
  /** One a reaction. */
  readonly coefficients: readonly FittedCoefficient[];
  /** Correlation of ln k between any two reactions; 0 with one that was held or cannot be told. */
  readonly correlations: readonly (readonly number[])[];
  /** The factors of signals, by name. */
  readonly factors: ReadonlyMap<
    string,
    { readonly value: number; readonly standardUncertainty: number | null }
  >;
  readonly residualSumOfSquares: number;
  readonly residualDeviation: number | null;
  readonly degreesOfFreedom: number;
  /** Reading less fitted course: run by run, signal by signal, gaps left out. */
  readonly residuals: Float64Array;
  /** For those who search on from here. */
  readonly search: {
    readonly model: MechanismModel;
    readonly logCoefficients: Float64Array;
    /** Reactions whose coefficients can be told apart from each other. */
    readonly distinct: readonly number[];
  };
}

/**
 * Least squares over all readings, each counting alike in its own unit; coefficients are searched on the
 * logarithmic scale, which keeps them above 0.
 *
 * @throws InvalidInput where the problem does not fit together
 * @throws NotDetermined where the search finds no end
 * @example fitMechanism({ scheme: parseScheme('A ->'), start: [1], experiments: [{ initial: [8], times: [0, 1, 2], signals: [{ weights: [1], readings: [8, 4, 2] }] }] }).coefficients[0].value // 0.6931472
 */
export function fitMechanism(given: MechanismFitProblem): MechanismFit {
  const problem = { ...given, start: Float64Array.from(given.start), work: { done: 0 } };
  const held = new Set(given.held);
  requireStart(problem, held);
  const places = problem.scheme.reactions.map((_, place) => place);
  const model = new MechanismModel(
    problem,
    places.filter((place) => !held.has(place)),
  );
  const unknowns = model.parameters + model.factors.length;
  if (model.residuals < unknowns) {
    throw new InvalidInput(`a fit of ${unknowns} numbers needs as many readings: got ${model.residuals}`);
  }
  model.follow(model.start); // breaks off in the user's own words while the values are the user's
  const first = lowestPlace(model).parameters;
  const parameters = polished(model, first, judged(model, first).kept);
  return assembled(model, parameters, judged(model, parameters));
}

const freedomOf = ({ residuals, factors }: MechanismModel, rank: number): number =>
  residuals - rank - factors.length;

function judged(model: MechanismModel, parameters: Float64Array): Determinations {
  const columns = model.searched.map(() => new Float64Array(model.residuals));
  model.derivativesAt(parameters, columns);
  const squares = model.squaresAt(parameters);
  const size = Math.sqrt(model.readings.reduce((sum, { value }) => sum + value * value, 0));
  return determine(model.problem.scheme, columns, model.searched, size, (rank) => {
    const freedom = freedomOf(model, rank);
    return freedom > 0 ? Math.sqrt(squares / freedom) : null;
  });
}

function assembled(model: MechanismModel, parameters: Float64Array, found: Determinations): MechanismFit {
  const residuals = new Float64Array(model.residuals);
  model.residualsAt(parameters, residuals);
  const residualSumOfSquares = model.squaresAt(parameters);
  const degreesOfFreedom = freedomOf(model, found.kept.length);
  const deviation = degreesOfFreedom > 0 ? Math.sqrt(residualSumOfSquares / degreesOfFreedom) : null;
  const places = model.problem.scheme.reactions.map((_, reaction) => model.searched.indexOf(reaction));
  const values = model.coefficientsAt(parameters);
  return {
    coefficients: places.map((j, reaction) => {
      const { logUncertainty = null, why = '' } = found.of[j] ?? {};
      const value = values[reaction];
      return { value, standardUncertainty: logUncertainty === null ? null : value * logUncertainty, why };
    }),
    correlations: places.map((one) => places.map((other) => found.correlations[one]?.[other] ?? 0)),
    factors: new Map(
      model.factors.map(({ name, value, squares, slopes }) => {
        const length = Math.hypot(1 / Math.sqrt(squares), found.lengthOf(slopes));
        return [name, { value, standardUncertainty: deviation === null ? null : deviation * length }];
      }),
    ),
    residualSumOfSquares,
    residualDeviation: deviation,
    degreesOfFreedom,
    residuals,
    search: {
      model,
      logCoefficients: parameters,
      distinct: found.kept.map((j) => model.searched[j]),
    },
  };
}

/** To the last digits, with what cannot be told left where it is: it keeps a search from an end. */
function polished(model: MechanismModel, place: Float64Array, kept: readonly number[]): Float64Array {
  if (kept.length === model.parameters || kept.length === 0) return place;
  const start = model.coefficientsAt(place);
  const distinct = new MechanismModel(
    { ...model.problem, start },
    kept.map((j) => model.searched[j]),
  );
  const { parameters } = fitLeastSquares(distinct, distinct.start);
  const whole = place.slice();
  kept.forEach((j, i) => (whole[j] = parameters[i]));
  return whole;
}

function requireStart({ scheme, start }: MechanismProblem, held: ReadonlySet<number>): void {
  if (start.length !== scheme.reactions.length) {
    const none = start.length < scheme.reactions.length;
    throw new InvalidInput(
      `coefficients must be one for each direction of each step: ${none ? `none for ${reactionInWords(scheme, start.length)}` : `got ${start.length} for ${scheme.reactions.length}`}`,
    );
  }
  start.forEach((value, place) => {
    if (Number.isFinite(value) && (value > 0 || (held.has(place) && value === 0))) return;
    throw new InvalidInput(
      `coefficients must be start values above 0: ${reactionInWords(scheme, place)} (${shown(value)})`,
    );
  });
}
