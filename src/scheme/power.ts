/**
 * c^n and its derivatives, fit for an integrator: rounding can push a spent species a little below 0, and
 * an order below 1 has an infinite slope at 0, where a straight line from a tiny floor takes its place.
 */

/**
 * c^n.
 *
 * @param floor above 0
 * @example powerOf(3, 2, 1e-15) // 9
 */
export function powerOf(c: number, order: number, floor: number): number {
  if (order === 1) return c;
  if (order === 2) return c * c;
  if (Number.isInteger(order)) return c ** order;
  if (order < 1 && c < floor) return floor ** (order - 1) * c;
  return c > 0 ? c ** order : 0;
}

/**
 * d(c^n)/dc.
 *
 * @example slopeOf(3, 2, 1e-15) // 6
 */
export function slopeOf(c: number, order: number, floor: number): number {
  if (order === 1) return 1;
  if (order === 2) return 2 * c;
  if (Number.isInteger(order)) return order * c ** (order - 1);
  if (order < 1 && c < floor) return floor ** (order - 1);
  return c > 0 ? order * c ** (order - 1) : 0;
}

/**
 * d²(c^n)/dc².
 *
 * @example curvatureOf(3, 3, 1e-15) // 18
 */
export function curvatureOf(c: number, order: number, floor: number): number {
  if (order === 1) return 0;
  if (order === 2) return 2;
  if (Number.isInteger(order)) return order * (order - 1) * c ** (order - 2);
  if (c < floor) return 0;
  return order * (order - 1) * c ** (order - 2);
}
