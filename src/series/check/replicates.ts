import { shown } from '../../errors';
import type { Series } from '../series';
import type { Finding } from './finding';
import { counted, listed } from './words';

/** Readings that share a time. Rule: two or more pairs with exactly equal times. */
export function replicates({ times, values, places }: Series): Finding | null {
  const shared = [...times.keys()].filter((i) => times[i] === times[i - 1] || times[i] === times[i + 1]);
  if (shared.length === 0) return null;
  const moments = [...new Set(shared.map((i) => times[i]))];
  const copies = shared.filter((i) => times[i] === times[i - 1] && values[i] === values[i - 1]).length;
  return {
    kind: 'replicates',
    places: shared.map((i) => places[i]).sort((a, b) => a - b),
    finding: `${counted(moments.length, 'time has', 'times have')} more than one reading: ${moments.length === 1 ? 'time' : 'times'} ${listed(moments.map(shown))}${copies > 0 ? `; ${counted(copies, 'reading repeats', 'readings repeat')} the one before exactly` : ''}`,
    meaning:
      'every one of them counts in a fit, and between readings their average is used: true replicates make the result better',
    advice:
      copies > 0
        ? 'make sure that no pair was copied twice and that these are not two runs in one'
        : 'make sure that these are not two runs in one column',
  };
}
