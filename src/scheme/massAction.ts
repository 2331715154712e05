/**
 * Mass-action kinetics of a scheme: how fast each species changes, and the derivatives of that which a
 * stiff integrator and its sensitivities need, all analytic and without allocation.
 *
 * A reaction's rate is v = k ∏ c^(coefficient on its left side); each species changes by its net number
 * times v.
 */
import type { SensitiveSystem } from '../numerics/stiffSystem';
import { curvatureOf, powerOf, slopeOf } from './power';
import type { Scheme } from './scheme';

export class MassAction implements SensitiveSystem {
  readonly size: number;
  /** One a rate coefficient. */
  readonly parameters: number;

  private readonly leftStart: Int32Array;
  private readonly leftSpecies: Int32Array;
  private readonly leftOrder: Float64Array;
  private readonly netStart: Int32Array;
  private readonly netSpecies: Int32Array;
  private readonly netNumber: Float64Array;

  /**
   * @param coefficients one a reaction, 0 or more
   * @param floor concentration below which a broken order is smoothed: far below any that matters
   */
  constructor(
    scheme: Scheme,
    readonly coefficients: Float64Array,
    private readonly floor: number,
  ) {
    const { species, reactions } = scheme;
    this.size = species.length;
    this.parameters = reactions.length;
    [this.leftStart, this.leftSpecies, this.leftOrder] = flattened(reactions.map(({ left }) => left));
    [this.netStart, this.netSpecies, this.netNumber] = flattened(reactions.map(({ net }) => net));
  }

  /** dc/dt. */
  derivative(state: Float64Array, out: Float64Array): void {
    out.fill(0, 0, this.size);
    for (let r = 0; r < this.parameters; r++) this.addNet(r, this.rateOf(state, r), out);
  }

  /** ∂(dc/dt)/∂c, row by row. */
  jacobian(state: Float64Array, out: Float64Array): void {
    const { size, leftStart, leftSpecies, netStart, netSpecies, netNumber } = this;
    out.fill(0, 0, size * size);
    for (let r = 0; r < this.parameters; r++) {
      for (let a = leftStart[r]; a < leftStart[r + 1]; a++) {
        const slope = this.rateSlope(state, r, a);
        const column = leftSpecies[a];
        for (let i = netStart[r]; i < netStart[r + 1]; i++) {
          out[netSpecies[i] * size + column] += netNumber[i] * slope;
        }
      }
    }
  }

  /** d/dt of ∂c/∂ln k of one coefficient: J s + ∂(dc/dt)/∂ln k. */
  sensitivitySlope(
    state: Float64Array,
    sensitivity: Float64Array,
    parameter: number,
    out: Float64Array,
  ): void {
    const { leftStart, leftSpecies } = this;
    out.fill(0, 0, this.size);
    for (let r = 0; r < this.parameters; r++) {
      let change = r === parameter ? this.rateOf(state, r) : 0;
      for (let a = leftStart[r]; a < leftStart[r + 1]; a++) {
        change += this.rateSlope(state, r, a) * sensitivity[leftSpecies[a]];
      }
      if (change !== 0) this.addNet(r, change, out);
    }
  }

  /** Derivative of {@link sensitivitySlope} with the state, along a direction; added to `out`. */
  addSensitivityCurvature(
    state: Float64Array,
    sensitivity: Float64Array,
    parameter: number,
    direction: Float64Array,
    out: Float64Array,
  ): void {
    const { leftStart, leftSpecies } = this;
    for (let r = 0; r < this.parameters; r++) {
      let change = 0;
      for (let a = leftStart[r]; a < leftStart[r + 1]; a++) {
        const along = direction[leftSpecies[a]];
        if (along === 0) continue;
        if (r === parameter) change += this.rateSlope(state, r, a) * along;
        for (let b = leftStart[r]; b < leftStart[r + 1]; b++) {
          const own = sensitivity[leftSpecies[b]];
          if (own !== 0) change += this.rateCurvature(state, r, a, b) * along * own;
        }
      }
      if (change !== 0) this.addNet(r, change, out);
    }
  }

  private addNet(r: number, rate: number, out: Float64Array): void {
    const { netStart, netSpecies, netNumber } = this;
    for (let i = netStart[r]; i < netStart[r + 1]; i++) out[netSpecies[i]] += netNumber[i] * rate;
  }

  private rateOf(state: Float64Array, r: number): number {
    return this.coefficients[r] * this.productWithout(state, r, -1, -1);
  }

  private rateSlope(state: Float64Array, r: number, a: number): number {
    const slope = slopeOf(state[this.leftSpecies[a]], this.leftOrder[a], this.floor);
    return this.coefficients[r] * slope * this.productWithout(state, r, a, -1);
  }

  private rateCurvature(state: Float64Array, r: number, a: number, b: number): number {
    const { leftSpecies, leftOrder, floor, coefficients } = this;
    const concentration = state[leftSpecies[a]];
    const factor =
      a === b
        ? curvatureOf(concentration, leftOrder[a], floor)
        : slopeOf(concentration, leftOrder[a], floor) * slopeOf(state[leftSpecies[b]], leftOrder[b], floor);
    return factor === 0 ? 0 : coefficients[r] * factor * this.productWithout(state, r, a, b);
  }

  /** ∏ c^order over the left side, without one or two of its species. */
  private productWithout(state: Float64Array, r: number, one: number, other: number): number {
    const { leftStart, leftSpecies, leftOrder, floor } = this;
    let product = 1;
    for (let a = leftStart[r]; a < leftStart[r + 1]; a++) {
      if (a !== one && a !== other) product *= powerOf(state[leftSpecies[a]], leftOrder[a], floor);
    }
    return product;
  }
}

/** Lists of terms laid end to end: where each begins, the species, the numbers. */
function flattened(
  lists: readonly (readonly { species: number; number: number }[])[],
): [Int32Array, Int32Array, Float64Array] {
  const starts = new Int32Array(lists.length + 1);
  lists.forEach((list, i) => (starts[i + 1] = starts[i] + list.length));
  const all = lists.flat();
  return [
    starts,
    Int32Array.from(all, ({ species }) => species),
    Float64Array.from(all, (term) => term.number),
  ];
}
