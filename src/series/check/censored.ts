import type { Finding } from './finding';
import { hasNumber, isText, rowsWhere, type RawText, type RawRun } from './rawRun';
import { isCensored } from './textKind';
import { counted, listed } from './words';

/**
 * Readings known only to lie beyond a limit. Rule: a time beside text that begins with <, >, ≤ or ≥ and a
 * number, or says n.d., LOD or the like.
 *
 * That leaving them out, or putting the limit, half of it or 0 in their place, biases what follows: D. R.
 * Helsel, Statistics for Censored Environmental Data, 2nd ed. (2012), chapter 1.
 */
export function censored(run: RawRun): Finding | null {
  const places = rowsWhere(run, (time, value) => hasNumber(time) && isText(value) && isCensored(value.text));
  if (places.length === 0) return null;
  const seen = listed([...new Set(places.map((row) => `"${(run.values[row] as RawText).text.trim()}"`))], 4);
  return {
    kind: 'censored',
    places,
    finding: `${counted(places.length, 'reading lies', 'readings lie')} beyond what the instrument can see: ${seen}`,
    meaning:
      'they are skipped; among readings near the limit only the seen ones are left, so the reaction seems slower towards its end than it is',
    advice:
      'end the run at the last time before them; put neither 0 nor the limit nor half of it in their place',
  };
}
