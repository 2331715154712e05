/** A rate law fitted to a run: rate coefficient, half life and order with their uncertainties. */
import { InvalidInput, NotDetermined, requireFinite, shown } from '../errors';
import { combinationVariance, factorQr, type QrFactor } from '../numerics/qr';
import { requireDistinctTimes, trend, type Series } from '../series/series';
import { reducedHalfLife, shareOrderSlope, shareSlope } from './law';
import { startRate } from './linearised';
import { ReducedFit, type ReducedProblem } from './reducedFit';
import { bestOrder, bestRate } from './search';

export interface RateLawOptions {
  /** n, or `"free"` to have it fitted. */
  readonly order: number | 'free';
  /** Reading at infinite time, or `"free"`; left out, 0 for a falling column. */
  readonly endpoint?: number | 'free';
  /** Reading at a time, where it is known beforehand; left out, that at the first time is fitted. Needs a free endpoint. */
  readonly start?: { readonly time: number; readonly value: number };
  /** Standard uncertainty of each reading, up to a common factor. */
  readonly uncertainties?: Float64Array;
}

export interface RateLawFit {
  readonly order: number;
  /** k, from the distance c₀ = |y₀ − y∞| at the first reading: (reading unit)¹⁻ⁿ per time unit. */
  readonly rateCoefficient: number;
  readonly halfLife: number;
  /** y₀ at the first time. */
  readonly start: number;
  /** y∞, fitted or as given. */
  readonly endpoint: number;
  readonly standardUncertainties: {
    readonly rateCoefficient: number | null;
    readonly halfLife: number | null;
    readonly order: number | null;
    readonly start: number | null;
    readonly endpoint: number | null;
  };
  /** Weighted where uncertainties were given. */
  readonly residualSumOfSquares: number;
  readonly residualDeviation: number | null;
  readonly parameters: number;
  readonly degreesOfFreedom: number;
  /** Reading less law, in order of time. */
  readonly residuals: Float64Array;
  /** Share of the reactant left at the last reading. */
  readonly shareLeft: number;
  /** The search's own view, for profile limits. */
  readonly search: { readonly fit: ReducedFit; readonly logRate: number; readonly amplitude: number };
}

/**
 * Fits y(t) = y∞ + (y₀ − y∞)·φ(κt; n) by nonlinear least squares on the untransformed readings.
 *
 * Time counts from the first reading (or from a known start), so that y₀, the half life and κ belong to that moment; k does not
 * depend on it. Standard uncertainties come from the full Jacobian at the optimum and the scatter about
 * the curve.
 *
 * @throws InvalidInput for a call that cannot be meant; NotDetermined when the data cannot tell
 * @see integrated rate laws: IUPAC Gold Book, order of reaction, doi:10.1351/goldbook.O04322
 * @example fitRateLaw(pairReadings([0, 6, 12], [1, 0.5, 0.25]), { order: 1 }).halfLife // 6
 */
export function fitRateLaw(series: Series, options: RateLawOptions): RateLawFit {
  const endpoint = settleEndpoint(series, options);
  if (endpoint !== 'free') requireAhead(series, trend(series), endpoint);
  if (options.order !== 'free') requireFinite({ order: options.order });
  if (options.start !== undefined && endpoint !== 'free') {
    throw new InvalidInput('start can be fixed only when the endpoint is "free"');
  }
  const parameters =
    (options.start === undefined ? 1 : 0) +
    (endpoint === 'free' ? 1 : 0) +
    1 +
    (options.order === 'free' ? 1 : 0);
  requireDistinctTimes(series, parameters, `a fit of ${parameters} parameters`);
  const known = options.start?.value ?? (endpoint === 'free' ? 0 : endpoint);
  const fit = new ReducedFit(reducedProblem(series, options, endpoint, known));
  const { order, logRate } = searched(fit, options.order);
  if (fit.at(logRate, order).amplitude === 0) {
    throw new NotDetermined('rate coefficient cannot be told: the readings do not change');
  }
  return assembled(fit, { order, logRate, parameters, known, endpoint, options });
}

function searched(fit: ReducedFit, order: number | 'free'): { order: number; logRate: number } {
  if (order === 'free') return bestOrder(fit);
  return { order, logRate: bestRate(fit, order, startRate(fit.problem, order)) };
}

/**
 * @throws InvalidInput where a rising or level column comes without an end
 * @example settleEndpoint(pairReadings([0, 1], [5, 3]), {}) // 0
 */
export function settleEndpoint(
  series: Series,
  { endpoint }: Pick<RateLawOptions, 'endpoint'>,
): number | 'free' {
  if (endpoint === 'free') return endpoint;
  if (endpoint !== undefined) {
    requireFinite({ endpoint });
    return endpoint;
  }
  requireDistinctTimes(series, 2, 'a fit');
  if (trend(series) > 0) {
    throw new InvalidInput('a rising column needs its end: give endpoint a number or "free"');
  }
  return 0;
}

function reducedProblem(
  series: Series,
  options: RateLawOptions,
  endpoint: number | 'free',
  known: number,
): ReducedProblem {
  const first = options.start?.time ?? series.times[0];
  if (first > series.times[0])
    throw new InvalidInput(
      `start must not be later than the first reading: ${shown(first)} is after ${shown(series.times[0])}`,
    );
  return {
    times: series.times.map((time) => time - first),
    values: series.values.map((value) => value - known),
    rootWeights: rootWeights(series, options.uncertainties),
    offset: endpoint === 'free' && options.start === undefined,
    shape: options.start === undefined ? 'left' : 'converted',
  };
}

function rootWeights(series: Series, uncertainties?: Float64Array): Float64Array {
  if (!uncertainties) return new Float64Array(series.times.length).fill(1);
  return uncertainties.map((u, i) => {
    if (!(Number.isFinite(u) && u > 0)) {
      throw new InvalidInput(`uncertainties must be above 0: row ${series.places[i] + 1} (${shown(u)})`);
    }
    return 1 / u;
  });
}

/** @throws InvalidInput where the end that was given lies behind the readings */
function requireAhead({ values }: Series, direction: -1 | 0 | 1, endpoint: number): void {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  if (direction === 0 || Math.sign(endpoint - mean) === direction) return;
  throw new InvalidInput(
    direction > 0
      ? `endpoint must lie ahead of the readings: they rise, and ${shown(endpoint)} is not above their mean of ${shown(mean)}`
      : `endpoint must lie ahead of the readings: they fall, and ${shown(endpoint)} is not below their mean of ${shown(mean)}`,
  );
}

interface Found {
  readonly order: number;
  readonly logRate: number;
  readonly parameters: number;
  readonly known: number;
  readonly endpoint: number | 'free';
  readonly options: RateLawOptions;
}

function assembled(fit: ReducedFit, found: Found): RateLawFit {
  const { order, logRate, parameters, known, endpoint, options } = found;
  const { amplitude, base, residualSumOfSquares } = fit.at(logRate, order);
  const left = fit.problem.shape === 'left';
  const start = left ? known + base + amplitude : known;
  const end = left ? known + base : known + amplitude;
  const residuals = fit.copyResiduals();
  const shape = fit.copyShape();
  const last = shape[shape.length - 1];
  const degreesOfFreedom = residuals.length - parameters;
  const deviation = degreesOfFreedom > 0 ? Math.sqrt(residualSumOfSquares / degreesOfFreedom) : null;
  const logCoefficient = logRate + (1 - order) * Math.log(Math.abs(amplitude));
  const rateCoefficient = Math.exp(logCoefficient);
  const halfLife = reducedHalfLife(order) / Math.exp(logRate);
  return {
    order,
    rateCoefficient,
    halfLife,
    start,
    endpoint: end,
    standardUncertainties: uncertaintiesOf(
      fit,
      { order, logRate, amplitude, rateCoefficient, halfLife, deviation },
      {
        endpointIsFree: endpoint === 'free',
        orderIsFree: options.order === 'free',
      },
    ),
    residualSumOfSquares,
    residualDeviation: deviation,
    parameters,
    degreesOfFreedom,
    residuals,
    shareLeft: left ? last : 1 - last,
    search: { fit, logRate, amplitude },
  };
}

interface Optimum {
  order: number;
  logRate: number;
  amplitude: number;
  rateCoefficient: number;
  halfLife: number;
  deviation: number | null;
}

/** From the full Jacobian in (A, ln κ, [b], [n]), carried to k, t½, y₀ and y∞ to first order. */
function uncertaintiesOf(
  fit: ReducedFit,
  { order, logRate, amplitude, rateCoefficient, halfLife, deviation }: Optimum,
  { endpointIsFree, orderIsFree }: { endpointIsFree: boolean; orderIsFree: boolean },
): RateLawFit['standardUncertainties'] {
  if (deviation === null)
    return { rateCoefficient: null, halfLife: null, order: null, start: null, endpoint: null };
  const { offset, shape } = fit.problem;
  const factor = jacobian(fit, order, logRate, amplitude, orderIsFree);
  if (factor.isDeficient) {
    throw new NotDetermined('parameters cannot be told apart: another set fits the readings as well');
  }
  const gradient = (a: number, logK: number, b: number, n: number): number[] => [
    a,
    logK,
    ...(offset ? [b] : []),
    ...(orderIsFree ? [n] : []),
  ];
  const uncertainty = (g: number[]): number => deviation * Math.sqrt(combinationVariance(factor, g));
  const perOrder = halfLifeOrderSlope(order);
  return {
    rateCoefficient:
      rateCoefficient * uncertainty(gradient((1 - order) / amplitude, 1, 0, -Math.log(Math.abs(amplitude)))),
    halfLife: halfLife * uncertainty(gradient(0, -1, 0, perOrder)),
    order: orderIsFree ? uncertainty(gradient(0, 0, 0, 1)) : null,
    start: shape === 'left' ? uncertainty(gradient(1, 0, 1, 0)) : null,
    endpoint: endpointIsFree
      ? uncertainty(shape === 'left' ? gradient(0, 0, 1, 0) : gradient(1, 0, 0, 0))
      : null,
  };
}

/** d ln(κ t½)/dn, by central difference of a smooth function whose own digits are all kept. */
function halfLifeOrderSlope(order: number): number {
  const h = 1e-4;
  return (Math.log(reducedHalfLife(order + h)) - Math.log(reducedHalfLife(order - h))) / (2 * h);
}

function jacobian(
  fit: ReducedFit,
  order: number,
  logRate: number,
  amplitude: number,
  orderIsFree: boolean,
): QrFactor {
  const { times, rootWeights, offset, shape } = fit.problem;
  const g = fit.at(logRate, order).copyShape();
  const rows = times.length;
  const columns = 2 + (offset ? 1 : 0) + (orderIsFree ? 1 : 0);
  const design = new Float64Array(rows * columns);
  const rate = Math.exp(logRate);
  const sign = shape === 'left' ? 1 : -1;
  for (let i = 0; i < rows; i++) {
    const s = rate * times[i];
    const share = shape === 'left' ? g[i] : 1 - g[i];
    const w = rootWeights[i];
    design[i] = w * g[i];
    design[rows + i] = w * sign * amplitude * shareSlope(s, order, share);
    if (offset) design[2 * rows + i] = w;
    if (orderIsFree)
      design[(columns - 1) * rows + i] = w * sign * amplitude * shareOrderSlope(s, order, share);
  }
  return factorQr(design, rows, columns);
}
