/**
 * One step of the Rosenbrock method {@link ./rodas5p}, for a system and, beside it, its sensitivities.
 *
 * The sensitivity equations are one larger system whose Jacobian is block triangular, so that every
 * parameter is carried along with the factors of the system's own matrix, at the full order.
 */
import { factorLu, solveLu } from './lu';
import { couplings, densities, gamma, positions, stages } from './rodas5p';
import type { SensitiveSystem } from './stiffSystem';

/** A point on the way: the state, and one sensitivity a parameter. */
export type Blocks = readonly Float64Array[];

/** @example newBlocks(2, 1)[0] // Float64Array [0, 0] */
export const newBlocks = (size: number, count: number): Blocks =>
  Array.from({ length: count }, () => new Float64Array(size));

export class RosenbrockStep {
  /** After {@link attempt}: the point a step further on. */
  readonly next: Blocks;
  /** After {@link attempt}: by how much it may be off. */
  readonly error: Blocks;

  private readonly blocks: number;
  private readonly increments: readonly Blocks[];
  private readonly trial: Blocks;
  private readonly right: Float64Array;
  private readonly jacobian: Float64Array;
  private readonly factors: Float64Array;
  private readonly pivots: Int32Array;
  private readonly dense: readonly Blocks[];
  private isDenseReady = false;

  /** @param parameters places of those whose sensitivities are carried along */
  constructor(
    private readonly system: SensitiveSystem,
    private readonly parameters: readonly number[],
  ) {
    const { size } = system;
    const blocks = 1 + parameters.length;
    this.blocks = blocks;
    this.next = newBlocks(size, blocks);
    this.trial = newBlocks(size, blocks);
    this.increments = Array.from({ length: stages }, () => newBlocks(size, blocks));
    this.error = this.increments[stages - 1];
    this.dense = densities.map(() => newBlocks(size, blocks));
    this.right = new Float64Array(size);
    this.jacobian = new Float64Array(size * size);
    this.factors = new Float64Array(size * size);
    this.pivots = new Int32Array(size);
  }

  /** To be called once at every new point, before the first attempt from there. */
  leave(from: Blocks): void {
    this.system.jacobian(from[0], this.jacobian);
  }

  /** @returns false where the step cannot be taken at this length */
  attempt(from: Blocks, step: number): boolean {
    const { size } = this.system;
    this.isDenseReady = false;
    for (let i = 0; i < size * size; i++) this.factors[i] = -this.jacobian[i];
    for (let i = 0; i < size; i++) this.factors[i * size + i] += 1 / (step * gamma);
    if (!factorLu(this.factors, size, this.pivots)) return false;
    for (let stage = 0; stage < stages; stage++) {
      for (let block = 0; block < this.blocks; block++) this.place(from, stage, block);
      for (let block = 0; block < this.blocks; block++) this.solve(from, stage, block, step);
    }
    const last = this.increments[stages - 1];
    for (let block = 0; block < this.blocks; block++) {
      for (let i = 0; i < size; i++) this.next[block][i] = this.trial[block][i] + last[block][i];
    }
    return true;
  }

  /** The point where a stage looks at the system. */
  private place(from: Blocks, stage: number, block: number): void {
    const trial = this.trial[block];
    const start = from[block];
    const weights = positions[stage];
    for (let i = 0; i < trial.length; i++) {
      let sum = start[i];
      for (let j = 0; j < stage; j++) sum += weights[j] * this.increments[j][block][i];
      trial[i] = sum;
    }
  }

  private solve(from: Blocks, stage: number, block: number, step: number): void {
    const { system, right, trial, increments } = this;
    if (block === 0) system.derivative(trial[0], right);
    else {
      const parameter = this.parameters[block - 1];
      system.sensitivitySlope(trial[0], trial[block], parameter, right);
      system.addSensitivityCurvature(from[0], from[block], parameter, increments[stage][0], right);
    }
    const weights = couplings[stage];
    const increment = increments[stage][block];
    for (let i = 0; i < increment.length; i++) {
      let sum = 0;
      for (let j = 0; j < stage; j++) sum += weights[j] * increments[j][block][i];
      increment[i] = right[i] + sum / step;
    }
    solveLu(this.factors, system.size, this.pivots, increment);
  }

  /**
   * The point a share of the last step on.
   *
   * @param share from 0 to 1
   */
  between(from: Blocks, share: number, block: number, out: Float64Array): void {
    if (!this.isDenseReady) this.prepareDense();
    const [first, second, third] = this.dense;
    const rest = 1 - share;
    for (let i = 0; i < out.length; i++) {
      const bend = first[block][i] + share * (second[block][i] + share * third[block][i]);
      out[i] = rest * from[block][i] + share * (this.next[block][i] + rest * bend);
    }
  }

  private prepareDense(): void {
    densities.forEach((weights, row) => {
      for (let block = 0; block < this.blocks; block++) {
        const out = this.dense[row][block].fill(0);
        for (let stage = 0; stage < stages; stage++) {
          const increment = this.increments[stage][block];
          for (let i = 0; i < out.length; i++) out[i] += weights[stage] * increment[i];
        }
      }
    });
    this.isDenseReady = true;
  }
}
