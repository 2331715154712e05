/** A run with its odd readings set aside, as the findings about its course see it. */
import type { Series } from '../series';
import { readingsForScatter, scatterOf } from './scatter';

export interface Course {
  readonly series: Series;
  /** Standard deviation of one reading. */
  readonly scatter: number;
  /** +1 where the run as a whole rises, −1 where it falls, 0 where it ends as it began. */
  readonly direction: -1 | 0 | 1;
}

export const courseOf = (series: Series): Course => ({
  series,
  scatter: scatterOf(series),
  direction: directionOf(series),
});

/** Enough readings to tell the course from the scatter. */
export const isLong = ({ series }: Course): boolean =>
  series.times.length >= readingsForScatter && series.distinctTimes >= readingsForScatter;

/** By the furthest departure from the first reading, so that a reaction that is over early still counts. */
function directionOf({ values }: Series): -1 | 0 | 1 {
  let furthest = 0;
  for (const value of values) {
    if (Math.abs(value - values[0]) > Math.abs(furthest)) furthest = value - values[0];
  }
  return furthest > 0 ? 1 : furthest < 0 ? -1 : 0;
}
