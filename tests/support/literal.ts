/** Calls that are written out, and the words of those that are refused. */
import { CellError } from '../../functions/cell';
import { calculate } from '../../functions/literal';

export { calculate, callIn } from '../../functions/literal';

/** @returns the words beside the error, after its code: `#VALUE! volume must …` */
export function errorOf(formula: string): string {
  const result = calculate(formula);
  if (!(result instanceof CellError)) throw new Error(`${formula} is no error: ${JSON.stringify(result)}`);
  return `${result.code} ${result.message}`;
}
