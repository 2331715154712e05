/** What a cell function is. Everything the product says or does about one derives from this object. */
import type { Tell } from '../src/progress';
import type { BuiltIn, FitTable } from './builtIn/said';
import type { CellResult } from './cell';
import type { Parameter } from './parameters';

export type Parameters = Readonly<Record<string, Parameter>>;

/** The values a function runs on, as its parameters read them. */
export type Values<P extends Parameters> = {
  readonly [K in keyof P]: P[K] extends Parameter<infer T> ? T : never;
};

/** The parts of the job, in the order of the work. */
export type Family = 'reading' | 'rate' | 'order' | 'temperature' | 'mechanism' | 'care';

/** In the notation of equation/equation.ts. */
export interface Equations {
  readonly lines: readonly string[];
  /** Every quantity in them, with its unit where it must have one. */
  readonly where: Readonly<Record<string, string>>;
}

/** A call that answers with an error; the words beside it are what the function says. */
export interface Refusal {
  readonly formula: string;
  readonly mend: string;
}

export interface Definition<P extends Parameters> {
  /** Without the namespace: `TANGENT`. Three letters or more, no dot, no underscore, and never changed. */
  readonly name: string;
  readonly family: Family;
  /** One sentence, for argument help and tables. */
  readonly summary: string;
  /** What it works out, typeset on the help page; left out where words say it all. */
  readonly equations?: Equations;
  /** How it is worked out: method, and what is taken for granted. */
  readonly method: string;
  /** What an uncertainty of the answer rests on, or why there is none. */
  readonly uncertainty: string;
  readonly parameters: P;
  readonly result: { readonly unit: string; readonly shape: 'one value' | 'as given' | 'column' | 'table' };
  /** Typed into an empty cell it gives `equals`: the value, or the first cells of each row that spills. */
  readonly example: {
    readonly formula: string;
    readonly equals: CellResult;
    /** Relative, where the outside value has fewer digits than ours; rounding alone when left out. */
    readonly within?: number;
  };
  /** Calls that are refused, beyond what the bounds of its parameters say, and what helps then. */
  readonly refusals?: readonly Refusal[];
  /** Names of functions that the same job may need, before or after. */
  readonly seeAlso: readonly string[];
  /** DOI or standard. */
  readonly reference: string;
  /** Where the work this serves can hurt someone. */
  readonly caution?: string;
  /**
   * May take long enough for a sheet to stand still, always or from so many cells in its arguments on: done on
   * another thread where there is one.
   */
  readonly isLong?: true | { readonly fromCells: number };
  /** @param tell takes how far it is, where it takes long */
  readonly run: (values: Values<P>, tell?: Tell) => CellResult;
  /** The same in built-in spreadsheet functions, for a copy that needs no add-in; left out where there is none. */
  readonly builtIn?: BuiltIn;
  /** What it fits, for the same copy: the numbers stay as they were, and a formula tells whether they still fit. */
  readonly fits?: FitTable;
}

/** A definition whose parameter types have been checked and can be forgotten. */
export type CellFunction = Omit<Definition<Parameters>, 'run'> & {
  readonly run: (values: Readonly<Record<string, unknown>>, tell?: Tell) => CellResult;
};

export const namespace = 'PACE';

/** As it is typed: `PACE.TANGENT`. */
export const typedName = (f: Pick<CellFunction, 'name'>): string => `${namespace}.${f.name}`;

/** As argument help shows it: `PACE.EVENT(times, [change], [coefficient])`. */
export function signature(f: CellFunction): string {
  const parameters = Object.entries(f.parameters).map(([name, { optional }]) =>
    optional ? `[${name}]` : name,
  );
  return `${typedName(f)}(${parameters.join(', ')})`;
}

/** Whether its answer can take more than one cell: `[detail]` turns one value into a row. */
export const canSpill = (f: Pick<CellFunction, 'result' | 'parameters'>): boolean =>
  f.result.shape !== 'one value' || 'detail' in f.parameters;

export function defineFunction<const P extends Parameters>(definition: Definition<P>): CellFunction {
  return definition as unknown as CellFunction;
}
