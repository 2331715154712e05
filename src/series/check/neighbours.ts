/** Where a reading ought to lie, by its neighbours alone. */
import { emptyLocalFit, fitLocalPolynomial } from '../../rate/localPolynomial';
import type { Series } from '../series';
import { timesApart } from './apart';

export type Side = 'both' | 'before' | 'after';

export interface Expectation {
  readonly value: number;
  /** Variance of `value`, in units of the variance of one reading. */
  readonly variance: number;
  /** What a curve of higher degree would say instead, less `value`: how little the neighbours agree on the bend. */
  readonly doubt: number;
  /** Variance of `doubt`, in the same units: nested least squares, var(a − b) = var(a) − var(b). */
  readonly doubtVariance: number;
  /** Scatter of the neighbours about their curve; `null` where they leave none. */
  readonly scatter: number | null;
}

/** Eight neighbours carry a quadratic, and a rival of higher degree, with readings to spare. */
const neighbourCount = 8;

/** Two degrees for a window: on both sides an even rival, since an odd one changes nothing in the middle. */
function degreesFor(distinct: number, side: Side): readonly [number, number] | null {
  if (side === 'both' && distinct >= 6) return [2, 4];
  if (distinct >= 5) return [2, 3];
  return distinct >= 3 ? [1, 2] : null;
}

const fit = emptyLocalFit();

interface Place {
  /** Time for which the reading is expected. */
  readonly at: number;
  /** The readings that may serve, `end` not among them. */
  readonly first: number;
  readonly end: number;
  /** Those next to `at` on either side; the reading in question is neither. */
  readonly left: number;
  readonly right: number;
  readonly side: Side;
}

/**
 * Fits a quadratic through the nearest readings on the sides asked for, and sets beside it a curve of
 * higher degree through the same readings.
 *
 * @returns `null` where too few readings stand on that side
 */
function expectationFrom(series: Series, place: Place): Expectation | null {
  const { times } = series;
  const { at, first, end, left, right, side } = place;
  let [low, high] = [left, right];
  const lowest = side === 'after' ? left : first - 1;
  const highest = side === 'before' ? right : end;
  while (high - low - 1 - (right - left - 1) < neighbourCount && (low > lowest || high < highest)) {
    const takeLeft = high >= highest || (low > lowest && at - times[low] <= times[high] - at);
    if (takeLeft) low--;
    else high++;
  }
  return throughChosen(series, [...range(low + 1, left + 1), ...range(right, high)], at, side);
}

function throughChosen(
  { times, values }: Series,
  chosen: readonly number[],
  at: number,
  side: Side,
): Expectation | null {
  const [t, y] = [Float64Array.from(chosen, (i) => times[i]), Float64Array.from(chosen, (i) => values[i])];
  const degrees = degreesFor(timesApart(t, at), side);
  if (!degrees) return null;
  const curve = { ...fitLocalPolynomial(t, y, 0, t.length, degrees[0], at, fit) };
  const rival = fitLocalPolynomial(t, y, 0, t.length, degrees[1], at, fit);
  return {
    value: curve.value,
    variance: curve.valueVariance,
    doubt: rival.value - curve.value,
    doubtVariance: Math.max(0, rival.valueVariance - curve.valueVariance),
    scatter:
      curve.degreesOfFreedom > 0 ? Math.sqrt(curve.residualSumOfSquares / curve.degreesOfFreedom) : null,
  };
}

/** The part of the doubt that scatter does not explain: what the bend leaves open, with its sign. */
export function bendBeyondScatter({ doubt, doubtVariance }: Expectation, scatter: number): number {
  return Math.sign(doubt) * Math.max(0, Math.abs(doubt) - 1.5 * scatter * Math.sqrt(doubtVariance));
}

const range = (from: number, to: number): number[] =>
  Array.from({ length: Math.max(0, to - from) }, (_, i) => from + i);

/** What reading i should be, had it not been taken. */
export const expectedReading = (series: Series, i: number, side: Side): Expectation | null =>
  expectationFrom(series, {
    at: series.times[i],
    first: 0,
    end: series.times.length,
    left: i - 1,
    right: i + 1,
    side,
  });

/** What the readings `first … end − 1` make of a time before or after them all. */
export function expectedBeyond(series: Series, at: number, first: number, end: number): Expectation | null {
  const side = at >= series.times[end - 1] ? 'before' : 'after';
  const [left, right] = side === 'before' ? [end - 1, end] : [first - 1, first];
  return expectationFrom(series, { at, first, end, left, right, side });
}
