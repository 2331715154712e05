/** How far long work is, told while it goes on. It changes nothing of what is worked out. */
export interface Progress {
  /** What is being done now, in words: `run 5 of 96`. */
  readonly doing: string;
  /** Of the whole, from 0 to 1; left out where nobody can tell. */
  readonly share?: number;
}

export type Tell = (progress: Progress) => void;

/**
 * The next of several things that take about as long each.
 *
 * @example nthOf('run', 4, 8).share // 0.5
 */
export const nthOf = (what: string, place: number, count: number): Progress => ({
  doing: `${what} ${place + 1} of ${count}`,
  share: place / count,
});
