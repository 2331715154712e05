import { InvalidInput, requireFinite, requirePositive, shown } from '../errors';

/**
 * Reactant left, from product formed: c = c₀ − ratio × formed.
 *
 * Readings scatter, so the end of a run may come out slightly below 0 and is left as it is; beyond 5 %
 * of the start the ratio or the start cannot be right (common practice).
 *
 * @param formed product formed so far
 * @param initial reactant at the start, above 0, in the unit of `formed`
 * @param ratio reactant used per product formed, above 0
 * @returns reactant left, in the same unit
 * @throws InvalidInput outside those ranges
 * @example remainingReactant(0.004, 0.02, 2) // 0.012
 */
export function remainingReactant(formed: number, initial: number, ratio = 1): number {
  requireFinite({ formed });
  requirePositive({ initial, ratio });
  const left = initial - ratio * formed;
  if (left < -0.05 * initial) {
    throw new InvalidInput(
      `product formed × ratio must not exceed initial by more than 5 %: ${shown(formed)} × ${shown(ratio)} is above ${shown(initial)}`,
    );
  }
  return left;
}
