/** Several columns side by side, each belonging to the same times or runs. */
import { InvalidInput } from '../src/errors';
import type { Column } from './column';

/**
 * The block's columns, or its rows where it lies the way of a row that they belong to.
 *
 * @param beside the times or rates that each column is as long as
 * @throws InvalidInput where neither fits
 */
export function columnsBeside(
  given: Column,
  beside: Column,
  names: { block: string; beside: string },
): Column[] {
  const length = beside.numbers.length;
  const isTurned = beside.rows === 1 && beside.columns > 1;
  if ((isTurned ? given.columns : given.rows) !== length) {
    throw new InvalidInput(
      `${names.block} must have ${length} ${isTurned ? 'columns' : 'rows'}, as many as ${names.beside}: got ${given.rows} rows of ${given.columns} cells`,
    );
  }
  const count = isTurned ? given.rows : given.columns;
  const placeOf = (line: number, i: number): number =>
    isTurned ? line * given.columns + i : i * given.columns + line;
  return Array.from({ length: count }, (_, line) => ({
    rows: isTurned ? 1 : length,
    columns: isTurned ? length : 1,
    numbers: Array.from({ length }, (__, i) => given.numbers[placeOf(line, i)]),
    errors: new Map(),
  }));
}
