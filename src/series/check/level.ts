import { shown } from '../../errors';
import type { Course } from './course';
import type { Finding } from './finding';
import { limitFor, median, spread } from './scatter';
import { lineThrough } from './straight';
import { roughly } from './words';

/**
 * A run in which nothing happens.
 *
 * Rule: all readings are equal; or, with enough of them, they have no trend ({@link hasTrend}), none is far from all others, and they scatter about a
 * straight line no more than one and a half times as much as about the curve through their neighbours.
 */
export function level({ series, scatter }: Course, isLong: boolean): Finding | null {
  const { values } = series;
  const count = values.length;
  if (count < 2) return null;
  const line = lineThrough(series, 0, count);
  const isEqual = spread(values) === 0;
  if (!isEqual) {
    if (!isLong || line.scatter === null || line.scatter > 1.5 * scatter) return null;
    if (hasTrend(values) || hasFarReading(values)) return null;
  }
  return {
    kind: 'level',
    places: [],
    finding: isEqual
      ? `all ${count} readings are ${shown(values[0])}`
      : `the readings do not change beyond their scatter: they stay at ${roughly(line.level)}`,
    meaning: 'no rate can be told from 0, and there is no order or half life',
    advice: 'follow the run longer, read more finely, or make sure that the right column was taken',
  };
}

/**
 * More pairs rise than fall, or fewer, than chance allows at 5 %, two-sided: whatever the shape of the course.
 *
 * @see H. B. Mann, Econometrica 13 (1945) 245, doi:10.2307/1907187 (normal approximation)
 */
function hasTrend(values: Float64Array): boolean {
  const stride = Math.ceil(values.length / 300);
  const chosen = values.filter((_, i) => i % stride === 0);
  let rising = 0;
  chosen.forEach((value, i) => {
    for (let k = 0; k < i; k++) rising += Math.sign(value - chosen[k]);
  });
  const n = chosen.length;
  return Math.abs(rising) > 1.96 * Math.sqrt((n * (n - 1) * (2 * n + 5)) / 18);
}

/** One reading far from all others, such as the first of a reaction that was over at the second. */
function hasFarReading(values: Float64Array): boolean {
  const middle = median([...values]);
  const distances = Array.from(values, (value) => Math.abs(value - middle));
  const far = limitFor(values.length) * 1.4826 * median(distances);
  return distances.some((distance) => distance > far);
}
