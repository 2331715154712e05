/** The table of texts that cells refer to by number; phonetic hints are no part of a text. */
import { readXml } from './parts';
import { localName, plainText, scanXml } from './xml';
import type { Package } from './zip';

export function readSharedStrings(pack: Package, path: string | undefined): string[] {
  if (path === undefined || !pack.has(path)) return [];
  const strings: string[] = [];
  let [isText, isHint] = [false, false];
  let item = '';
  scanXml(readXml(pack, path), path, {
    open({ name }) {
      isText = localName(name) === 't';
      isHint ||= localName(name) === 'rPh';
      if (localName(name) === 'si') item = '';
    },
    text(text) {
      if (isText && !isHint) item += text;
    },
    close({ name }) {
      isText = false;
      if (localName(name) === 'rPh') isHint = false;
      if (localName(name) === 'si') strings.push(plainText(item));
    },
  });
  return strings;
}
