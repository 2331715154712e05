/** A fitted rate law as a curve. */
import { NotDetermined, shown } from '../errors';
import type { Series } from '../series/series';
import type { RateLawFit } from './fit';
import { shareLeft } from './law';

/**
 * Height of the fitted law at a time.
 *
 * @param time at or after the first reading; beyond the last one it predicts
 * @returns in the unit of the readings
 * @throws NotDetermined before the first reading, to which the law need not reach back
 * @example heightAt(fitRateLaw(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }), pairReadings([0, 1, 2], [4, 2, 1]), 3) // 0.5
 */
export function heightAt(fit: RateLawFit, { times }: Series, time: number): number {
  if (time < times[0]) {
    throw new NotDetermined(
      `the law holds from the first reading on, at ${shown(times[0])}: ${shown(time)} is earlier`,
    );
  }
  const rate = Math.exp(fit.search.logRate);
  return fit.endpoint + (fit.start - fit.endpoint) * shareLeft(rate * (time - times[0]), fit.order);
}
