/** One of our cell functions as a function of the engine. */
import { AsyncObject, BaseFunction, type BaseValueObject } from '@univerjs/engine-formula';
import type { Caller } from '../../../functions/caller';
import type { CellFunction } from '../../../functions/define';
import { argumentFrom, resultFor } from './values';

export type EngineFunctionClass = new (name: string) => BaseFunction;

/**
 * The engine's own limits on the number of arguments are left open: it would answer #N/A without a
 * word, where callFunction says which argument is missing or too many.
 */
export const engineFunction = (f: CellFunction, caller: Caller): EngineFunctionClass =>
  class extends BaseFunction {
    override isAsync(): boolean {
      return caller.mayBePromise(f);
    }

    override calculate(...args: BaseValueObject[]): BaseValueObject | AsyncObject {
      const result = caller.call(f, args.map(argumentFrom));
      return result instanceof Promise ? new AsyncObject(result.then(resultFor)) : resultFor(result);
    }
  };
