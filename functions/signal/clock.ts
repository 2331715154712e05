import { InvalidInput } from '../../src/errors';
import { elapsedSeconds, type ClockStart } from '../../src/signal/clock';
import { timeFromNumber, timeFromText, type TimeReading } from '../../src/signal/timeText';
import { convertUnit } from '../../src/units';
import { CellError, shownCell, type CellRange, type CellValue } from '../cell';
import { inRows, placeInWords } from '../column';
import { sayClock } from '../builtIn/clock';
import { defineFunction } from '../define';
import { isLeftOut, optional, required, single, text, type Parameter } from '../parameters';

/** What a clock showed, cell by cell, in the shape given. */
interface ClockReadings {
  readonly rows: number;
  readonly columns: number;
  readonly cells: readonly (TimeReading | CellError | null)[];
}

const clockReadings: Parameter<ClockReadings> = {
  kind: 'readings',
  help: 'times or date-times of the workbook, or text such as 0:04:30 and "4 min 30 s"; one or many',
  unit: 'any',
  dimension: 'matrix',
  optional: false,
  keepsErrors: true,
  read(cells, name) {
    const given = required(cells, name);
    const shape = { rows: given.length, columns: given[0].length };
    return {
      ...shape,
      cells: given.flat().map((cell, place) => readTime(cell, () => placeInWords(place, shape))),
    };
  },
};

function readTime(cell: CellValue, place: () => string): TimeReading | CellError | null {
  if (cell instanceof CellError) return cell;
  if (typeof cell === 'number') return timeFromNumber(cell);
  if (typeof cell !== 'string') return null;
  try {
    return timeFromText(cell) ?? null;
  } catch (error) {
    if (!(error instanceof InvalidInput)) throw error;
    throw new InvalidInput(`${error.message}, in ${place()}`);
  }
}

const clockStart: Parameter<ClockStart> = {
  kind: 'text',
  help: '"first" to count from the first reading, or a clock time',
  unit: 'text',
  dimension: 'scalar',
  optional: true,
  whenOmitted: 'as a stopwatch shows it',
  read(cells: CellRange | undefined, name) {
    if (cells === undefined || isLeftOut(cells)) return undefined;
    const cell = single(cells, name);
    if (typeof cell === 'string' && cell.trim().toLowerCase() === 'first') return 'first';
    const start =
      typeof cell === 'number'
        ? timeFromNumber(cell)
        : typeof cell === 'string'
          ? timeFromText(cell)
          : undefined;
    if (start) return start;
    throw new InvalidInput(`${name} must be "first" or a clock time: got ${shownCell(cell)}`);
  },
};

export default defineFunction({
  name: 'CLOCK',
  family: 'reading',
  summary: 'Time a run has taken, from what a stopwatch or a clock showed.',
  method:
    'A workbook keeps times as days; this gives them in a unit of your choice, to a microsecond. Clock times without a date may pass midnight: a step back by more than half a day starts the next one. 4:30 is hours and minutes, as the workbook itself reads it; 4:30.0 and "4 min 30 s" are minutes.',
  uncertainty: 'None is given: a clock is taken at its word.',
  parameters: {
    times: clockReadings,
    unit: optional(text({ help: 'unit of the answer' }), 's'),
    start: clockStart,
  },
  result: { unit: 's unless unit says otherwise', shape: 'as given' },
  example: { formula: '=PACE.CLOCK({"23:58:30";"0:04:30"},"min","first")', equals: [[0], [6]] },
  refusals: [
    {
      formula: '=PACE.CLOCK({"4:75:00"})',
      mend: 'Write minutes and seconds below 60, or the unit with each: "4 h 75 min".',
    },
    { formula: '=PACE.CLOCK({46000.5;0.6},"s","first")', mend: 'Give every time its date, or none.' },
    { formula: '=PACE.CLOCK({0;60},"mL")', mend: 'Give a unit of time: s, min, h, day.' },
  ],
  seeAlso: ['CHECK', 'GASVOLUME', 'MASSLOSS'],
  reference: 'ISO 8601-1:2019',
  run({ times, unit, start }) {
    const unitInSeconds = convertUnit(1, unit, 's', 'unit');
    const seconds = elapsedSeconds(
      times.cells.map((cell) => (cell instanceof CellError ? null : cell)),
      start,
    );
    const answers = times.cells.map((cell, place): CellValue => {
      if (cell instanceof CellError) return cell;
      const value = seconds[place];
      return value === null ? '' : value / unitInSeconds;
    });
    return inRows(answers, times.rows, times.columns);
  },
  builtIn: sayClock,
});
