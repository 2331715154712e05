/** Formula text: how a value is written, and how a piece is set so that it stays whole. */
import { areaName, columnName, quotedSheet, type Area } from '../address';
import { CellError, type CellValue } from '../cell';

/**
 * A number as a formula takes it: `-3` in brackets, since a formula reads -3^2 as 9, and small ones written
 * out, since beside a comparison not every program reads 1E-9 as one number.
 *
 * @example numberText(-2.5e-7) // '(-0.00000025)'
 */
export function numberText(value: number): string {
  const [digits, exponent] = String(Math.abs(value)).split('e');
  const text = exponent === undefined ? digits : writtenOut(digits, Number(exponent));
  return value < 0 ? `(-${text})` : text;
}

/** Beyond these a number is hard to read, and the exponent stays. */
const smallest = -15;

function writtenOut(digits: string, exponent: number): string {
  if (exponent >= 0 || exponent < smallest) return `${digits}E${exponent > 0 ? '+' : ''}${exponent}`;
  return `0.${'0'.repeat(-exponent - 1)}${digits.replace('.', '')}`;
}

export function valueText(value: CellValue): string {
  if (value === null) return '""';
  if (value instanceof CellError) return value.code;
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return typeof value === 'number' ? numberText(value) : quoted(value);
}

export const quoted = (text: string): string => `"${text.replace(/"/g, '""')}"`;

/** One cell of an area, so that a copied formula moves with its reading. */
export const cellOf = ({ sheet, row, column }: Area, r: number, c: number): string =>
  areaName({ sheet, row: row + r, column: column + c, rows: 1, columns: 1 });

/** `'Gas run'!$B$5:$B$24`, which stays where it is. */
export function fixedArea({ sheet, row, column, rows, columns }: Area): string {
  const first = `$${columnName(column)}$${row + 1}`;
  const last = `$${columnName(column + columns - 1)}$${row + rows}`;
  return `${sheet === undefined ? '' : `${quotedSheet(sheet)}!`}${first === last ? first : `${first}:${last}`}`;
}

/** `IF(AND(…),result,#VALUE!)`; the result alone where nothing has to hold. */
export function where(holds: readonly string[], result: string): string {
  const each = [...new Set(holds)];
  if (each.length === 0) return result;
  return `IF(${each.length === 1 ? each[0] : `AND(${each.join(',')})`},${result},#VALUE!)`;
}
