/** One of our cell functions as a function of the engine. */
import { AsyncObject, BaseFunction, type BaseValueObject } from '@univerjs/engine-formula';
import { callFunction } from '../../../functions/call';
import type { CellFunction } from '../../../functions/define';
import type { LongWork } from '../../../functions/longWork';
import { argumentFrom, resultFor } from './values';

export type EngineFunctionClass = new (name: string) => BaseFunction;

/**
 * The engine's own limits on the number of arguments are left open: it would answer #N/A without a
 * word, where callFunction says which argument is missing or too many.
 */
export function engineFunction(f: CellFunction, longWork?: LongWork): EngineFunctionClass {
  return f.isLong && longWork ? onAnotherThread(f, longWork) : here(f);
}

const here = (f: CellFunction): EngineFunctionClass =>
  class extends BaseFunction {
    override calculate(...args: BaseValueObject[]): BaseValueObject {
      return resultFor(callFunction(f, args.map(argumentFrom)));
    }
  };

const onAnotherThread = (f: CellFunction, longWork: LongWork): EngineFunctionClass =>
  class extends BaseFunction {
    override isAsync(): boolean {
      return true;
    }

    override calculate(...args: BaseValueObject[]): AsyncObject {
      return new AsyncObject(longWork.run(f, args.map(argumentFrom)).then(resultFor));
    }
  };
