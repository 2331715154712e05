/** The simple orders and the free order side by side. */
import { NotDetermined } from '../errors';
import type { Estimate } from '../estimate';
import { runsTest } from '../numerics/runsTest';
import type { Series } from '../series/series';
import { fitRateLaw, type RateLawFit, type RateLawOptions } from './fit';
import { straightLineFit } from './linearised';
import { orderEstimate, roundingFloor } from './profile';
import { patternInWords, verdicts } from './verdict';

export const simpleOrders = [0, 0.5, 1, 1.5, 2, 3] as const;

export interface OrderRow {
  readonly order: number | null;
  /** `null` with the reason in `why` when this order could not be fitted. */
  readonly fit: RateLawFit | null;
  readonly why: string;
  /** R² of the straight-line plot: shown since people ask for it, and never used. */
  readonly straightLineR2: number | null;
  /** AICc weight among the simple orders; `null` with too few readings, and for the free order. */
  readonly weight: number | null;
  /** p of the runs test on the residuals. */
  readonly runsProbability: number | null;
  readonly verdict: string;
}

export interface OrderTable {
  readonly rows: readonly OrderRow[];
  readonly free: OrderRow;
  /** The free order with its limits, where it could be fitted. */
  readonly freeOrder: Estimate | null;
}

/**
 * AICc from a residual sum of squares, up to a constant of the data: m ln(RSS/m) + 2K + 2K(K+1)/(m−K−1)
 * with K parameters, the scatter counted as one of them.
 *
 * @returns `null` when m − K − 1 leaves nothing
 * @see C. M. Hurvich and C.-L. Tsai, Biometrika 76 (1989) 297, doi:10.1093/biomet/76.2.297
 * @example correctedAic(6, 6, 2) // 18
 */
export function correctedAic(
  residualSumOfSquares: number,
  readings: number,
  parameters: number,
): number | null {
  const k = parameters + 1;
  const spare = readings - k - 1;
  return spare > 0
    ? readings * Math.log(residualSumOfSquares / readings) + 2 * k + (2 * k * (k + 1)) / spare
    : null;
}

/**
 * Shares of the evidence: exp(−Δ/2), summing to 1 over those that have one.
 *
 * @example akaikeWeights([0, null, 2 * Math.log(3)]) // [0.75, null, 0.25]
 */
export function akaikeWeights(criteria: readonly (number | null)[]): (number | null)[] {
  const known = criteria.filter((value): value is number => value !== null);
  const least = Math.min(...known);
  const sum = known.reduce((total, value) => total + Math.exp((least - value) / 2), 0);
  return criteria.map((value) => (value === null ? null : Math.exp((least - value) / 2) / sum));
}

type Attempt = { readonly fit: RateLawFit; readonly why: '' } | { readonly fit: null; readonly why: string };

function attempt(series: Series, options: RateLawOptions): Attempt {
  try {
    return { fit: fitRateLaw(series, options), why: '' };
  } catch (error) {
    if (error instanceof NotDetermined) return { fit: null, why: error.message };
    throw error;
  }
}

/**
 * Fits each simple order and the free order, and says in words what the data can tell.
 *
 * @throws InvalidInput for a call that cannot be meant; NotDetermined when no order can be fitted
 * @example compareOrders(pairReadings([0, 1, 2, 3, 4, 5], [32, 16, 8, 4, 2, 1]), {}).rows[0].verdict // 'fits less well'
 */
export function compareOrders(series: Series, options: Omit<RateLawOptions, 'order'>): OrderTable {
  const attempts = simpleOrders.map((order) => attempt(series, { ...options, order }));
  if (attempts.every(({ fit }) => fit === null)) throw new NotDetermined(attempts[2].why);
  const weights = akaikeWeights(attempts.map(({ fit }) => (fit ? criterion(fit) : null)));
  const free = attempt(series, { ...options, order: 'free' });
  const freeOrder = free.fit ? orderEstimate(free.fit) : null;
  const words = verdicts({ orders: simpleOrders, fits: attempts.map(({ fit }) => fit), weights, freeOrder });
  return {
    rows: attempts.map((tried, i) => row(series, simpleOrders[i], tried, weights[i], words.simple[i])),
    free: row(series, free.fit?.order ?? null, free, null, words.free),
    freeOrder,
  };
}

const criterion = (fit: RateLawFit): number | null =>
  correctedAic(
    Math.max(fit.residualSumOfSquares, roundingFloor(fit.search.fit)),
    fit.residuals.length,
    fit.parameters,
  );

function row(
  series: Series,
  order: number | null,
  { fit, why }: Attempt,
  weight: number | null,
  verdict: string,
): OrderRow {
  const runsProbability = fit ? runsTest(fit.residuals) : null;
  return {
    order,
    fit,
    why,
    straightLineR2: fit ? straightLineFit(series.times, series.values, fit.endpoint, fit.order) : null,
    weight,
    runsProbability,
    verdict: fit ? verdict + patternInWords(runsProbability) : `not fitted: ${why}`,
  };
}
