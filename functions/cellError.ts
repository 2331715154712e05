/** Our errors → the cell's. The only place that knows both. */
import { InvalidInput, NotDetermined } from '../src/errors';
import { CellError } from './cell';

export function cellErrorOf(error: unknown): CellError {
  if (error instanceof CellError) return error;
  if (error instanceof InvalidInput) return new CellError('#VALUE!', error.message);
  if (error instanceof NotDetermined) return new CellError('#N/A', error.message);
  const words = error instanceof Error ? error.message : String(error);
  return new CellError('#VALUE!', `the calculation broke off, which is a fault of the add-in: ${words}`);
}
