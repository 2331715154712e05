/**
 * `1.50`, `.5` and `1E-5` in a formula are numbers: the engine (0.25.1) takes a number for a word unless it is
 * spelled as JavaScript would spell it, so that 35>1.0 is FALSE. Criteria such as ">1.50" are read here, too.
 */
import { NumberValueObject, ValueObjectFactory } from '@univerjs/engine-formula';

const numeral = /^\s*[+-]?(?:\d+\.?\d*|\.\d+)(?:E[+-]?\d+)?\s*$/i;

let mended = false;

/** Calling it again changes nothing. */
export function mendNumerals(): void {
  if (mended) return;
  mended = true;
  const create = ValueObjectFactory.create;
  ValueObjectFactory.create = (raw, ...rest) => {
    const value = typeof raw === 'string' && numeral.test(raw) ? Number(raw) : NaN;
    return Number.isFinite(value)
      ? NumberValueObject.create(value)
      : create.call(ValueObjectFactory, raw, ...rest);
  };
}
