/** The search for the coefficients of least squares: from where it starts, and in how many digits. */
import { NotDetermined } from '../errors';
import { fitLeastSquares, type LeastSquaresFit } from '../numerics/leastSquares';
import { MechanismModel, type MechanismProblem } from './mechanismModel';

/** The way to the lowest place needs fewer digits than the place itself. */
const coarseTolerance = 1e-6;

/** By what share a valley must be deeper to be preferred to the one that the start values lead to. */
const clearlyDeeper = 1e-3;

/**
 * ln k of least squares.
 *
 * Besides the start values given, the search sets out from coefficients that suit the length of the runs:
 * a start some powers of ten off leads to a plain where a reaction is over at once, or never begins.
 *
 * @throws NotDetermined where no search finds an end
 * @example lowestPlace(new MechanismModel({ scheme: parseScheme('A ->'), start: Float64Array.of(9), experiments: [{ initial: [8], times: [0, 1, 2], signals: [{ weights: [1], readings: [8, 4, 2] }] }] }, [0])).parameters[0] // -0.3665129
 */
export function lowestPlace(model: MechanismModel): LeastSquaresFit {
  const { problem, searched } = model;
  const coarse = new MechanismModel({ ...problem, tolerance: coarseTolerance }, searched);
  problem.tell?.({ doing: 'searching from the coefficients given' });
  const own = attempt(coarse, coarse.start);
  problem.tell?.({ doing: 'searching from coefficients that suit the run' });
  const other = attempt(coarse, startOfRuns(problem, searched));
  if (own instanceof NotDetermined && other instanceof NotDetermined) throw own;
  problem.tell?.({ doing: 'fitting to the last digits' });
  return fitLeastSquares(model, better(own, other).parameters);
}

function better(
  own: LeastSquaresFit | NotDetermined,
  other: LeastSquaresFit | NotDetermined,
): LeastSquaresFit {
  if (own instanceof NotDetermined) return other as LeastSquaresFit;
  if (other instanceof NotDetermined) return own;
  const isDeeper = other.residualSumOfSquares < own.residualSumOfSquares * (1 - clearlyDeeper);
  return isDeeper ? other : own;
}

function attempt(model: MechanismModel, start: Float64Array): LeastSquaresFit | NotDetermined {
  try {
    return fitLeastSquares(model, start);
  } catch (error) {
    if (error instanceof NotDetermined && !model.isExhausted) return error;
    throw error;
  }
}

/** ln k at which each reaction, at the highest concentration, takes a third of the longest run. */
function startOfRuns({ scheme, experiments }: MechanismProblem, searched: readonly number[]): Float64Array {
  const longest = Math.max(...experiments.flatMap(({ times }) => Array.from(times))) || 1;
  const highest = Math.max(...experiments.flatMap(({ initial }) => Array.from(initial))) || 1;
  return Float64Array.from(searched, (place) => {
    const order = scheme.reactions[place].left.reduce((sum, { number }) => sum + number, 0);
    return Math.log(3 / longest) + (1 - order) * Math.log(highest);
  });
}
