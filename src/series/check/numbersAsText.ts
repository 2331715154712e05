import type { Finding } from './finding';
import { hasNumber, isText, rowsWhere, type RawCell, type RawRun, type RawText } from './rawRun';
import { isNumberAsText } from './textKind';
import { counted, listed } from './words';

const isReadText = (cell: RawCell): cell is RawText => isText(cell) && cell.readAs !== undefined;
const isUnreadText = (cell: RawCell): cell is RawText =>
  isText(cell) && cell.readAs === undefined && isNumberAsText(cell.text);

const quoted = (run: RawRun, places: readonly number[], holds: (cell: RawCell) => cell is RawText): string =>
  listed(
    places
      .flatMap((row) => [run.times[row], run.values[row]])
      .filter(holds)
      .map(({ text }) => `"${text.trim()}"`),
    4,
  );

const pairsHold = (count: number): string => counted(count, 'pair holds', 'pairs hold');

/**
 * Numbers stored as text that cannot be taken for one. Rule: a text cell reads as a number with a unit, as
 * clock time, or as a number that could mean two, and beside it stands a number or another such text.
 */
export function numbersAsText(run: RawRun): Finding | null {
  const isNumeric = (cell: RawCell): boolean => hasNumber(cell) || isUnreadText(cell);
  const places = rowsWhere(
    run,
    (time, value) => isNumeric(time) && isNumeric(value) && (isUnreadText(time) || isUnreadText(value)),
  );
  if (places.length === 0) return null;
  return {
    kind: 'number as text',
    places,
    finding: `${pairsHold(places.length)} text that looks like a number: ${quoted(run, places, isUnreadText)}`,
    meaning:
      'such pairs are skipped without a word and the result rests on the others; text that could mean two numbers, such as "1,234", is refused',
    advice:
      'retype them as plain numbers with the decimal sign this sheet uses, the unit in the heading; PACE.CLOCK reads clock times',
  };
}

/** Numbers stored as text that estimates read all the same. Rule: the text is a plain number. */
export function numbersReadFromText(run: RawRun): Finding | null {
  const places = rowsWhere(run, (time, value) => isReadText(time) || isReadText(value));
  if (places.length === 0) return null;
  return {
    kind: 'number read from text',
    places,
    finding: `${pairsHold(places.length)} a number stored as text: ${quoted(run, places, isReadText)}`,
    meaning:
      'PACE functions read it as the number it shows, but a chart, a sum or a slope of the sheet skips it and gives another answer',
    advice: 'turn it into a number: retype it with the decimal sign this sheet uses, or use VALUE',
  };
}
