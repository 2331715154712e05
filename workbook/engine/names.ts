/** How our functions are called: as typed, `PACE.EVENT(…)`, and as a file stores that, `_xldudf_PACE_EVENT(…)`. */
import { catalogue } from '../../functions/catalogue';
import { typedName, type CellFunction } from '../../functions/define';

/** The mark that Excel puts before the name of an add-in's function when it saves one. */
export const filedPrefix = '_xldudf_';

export const filedName = (f: Pick<CellFunction, 'name'>): string =>
  `${filedPrefix}${typedName(f).replace('.', '_')}`;

/** The typed name of a filed one, in any case; `undefined` for a function that is not ours. */
export const typedNameOf = (filed: string): string | undefined => typedByFiled.get(filed.toUpperCase());

/** The filed name of a typed one, in any case; `undefined` for a function that is not ours. */
export const filedNameOf = (typed: string): string | undefined => filedByTyped.get(typed.toUpperCase());

const typedByFiled = new Map(catalogue.map((f) => [filedName(f).toUpperCase(), typedName(f)]));
const filedByTyped = new Map(catalogue.map((f) => [typedName(f).toUpperCase(), filedName(f)]));
