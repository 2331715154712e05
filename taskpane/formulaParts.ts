/** A formula of ours, cut into parts that can each be explained. */
import { areaName, parseArea } from '../functions/address';
import { functionNamed } from '../functions/catalogue';
import { signature, typedName, type CellFunction } from '../functions/define';
import { cutAt } from '../functions/literal';
import type { SheetArea } from './port';
import { parameterHelp } from './steps/parameterHelp';

export interface FormulaPart {
  readonly text: string;
  /** What it is; left out for brackets and commas. */
  readonly says?: string;
  /** The name of the argument that it is. */
  readonly name?: string;
}

/**
 * All parts together are the formula, to the letter.
 *
 * @example formulaParts('=PACE.EVENT(A1)').map(({ text }) => text) // ['=', 'PACE.EVENT', '(', 'A1', ')']
 */
export const formulaParts = (formula: string): FormulaPart[] => [
  { text: '=' },
  ...partsOfCall(formula.replace(/^=/, '')),
];

/** @param as what the answer of the call is to the function around it */
function partsOfCall(text: string, as?: Omit<FormulaPart, 'text'>): FormulaPart[] {
  // a call that is being typed has no end yet
  const [, name = '', given = '', end = ''] = /^PACE\.([A-Z]+)\((.*?)(\)?)$/is.exec(text) ?? [];
  const f = functionNamed(name.toUpperCase());
  if (!f) return [{ text, ...as }];
  const parameters = Object.entries(f.parameters);
  const args = cutAt(given, ',').flatMap((argument, place): FormulaPart[] => {
    if (!parameters[place]) return [{ text: `,${argument}` }]; // more than it takes, which it will say itself
    const [parameter, definition] = parameters[place];
    const what = { name: parameter, says: `${parameter}: ${parameterHelp(definition)}` };
    const parts = argument === '' ? [] : partsOfCall(argument, what);
    return place === 0 ? parts : [{ text: ',' }, ...parts];
  });
  const own = { text: text.slice(0, typedName(f).length), says: whatItDoes(f, as?.says) };
  return [own, { text: '(' }, ...args, ...(end ? [{ text: end }] : [])];
}

const whatItDoes = (f: CellFunction, as?: string): string =>
  [as, `${signature(f)}: ${f.summary}`].filter(Boolean).join('. Here worked out by ');

/** Cells that a formula reads. */
export interface Read {
  /** The first argument that reads them. */
  readonly name: string;
  readonly area: SheetArea;
}

/** In the order in which the formula names them, each once. @param sheet where names without one are meant */
export function cellsRead(parts: readonly FormulaPart[], sheet: string): Read[] {
  const found = new Map<string, Read>();
  for (const { text, name } of parts) {
    const area = readArea(text, sheet);
    if (name !== undefined && area && !found.has(areaName(area))) found.set(areaName(area), { name, area });
  }
  return [...found.values()];
}

/** @returns nothing for what is no plain reference, or names no sheet and has none around it */
export function readArea(text: string, sheet: string): SheetArea | undefined {
  const area = parseArea(text);
  const on = area?.sheet ?? sheet;
  return area && on !== '' ? { ...area, sheet: on } : undefined;
}
