import type { Series } from '../series';

/** The readings of a series for which something holds. */
export function keeping(series: Series, holds: (i: number) => boolean): Series {
  const kept = [...series.times.keys()].filter(holds);
  const times = Float64Array.from(kept, (i) => series.times[i]);
  return {
    times,
    values: Float64Array.from(kept, (i) => series.values[i]),
    places: Int32Array.from(kept, (i) => series.places[i]),
    distinctTimes: new Set(times).size,
  };
}

export const without = (series: Series, left: { has(i: number): boolean }): Series =>
  keeping(series, (i) => !left.has(i));
