/** XML as text: written with care, read with a real scanner. */
import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { NotAWorkbook } from './notAWorkbook';

/** Text between tags. Characters that XML cannot hold are written `_x000D_`, as ISO/IEC 29500-1, 22.9.2.19 has it. */
export const xmlText = (text: string): string =>
  text
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_')
    .replace(
      /[^\t\n\u0020-\ufffd]/g,
      (c) => `_x${c.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')}_`,
    )
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;');

export const xmlAttribute = (text: string): string =>
  xmlText(text)
    .replace(/"/g, '&quot;')
    .replace(/[\t\n]/g, (c) => `&#${c.charCodeAt(0)};`);

/** The other way: `_x000D_` back into its character. */
export const plainText = (text: string): string =>
  text.replace(/_x([0-9A-Fa-f]{4})_/g, (_, code: string) => String.fromCharCode(parseInt(code, 16)));

/** @throws NotAWorkbook for a part in another encoding, which could not be written back as it came */
export function decodeXml(bytes: Uint8Array, part: string): string {
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    throw new NotAWorkbook(`${part} is not written in UTF-8`);
  }
}

export const encodeXml = (xml: string): Uint8Array => new TextEncoder().encode(xml);

/** Without a prefix: `x:row` is a `row`. */
export const localName = (name: string): string => name.slice(name.indexOf(':') + 1);

export interface XmlElement {
  /** Without a prefix. */
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  /** The names of the elements it stands in, outermost first. */
  readonly inside: readonly string[];
  /** All text inside, however deep. */
  text: string;
}

/** Every element of a small part, in the order of their opening tags. @throws NotAWorkbook */
export function elementsOf(xml: string, part: string): XmlElement[] {
  const elements: XmlElement[] = [];
  const open: XmlElement[] = [];
  scanXml(xml, part, {
    open(tag) {
      const element = {
        name: localName(tag.name),
        attributes: tag.attributes,
        inside: open.map((e) => e.name),
        text: '',
      };
      elements.push(element);
      open.push(element);
    },
    close: () => void open.pop(),
    text: (text) => open.forEach((element) => (element.text += text)),
  });
  return elements;
}

export interface XmlListener {
  /** `end` is the place after the tag's `>`. */
  open(tag: SaxesTagPlain, end: number): void;
  close?(tag: SaxesTagPlain, end: number): void;
  text?(text: string): void;
}

/** @throws NotAWorkbook where the XML is not well formed */
export function scanXml(xml: string, part: string, listener: XmlListener): void {
  const parser = new SaxesParser<{ position: true; xmlns: false }>({ position: true, xmlns: false });
  parser.on('opentag', (tag) => listener.open(tag, parser.position));
  parser.on('closetag', (tag) => listener.close?.(tag, parser.position));
  parser.on('text', (text) => listener.text?.(text));
  parser.on('cdata', (text) => listener.text?.(text));
  parser.on('error', (error) => {
    throw new NotAWorkbook(`${part} is damaged: ${error.message}`);
  });
  parser.write(xml).close();
}

/** Where the tag begins that ends at `end`: no attribute can hold a `<`. Over so short a way, lastIndexOf takes far longer. */
export function tagStart(xml: string, end: number): number {
  let at = end - 1;
  while (xml.charCodeAt(at) !== lessThan) at -= 1;
  return at;
}

const lessThan = '<'.charCodeAt(0);
