/** A fitted rate law as a curve. */
import { NotDetermined, shown } from '../errors';
import type { Series } from '../series/series';
import type { RateLawFit } from './fit';
import { shareLeft } from './law';

/** A rate law with its numbers: all that its curve needs. */
export interface RateLaw {
  readonly order: number;
  /** κ = k c₀ⁿ⁻¹, per time unit. */
  readonly rate: number;
  /** y₀ at the first time. */
  readonly start: number;
  /** y∞. */
  readonly endpoint: number;
  readonly firstTime: number;
}

/**
 * The law that a fit found.
 *
 * @example lawOf(fitRateLaw(pairReadings([5, 6, 7], [4, 2, 1]), { order: 1 }), pairReadings([5, 6, 7], [4, 2, 1])).firstTime // 5
 */
export function lawOf({ order, start, endpoint, search }: RateLawFit, { times }: Series): RateLaw {
  return { order, rate: Math.exp(search.logRate), start, endpoint, firstTime: times[0] };
}

/**
 * Height of the fitted law at a time.
 *
 * @param time at or after the first reading; beyond the last one it predicts
 * @returns in the unit of the readings
 * @throws NotDetermined before the first reading, to which the law need not reach back
 * @example heightAt(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }), pairReadings([0, 1, 2], [4, 2, 1]), 3) // 0.5
 */
export function heightAt(fit: RateLawFit, series: Series, time: number): number {
  const { order, rate, start, endpoint, firstTime } = lawOf(fit, series);
  if (time < firstTime) {
    throw new NotDetermined(
      `the law holds from the first reading on, at ${shown(firstTime)}: ${shown(time)} is earlier`,
    );
  }
  return endpoint + (start - endpoint) * shareLeft(rate * (time - firstTime), order);
}
