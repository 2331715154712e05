/**
 * Profile-likelihood limits of a mechanism's coefficients: how far each can be moved, all others adapting,
 * before the fit becomes significantly worse. The limits are where RSS reaches RSS_min [1 + F₀.₉₅(1, ν)/ν].
 *
 * @see D. M. Bates and D. G. Watts, Nonlinear Regression Analysis and Its Applications (1988), 6.1
 */
import { NotDetermined } from '../errors';
import type { Estimate } from '../estimate';
import { findRoot } from '../numerics/findRoot';
import { fitLinearOnce } from '../numerics/linearFit';
import { studentQuantile } from '../numerics/studentT';
import type { MechanismFit } from './fitMechanism';
import { MechanismModel } from './mechanismModel';

/** Beyond this many standard uncertainties no limit is looked for. */
const farthest = 40;

/** Nor beyond this factor: a limit so far away is none. */
const farthestFactor = 1e6;

/** In ln k, of the others on their way to their best. */
const longestStep = 1;

/** Digits to which an integration and its readings can agree. */
const noise = 1e-8;

/**
 * A coefficient with its limits.
 *
 * @throws NotDetermined where the readings cannot tell it, saying why
 * @example coefficientEstimate(fitMechanism({ scheme: parseScheme('A ->'), start: [1], experiments: [{ initial: [8], times: [0, 1, 2], signals: [{ weights: [1], readings: [8, 4, 2] }] }] }), 0).degreesOfFreedom // 2
 */
export function coefficientEstimate(fit: MechanismFit, reaction: number): Estimate {
  const { residualSumOfSquares, degreesOfFreedom, search } = fit;
  const { value, standardUncertainty, why } = fit.coefficients[reaction];
  if (why !== '') throw new NotDetermined(why);
  const estimate = { value, standardUncertainty, degreesOfFreedom };
  if (standardUncertainty === null) return { ...estimate, lower: null, upper: null };
  const size = search.model.readings.reduce((sum, reading) => sum + reading.value ** 2, 0);
  // readings that lie on the course to the last digit leave no room
  if (residualSumOfSquares <= size * noise ** 2) return { ...estimate, lower: value, upper: value };
  const t = studentQuantile(0.975, degreesOfFreedom);
  const step = standardUncertainty / value;
  const at = Math.log(value);
  const lowest = squaresAlong(fit, reaction);
  const allowed = Math.sqrt(residualSumOfSquares * ((t * t) / degreesOfFreedom));
  // the root of the rise is nearly straight in ln k; at the estimate itself there is none
  const excess = (logK: number): number =>
    logK === at ? -allowed : Math.sqrt(Math.max(0, lowest(logK) - residualSumOfSquares)) - allowed;
  const side = (sign: number): number | null => {
    let near = at;
    for (let reach = t; reach <= farthest; reach *= 1.5) {
      const far = at + sign * reach * step;
      if (reach * step > Math.log(farthestFactor)) return null;
      if (excess(far) > 0) return Math.exp(findRoot(excess, near, far, 1e-7 * step));
      near = far;
    }
    return null;
  };
  return { ...estimate, lower: side(-1), upper: side(1) };
}

/** RSS as a function of one ln k, the other coefficients at their best. */
function squaresAlong({ search }: MechanismFit, reaction: number): (logK: number) => number {
  const { model, logCoefficients, distinct } = search;
  const own = model.searched.indexOf(reaction);
  // one that cannot be told apart would wander
  const others = distinct.filter((place) => place !== reaction);
  const slopes = adaptation(search, reaction, others);
  return (logK) => {
    const start = model.coefficientsAt(logCoefficients);
    start[reaction] = Math.exp(logK);
    const held = new MechanismModel({ ...model.problem, start }, others);
    const shift = logK - logCoefficients[own];
    return lowestSquares(
      held,
      held.start.map((log, i) => log + shift * slopes[i]),
    );
  };
}

/** How the other ln k follow one, to first order: −(column of each on the others). */
function adaptation(
  { model, logCoefficients }: MechanismFit['search'],
  reaction: number,
  others: readonly number[],
): Float64Array {
  if (others.length === 0) return new Float64Array(0);
  const columns = model.searched.map(() => new Float64Array(model.residuals));
  model.derivativesAt(logCoefficients, columns);
  const columnOf = (place: number): Float64Array => columns[model.searched.indexOf(place)];
  const { coefficients, factor } = fitLinearOnce(others.map(columnOf), columnOf(reaction));
  return factor.isDeficient ? new Float64Array(others.length) : coefficients.map((value) => -value);
}

/** From a start that is nearly there: a few undamped steps, each judged by the sum it leads to. */
function lowestSquares(model: MechanismModel, start: Float64Array): number {
  let here = start;
  let squares = model.squaresAt(here);
  if (squares === Infinity || model.parameters === 0) return squares;
  const columns = model.searched.map(() => new Float64Array(model.residuals));
  const residuals = new Float64Array(model.residuals);
  for (let turn = 0; turn < 12; turn++) {
    model.residualsAt(here, residuals);
    model.derivativesAt(here, columns);
    const { coefficients: step, factor } = fitLinearOnce(columns, residuals);
    if (factor.isDeficient) break;
    const next = shorter(model, here, step, squares);
    if (!next) break;
    const lowered = squares - next.squares;
    here = next.place;
    squares = next.squares;
    if (lowered < 1e-8 * squares) break;
  }
  return squares;
}

/** The step, or a part of it, that lowers the sum; nothing where none does. */
function shorter(
  model: MechanismModel,
  here: Float64Array,
  step: Float64Array,
  squares: number,
): { readonly place: Float64Array; readonly squares: number } | undefined {
  const longest = step.reduce((most, value) => Math.max(most, Math.abs(value)), longestStep);
  for (let share = longestStep / longest; share > 0.01; share /= 2) {
    const place = here.map((value, j) => value + share * step[j]);
    const reached = model.squaresAt(place);
    if (reached < squares) return { place, squares: reached };
  }
  return undefined;
}
