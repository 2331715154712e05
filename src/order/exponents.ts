/** Partial orders from initial rates: ln r = ln k + Σ nᵢ ln cᵢ. */
import { InvalidInput, NotDetermined, shown } from '../errors';
import { withStudentLimits, type Estimate } from '../estimate';
import { fitLinear, type LinearFit } from '../numerics/linearFit';
import { combinationVariance } from '../numerics/qr';

export interface PartialOrders {
  /** One for each reactant. */
  readonly orders: readonly Estimate[];
  /** k, with the limits of ln k taken back. */
  readonly rateCoefficient: Estimate;
  /** Standard deviation of ln r about the fit; `null` without degrees of freedom. */
  readonly residualDeviation: number | null;
}

/**
 * Partial orders and rate coefficient of r = k ∏ cᵢ^nᵢ, by linear least squares on logarithms: each rate
 * counts with the same share of itself.
 *
 * @param rates one a run, above 0
 * @param concentrations one column a reactant, each as long as `rates`, above 0
 * @param uncertainties standard uncertainty of each rate, up to a common factor; left out, the same share of each
 * @throws InvalidInput for lengths that differ or numbers that are not above 0; NotDetermined with fewer runs
 *   than unknowns, or reactants that were not varied by themselves
 * @see IUPAC Gold Book, order of reaction, doi:10.1351/goldbook.O04322
 * @example partialOrders(Float64Array.of(5, 20, 45), [Float64Array.of(1, 2, 3)]).rateCoefficient.value // 5
 */
export function partialOrders(
  rates: Float64Array,
  concentrations: readonly Float64Array[],
  uncertainties?: Float64Array,
): PartialOrders {
  requireAboveZero(rates, 'rates');
  concentrations.forEach((column, j) => requireAboveZero(column, `concentrations of reactant ${j + 1}`));
  const unknowns = concentrations.length + 1;
  if (rates.length < unknowns) {
    throw new NotDetermined(`${unknowns} unknowns need as many runs: got ${rates.length}`);
  }
  const weights = rates.map((rate, i) => (uncertainties ? rate / uncertainties[i] : 1));
  const columns = [...concentrations.map((column) => logarithms(column, weights)), weights];
  const fit = fitLinear(columns, logarithms(rates, weights));
  requireVaried(concentrations, fit);
  const degreesOfFreedom = rates.length - unknowns;
  const deviation = degreesOfFreedom > 0 ? Math.sqrt(fit.residualSumOfSquares / degreesOfFreedom) : null;
  const estimates = columns.map((_, j) => {
    const unit = columns.map((__, k) => (k === j ? 1 : 0));
    const uncertainty =
      deviation === null ? null : deviation * Math.sqrt(combinationVariance(fit.factor, unit));
    return withStudentLimits(fit.coefficients[j], uncertainty, degreesOfFreedom);
  });
  return {
    orders: estimates.slice(0, -1),
    rateCoefficient: fromLogarithm(estimates[unknowns - 1]),
    residualDeviation: deviation,
  };
}

const logarithms = (numbers: Float64Array, weights: Float64Array): Float64Array =>
  numbers.map((x, i) => weights[i] * Math.log(x));

function fromLogarithm({ value, standardUncertainty, lower, upper, degreesOfFreedom }: Estimate): Estimate {
  const back = Math.exp(value);
  return {
    value: back,
    standardUncertainty: standardUncertainty === null ? null : back * standardUncertainty,
    lower: lower === null ? null : Math.exp(lower),
    upper: upper === null ? null : Math.exp(upper),
    degreesOfFreedom,
  };
}

function requireAboveZero(numbers: Float64Array, name: string): void {
  const place = numbers.findIndex((x) => !(x > 0 && Number.isFinite(x)));
  if (place >= 0)
    throw new InvalidInput(`${name} must be above 0: run ${place + 1} (${shown(numbers[place])})`);
}

/** @throws NotDetermined naming the reactant whose order cannot be told */
function requireVaried(concentrations: readonly Float64Array[], { factor }: LinearFit): void {
  const same = concentrations.findIndex((column) => column.every((c) => c === column[0]));
  if (same >= 0) {
    throw new NotDetermined(
      `the order in reactant ${same + 1} needs runs in which it differs: all have ${shown(concentrations[same][0])}`,
    );
  }
  if (factor.isDeficient) {
    throw new NotDetermined(
      'the orders cannot be told apart: two reactants, or more, were always changed together',
    );
  }
}

/** Orders that reactions commonly have. */
export const commonOrders = [-2, -1, -0.5, 0, 0.5, 1, 1.5, 2, 3] as const;

/**
 * The simple order nearest to an estimate, where its 95 % limits hold it; `null` otherwise.
 *
 * @example nearestSimpleOrder({ value: 1.04, standardUncertainty: 0.05, lower: 0.93, upper: 1.15, degreesOfFreedom: 8 }) // 1
 */
export function nearestSimpleOrder({ value, lower, upper }: Estimate): number | null {
  const nearest = commonOrders.reduce((best, order) =>
    Math.abs(order - value) < Math.abs(best - value) ? order : best,
  );
  if (lower === null || upper === null) return null;
  return lower <= nearest && nearest <= upper ? nearest : null;
}
