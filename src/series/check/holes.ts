import { shown } from '../../errors';
import type { Course } from './course';
import type { Finding } from './finding';
import { median, spread } from './scatter';
import { listed, percent } from './words';

/** A hole is longer than this many usual intervals, and than this many times the shorter interval beside it. */
const usualIntervals = 3;
const besideIntervals = 4;

/** And this share of the whole change passes in it: half a half life of what is left at the start. */
const leastShare = 0.25;

/**
 * Stretches without readings while the reaction runs. The comparison with the interval beside lets a run
 * pass whose intervals grow steadily, which is good practice.
 *
 * @param known rows that another finding has left out: what they leave is no finding of its own
 */
export function holes({ series }: Course, known: ReadonlySet<number>): Finding | null {
  const { times, values, places } = series;
  const intervals = [...times.keys()].slice(1).map((i) => times[i] - times[i - 1]);
  const apart = intervals.filter((interval) => interval > 0);
  if (apart.length < 4) return null;
  const usual = median(apart);
  const change = spread(values);
  const found = [...intervals.keys()].filter((i) => {
    const beside = [intervals[i - 1], intervals[i + 1]].filter((interval) => interval > 0);
    return (
      intervals[i] > usualIntervals * usual &&
      intervals[i] > besideIntervals * Math.min(...beside) &&
      Math.abs(values[i + 1] - values[i]) >= leastShare * change &&
      !rowsBetween(places[i], places[i + 1]).some((row) => known.has(row))
    );
  });
  if (found.length === 0) return null;
  const said = found.map(
    (i) =>
      `time ${shown(times[i])} to ${shown(times[i + 1])} (${percent(Math.abs(values[i + 1] - values[i]) / change)} of the whole change)`,
  );
  return {
    kind: 'hole',
    places: [...new Set(found.flatMap((i) => [places[i], places[i + 1]]))].sort((a, b) => a - b),
    finding: `no reading for a long while: ${listed(said)}`,
    meaning:
      'tangents near the hole rest on readings from far away, and how the course bends inside it was not seen; fits of the whole run suffer less',
    advice: 'read no tangent there; next time, read at even intervals of time or of change',
  };
}

const rowsBetween = (a: number, b: number): number[] =>
  Array.from({ length: Math.max(0, Math.abs(b - a) - 1) }, (_, k) => Math.min(a, b) + 1 + k);
