import type { Series } from '../series';
import type { Finding } from './finding';
import { listed } from './words';

/**
 * Different times that each method needs: as many as it has parameters, one more for its uncertainty, and
 * for weighing the orders by AICc two more than the parameters and the scatter (Hurvich and Tsai 1989,
 * doi:10.1093/biomet/76.2.297).
 */
const needs: readonly (readonly [needed: number, method: string])[] = [
  [2, 'an average rate'],
  [3, 'a tangent, or the uncertainty of a rate coefficient whose end is known'],
  [4, 'the uncertainty of a tangent, or a rate coefficient with a free end and its uncertainty'],
  [5, 'weighing the orders, or a free order with a free end and its uncertainty'],
  [6, 'weighing the orders with a free end'],
];

/** Too few readings. Rule: fewer different times than one of the methods needs. */
export function tooFew({ distinctTimes }: Series): Finding | null {
  const missing = needs.filter(([needed]) => distinctTimes < needed);
  if (missing.length === 0) return null;
  const possible = needs.filter(([needed]) => distinctTimes >= needed).map(([, method]) => method);
  return {
    kind: 'too few',
    places: [],
    finding: `${distinctTimes} different ${distinctTimes === 1 ? 'time' : 'times'}`,
    meaning: `too few for ${listed(missing.map(([needed, method]) => `${method} (${needed})`))}${possible.length > 0 ? `; enough for ${listed(possible)}` : ''}`,
    advice:
      'take more readings, ten or more for an order; what can be calculated here comes with large or unknown uncertainty',
  };
}
