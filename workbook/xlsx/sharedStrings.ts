/** The table of texts that cells refer to by number; phonetic hints are no part of a text. */
import { elementsIn } from './parts';
import { plainText } from './xml';
import type { Package } from './zip';

export function readSharedStrings(pack: Package, path: string | undefined): string[] {
  if (path === undefined || !pack.has(path)) return [];
  const strings: string[] = [];
  for (const { name, inside, text } of elementsIn(pack, path)) {
    if (name === 'si') strings.push('');
    else if (name === 't' && !inside.includes('rPh')) strings[strings.length - 1] += plainText(text);
  }
  return strings;
}
