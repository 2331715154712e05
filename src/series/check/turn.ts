import { shown } from '../../errors';
import type { Course } from './course';
import type { Finding } from './finding';
import { limitFor, median, spread } from './scatter';

/** Of the spread of the readings: less is no turn to speak of. */
const leastShare = 0.1;

/**
 * A course that turns round. Rule: after the furthest reading, by medians of three so that no single
 * reading decides, the run comes back by more than its scatter ({@link limitFor}) and 10 % of its spread.
 */
export function turn({ series, scatter, direction }: Course): Finding | null {
  const { times, values, places } = series;
  const smooth = Array.from(values, (_, i) => median([...values.subarray(Math.max(0, i - 1), i + 2)]));
  let furthest = 0;
  let back = 0;
  smooth.forEach((value, i) => {
    if (direction * (value - smooth[furthest]) > 0) [furthest, back] = [i, i];
    else if (direction * (value - smooth[back]) < 0) back = i;
  });
  const size = Math.abs(smooth[furthest] - smooth[back]);
  if (size <= Math.max(leastShare * spread(values), limitFor(values.length) * scatter)) return null;
  const [first, then] = direction > 0 ? ['rise', 'fall'] : ['fall', 'rise'];
  return {
    kind: 'turn',
    places: [places[furthest]],
    finding: `the readings ${first} until time ${shown(times[furthest])} (${shown(values[furthest])}) and then ${then} (to ${shown(values[back])})`,
    meaning: `what is followed is first ${direction > 0 ? 'formed and then used up' : 'used up and then formed'}, or the reading depends on more than one substance: no single rate law, order or half life holds for the run`,
    advice:
      'take rates as tangents on either side, each with the coefficient of what happens there; fit a written scheme, not an order',
  };
}
