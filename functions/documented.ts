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

/** Columns of a table of arguments, after their names. */
export const argumentHeadings = ['meaning', 'unit', 'must be', 'left out'] as const;

/** What stands in them; empty where there is nothing to say. */
export const argumentFacts = ({ help, unit, bounds, optional, whenOmitted }: Parameter): string[] => [
  help,
  unit === '1' ? '' : unit,
  bounds ? boundsInWords(bounds) : '',
  optional ? (whenOmitted ?? 'not used') : 'needed',
];

/** A cell of an example, to eight digits. */
export function exampleCell(value: CellValue): string {
  if (value instanceof CellError) return value.code;
  return typeof value === 'number' ? String(Number(value.toPrecision(8))) : String(value ?? '');
}
