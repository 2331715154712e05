/** A conversion, said reading by reading, in the shape given: a gap stays empty and an error cell keeps its error. */
import { isNumberText } from './phrase';
import type { Readings } from './readings';
import { NotSaid, type Said } from './said';
import { where } from './text';

/** The place of a reading; nothing where the formula is for all of them at once. */
export interface Place {
  readonly row: number;
  readonly column: number;
}

/**
 * @param holds what must hold for all, besides the bounds of the readings
 * @param convert the formula of one reading
 * @param tells what must hold for the readings to tell anything at all
 */
export function eachReading(
  readings: Readings,
  holds: readonly string[],
  convert: (reading: string, place: Place | undefined) => string,
  tells?: string,
): Said {
  const say = (x: string, place?: Place): string => {
    const answer = convert(x, place);
    const all = [...readings.holds, ...holds];
    const gap = `IF(${readings.isNumberAsText(x)},#VALUE!,"")`;
    const known = `IF(ISNUMBER(${x}),${answer},IF(ISERROR(${x}),${x},${gap}))`;
    const each = isNumberText(x) ? answer : known;
    return where(all, tells === undefined ? each : `IF(${tells},${each},NA())`);
  };
  const whole = (): string => say(readings.whole);
  if (!readings.isPlaced) return { whole };
  return { whole, cell: (row, column) => say(readings.element(row, column), { row, column }) };
}

/** @throws NotSaid where the formula is for all readings at once, and this differs from one to the next */
export function placed(place: Place | undefined): Place {
  if (!place) throw new NotSaid('each reading has a quantity of its own, within another formula');
  return place;
}
