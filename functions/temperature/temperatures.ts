/** Temperatures in cells: °C where a number stands alone, text with its own unit otherwise; kelvin inside. */
import { celsiusZero } from '../../src/constants';
import { InvalidInput, shown } from '../../src/errors';
import { parseQuantity } from '../../src/units';
import { shownCell, type CellValue } from '../cell';
import { numberInText, placeInWords, readColumn, requireLine, type Column } from '../column';
import { ofOneCell, ofRange, requireWithin, type About, type Parameter } from '../parameters';

const unit = 'degC';
const bounds = { above: -celsiusZero };

/** A temperature, and the bare number that stood in the cell where no unit did. */
interface Reading {
  readonly kelvin: number;
  readonly bare?: number;
}

/** Hardly a reaction is followed where every temperature lies above this many °C, while room temperature does in kelvin. */
const hottestUnasked = 200;

/** A column of temperatures, read as kelvin. */
export const temperatures = ({ help }: About): Parameter<Column> =>
  ofRange({ kind: 'quantities', help, unit, bounds }, (cells, name) => {
    const shape = { rows: cells.length, columns: cells[0]?.length ?? 0 };
    const bare: (number | undefined)[] = [];
    const inKelvin = cells.map((row, r) =>
      row.map((cell, c): CellValue => {
        const reading = readTemperature(cell, name, () => placeInWords(r * shape.columns + c, shape));
        if (!reading) return cell;
        bare.push(reading.bare);
        return reading.kelvin;
      }),
    );
    requireCelsius(bare, name);
    const column = readColumn(inKelvin);
    requireLine(column, name);
    return column;
  });

/** One temperature. @returns the bare number too, so that a function can question it beside the others */
export const temperature = ({ help }: About): Parameter<Reading> =>
  ofOneCell({ kind: 'quantity', help, unit, bounds }, (cell, name) => {
    const reading = readTemperature(cell, name);
    if (reading) return reading;
    throw new InvalidInput(`${name} must be a number or text with a unit: got ${shownCell(cell)}`);
  });

/** @returns nothing for a gap: a blank cell, or text without a figure */
function readTemperature(cell: CellValue, name: string, place?: () => string): Reading | undefined {
  const where = place?.() ?? '';
  const within = (value: number): number => requireWithin(value, bounds, name, unit, where) + celsiusZero;
  if (typeof cell === 'number') return { kelvin: within(cell), bare: cell };
  if (typeof cell !== 'string' || !/\d/.test(cell)) return undefined;
  const bare = numberInText(cell, () => where);
  if (bare !== null) return { kelvin: within(bare), bare };
  return { kelvin: within(parsed(cell, name, where)) };
}

function parsed(text: string, name: string, where: string): number {
  try {
    return parseQuantity(text, unit, name);
  } catch (error) {
    if (!(error instanceof InvalidInput) || where === '') throw error;
    throw new InvalidInput(`${error.message}, in ${where}`);
  }
}

/** @throws InvalidInput where bare numbers look like kelvin */
function requireCelsius(bare: readonly (number | undefined)[], name: string): void {
  if (bare.length === 0 || !bare.every((value) => value !== undefined && value > hottestUnasked)) return;
  const numbers = bare as readonly number[];
  throw new InvalidInput(
    `${name} must be in degC: all lie above ${hottestUnasked}, from ${shown(Math.min(...numbers))} to ${shown(Math.max(...numbers))}, which look like kelvin; take off 273.15, or write a unit in each cell, "298.15 K" or "298.15 degC"`,
  );
}

/**
 * A bare number that lies far from the others as °C, and nearer to them as kelvin.
 *
 * @param range of the others, K
 * @throws InvalidInput
 */
export function requireNotKelvin(
  { kelvin, bare }: Reading,
  [lowest, highest]: readonly [number, number],
  name: string,
): void {
  if (bare === undefined || bare <= hottestUnasked) return;
  const away = (value: number): number => Math.max(lowest - value, value - highest, 0);
  if (away(kelvin) <= away(bare)) return;
  const [from, to] = [lowest, highest].map((value) => shown(value - celsiusZero));
  throw new InvalidInput(
    `${name} must be in degC: ${shown(bare)} looks like kelvin beside ${from} to ${to} degC; write ${shown(bare - celsiusZero)}, or the unit with it, "${shown(bare)} K" or "${shown(bare)} degC"`,
  );
}
