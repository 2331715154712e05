/** What Excel must be told of each function before it is ever called: the content of functions.json. */
import { mayBeLong } from './caller';
import { boundsInWords, type Parameter } from './parameters';
import { canSpill, type CellFunction } from './define';
import { pageName } from './help/pageName';

export interface FunctionsMetadata {
  /** Error cells inside a range reach the function as errors. Honoured only in metadata written by hand, as this is. */
  readonly allowErrorForDataTypeAny: true;
  readonly functions: readonly FunctionMetadata[];
}

export interface FunctionMetadata {
  readonly id: string;
  readonly name: string;
  readonly description: string;
  readonly helpUrl?: string;
  readonly parameters: readonly ParameterMetadata[];
  readonly result: { readonly type: 'any'; readonly dimensionality: Dimensionality };
  readonly options?: {
    /** Where its arguments stand in the sheet, so that a blank can be told from a zero. */
    readonly requiresParameterAddresses?: true;
    /** It is told when its answer is no longer wanted. */
    readonly cancelable?: true;
  };
}

interface ParameterMetadata {
  readonly name: string;
  readonly description: string;
  readonly type: 'any';
  readonly dimensionality: Dimensionality;
  readonly optional?: true;
}

type Dimensionality = 'scalar' | 'matrix';

export interface MetadataOptions {
  /** Where the help pages stand, with `https://` and no slash at the end; left out, functions carry no help link. */
  readonly helpBase?: string;
}

export function functionsMetadata(
  catalogue: readonly CellFunction[],
  { helpBase }: MetadataOptions = {},
): FunctionsMetadata {
  return { allowErrorForDataTypeAny: true, functions: catalogue.map((f) => describeFunction(f, helpBase)) };
}

function describeFunction(f: CellFunction, helpBase: string | undefined): FunctionMetadata {
  return {
    id: f.name, // never changes: workbooks refer to it
    name: f.name,
    description: f.summary,
    ...(helpBase === undefined ? {} : { helpUrl: `${helpBase}/${pageName(f)}` }),
    parameters: Object.entries(f.parameters).map(([name, parameter]) => describeParameter(name, parameter)),
    result: { type: 'any', dimensionality: canSpill(f) ? 'matrix' : 'scalar' },
    ...optionsOf(f),
  };
}

function optionsOf(f: CellFunction): Pick<FunctionMetadata, 'options'> {
  const options = {
    ...(Object.keys(f.parameters).length > 0 ? { requiresParameterAddresses: true as const } : {}),
    ...(mayBeLong(f) ? { cancelable: true as const } : {}),
  };
  return Object.keys(options).length > 0 ? { options } : {};
}

function describeParameter(name: string, parameter: Parameter): ParameterMetadata {
  return {
    name,
    description: parameterHelp(parameter),
    type: 'any',
    dimensionality: parameter.dimension,
    ...(parameter.optional ? { optional: true } : {}),
  };
}

/** All a person needs while typing: `fraction converted (above 0 and below 1; left out: 0.5)`. */
export function parameterHelp({ help, unit, bounds, optional, whenOmitted }: Parameter): string {
  const facts = [
    unitlessUnits.has(unit) ? '' : `unit: ${unit}`,
    bounds ? boundsInWords(bounds) : '',
    optional ? `left out: ${whenOmitted ?? 'not used'}` : '',
  ].filter(Boolean);
  return facts.length > 0 ? `${help} (${facts.join('; ')})` : help;
}

const unitlessUnits = new Set(['', '1', 'any', 'text']);
