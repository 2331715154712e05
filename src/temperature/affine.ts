import type { Estimate } from '../estimate';

/**
 * factor × estimate + offset, exact constants both: the limits change sides with the sign of the factor.
 *
 * @example affine({ value: 2, standardUncertainty: 1, lower: 0, upper: 4, degreesOfFreedom: 3 }, -1).upper // 0
 */
export function affine(estimate: Estimate, factor: number, offset = 0): Estimate {
  const move = (value: number | null): number | null => (value === null ? null : factor * value + offset);
  const [lower, upper] = [move(estimate.lower), move(estimate.upper)];
  return {
    value: factor * estimate.value + offset,
    standardUncertainty:
      estimate.standardUncertainty === null ? null : Math.abs(factor) * estimate.standardUncertainty,
    lower: factor < 0 ? upper : lower,
    upper: factor < 0 ? lower : upper,
    degreesOfFreedom: estimate.degreesOfFreedom,
  };
}
