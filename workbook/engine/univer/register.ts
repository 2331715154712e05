/** Our cell functions in the engine: every definition of the catalogue, with its argument help. */
import { FunctionType, type IFunctionInfo } from '@univerjs/engine-formula';
import { sharingCaller, type Caller } from '../../../functions/caller';
import { catalogue } from '../../../functions/catalogue';
import { typedName, type CellFunction } from '../../../functions/define';
import type { LongWork } from '../../../functions/longWork';
import { parameterHelp } from '../../../functions/metadata';
import { filedName } from '../names';
import { anchorArray } from '../anchorText';
import { AnchorArray } from './anchor';
import { mendArrayConstants } from './arrayConstants';
import { engineFunction, type EngineFunctionClass } from './engineFunction';
import { exampleArguments } from './exampleArguments';
import { containFaults } from './faults';
import { mendLargeSpills } from './largeSpills';
import { mendNumerals } from './numerals';
import { noteMessages } from './words';

export { forgetMessages, messageAt } from './words';
export { withHash, withoutHash } from '../anchorText';

export interface FormulaPluginConfig {
  /** For the formula engine's plugin. */
  readonly function: [EngineFunctionClass, string][];
  /** For the sheet formula plugin, which shows it while a formula is typed. */
  readonly description: IFunctionInfo[];
}

/**
 * What both plugins must be given; it also mends the engine where our functions need it.
 *
 * @param longWork where long calculations are done; left out, with all others
 */
export function formulaPluginConfig(longWork?: LongWork): FormulaPluginConfig {
  mendArrayConstants();
  mendLargeSpills();
  mendNumerals();
  containFaults();
  noteMessages();
  const caller = sharingCaller(longWork);
  return {
    function: [...catalogue.flatMap((f) => underBothNames(f, caller)), [AnchorArray, anchorArray]],
    description: catalogue.map(argumentHelp),
  };
}

/** The engine looks names up in capitals. */
function underBothNames(f: CellFunction, caller: Caller): [EngineFunctionClass, string][] {
  const Class = engineFunction(f, caller);
  return [
    [Class, typedName(f)],
    [Class, filedName(f).toUpperCase()],
  ];
}

function argumentHelp(f: CellFunction): IFunctionInfo {
  const examples = exampleArguments(f.example.formula);
  return {
    functionName: typedName(f),
    functionType: FunctionType.User,
    description: f.summary,
    abstract: f.summary,
    functionParameter: Object.entries(f.parameters).map(([name, parameter], place) => ({
      name,
      detail: parameterHelp(parameter),
      example: examples[place] ?? '',
      require: parameter.optional ? 0 : 1,
      repeat: 0,
    })),
  };
}
