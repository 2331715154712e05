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
const halfLivesNeeded = 2;
const halfLivesAdvised = 3;

/** Below this p the residuals run in a pattern. */
const patternProbability = 0.05;

export interface Evidence {
  readonly orders: readonly number[];
  readonly fits: readonly (RateLawFit | null)[];
  readonly weights: readonly (number | null)[];
  readonly freeOrder: Estimate | null;
}

/** Half lives followed, log₂ of the share consumed: 3 when an eighth is left. Infinite when nothing is left. */
export const halfLivesFollowed = (fit: RateLawFit): number => -Math.log2(fit.shareLeft);

const listed = (orders: readonly number[]): string =>
  orders.length < 2 ? orders.map(shown).join('') : `${orders.slice(0, -1).map(shown).join(', ')} or ${shown(orders[orders.length - 1])}`;

export function verdicts({ orders, fits, weights, freeOrder }: Evidence): { simple: string[]; free: string } {
  const best = indexOfBest(fits);
  const followed = best === -1 ? 0 : halfLivesFollowed(fits[best]!);
  const plausible = orders.filter((_, i) => (weights[i] ?? 0) >= leastWeight);
  return {
    simple: orders.map((order, i) => (fits[i] ? simpleVerdict(order, weights[i], { plausible, followed, freeOrder }) : '')),
    free: freeVerdict(orders, freeOrder, followed),
  };
}

function indexOfBest(fits: readonly (RateLawFit | null)[]): number {
  let best = -1;
  fits.forEach((fit, i) => {
    if (fit && (best === -1 || fit.residualSumOfSquares < fits[best]!.residualSumOfSquares)) best = i;
  });
  return best;
}

interface Standing {
  readonly plausible: readonly number[];
  readonly followed: number;
  readonly freeOrder: Estimate | null;
}

function simpleVerdict(order: number, weight: number | null, { plausible, followed, freeOrder }: Standing): string {
  if (weight === null) return 'too few readings to weigh the orders';
  if (weight < leastWeight) return 'fits less well';
  const rivals = plausible.filter((other) => other !== order);
  if (followed < halfLivesNeeded) {
    const others = rivals.length > 0 ? `cannot be told from order ${listed(rivals)}` : 'best so far, not established';
    return `${others}: ${followed.toFixed(1)} half lives followed, follow ${halfLivesAdvised} or more`;
  }
  if (rivals.length > 0) return `cannot be told from order ${listed(rivals)}`;
  if (freeOrder && !includes(freeOrder, order)) {
    return `best of these, but a free order of ${shown(Number(freeOrder.value.toPrecision(3)))} fits better`;
  }
  return 'fits best';
}

const includes = ({ lower, upper }: Estimate, order: number): boolean =>
  (lower === null || lower <= order + 1e-6) && (upper === null || upper >= order - 1e-6);

function freeVerdict(orders: readonly number[], freeOrder: Estimate | null, followed: number): string {
  if (!freeOrder) return '';
  const { lower, upper } = freeOrder;
  if (lower === null || upper === null) return 'the data do not bound the order on both sides';
  const inside = orders.filter((order) => includes(freeOrder, order));
  const range = `95 %: ${lower.toFixed(2)} to ${upper.toFixed(2)}`;
  const short = followed < halfLivesNeeded ? `; only ${followed.toFixed(1)} half lives followed` : '';
  return `${range}, ${inside.length > 0 ? `holds order ${listed(inside)}` : 'holds none of the simple orders'}${short}`;
}

/** Words to add when the residuals run in a pattern; empty otherwise. */
export const patternInWords = (runsProbability: number | null): string =>
  runsProbability !== null && runsProbability < patternProbability ? '; residuals run in a pattern' : '';
