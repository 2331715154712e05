import { emptyLocalFit, fitLocalPolynomial, nearestWindow } from './localPolynomial';
import type { Series } from '../series/series';

export interface Scatter {
  /** Of a single reading. */
  readonly variance: number;
  readonly degreesOfFreedom: number;
}

/**
 * Scatter of single readings about local polynomials, pooled over the run: Σ e²/Σ(1 − h), where e is a reading
 * less the polynomial of the window nearest to it and h that reading's own weight in it. Σ(1 − h) counts the
 * degrees of freedom.
 *
 * @param points in each window
 * @see C. Loader, Local Regression and Likelihood (1999), 2.3
 * @example scatterAlong(pairReadings([0, 1, 2, 3, 4], [0, 1, 4, 9, 16]), 5, 2).degreesOfFreedom // 2
 */
export function scatterAlong({ times, values }: Series, points: number, degree: number): Scatter {
  const fit = emptyLocalFit();
  let squares = 0;
  let freedom = 0;
  for (let i = 0, first = 0; i < times.length; i++) {
    first = nearestWindow(times, points, times[i], first);
    fitLocalPolynomial(times, values, first, points, degree, times[i], fit);
    squares += (values[i] - fit.value) ** 2;
    freedom += 1 - fit.valueVariance;
  }
  return { variance: squares / freedom, degreesOfFreedom: freedom };
}
