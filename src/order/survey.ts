/** Many runs at a glance: what each says of order, rate coefficient, half life and initial rate. */
import { InvalidInput, NotDetermined, shown } from '../errors';
import { runsTest } from '../numerics/runsTest';
import { startRateOf } from '../rate/start';
import type { Series } from '../series/series';
import { fitRateLaw, type RateLawFit, type RateLawOptions } from './fit';
import { halfLivesFollowed, halfLivesNeeded, patternInWords } from './verdict';

export interface SurveyedRun {
  /** `null` with the reason among the flags when no law could be fitted. */
  readonly fit: RateLawFit | null;
  readonly initialRate: number | null;
  /** What should make a reader look again, in words; empty when nothing should. */
  readonly flags: readonly string[];
}

/**
 * One run. Never throws: what goes wrong is a flag, so that the others are not lost.
 *
 * @example surveyRun(pairReadings([0, 1, 2], [4, 2, 1]), { order: 1 }).flags // []
 */
export function surveyRun(series: Series, options: RateLawOptions): SurveyedRun {
  const flags: string[] = [];
  const noted = <T>(what: string, work: () => T): T | null => {
    try {
      return work();
    } catch (error) {
      if (!(error instanceof InvalidInput || error instanceof NotDetermined)) throw error;
      flags.push(`${what}: ${error.message}`);
      return null;
    }
  };
  const fit = noted('not fitted', () => fitRateLaw(series, options));
  const initialRate = noted('no initial rate', () => startRateOf(series).value);
  return { fit, initialRate, flags: [...flags, ...(fit ? flagsOf(fit) : [])] };
}

function flagsOf(fit: RateLawFit): string[] {
  const followed = halfLivesFollowed(fit);
  const pattern = patternInWords(runsTest(fit.residuals)).replace(/^; /, '');
  return [
    ...(followed < halfLivesNeeded ? [`only ${followed.toFixed(1)} half lives followed`] : []),
    ...(pattern ? [pattern] : []),
    ...largestOutlier(fit),
  ];
}

/** Beyond this many robust standard deviations a residual is named (common practice). */
const farOut = 5;

function largestOutlier({ residuals }: RateLawFit): string[] {
  const sizes = Array.from(residuals, Math.abs);
  const median = [...sizes].sort((a, b) => a - b)[Math.floor(sizes.length / 2)];
  const largest = Math.max(...sizes);
  // 1.4826: from the median of absolute deviations to a standard deviation (normal scatter)
  if (sizes.length < 6 || largest <= farOut * 1.4826 * median) return [];
  return [
    `reading ${sizes.indexOf(largest) + 1} lies ${shown(Number((largest / (1.4826 * median)).toPrecision(2)))} standard deviations off`,
  ];
}
