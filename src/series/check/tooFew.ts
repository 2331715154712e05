import type { Series } from '../series';
import type { Finding } from './finding';
import { counted, listed } from './words';

/**
 * Different times that each method needs: as many as it has parameters, one more for its uncertainty, and
 * for weighing the orders by AICc two more than the parameters and the scatter (Hurvich and Tsai 1989,
 * doi:10.1093/biomet/76.2.297).
 */
const needs: readonly (readonly [needed: number, method: string])[] = [
  [2, 'an average rate'],
  [3, 'a tangent'],
  [3, 'the uncertainty of a rate coefficient'],
  [4, 'the uncertainty of a tangent'],
  [4, 'the uncertainty of a rate coefficient with a free end'],
  [5, 'weighing the orders'],
  [6, 'weighing the orders with a free end'],
];

/** Too few readings. Rule: fewer different times than one of the methods needs. */
export function tooFew({ distinctTimes }: Series): Finding | null {
  const missing = needs.filter(([needed]) => distinctTimes < needed);
  if (missing.length === 0) return null;
  return {
    kind: 'too few',
    places: [],
    finding: `only ${counted(distinctTimes, 'different time')}`,
    meaning: listed(
      missing.map(([needed, method]) => `${method} needs ${needed}`),
      needs.length,
    ),
    advice: 'take more readings, ten or more for an order',
  };
}
