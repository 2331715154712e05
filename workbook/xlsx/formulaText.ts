/** A formula as a person types it ↔ as a file stores it. Neither has a leading `=`. */
import { anchorArray, withHash } from '../engine/anchorText';
import { filedNameOf, filedPrefix, typedNameOf } from '../engine/names';
import { namedIntersections, withoutIntersections } from './intersection';
import { localPrefix, withLocalPrefixes } from './localNames';
import { filedModernName } from './modernFunctions';

/** Text in double quotes, names in single quotes and `[…]` columns stay as they are; calls and `F2#` are of interest. */
const parts =
  /"(?:[^"]|"")*"|'(?:[^']|'')*'(?:!\$?[A-Z]{1,3}\$?\d+)?#?|\[[^\]]*\]!?|[A-Z_\\][\w.\\]*(?:!\$?[A-Z]{1,3}\$?\d+)?(?:\s*\(|#)?|\$?[A-Z]{1,3}\$?\d+#/gi;

const call = /^(.*?)(\s*\()$/s;

/** `_xlfn.STDEV.S(A1:A9)+[2]!_xldudf_PACE_EVENT(B2)` → `STDEV.S(A1:A9)+PACE.EVENT(B2)`. */
export function typedFormula(filed: string): string {
  const withoutLink = filed.replace(new RegExp(String.raw`\[\d+\]!(?=${filedPrefix})`, 'gi'), '');
  const typed = withoutLink.replace(parts, (part) => {
    const [, name, bracket] = call.exec(part) ?? [];
    if (name === undefined) return part.startsWith(localPrefix) ? part.slice(localPrefix.length) : part;
    return `${typedNameOf(name) ?? name.replace(/^_xl(?:fn|ws|pm|udf)\.(?:_xlws\.)?/i, '')}${bracket}`;
  });
  return withAt(withHash(typed));
}

/** Our own calls alone: what a file needs so that Excel knows them. `PACE.EVENT(B2)` → `_xldudf_PACE_EVENT(B2)`. */
export const withFiledNames = (formula: string): string =>
  formula.replace(parts, (part) => {
    const [, name, bracket] = call.exec(part) ?? [];
    const filed = name === undefined ? undefined : filedNameOf(name);
    return filed === undefined ? part : `${filed}${bracket}`;
  });

/**
 * The whole way: our calls, the prefixes of functions younger than the file format, `F2#`, and `@`.
 *
 * @param kind whether it will stand in the file as a plain formula or as an array
 */
export function filedFormula(typed: string, kind: 'plain' | 'array' = 'plain'): string {
  const filed = withLocalPrefixes(typed).replace(parts, (part) => {
    if (part.endsWith('#') && part.length > 1) return `_xlfn.${anchorArray}(${part.slice(0, -1)})`;
    const [, name, bracket] = call.exec(part) ?? [];
    if (name === undefined) return part;
    return `${filedNameOf(name) ?? filedModernName(name) ?? name}${bracket}`;
  });
  return kind === 'plain' ? withoutIntersections(filed) : namedIntersections(filed);
}

/** Whether a formula calls one of our functions, under either name. */
export const callsOurs = (formula: string): boolean =>
  [...formula.matchAll(parts)].some(([part]) => {
    const name = call.exec(part)?.[1];
    return name !== undefined && (filedNameOf(name) ?? typedNameOf(name)) !== undefined;
  });

/** Words in quotes, or the cells whose one in this row or column is meant. */
const single = /"(?:[^"]|"")*"|\bSINGLE\(((?:'(?:[^']|'')+'|[^'()",])+)\)/gi;

/** `SINGLE(A2:A9)` → `@A2:A9`. */
const withAt = (formula: string): string =>
  formula.replace(single, (all, cells?: string) => (cells === undefined ? all : `@${cells}`));
