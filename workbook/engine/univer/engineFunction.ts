/** One of our cell functions as a function of the engine. */
import { BaseFunction, type BaseValueObject } from '@univerjs/engine-formula';
import { callFunction } from '../../../functions/call';
import type { CellFunction } from '../../../functions/define';
import { argumentFrom, resultFor } from './values';

export type EngineFunctionClass = new (name: string) => BaseFunction;

/**
 * The engine's own limits on the number of arguments are left open: it would answer #N/A without a
 * word, where callFunction says which argument is missing or too many.
 */
export function engineFunction(f: CellFunction): EngineFunctionClass {
  return class extends BaseFunction {
    override calculate(...args: BaseValueObject[]): BaseValueObject {
      return resultFor(callFunction(f, args.map(argumentFrom)));
    }
  };
}
