/** A sheet to hand over: what is typed in it, and what is typed over it afterwards. */
import type { Typed } from '../../engine/book';

export interface Case {
  readonly typed: Typed;
  /** Whether its formulas can be said in built-in functions. */
  readonly becomes: 'live' | 'frozen';
  /** Inputs that someone changes in the copy. */
  readonly changed: Typed;
  /** Left out where the inputs of a frozen formula can be watched. */
  readonly unwatched?: true;
  /** The change is none of those that a flag is raised for. */
  readonly flagStaysDown?: true;
  /** What the copy makes of that: an error, or what PACE makes of it. */
  readonly then?: 'error';
}

export type Cases = Readonly<Record<string, Case>>;
