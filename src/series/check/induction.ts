import { shown } from '../../errors';
import { emptyLocalFit, fitLocalPolynomial, nearestWindow } from '../../rate/localPolynomial';
import { timesApart } from './apart';
import type { Course } from './course';
import type { Finding } from './finding';
import { limitFor } from './scatter';
import { percent } from './words';

/** A start below this share of the highest rate is an induction period; a little less is no news. */
const largestShare = 0.75;

interface Slope {
  readonly index: number;
  readonly rate: number;
  readonly variance: number;
}

/**
 * A rate that rises at first. Rule: slopes of quadratics over a sixth of the readings (five at least) along
 * the run; the largest, in the direction of the run, lies beyond the first by more than the uncertainty of
 * both ({@link limitFor}), and the first is below three quarters of it.
 */
export function induction(course: Course): Finding | null {
  const { series, scatter } = course;
  const slopes = slopesAlong(course);
  if (slopes.length === 0) return null;
  const fastest = slopes.reduce((best, slope) => (slope.rate > best.rate ? slope : best));
  const [start] = slopes;
  const clear = (fastest.rate - start.rate) / (scatter * Math.sqrt(fastest.variance + start.variance));
  if (fastest === start || start.rate > largestShare * fastest.rate) return null;
  if (clear <= limitFor(series.times.length)) return null;
  const at = shown(series.times[fastest.index]);
  const rises = fastest.index >= series.times.length - 2;
  return {
    kind: 'induction',
    places: [...series.places.subarray(0, fastest.index)].sort((a, b) => a - b),
    finding: `the rate rises at first: at the start it is ${shareInWords(start.rate / fastest.rate)} of that at time ${at}${rises ? ', and it rises to the end' : ''}`,
    meaning:
      'an induction period (warming up, mixing, a catalyst or radical that has to form, a gas that has to saturate the liquid) or a product that speeds the reaction up: an initial rate read at the first time is too low, and no simple order holds from there',
    advice: rises
      ? 'quote no order from this run; find the cause and follow the run further'
      : `state the induction period; take the highest rate, at time ${at}, and fit an order only from there on`,
  };
}

/** At forty times or fewer. */
function slopesAlong({ series, scatter, direction }: Course): Slope[] {
  const { times, values } = series;
  const count = times.length;
  const window = Math.max(5, Math.round(count / 6));
  const stride = Math.max(1, Math.ceil(count / 40));
  const fit = emptyLocalFit();
  const slopes: Slope[] = [];
  for (let index = 0, first = 0; index < count; index += stride) {
    first = nearestWindow(times, window, times[index], first);
    if (timesApart(times.subarray(first, first + window), times[index]) < 4) continue;
    fitLocalPolynomial(times, values, first, window, 2, times[index], fit);
    const own = fit.residualSumOfSquares / fit.degreesOfFreedom / scatter ** 2;
    slopes.push({ index, rate: direction * fit.slope, variance: fit.slopeVariance * Math.max(1, own) });
  }
  return slopes;
}

const shareInWords = (share: number): string => (share < 0.05 ? 'next to nothing' : percent(share));
