/**
 * What the comparison of orders can honestly say. Evidence is the AICc weight and the free order's
 * interval; how far the run was followed decides whether they may be believed. R² has no say.
 */
import { shown } from '../errors';
import type { Estimate } from '../estimate';
import type { RateLawFit } from './fit';

/** Below this weight an order is set aside: an evidence ratio of about 20 to 1 (common practice). */
const leastWeight = 0.05;

/** Below two half lives neighbouring orders differ less than most readings scatter; three tell them apart (common practice). */
export const halfLivesNeeded = 2;
const halfLivesAdvised = 3;

/** Below this p the residuals run in a pattern. */
const patternProbability = 0.05;

export interface Evidence {
  readonly orders: readonly number[];
  readonly fits: readonly (RateLawFit | null)[];
  readonly weights: readonly (number | null)[];
  readonly freeOrder: Estimate | null;
}

/**
 * Half lives followed, log₂ of the share consumed: 3 when an eighth is left. Infinite when nothing is left.
 *
 * @example halfLivesFollowed(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 })) // 2
 */
export const halfLivesFollowed = (fit: RateLawFit): number => -Math.log2(fit.shareLeft);

const listed = (orders: readonly number[]): string =>
  orders.length < 2
    ? orders.map(shown).join('')
    : `${orders.slice(0, -1).map(shown).join(', ')} or ${shown(orders[orders.length - 1])}`;

/** @example verdicts({ orders: [1], fits: [null], weights: [null], freeOrder: null }) // { simple: [''], free: '' } */
export function verdicts({ orders, fits, weights, freeOrder }: Evidence): { simple: string[]; free: string } {
  const hasWeight = orders.map((_, i) => (weights[i] ?? 0) >= leastWeight);
  const followed = leastFollowed(fits, hasWeight);
  const plausible = orders.filter(
    (order, i) => hasWeight[i] || (freeOrder !== null && includes(freeOrder, order)),
  );
  return {
    simple: orders.map((order, i) =>
      fits[i] ? simpleVerdict(order, weights[i], { plausible, followed, freeOrder }) : '',
    ),
    free: freeVerdict(orders, freeOrder, followed),
  };
}

/**
 * Half lives followed, by the most cautious of the fits that have weight (of all, where none has): with a
 * free endpoint one order can take for the end what another takes for the first half.
 */
function leastFollowed(fits: readonly (RateLawFit | null)[], hasWeight: readonly boolean[]): number {
  const fitted = fits.filter((fit) => fit !== null);
  const weighty = fits.filter((fit, i) => fit !== null && hasWeight[i]) as RateLawFit[];
  const judged = weighty.length > 0 ? weighty : fitted;
  return judged.length === 0 ? 0 : Math.min(...judged.map(halfLivesFollowed));
}

interface Standing {
  /** Orders with weight, and those inside the free order's interval. */
  readonly plausible: readonly number[];
  readonly followed: number;
  readonly freeOrder: Estimate | null;
}

/**
 * An order is called the best only where all three agree: it alone has weight, the free order's interval
 * holds it and no other simple order, and the run was followed far enough. With few readings the weights
 * alone are too sure of themselves, since they do not count the degrees of freedom of the scatter.
 */
function simpleVerdict(
  order: number,
  weight: number | null,
  { plausible, followed, freeOrder }: Standing,
): string {
  if (weight === null) return 'too few readings to weigh the orders';
  if (weight < leastWeight) {
    return plausible.includes(order)
      ? 'fits less well, but lies within what a free order allows'
      : 'fits less well';
  }
  const rivals = plausible.filter((other) => other !== order);
  if (followed < halfLivesNeeded) {
    const others =
      rivals.length > 0 ? `cannot be told from order ${listed(rivals)}` : 'best so far, not established';
    return `${others}: ${followed.toFixed(1)} half lives followed, follow ${halfLivesAdvised} or more`;
  }
  if (rivals.length > 0) return `cannot be told from order ${listed(rivals)}`;
  if (!freeOrder) return 'best of these, but not established: a free order cannot be told';
  if (!includes(freeOrder, order)) {
    return `best of these, but a free order of ${shown(Number(freeOrder.value.toPrecision(3)))} fits better`;
  }
  return 'fits best';
}

const includes = ({ lower, upper }: Estimate, order: number): boolean =>
  (lower === null || lower <= order + 1e-6) && (upper === null || upper >= order - 1e-6);

function freeVerdict(orders: readonly number[], freeOrder: Estimate | null, followed: number): string {
  if (!freeOrder) return '';
  const { lower, upper, degreesOfFreedom } = freeOrder;
  if (degreesOfFreedom === 0) return 'too few readings to set limits to the order';
  if (lower === null || upper === null) return 'the data do not bound the order on both sides';
  const inside = orders.filter((order) => includes(freeOrder, order));
  const range = `95 %: ${lower.toFixed(2)} to ${upper.toFixed(2)}`;
  const short = followed < halfLivesNeeded ? `; only ${followed.toFixed(1)} half lives followed` : '';
  return `${range}, ${inside.length > 0 ? `holds order ${listed(inside)}` : 'holds none of the simple orders'}${short}`;
}

/**
 * Words to add when the residuals run in a pattern; empty otherwise.
 *
 * @example patternInWords(0.01) // '; residuals run in a pattern'
 */
export const patternInWords = (runsProbability: number | null): string =>
  runsProbability !== null && runsProbability < patternProbability ? '; residuals run in a pattern' : '';
