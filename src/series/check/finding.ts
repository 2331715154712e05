/** What a check found, in words a chemist understands at once. */

/** What spoils a result first stands first. */
export const kindsBySeverity = [
  'error',
  'number as text',
  'no pairs',
  'midnight',
  'zero',
  'step',
  'outlier',
  'time slip',
  'censored',
  'too few',
  'level',
  'turn',
  'drift',
  'plateau',
  'end',
  'induction',
  'conversion',
  'resolution',
  'hole',
  'number read from text',
  'gap',
  'unsorted',
  'replicates',
] as const;

export type FindingKind = (typeof kindsBySeverity)[number];

export interface Finding {
  readonly kind: FindingKind;
  /** Rows of the columns given, counted from 0; empty where it is the run as a whole. */
  readonly places: readonly number[];
  /** What was seen, with its values. */
  readonly finding: string;
  /** What that makes of a rate, an order or a half life. */
  readonly meaning: string;
  /** What to do about it. */
  readonly advice: string;
}

export const bySeverity = (a: Finding, b: Finding): number =>
  kindsBySeverity.indexOf(a.kind) - kindsBySeverity.indexOf(b.kind);
