/** All that can be found about a run, what spoils a result first standing first. */
import { pairReadings, requireOneLength, type Series } from '../series';
import { censored } from './censored';
import { conversion } from './conversion';
import { courseOf, isLong, type Course } from './course';
import { endingOf, type Ending } from './ending';
import { drift, plateau } from './endingFindings';
import { errorCells } from './errorCells';
import { bySeverity, type Finding } from './finding';
import { gaps } from './gaps';
import { holes } from './holes';
import { induction } from './induction';
import { level } from './level';
import { midnight, unrolled } from './midnight';
import { noPairs } from './noPairs';
import { numbersAsText, numbersReadFromText } from './numbersAsText';
import { outlierFinding, outliersIn } from './outliers';
import { numbersIn, type RawRun } from './rawRun';
import { replicates } from './replicates';
import { resolution } from './resolution';
import { stepFinding, stepsIn } from './steps';
import { without } from './subset';
import { tooFew } from './tooFew';
import { turn } from './turn';
import { rowsOutOfOrder, unsorted } from './unsorted';
import { oddZeros, zeroFinding } from './zeros';

type Found = Finding | null;

/**
 * Looks a run over. One cause gives one finding: what an odd cell or reading explains is not found again
 * as the course of the run, and a course that is broken is not asked for its end.
 *
 * @returns none for a clean run, else one finding a cause, in order of severity
 * @throws InvalidInput when the two columns differ in length
 */
export function findings(run: RawRun): readonly Finding[] {
  requireOneLength(run.times, run.values);
  const cells = present([errorCells(run), numbersAsText(run), censored(run), gaps(run)]);
  const nothing = noPairs(run);
  if (nothing) return cells.length > 0 ? cells : [nothing];
  const series = pairReadings(unrolled(numbersIn(run.times)), numbersIn(run.values));
  return present([...cells, numbersReadFromText(run), midnight(run), ...ofReadings(run, series, cells)]);
}

const present = (found: readonly Found[]): Finding[] =>
  found.filter((finding) => finding !== null).sort(bySeverity);

/** Single readings first; the rest is asked of the course without them. */
function ofReadings(run: RawRun, series: Series, cells: readonly Finding[]): Found[] {
  const zeros = new Set(oddZeros(series));
  const nonZero = leaving(series, zeros);
  const outliers = outliersIn(nonZero);
  const odd = new Set(outliers.map(({ place }) => place));
  const misplaced = new Set(rowsOutOfOrder(unrolled(numbersIn(run.times))));
  const known = new Set([...cells.flatMap(({ places }) => places), ...zeros, ...odd]);
  return [
    zeroFinding(series, [...zeros]),
    // a reading whose time is out of order is no outlier: the slip is in the time
    outlierFinding(outliers.filter(({ place }) => !misplaced.has(place))),
    unsorted(run, odd),
    replicates(leaving(series, new Set([...odd].filter((place) => misplaced.has(place))))),
    tooFew(series),
    ...ofCourse(courseOf(leaving(nonZero, odd)), known),
  ];
}

const leaving = (series: Series, rows: ReadonlySet<number>): Series =>
  rows.size === 0 ? series : without(series, { has: (i) => rows.has(series.places[i]) });

function ofCourse(course: Course, known: ReadonlySet<number>): Found[] {
  const { series } = course;
  const canSee = isLong(course);
  const nothingHappens = level(course, canSee);
  if (nothingHappens) return [nothingHappens];
  const gap = holes(course, known);
  if (!canSee) return [gap, conversion(course), resolution(course, undefined)];
  const broken = stepFinding(stepsIn(series));
  if (broken) return [broken, resolution(course, undefined)];
  const ending = endingOf(course);
  const turned = ending ? null : turn(course);
  if (turned) return [turned, gap, resolution(course, undefined)];
  const late = induction(course);
  return [gap, late, ofEnding(course, ending, late !== null), resolution(course, ending?.line.first)];
}

function ofEnding(course: Course, ending: Ending | null, isLate: boolean): Found {
  if (ending) return (ending.kind === 'drift' ? drift : plateau)(course, ending);
  // a rising run with an induction period follows no law that could tell its end
  return isLate && course.direction > 0 ? null : conversion(course);
}
