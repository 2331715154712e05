/** A formula of ours, cut into parts that can each be explained. */
import { functionNamed } from '../functions/catalogue';
import { signature, typedName, type CellFunction } from '../functions/define';
import { cutAt } from '../functions/literal';
import { parameterHelp } from './steps/parameterHelp';

export interface FormulaPart {
  readonly text: string;
  /** What it is; left out for brackets and commas. */
  readonly says?: string;
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
function partsOfCall(text: string, as = ''): FormulaPart[] {
  const [, name = '', given = ''] = /^PACE\.([A-Z]+)\((.*)\)$/s.exec(text) ?? [];
  const f = functionNamed(name);
  if (!f) return [{ text, ...(as && { says: as }) }];
  const parameters = Object.entries(f.parameters);
  const args = cutAt(given, ',').flatMap((argument, place): FormulaPart[] => {
    const [parameter, definition] = parameters[place];
    const parts = argument === '' ? [] : partsOfCall(argument, `${parameter}: ${parameterHelp(definition)}`);
    return place === 0 ? parts : [{ text: ',' }, ...parts];
  });
  return [{ text: typedName(f), says: whatItDoes(f, as) }, { text: '(' }, ...args, { text: ')' }];
}

const whatItDoes = (f: CellFunction, as: string): string =>
  [as, `${signature(f)}: ${f.summary}`].filter(Boolean).join('. Here worked out by ');
