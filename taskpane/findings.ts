/** What PACE.CHECK finds in the chosen run, with the places as the sheet counts them. */
import { placesInWords } from '../functions/series/places';
import { rawColumn } from '../functions/series/rawColumn';
import { findings } from '../src/series/check/findings';
import { nothingFound } from '../src/series/check/nothingFound';
import { columnOf, type Run, type Table } from './runs';
import { placeName } from './turned';

export interface Concern {
  /** What was seen: `one pair holds a number stored as text: "16,0"`. */
  readonly finding: string;
  /** `row 7` of the sheet, not of the range. */
  readonly where: string;
  readonly meaning: string;
  readonly advice: string;
}

export interface Check {
  /** What spoils a result first stands first. */
  readonly concerns: readonly Concern[];
  /** What was looked for in a run in which nothing was found; empty otherwise. */
  readonly clean: string;
}

const asItStands = rawColumn({ help: 'as it stands' });

export function checkRun(table: Table, run: Run): Check {
  const [times, values] = [run.timeColumn, run.readingColumn].map(
    (column) => asItStands.read(columnOf(table, column, run), 'column').cells,
  );
  const raw = { times, values };
  const concerns = findings(raw).map(({ places, ...words }) => ({
    ...words,
    where: placesInWords(
      places.map((place) => run.firstRow + place),
      table.isTurned ? { rows: 1, columns: values.length } : { rows: values.length, columns: 1 },
      (row) => placeName(row, table.isTurned),
    ),
  }));
  return { concerns, clean: concerns.length === 0 ? nothingFound(raw) : '' };
}
