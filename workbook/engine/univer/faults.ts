/** A fault inside one of the engine's own functions is that cell's error; left alone, it ends the whole calculation. */
import { ErrorType, ErrorValueObject, Interpreter } from '@univerjs/engine-formula';

let contained = false;

/** Calling it again changes nothing. */
export function containFaults(): void {
  if (contained) return;
  contained = true;
  const { execute, executeAsync } = Interpreter.prototype;
  Interpreter.prototype.execute = function (this: Interpreter, ...args) {
    try {
      return execute.apply(this, args);
    } catch (fault) {
      return errorFor(fault);
    }
  };
  Interpreter.prototype.executeAsync = function (this: Interpreter, ...args) {
    return executeAsync.apply(this, args).catch(errorFor);
  };
}

const errorFor = (fault: unknown): ErrorValueObject =>
  ErrorValueObject.create(
    ErrorType.VALUE,
    `a built-in function broke off: ${fault instanceof Error ? fault.message : String(fault)}`,
  );
