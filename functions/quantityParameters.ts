/** Kinds of parameter that physics gives a unit: a bare number means the one documented, text carries its own. */
import { InvalidInput } from '../src/errors';
import { convertQuantity, parseQuantity } from '../src/units';
import { CellError, shownCell, type CellValue } from './cell';
import { placeInWords, type Column } from './column';
import { required, requireWithin, single, type About, type Bounds, type Parameter } from './parameters';

interface AboutQuantity extends About, Bounds {
  /** Of a bare number. */
  readonly unit: string;
  /** In which the function gets it. */
  readonly to: string;
}

/** One physical quantity: a bare number in `unit`, or text with a unit of its own. Read as a number of `to`. */
export function quantity(about: AboutQuantity): Parameter<number> {
  const { help, unit, to, ...bounds } = about;
  return {
    kind: 'quantity',
    help,
    unit,
    dimension: 'scalar',
    optional: false,
    bounds,
    read: (cells, name) => readQuantity(single(required(cells, name), name), { name, unit, to, bounds }),
  };
}

/** The same for every reading, or one a reading: a quantity, or a range of them as long as the readings. */
export function quantities(about: AboutQuantity): Parameter<readonly number[]> {
  const { help, unit, to, ...bounds } = about;
  return {
    kind: 'quantities',
    help: `${help}; one value, or one a reading`,
    unit,
    dimension: 'matrix',
    optional: false,
    bounds,
    read(cells, name) {
      const rows = required(cells, name);
      const shape = { rows: rows.length, columns: rows[0]?.length ?? 0 };
      const flat = rows.flat();
      return flat.map((cell, place) => {
        if (cell instanceof CellError) throw cell;
        const where = flat.length === 1 ? '' : placeInWords(place, shape);
        return readQuantity(cell, { name, unit, to, bounds, where });
      });
    },
  };
}

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
export function quantityReadings(about: AboutQuantity): Parameter<Column> {
  const { help, unit, to, ...bounds } = about;
  return {
    kind: 'readings',
    help,
    unit,
    dimension: 'matrix',
    optional: false,
    bounds,
    keepsErrors: true,
    read(cells, name) {
      const rows = required(cells, name);
      const shape = { rows: rows.length, columns: rows[0].length };
      const errors = new Map<number, CellError>();
      const numbers = rows.flat().map((cell, place) => {
        if (cell instanceof CellError) errors.set(place, cell);
        const isReading = typeof cell === 'number' || (typeof cell === 'string' && /\d/.test(cell));
        const where = rows.flat().length === 1 ? '' : placeInWords(place, shape);
        return isReading ? readQuantity(cell, { name, unit, to, bounds, where }) : null;
      });
      return { ...shape, numbers, errors };
    },
  };
}
