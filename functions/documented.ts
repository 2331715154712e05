/** What every page about a function says the same way: its arguments, and its example's cells. */
import { CellError, type CellValue } from './cell';
import type { CellFunction } from './define';
import { inLine } from './equation/equation';
import { boundsInWords, type Parameter } from './parameters';

/** Equations, their quantities and the method in one text, for where nothing can be typeset. */
export function howInWords({ equations, method }: CellFunction): string {
  if (!equations) return method;
  const quantities = Object.entries(equations.where).map(([sign, meaning]) => `${sign} ${meaning}`);
  return `${equations.lines.map(inLine).join('; ')} (${quantities.join('; ')}). ${method}`;
}

/** Typed as degC, since a keyboard has no ring; read as °C. */
export const asRead = (unit: string): string => unit.replace(/\bdegC\b/g, '°C');

/** Columns of a table of arguments, after their names. */
export const argumentHeadings = ['meaning', 'unit', 'must be', 'left out'] as const;

/** What stands in them; empty where there is nothing to say. */
export const argumentFacts = ({ help, unit, bounds, optional, whenOmitted }: Parameter): string[] => [
  help,
  unit === '1' ? '' : asRead(unit),
  bounds ? boundsInWords(bounds) : '',
  optional ? asRead(whenOmitted ?? 'not used') : 'needed',
];

/** What the rounding of the arithmetic leaves of nothing: an example’s numbers are far larger. */
const rounding = 1e-14;

/** A cell of an example, to eight digits. */
export function exampleCell(value: CellValue): string {
  if (value instanceof CellError) return value.code;
  if (typeof value !== 'number') return String(value ?? '');
  return value !== 0 && Math.abs(value) < rounding ? '≈ 0' : String(Number(value.toPrecision(8)));
}
