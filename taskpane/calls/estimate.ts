/** The standard row of an estimate, as the pane shows it. */
import { CellError, type CellRange, type CellValue } from '../../functions/cell';
import { refusalOf } from './call';

/** `null` where the data leave no such number. */
export interface Estimate {
  readonly value: number;
  readonly uncertainty: number | null;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly degreesOfFreedom: number | null;
}

/** An answer, or why there is none. */
export type Answered<T> = { readonly ok: T } | { readonly refused: string };

const orNull = (cell: CellValue | undefined): number | null => (typeof cell === 'number' ? cell : null);

export function readEstimate([
  value,
  uncertainty,
  lower,
  upper,
  degreesOfFreedom,
]: readonly CellValue[]): Estimate | null {
  if (typeof value !== 'number') return null;
  return {
    value,
    uncertainty: orNull(uncertainty),
    lower: orNull(lower),
    upper: orNull(upper),
    degreesOfFreedom: orNull(degreesOfFreedom),
  };
}

export function answeredEstimate(rows: CellRange): Answered<Estimate> {
  const estimate = readEstimate(rows[0]);
  if (estimate) return { ok: estimate };
  const [cell] = rows[0];
  return { refused: cell instanceof CellError ? refusalOf(cell) : 'there is no answer here' };
}
