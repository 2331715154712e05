import type { Finding } from './finding';
import { isText, rowsWhere, type RawCell, type RawRun } from './rawRun';
import { isNumberAsText } from './textKind';
import { counted, listed } from './words';

export const holdsNumberAsText = (cell: RawCell): boolean => isText(cell) && isNumberAsText(cell.text);

/**
 * Numbers that are stored as text. Rule: a text cell reads as a number, with decimal point or comma, with
 * or without a unit, or as clock time, and beside it stands a number or another such text.
 */
export function numbersAsText(run: RawRun): Finding | null {
  const numeric = (cell: RawCell): boolean => typeof cell === 'number' || holdsNumberAsText(cell);
  const places = rowsWhere(
    run,
    (time, value) => numeric(time) && numeric(value) && (holdsNumberAsText(time) || holdsNumberAsText(value)),
  );
  if (places.length === 0) return null;
  const texts = places.map((row) => [run.values[row], run.times[row]].find(holdsNumberAsText) as { text: string });
  const seen = listed(texts.map(({ text }) => `"${text.trim()}"`), 4);
  return {
    kind: 'number as text',
    places,
    finding: `${counted(places.length, 'row holds', 'rows hold')} text that looks like a number: ${seen}`,
    meaning: 'a sheet does not calculate with text, so these rows are skipped without a word and the result rests on the others',
    advice: 'turn them into numbers: retype one with the decimal sign this sheet uses, or use VALUE; keep the unit in the heading',
  };
}
