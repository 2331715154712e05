/** A run as a function was handed it: two columns → a series, and the weights that belong to it. */
import { InvalidInput } from '../src/errors';
import { pairReadings, type Series } from '../src/series/series';
import type { CellValue } from './cell';
import { linesBeside, placeInWords, type Column } from './column';
import type { Uncertainties } from './commonParameters';

/** Formulas filled down ask about one run, and much of what is found out about a run is kept with it. */
const known = new WeakMap<Column, WeakMap<Column, Series>>();

export function seriesOf(times: Column, values: Column): Series {
  const beside = known.get(times) ?? new WeakMap<Column, Series>();
  known.set(times, beside);
  const series = beside.get(values) ?? pairReadings(times.numbers, values.numbers);
  beside.set(values, series);
  return series;
}

/**
 * The standard uncertainty of each reading that was kept, in the order of the series.
 *
 * @throws InvalidInput where one is missing, or where it is to be in proportion to a reading of 0
 */
export function uncertaintiesOf(
  series: Series,
  values: Column,
  given: Uncertainties,
): Float64Array | undefined {
  if (given === undefined) return undefined;
  if (given === 'relative') {
    return series.values.map((value, i) => {
      if (value !== 0) return Math.abs(value);
      throw new InvalidInput(
        `uncertainties must not be "relative" where a reading is 0: ${placeInWords(series.places[i], values)}`,
      );
    });
  }
  if (given.numbers.length !== values.numbers.length) {
    throw new InvalidInput(
      `uncertainties must be as many as values: got ${given.numbers.length} for ${values.numbers.length}`,
    );
  }
  return Float64Array.from(series.places, (place) => {
    const uncertainty = given.numbers[place];
    if (uncertainty !== null && uncertainty > 0) return uncertainty;
    const seen = uncertainty === null ? 'no number' : uncertainty;
    throw new InvalidInput(
      `uncertainties must be above 0 for every reading: ${placeInWords(place, given)} (${seen})`,
    );
  });
}

/**
 * One answer a pair, back in the place where the pair stood: beside its time, with gaps left empty. A
 * row of times gives the answers in columns.
 *
 * @param answers in the order of the series, each one cell or several
 */
export function besideTimes(
  times: Column,
  { places }: Series,
  answers: readonly (readonly CellValue[])[],
): CellValue[][] {
  const width = answers[0].length;
  const lines: (readonly CellValue[])[] = Array.from(times.numbers, () =>
    new Array<CellValue>(width).fill(''),
  );
  places.forEach((place, i) => (lines[place] = answers[i]));
  return linesBeside(times, lines);
}
