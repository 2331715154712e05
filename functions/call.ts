/** The one way a cell function is called, whatever workbook calls it: cells in, cells or a cell's error out. */
import { asRange, CellError, isRange, type CellResult, type CellValue } from './cell';
import { cellErrorOf } from './cellError';
import type { Column } from './column';
import { typedName, type CellFunction } from './define';
import { InvalidInput } from '../src/errors';
import type { Tell } from '../src/progress';

/**
 * @param args in the order of the parameters; `undefined` or `null` where left out
 * @param tell takes how far it is while it runs
 * @returns the result, with nothing in it that a cell cannot show; never throws
 */
export function callFunction(
  f: CellFunction,
  args: readonly (CellResult | undefined)[],
  tell?: Tell,
): CellResult {
  try {
    return presentable(f.run(readArguments(f, args), tell));
  } catch (error) {
    return cellErrorOf(error);
  }
}

function readArguments(f: CellFunction, args: readonly (CellResult | undefined)[]): Record<string, unknown> {
  const parameters = Object.entries(f.parameters);
  if (args.length > parameters.length) {
    throw new InvalidInput(
      `${typedName(f)} takes ${parameters.length} arguments at most: got ${args.length}`,
    );
  }
  const values: Record<string, unknown> = {};
  parameters.forEach(([name, parameter], place) => {
    const value = parameter.read(asRange(args[place]), name);
    if (!parameter.keepsErrors && isColumn(value) && value.errors.size > 0) {
      throw value.errors.values().next().value;
    }
    values[name] = value;
  });
  return values;
}

const isColumn = (value: unknown): value is Column =>
  typeof value === 'object' && value !== null && 'errors' in value && 'numbers' in value;

/** The gate: a number that is not finite never reaches a cell, where a host would turn it into 0. */
function presentable(result: CellResult): CellResult {
  return isRange(result) ? result.map((row) => row.map(presentableCell)) : presentableCell(result);
}

function presentableCell(cell: CellValue): CellValue {
  if (typeof cell === 'number') {
    if (!Number.isFinite(cell))
      return new CellError('#N/A', 'the result is too large or too small for a cell to hold');
    return cell === 0 ? 0 : cell; // −0 would show as -0
  }
  return cell === null ? '' : cell;
}
