/**
 * How large an error each number of a state may have. It follows the number's own size, so that a trace
 * beside a large amount keeps its digits; what has died away to nothing is let go.
 */
import type { Blocks } from './rosenbrockStep';

/** Below this share of its own highest value a number loses its claim to the relative tolerance. */
const shareOfOwnPeak = 1e-9;

/** Below this share of the highest value of all, a number counts as nothing. */
const shareOfAll = 1e-13;

/** Sensitivities serve a search and its uncertainties, which need fewer digits. */
const sensitivityTolerance = 1e-6;

export class ToleranceScale {
  private readonly peaks: Float64Array;
  private highest = 0;

  constructor(
    start: Float64Array,
    private readonly tolerance: number,
  ) {
    this.peaks = new Float64Array(start.length);
    this.follow(start);
  }

  /** To be told of every point that the integration has reached. */
  follow(state: Float64Array): void {
    for (let i = 0; i < state.length; i++) {
      const size = Math.abs(state[i]);
      if (size > this.peaks[i]) this.peaks[i] = size;
      if (size > this.highest) this.highest = size;
    }
  }

  /**
   * The largest error of a step as a multiple of what is allowed; above 1 the step must be shorter.
   * `Infinity` where a number has run away, or has gone below 0 by more than its allowance.
   */
  errorOf(from: Blocks, next: Blocks, error: Blocks): number {
    let largest = 0;
    for (let i = 0; i < next[0].length; i++) {
      const floor = this.floorOf(i, Math.abs(next[0][i]));
      const allowed = this.tolerance * (Math.max(Math.abs(from[0][i]), Math.abs(next[0][i])) + floor);
      if (next[0][i] < -100 * allowed) return Infinity;
      largest = Math.max(largest, ratio(error[0][i], allowed));
    }
    for (let block = 1; block < next.length; block++) {
      const tolerance = Math.max(this.tolerance, sensitivityTolerance);
      for (let i = 0; i < next[block].length; i++) {
        const size = Math.max(Math.abs(from[block][i]), Math.abs(next[block][i]), 1e-3 * this.peaks[i]);
        largest = Math.max(largest, ratio(error[block][i], tolerance * (size + this.floorOf(i, 0))));
      }
    }
    return Number.isFinite(largest) ? largest : Infinity;
  }

  private floorOf(i: number, size: number): number {
    return shareOfOwnPeak * Math.max(this.peaks[i], size) + shareOfAll * Math.max(this.highest, size);
  }
}

const ratio = (error: number, allowed: number): number => (error === 0 ? 0 : Math.abs(error) / allowed);
