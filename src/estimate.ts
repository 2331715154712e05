import { studentQuantile } from './numerics/studentT';

/** A number that was estimated, with what is known of its uncertainty. */
export interface Estimate {
  readonly value: number;
  /** `null` where the data leave none: no degrees of freedom. */
  readonly standardUncertainty: number | null;
  /** 95 % limits; `null` where the data set none. */
  readonly lower: number | null;
  readonly upper: number | null;
  /** `Infinity` for an uncertainty that was stated, not estimated (GUM type B). */
  readonly degreesOfFreedom: number;
}

/**
 * An estimate with Student's 95 % limits.
 *
 * @param standardUncertainty `null` without degrees of freedom
 * @param degreesOfFreedom `Infinity` for normal limits
 * @example withStudentLimits(10, 1, Infinity).upper // 11.959963984540054
 */
export function withStudentLimits(
  value: number,
  standardUncertainty: number | null,
  degreesOfFreedom: number,
): Estimate {
  if (standardUncertainty === null) {
    return { value, standardUncertainty, lower: null, upper: null, degreesOfFreedom };
  }
  const reach = studentQuantile(0.975, degreesOfFreedom) * standardUncertainty;
  return { value, standardUncertainty, lower: value - reach, upper: value + reach, degreesOfFreedom };
}
