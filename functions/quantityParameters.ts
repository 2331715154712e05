/** Kinds of parameter that physics gives a unit: a bare number means the one documented, text carries its own. */
import { InvalidInput } from '../src/errors';
import { convertQuantity, parseQuantity } from '../src/units';
import { CellError, shownCell, type CellRange, type CellValue } from './cell';
import { placeInWords, type Column } from './column';
import { ofOneCell, ofRange, requireWithin, type About, type Bounds, type Parameter } from './parameters';

interface AboutQuantity extends About, Bounds {
  /** Of a bare number. */
  readonly unit: string;
  /** In which the function gets it. */
  readonly to: string;
}

/** One physical quantity: a bare number in `unit`, or text with a unit of its own. Read as a number of `to`. */
export const quantity = ({ help, unit, to, ...bounds }: AboutQuantity): Parameter<number> =>
  ofOneCell({ kind: 'quantity', help, unit, bounds }, (cell, name) =>
    readQuantity(cell, { name, unit, to, bounds }),
  );

/** The same for every reading, or one a reading: a quantity, or a range of them as long as the readings. */
export function quantities({ help, unit, to, ...bounds }: AboutQuantity): Parameter<readonly number[]> {
  const kind = { kind: 'quantities', help: `${help}; one value, or one a reading`, unit, bounds } as const;
  return ofRange(kind, (cells, name) =>
    eachIn(cells, (cell, where) => {
      if (cell instanceof CellError) throw cell;
      return readQuantity(cell, { name, unit, to, bounds, where });
    }),
  );
}

/** Goes through a range, row by row. @param read is told where a cell stands, unless it is the only one */
function eachIn<T>(cells: CellRange, read: (cell: CellValue, where: string, place: number) => T): T[] {
  const flat = cells.flat();
  const shape = shapeOf(cells);
  return flat.map((cell, place) => read(cell, flat.length === 1 ? '' : placeInWords(place, shape), place));
}

const shapeOf = (cells: CellRange): Pick<Column, 'rows' | 'columns'> => ({
  rows: cells.length,
  columns: cells[0]?.length ?? 0,
});

/**
 * One quantity for all readings, or one each.
 *
 * @returns the quantity that belongs to the reading at a place
 * @throws InvalidInput where there are neither one nor as many as readings
 */
export function requireOneEach(
  given: readonly number[],
  readings: Column,
  name: string,
): (place: number) => number {
  if (given.length !== 1 && given.length !== readings.numbers.length) {
    throw new InvalidInput(
      `${name} must be one value or one a reading: got ${given.length} for ${readings.numbers.length} readings`,
    );
  }
  return (place) => (given.length === 1 ? given[0] : given[place]);
}

function readQuantity(
  cell: CellValue,
  {
    name,
    unit,
    to,
    bounds,
    where = '',
  }: { name: string; unit: string; to: string; bounds: Bounds; where?: string },
): number {
  const inUnit = typeof cell === 'string' && cell.trim() !== '' ? parseQuantity(cell, unit, name) : cell;
  if (typeof inUnit !== 'number') {
    throw new InvalidInput(
      `${name} must be a number or text with a unit: ${where ? `${where} is` : 'got'} ${shownCell(cell)}`,
    );
  }
  return convertQuantity(requireWithin(inUnit, bounds, name, unit, where), unit, to);
}

/** Readings with units, converted one by one, in any shape; text without a figure is a gap. */
export function quantityReadings({ help, unit, to, ...bounds }: AboutQuantity): Parameter<Column> {
  return ofRange({ kind: 'readings', help, unit, bounds, keepsErrors: true }, (cells, name) => {
    const errors = new Map<number, CellError>();
    const numbers = eachIn(cells, (cell, where, place) => {
      if (cell instanceof CellError) errors.set(place, cell);
      const isReading = typeof cell === 'number' || (typeof cell === 'string' && /\d/.test(cell));
      return isReading ? readQuantity(cell, { name, unit, to, bounds, where }) : null;
    });
    return { ...shapeOf(cells), numbers, errors };
  });
}
