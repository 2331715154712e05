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
