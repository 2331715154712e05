import { shown } from '../../errors';
import type { Series } from '../series';
import type { Finding } from './finding';
import { expectedReading, type Expectation } from './neighbours';
import { limitFor, readingsForScatter, scatterOf } from './scatter';
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

/** The last look takes the worst away and looks again, since a bad reading hides others beside it. */
const looks = 5;

/**
 * Readings off the curve that their neighbours make.
 *
 * Rule: leave the reading out; draw a quadratic through its nearest neighbours on both sides, another
 * through those before it, another through those after it. The reading is an outlier when it is beyond
 * the scatter ({@link limitFor}) of all three, so that a kink or a step in the course is none. How far
 * the three can be trusted where the course bends is told by a curve of higher degree. Scatter is judged
 * over the whole run and beside the reading, and the larger counts.
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

/** Those beyond the limit that stand out more than every reading close by, which they may have spoilt. */
function worstIn(series: Series): Map<number, Outlier> {
  const scatter = scatterOf(series);
  const limit = limitFor(series.times.length);
  const beyond = new Map<number, Outlier>();
  for (let i = 0; i < series.times.length; i++) {
    const outlier = judged(series, i, scatter);
    if (outlier && outlier.deviations > limit) beyond.set(i, outlier);
  }
  const reach = 4;
  const worst = new Map<number, Outlier>();
  for (const [i, outlier] of beyond) {
    const rivals = Array.from({ length: 2 * reach + 1 }, (_, k) => beyond.get(i - reach + k));
    if (rivals.every((rival) => !rival || rival.deviations <= outlier.deviations)) worst.set(i, outlier);
  }
  return worst;
}

/** The view of reading i that speaks most for it. */
function judged(series: Series, i: number, scatter: number): Outlier | null {
  const last = series.times.length - 1;
  const isAtEnd = i === 0 || i === last;
  const sides = isAtEnd ? ([i === 0 ? 'after' : 'before'] as const) : (['both', 'before', 'after'] as const);
  let kindest: Outlier | null = null;
  for (const side of sides) {
    const expected = expectedReading(series, i, side);
    if (!expected) continue;
    const distance = series.values[i] - expected.value;
    const local = Math.max(scatter, expected.scatter ?? 0);
    const clear = Math.max(0, Math.abs(distance) - allowance(expected, distance, isAtEnd));
    const deviations = clear / (local * Math.sqrt(1 + expected.variance));
    if (!kindest || deviations < kindest.deviations) {
      kindest = { place: series.places[i], value: series.values[i], distance, deviations };
    }
  }
  return kindest;
}

/**
 * How far off the bend alone can put a reading. At an end the curve is drawn beyond its readings: where a
 * higher degree comes closer to the reading, the run may simply begin or end that steeply.
 */
function allowance({ doubt }: Expectation, distance: number, isAtEnd: boolean): number {
  if (!isAtEnd) return 2 * Math.abs(doubt);
  return (doubt * distance > 0 ? 10 : 3) * Math.abs(doubt);
}

export function outlierFinding(outliers: readonly Outlier[]): Finding | null {
  if (outliers.length === 0) return null;
  const said = outliers.map(({ value, distance }) => `${shown(value)} (${roughly(Math.abs(distance))} too ${distance > 0 ? 'high' : 'low'})`);
  return {
    kind: 'outlier',
    places: outliers.map(({ place }) => place),
    finding: `${counted(outliers.length, 'reading lies', 'readings lie')} far off the curve through the others: ${listed(said)}`,
    meaning: `beyond what the scatter of the run explains (at least ${roughly(Math.min(...outliers.map(({ deviations }) => deviations)))} standard deviations): a tangent or fit near it is pulled aside, and its uncertainty grows`,
    advice: 'look for a cause in the notebook (a slip of the pen, a bubble, a missed moment); with a cause blank the cell and say so, without one keep it and report both results',
  };
}
