/**
 * The kinds of parameter a cell function can have. Each says what the user must know (help, unit,
 * default, bounds) and reads its argument from cells, or refuses in words.
 */
import { InvalidInput, shown } from '../src/errors';
import { isUnit } from '../src/units';
import { CellError, shownCell, type CellRange, type CellValue } from './cell';
import { placeInWords, readColumn, requireLine, type Column } from './column';

export interface Bounds {
  readonly above?: number;
  readonly atLeast?: number;
  readonly below?: number;
  readonly atMost?: number;
  readonly whole?: boolean;
}

export interface Parameter<T = unknown> {
  readonly kind:
    | 'number'
    | 'quantity'
    | 'quantities'
    | 'column'
    | 'readings'
    | 'flag'
    | 'text'
    | 'endpoint'
    | 'uncertainties';
  readonly help: string;
  /** `1` for a pure number, `of the readings` and the like where the columns decide. */
  readonly unit: string;
  readonly dimension: 'scalar' | 'matrix';
  readonly optional: boolean;
  /** What leaving it out means, in words. */
  readonly whenOmitted?: string;
  /** What is read then; in the unit that the function gets. */
  readonly fallback?: unknown;
  readonly bounds?: Bounds;
  /** Conversions keep an error cell in its place; elsewhere the error becomes the answer. */
  readonly keepsErrors?: boolean;
  /** @throws InvalidInput, or a CellError that stands in the range */
  read(cells: CellRange | undefined, name: string): T;
}

export interface About {
  readonly help: string;
  readonly unit?: string;
}

/** The single cell of an argument. @throws InvalidInput for a range, the cell's own error for an error cell */
export function single(cells: CellRange, name: string): CellValue {
  if (cells.length !== 1 || cells[0].length !== 1) {
    throw new InvalidInput(`${name} must be one value: got ${cells.length} × ${cells[0]?.length ?? 0} cells`);
  }
  const cell = cells[0][0];
  if (cell instanceof CellError) throw cell;
  return cell;
}

/** With its unit, where that is one and not the kind of quantity, such as `time`. */
const withUnit = (value: number, unit: string): string =>
  unit !== '1' && isUnit(unit) ? `${shown(value)} ${unit}` : shown(value);

/** The rule a bound states: `above 0`, `a whole number from 1 to 5`. */
export function boundsInWords({ above, atLeast, below, atMost, whole }: Bounds): string {
  const parts: string[] = [];
  if (above !== undefined) parts.push(`above ${above}`);
  if (atLeast !== undefined && atMost !== undefined) parts.push(`from ${atLeast} to ${atMost}`);
  else if (atLeast !== undefined) parts.push(`${atLeast} or more`);
  else if (atMost !== undefined) parts.push(`${atMost} or less`);
  if (below !== undefined) parts.push(`below ${below}`);
  const range = parts.join(' and ');
  if (!whole) return range;
  return range === '' ? 'a whole number' : `a whole number${range.startsWith('from') ? '' : ','} ${range}`;
}

function isWithin(value: number, { above, atLeast, below, atMost, whole }: Bounds): boolean {
  return (
    (above === undefined || value > above) &&
    (atLeast === undefined || value >= atLeast) &&
    (below === undefined || value < below) &&
    (atMost === undefined || value <= atMost) &&
    (!whole || Number.isInteger(value))
  );
}

/** @param where `: row 7` inside a range, empty for a single value */
export function requireWithin(value: number, bounds: Bounds, name: string, unit: string, where = ''): number {
  if (isWithin(value, bounds)) return value;
  throw new InvalidInput(
    `${name} must be ${boundsInWords(bounds)}: ${where ? `${where} (${withUnit(value, unit)})` : `got ${withUnit(value, unit)}`}`,
  );
}

/** What a kind of parameter says of itself, before anything is read. */
type Kind<T> = Omit<Parameter<T>, 'dimension' | 'optional' | 'read'>;

/** A parameter that takes one value, in one cell. */
export const ofOneCell = <T>(
  kind: Kind<T>,
  readCell: (cell: CellValue, name: string) => T,
): Parameter<T> => ({
  ...kind,
  dimension: 'scalar',
  optional: false,
  read: (cells, name) => readCell(single(required(cells, name), name), name),
});

/** A parameter that takes a range. */
export const ofRange = <T>(
  kind: Kind<T>,
  readRange: (cells: CellRange, name: string) => T,
): Parameter<T> => ({
  ...kind,
  dimension: 'matrix',
  optional: false,
  read: (cells, name) => readRange(required(cells, name), name),
});

/** One pure number or one number in the unit of the columns. */
export function number({ help, unit = '1', ...bounds }: About & Bounds): Parameter<number> {
  return ofOneCell({ kind: 'number', help, unit, bounds }, (cell, name) => {
    if (typeof cell !== 'number') throw new InvalidInput(`${name} must be a number: got ${shownCell(cell)}`);
    return requireWithin(cell, bounds, name, unit);
  });
}

/** A rectangle of numbers, such as several runs side by side; blank and text cells are gaps. */
export const block = ({ help, unit = 'any' }: About): Parameter<Column> =>
  ofRange({ kind: 'column', help, unit }, readColumn);

/** Times or readings from which something is estimated: one column or one row; blank and text cells are gaps. */
export const column = ({ help, unit = 'any' }: About): Parameter<Column> =>
  ofRange({ kind: 'column', help, unit }, (cells, name) => {
    const read = readColumn(cells);
    requireLine(read, name);
    return read;
  });

/** Readings that are converted one by one, in any shape. */
export function readings({ help, unit = 'any', ...bounds }: About & Bounds): Parameter<Column> {
  return ofRange({ kind: 'readings', help, unit, bounds, keepsErrors: true }, (cells, name) => {
    const read = readColumn(cells);
    read.numbers.forEach((value, place) => {
      if (value !== null) requireWithin(value, bounds, name, unit, placeInWords(place, read));
    });
    return read;
  });
}

/** TRUE or FALSE; 1 and 0 count as such. */
export const flag = ({ help }: About): Parameter<boolean> =>
  ofOneCell({ kind: 'flag', help, unit: '1' }, (cell, name) => {
    if (typeof cell === 'boolean') return cell;
    if (cell === 0 || cell === 1) return cell === 1;
    throw new InvalidInput(`${name} must be TRUE or FALSE: got ${shownCell(cell)}`);
  });

/** A word, a unit, a formula; a bare number where `orNumber` allows it. */
export function text(about: About): Parameter<string>;
export function text(about: About & { readonly orNumber: true }): Parameter<string | number>;
export function text({
  help,
  unit = 'text',
  orNumber = false,
}: About & { readonly orNumber?: boolean }): Parameter<string | number> {
  return ofOneCell({ kind: 'text', help, unit }, (cell, name) => {
    if (typeof cell === 'string' && cell.trim() !== '') return cell.trim();
    if (orNumber && typeof cell === 'number') return cell;
    throw new InvalidInput(`${name} must be text${orNumber ? ' or a number' : ''}: got ${shownCell(cell)}`);
  });
}

const fallbackInWords = (fallback: unknown): string | undefined =>
  typeof fallback === 'boolean'
    ? String(fallback).toUpperCase()
    : fallback === undefined
      ? undefined
      : String(fallback);

/** Makes a parameter optional: left out (or an empty cell), it takes `fallback`. */
export function optional<T>(parameter: Parameter<T>): Parameter<T | undefined>;
export function optional<T, F>(parameter: Parameter<T>, fallback: F, whenOmitted?: string): Parameter<T | F>;
export function optional<T, F>(
  parameter: Parameter<T>,
  fallback?: F,
  whenOmitted?: string,
): Parameter<T | F | undefined> {
  return {
    ...parameter,
    optional: true,
    fallback,
    whenOmitted: whenOmitted ?? fallbackInWords(fallback),
    read: (cells, name) => (isLeftOut(cells) ? fallback : parameter.read(cells, name)),
  };
}

export const isLeftOut = (cells: CellRange | undefined): boolean =>
  cells === undefined ||
  (cells.length === 1 && cells[0].length === 1 && (cells[0][0] === null || cells[0][0] === ''));

/** @throws InvalidInput where an argument that is needed was left out */
export function required(cells: CellRange | undefined, name: string): CellRange {
  if (cells === undefined || cells.length === 0)
    throw new InvalidInput(`${name} is needed: nothing was given`);
  return cells;
}
