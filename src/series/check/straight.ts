/** Straight lines through the last readings of a run, however many, each at the cost of one more reading. */
import type { Series } from '../series';

export interface Line {
  /** The first reading on it; it goes on to the last. */
  readonly first: number;
  readonly count: number;
  /** Mean time, and the height of the line there. */
  readonly centre: number;
  readonly level: number;
  readonly slope: number;
  /** Standard deviation of the slope, in units of one reading's. */
  readonly slopeDeviation: number;
  /** Standard deviation of the readings about the line; `null` for two. */
  readonly scatter: number | null;
}

/** The line through readings `first … end − 1`, by sums about their own means. */
export function lineThrough({ times, values }: Series, first: number, end: number): Line {
  const count = end - first;
  let [meanTime, meanValue] = [0, 0];
  for (let i = first; i < end; i++) {
    meanTime += (times[i] - meanTime) / (i - first + 1);
    meanValue += (values[i] - meanValue) / (i - first + 1);
  }
  let [tt, ty, yy] = [0, 0, 0];
  for (let i = first; i < end; i++) {
    const [t, y] = [times[i] - meanTime, values[i] - meanValue];
    tt += t * t;
    ty += t * y;
    yy += y * y;
  }
  const slope = tt > 0 ? ty / tt : 0;
  return {
    first,
    count,
    centre: meanTime,
    level: meanValue,
    slope,
    slopeDeviation: tt > 0 ? 1 / Math.sqrt(tt) : Infinity,
    scatter: count > 2 ? Math.sqrt(Math.max(0, yy - slope * ty) / (count - 2)) : null,
  };
}

/** Where a line could begin: every reading of a short run, a few hundred evenly chosen ones of a long run. */
export function possibleStarts(from: number, to: number): number[] {
  const stride = Math.max(1, Math.ceil((to - from) / 300));
  const starts: number[] = [];
  for (let first = from; first <= to; first += stride) starts.push(first);
  return starts;
}
