/** The cell functions, called as a sheet would, and the invented runs as they want them. */
import { callFunction } from '../../call';
import { functionNamed } from '../../catalogue';
import { CellError, isRange, type CellResult, type CellValue } from '../../cell';
import type { Place } from '../../drawing/frame';

/** @throws Error where the function refuses: a picture rests on runs that it answers for */
export function rowsOf(name: string, ...args: readonly (CellResult | undefined)[]): CellValue[][] {
  const answer = callFunction(functionNamed(name)!, args);
  if (answer instanceof CellError) throw new Error(`PACE.${name}: ${answer.message}`);
  return isRange(answer) ? answer.map((row) => [...row]) : [[answer]];
}

export const numberOf = (name: string, ...args: readonly (CellResult | undefined)[]): number =>
  Number(rowsOf(name, ...args)[0][0]);

/** The first column, such as a spill of one number a reading. */
export const numbersOf = (name: string, ...args: readonly (CellResult | undefined)[]): number[] =>
  rowsOf(name, ...args).map(([first]) => Number(first));

/** The standard row. */
export function estimateOf(name: string, ...args: readonly (CellResult | undefined)[]) {
  const [value, uncertainty, lower, upper] = rowsOf(name, ...args)[0].map(Number);
  return { value, uncertainty, lower, upper };
}

export const columnOf = (numbers: readonly number[]): number[][] => numbers.map((number) => [number]);
export const times = (points: readonly Place[]): number[][] => columnOf(points.map(({ x }) => x));
export const values = (points: readonly Place[]): number[][] => columnOf(points.map(({ y }) => y));

/** Rows of a run, as points; a missed reading is left out. */
export const pointsOf = (rows: readonly (readonly (number | string)[])[], column = 1): Place[] =>
  rows.flatMap((row) => {
    const [x, y] = [row[0], row[column]];
    return typeof x === 'number' && typeof y === 'number' ? [{ x, y }] : [];
  });

export const xs = (points: readonly Place[]): number[] => points.map(({ x }) => x);
export const ys = (points: readonly Place[]): number[] => points.map(({ y }) => y);
