/** How a run ends: on a level, on a slow drift, or still on its way. */
import { studentQuantile } from '../../numerics/studentT';
import type { Course } from './course';
import { lastFigure, roundingScatter } from './scatter';
import { lineThrough, possibleStarts, type Line } from './straight';

export interface Ending {
  readonly kind: 'plateau' | 'drift';
  readonly line: Line;
}

const readingsOnPlateau = 4;
const readingsOnDrift = 6;
/** Beside the mean rate until then: slower counts as standing still. */
const plateauShare = 0.05;
const driftShare = 0.1;
/** Of the whole change: less is over and done with, even where it can be told from nothing. */
const negligibleShare = 0.005;
/** Of readings about their line, beside the scatter of single readings: more means that it is still bent. */
const straightness = 1.7;

/**
 * Rule for a plateau: four or more last readings through which a straight line runs level, within its 95 %
 * limits or but for 0.5 % of the whole change, and whose slope, even at that limit, is below 5 % of the
 * mean rate until there. A more lenient share would take the long tail of order 2 for an end.
 *
 * Rule for a drift: six or more last readings on a straight line that is clearly not level (99.9 %) yet
 * below 10 % of the mean rate until there. One that goes on in the direction of the run must last twice as
 * long as the run did before and keep its slope, the later half, at its lower limit, half that of the
 * earlier one, at its upper. A reaction that still runs slows down more: between once and three times a
 * moment, one of order 3 to 0.44, and one of lower order further (from its integrated law).
 *
 * The earliest beginning that keeps the rule counts. Common practice, in numbers of our own choosing.
 */
export function endingOf(course: Course): Ending | null {
  const drift = firstLine(course, readingsOnDrift, driftShare, (line) => isDrift(course, line));
  if (drift) return { kind: 'drift', line: drift };
  const plateau = firstLine(course, readingsOnPlateau, plateauShare, (line) => isLevel(course, line));
  return plateau && { kind: 'plateau', line: plateau };
}

function firstLine(
  course: Course,
  least: number,
  share: number,
  holds: (line: Line) => boolean,
): Line | null {
  const { series, scatter } = course;
  const end = series.times.length;
  for (const first of possibleStarts(3, end - least)) {
    const line = lineThrough(series, first, end);
    if (line.scatter === null || line.scatter > straightness * scatter) continue;
    const begin = line.level + line.slope * (series.times[first] - line.centre);
    const before = (begin - series.values[0]) / (series.times[first] - series.times[0]);
    const steepest = Math.abs(line.slope) + reach(course, line, 0.975);
    if (steepest <= share * Math.abs(before) && holds(line)) return line;
  }
  return null;
}

/** So many readings tell their own scatter; fewer lie on a line by chance. */
const readingsForOwnScatter = 6;

/** How far the slope may be off, at a probability. Readings that are all equal leave their last figure open. */
function reach({ scatter, series }: Course, line: Line, probability: number): number {
  const own = line.scatter ?? 0;
  if (line.slope === 0 && own === 0) return lastFigure(series.values) * line.slopeDeviation;
  const floor = line.count < readingsForOwnScatter ? scatter : roundingScatter(series.values);
  const deviation = Math.max(floor, own);
  return studentQuantile(probability, Math.max(1, line.count - 2)) * deviation * line.slopeDeviation;
}

/** Within its limits of level; or so nearly that what is still to come is too little to matter. */
function isLevel(course: Course, line: Line): boolean {
  const { times, values } = course.series;
  const change = Math.abs(line.slope) * (times[times.length - 1] - times[line.first]);
  const isOver = change <= negligibleShare * Math.abs(line.level - values[0]);
  return isOver || Math.abs(line.slope) <= reach(course, line, 0.975);
}

function isDrift(course: Course, line: Line): boolean {
  if (Math.abs(line.slope) <= reach(course, line, 0.9995)) return false;
  if (Math.sign(line.slope) !== course.direction) return true;
  const { series } = course;
  const middle = line.first + (line.count >> 1);
  const earlier = lineThrough(series, line.first, middle);
  const later = lineThrough(series, middle, series.times.length);
  const [high, low] = [
    Math.abs(earlier.slope) + reach(course, earlier, 0.975),
    Math.abs(later.slope) - reach(course, later, 0.975),
  ];
  return isLongAfter(course, line) && Math.sign(later.slope) === course.direction && low > 0.5 * high;
}

/** By three times the time of its beginning a reaction of any order has slowed down visibly. */
const isLongAfter = ({ series: { times } }: Course, { first }: Line): boolean =>
  times[times.length - 1] - times[first] >= 2 * (times[first] - times[0]);
