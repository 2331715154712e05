/** What an integrator asks of a system dy/dt = f(y) that does not depend on time itself. */

export interface StiffSystem {
  /** How many numbers the state has. */
  readonly size: number;
  /** f(y). */
  derivative(state: Float64Array, out: Float64Array): void;
  /** ∂f/∂y, row by row. */
  jacobian(state: Float64Array, out: Float64Array): void;
}

/** One that also knows how its state answers to parameters θ: s = ∂y/∂θ. */
export interface SensitiveSystem extends StiffSystem {
  readonly parameters: number;
  /** ds/dt = J s + ∂f/∂θ. */
  sensitivitySlope(
    state: Float64Array,
    sensitivity: Float64Array,
    parameter: number,
    out: Float64Array,
  ): void;
  /** Derivative of ds/dt with y, along a direction; added to `out`. */
  addSensitivityCurvature(
    state: Float64Array,
    sensitivity: Float64Array,
    parameter: number,
    direction: Float64Array,
    out: Float64Array,
  ): void;
}
