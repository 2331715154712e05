import { shown } from '../../errors';
import type { Series } from '../series';
import type { Finding } from './finding';
import { bendBeyondScatter, expectedReading, type Side } from './neighbours';
import { limitFor, readingsForScatter, scatterOf, spread } from './scatter';
import { without } from './subset';
import { counted, listed, roughly } from './words';

export interface Outlier {
  /** Row of the columns given. */
  readonly place: number;
  readonly value: number;
  /** Reading less what its neighbours lead to. */
  readonly distance: number;
  /** That distance in standard deviations of scatter. */
  readonly deviations: number;
}

/** More than one reading in six cannot be the odd ones out: then the scatter itself is that large. */
const largestShare = 1 / 6;

/** Each look takes the worst away and looks again, since a bad reading hides others beside it. */
const looks = 5;

/**
 * Readings off the curve that their neighbours make.
 *
 * Rule: leave the reading out and draw a quadratic through its eight nearest neighbours. The reading is an
 * outlier when it lies off it by more than scatter ({@link limitFor}) and bend explain. How far the curve
 * can be trusted where the course bends is told by one of higher degree. Scatter is judged over the whole
 * run and among the neighbours, and the larger counts: where the course breaks off, or where readings
 * scatter more, the neighbours themselves lie off their curve.
 *
 * @see leaving out: R. D. Cook and S. Weisberg, Residuals and Influence in Regression (1982), 2.2
 */
export function outliersIn(series: Series): Outlier[] {
  let left = series;
  const found: Outlier[] = [];
  for (let look = 0; look < looks && left.times.length >= readingsForScatter; look++) {
    const worst = worstIn(left);
    if (worst.size === 0) break;
    found.push(...worst.values());
    left = without(left, worst);
  }
  return found.length <= Math.max(1, largestShare * series.times.length)
    ? found.sort((a, b) => a.place - b.place)
    : [];
}

/** So many of the furthest are judged by the scatter of the rest, which they may have swollen. */
const closerLooks = 3;

/** Of a longer run a few bad readings cannot swell the median. */
const longRun = 500;

/** The rest leaves out, too, what lies this far off. */
const suspect = 3;

/** Those beyond the limit that stand out more than every reading close by, which they may have spoilt. */
function worstIn(series: Series): Map<number, Outlier> {
  const common = scatterOf(series);
  const limit = limitFor(series.times.length);
  const seen = [...series.times.keys()]
    .flatMap((i) => {
      const outlier = judged(series, i, common);
      return outlier ? [{ i, outlier }] : [];
    })
    .sort((a, b) => b.outlier.deviations - a.outlier.deviations);
  const suspects = seen.filter(({ outlier }) => outlier.deviations > suspect).map(({ i }) => i);
  const isShort = series.times.length <= longRun;
  const beyond = new Map<number, Outlier>();
  seen.forEach(({ i, outlier }, rank) => {
    const rest =
      isShort && rank < closerLooks ? scatterOf(without(series, new Set([...suspects, i]))) : common;
    const closer = rest < common ? judged(series, i, rest) : outlier;
    if (closer && closer.deviations > limit) beyond.set(i, closer);
  });
  const reach = 4;
  return new Map(
    [...beyond].filter(([i, { deviations }]) =>
      Array.from({ length: 2 * reach + 1 }, (_, k) => beyond.get(i - reach + k)).every(
        (rival) => !rival || rival.deviations <= deviations,
      ),
    ),
  );
}

/** How far reading i is off, given the scatter of the run; `null` where that cannot be told. */
function judged(series: Series, i: number, scatter: number): Outlier | null {
  const last = series.times.length - 1;
  const isSteep = (i === 0 && isSteepEnd(series, 0, 1)) || (i === last && isSteepEnd(series, last, last - 1));
  return isSteep ? null : offCurve(series, i, scatter);
}

/** The same, whatever a steep first or last phase might explain. */
export function offCurve(series: Series, i: number, scatter: number): Outlier | null {
  const last = series.times.length - 1;
  const side = i === 0 ? 'after' : i === last ? 'before' : 'both';
  const expected = expectedReading(series, i, side);
  if (!expected) return null;
  const distance = series.values[i] - expected.value;
  const local = Math.max(scatter, expected.scatter ?? 0);
  const clear = Math.max(
    0,
    Math.abs(distance) - allowance(bendBeyondScatter(expected, scatter), distance, side),
  );
  const deviations = clear / (local * Math.sqrt(1 + expected.variance));
  return { place: series.places[i], value: series.values[i], distance, deviations };
}

/** More than this, beside the spread of all other readings, is a lost digit and no steep phase. */
const steepest = 10;

/** A fast first or last phase: the reading at the end lies on the way, only further along than the others lead to. */
function isSteepEnd({ values }: Series, end: number, next: number): boolean {
  const others = end === 0 ? values.subarray(1) : values.subarray(0, end);
  const change = values[end] - values[next];
  const course = values[next] - values[values.length - 1 - end];
  return change * course > 0 && Math.abs(change) < steepest * spread(others);
}

/**
 * How far off the bend alone can put a reading. At an end the curve is drawn beyond its readings: where a
 * higher degree comes closer to the reading, the run may simply end that steeply.
 */
function allowance(bend: number, distance: number, side: Side): number {
  if (side === 'both') return 2 * Math.abs(bend);
  return (bend * distance > 0 ? 10 : 3) * Math.abs(bend);
}

export function outlierFinding(outliers: readonly Outlier[]): Finding | null {
  if (outliers.length === 0) return null;
  const said = outliers.map(
    ({ value, distance }) =>
      `${shown(value)} (${roughly(Math.abs(distance))} too ${distance > 0 ? 'high' : 'low'})`,
  );
  return {
    kind: 'outlier',
    places: outliers.map(({ place }) => place),
    finding: `${counted(outliers.length, 'reading lies', 'readings lie')} far off the curve through the others: ${listed(said)}`,
    meaning: `beyond what the scatter of the run explains (${deviationsInWords(outliers)}): a tangent or fit near it is pulled aside, and its uncertainty grows`,
    advice:
      'look for a cause in the notebook (a slip of the pen, a bubble, a missed moment); with a cause blank the cell and say so, without one keep it and report both results',
  };
}

function deviationsInWords(outliers: readonly Outlier[]): string {
  const least = outliers.reduce((smallest, { deviations }) => Math.min(smallest, deviations), Infinity);
  return least > 100 ? 'more than 100 standard deviations' : `at least ${roughly(least)} standard deviations`;
}
