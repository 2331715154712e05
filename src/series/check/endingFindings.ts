import { shown } from '../../errors';
import type { Course } from './course';
import type { Ending } from './ending';
import type { Finding } from './finding';
import { lineThrough } from './straight';
import { percent, roughly } from './words';

const placesOf = ({ series }: Course, { line }: Ending): number[] =>
  [...series.places.subarray(line.first)].sort((a, b) => a - b);

/** The readings stand still at the end. */
export function plateau(course: Course, ending: Ending): Finding {
  const { series, direction } = course;
  const { line } = ending;
  const end = roughly(line.level);
  const isUsedUp = direction < 0 && Math.abs(line.level) <= 0.02 * Math.abs(series.values[0] - line.level);
  const since = shown(series.times[line.first]);
  return {
    kind: 'plateau',
    places: placesOf(course, ending),
    finding: `from time ${since} on the readings no longer change beyond their scatter: they stay at ${end}`,
    meaning: isUsedUp
      ? 'the reaction is over there: a tangent gives only scatter, and the readings say nothing more of the order'
      : `the reaction is over there: a tangent gives only scatter${direction < 0 ? `, and an end of 0, taken when none is given, would spoil order, rate coefficient and half life` : ''}`,
    advice: isUsedUp
      ? `draw tangents before time ${since} only`
      : `give ${end}, or "free", as the endpoint of a fit, and draw tangents before time ${since} only`,
  };
}

/** The readings creep on in a straight line after the reaction is over. */
export function drift(course: Course, ending: Ending): Finding {
  const { series, direction } = course;
  const { line } = ending;
  const { times, values } = series;
  const last = times.length - 1;
  // of the later half: the earlier one can hold the last of the reaction
  const { slope } = lineThrough(series, line.first + (line.count >> 1), times.length);
  const crept = slope * (times[last] - times[line.first]);
  const share = Math.abs(crept / (line.level - values[0]));
  const isBack = Math.sign(slope) !== direction;
  return {
    kind: 'drift',
    places: placesOf(course, ending),
    finding: `from time ${shown(times[line.first])} on the readings ${isBack ? 'creep back' : 'creep on'} in a straight line, by ${roughly(slope)} per unit of time (in all ${percent(share)} of the whole change)`,
    meaning: `the reaction is over there, and something else changes the reading (evaporation, temperature, a leak, a lamp, a slow side reaction): the end is blurred, and a rate taken late is that of the drift`,
    advice:
      'find the cause; end the run where the drift begins, or take the drift off all readings if it ran from the start',
  };
}
