/** Number formats for cells of an opened file: looks are added to its list, and none that it has is touched. */
import { applyEdits, insertion, type Edit } from './edits';
import { builtInFormats } from './numberFormats';
import { readXml } from './parts';
import { encodeXml, localName, scanXml, tagStart, xmlAttribute } from './xml';
import type { Package } from './zip';

/** How a number is shown where nobody said (ISO/IEC 29500-1, 18.8.30). */
export const plainNumber = 'General';

/** Formats of one's own are numbered from here (18.8.30). */
const firstOwnFormat = 164;

/** A list in the styles: `<cellXfs count="3">`. */
interface List {
  readonly open: { readonly start: number; readonly end: number };
  readonly close: number;
  readonly isClosed: boolean;
}

export class AddedNumberFormats {
  private readonly xml: string;
  private readonly lists = new Map<string, List>();
  private readonly looks: string[] = [];
  private readonly numbers = new Map<string, number>();
  private readonly newLooks = new Map<string, number>();
  private readonly newFormats: string[] = [];
  private prefix = '';
  private rootEnd = 0;

  constructor(
    private readonly pack: Package,
    private readonly path: string,
  ) {
    this.xml = readXml(pack, path);
    this.numbers = new Map([...builtInFormats].map(([number, code]) => [code, number]));
    this.numbers.set(plainNumber, 0);
    this.scan();
  }

  private scan(): void {
    const { xml } = this;
    const inside: { name: string; start: number; end: number }[] = [];
    scanXml(xml, this.path, {
      open: ({ name: full, attributes }, end) => {
        const name = localName(full);
        if (inside.length === 0) {
          this.prefix = full.slice(0, full.length - name.length);
          this.rootEnd = end;
        }
        if (name === 'numFmt' && inside.at(-1)?.name === 'numFmts')
          this.numbers.set(attributes.formatCode, Number(attributes.numFmtId));
        inside.push({ name, start: tagStart(xml, end), end });
      },
      close: ({ isSelfClosing }, end) => {
        const { name, ...open } = inside.pop()!;
        if (inside.length === 1)
          this.lists.set(name, { open, close: tagStart(xml, end), isClosed: isSelfClosing });
        if (name === 'xf' && inside.at(-1)?.name === 'cellXfs') this.looks.push(xml.slice(open.start, end));
      },
    });
  }

  /** The look, by its number, that differs from the cell's own in its number format alone. */
  look(own: number, format: string): number {
    const xf = this.looks[own] ?? `<${this.prefix}xf/>`;
    const changed = withFormat(xf, this.numberOf(format));
    const number = this.newLooks.get(changed) ?? this.looks.length + this.newLooks.size;
    this.newLooks.set(changed, number);
    return number;
  }

  private numberOf(format: string): number {
    const known = this.numbers.get(format);
    if (known !== undefined) return known;
    const number = Math.max(firstOwnFormat - 1, ...this.numbers.values()) + 1;
    this.numbers.set(format, number);
    this.newFormats.push(`<${this.prefix}numFmt numFmtId="${number}" formatCode="${xmlAttribute(format)}"/>`);
    return number;
  }

  write(): void {
    if (this.newLooks.size === 0) return;
    const edits = [
      ...this.appended('numFmts', this.newFormats),
      ...this.appended('cellXfs', [...this.newLooks.keys()]),
    ];
    this.pack.write(this.path, encodeXml(applyEdits(this.xml, edits)));
  }

  private appended(name: string, elements: readonly string[]): Edit[] {
    if (elements.length === 0) return [];
    const list = this.lists.get(name);
    const [text, full] = [elements.join(''), `${this.prefix}${name}`];
    // only the list of number formats may be missing, and it comes first
    if (!list) return [insertion(this.rootEnd, `<${full} count="${elements.length}">${text}</${full}>`)];
    const tag = this.xml.slice(list.open.start, list.open.end);
    const counted = tag.replace(
      /(\scount\s*=\s*["'])(\d+)/,
      (_, before: string, count: string) => `${before}${Number(count) + elements.length}`,
    );
    if (list.isClosed) return [{ ...list.open, text: `${counted.replace(/\s*\/>$/, '>')}${text}</${full}>` }];
    return [{ ...list.open, text: counted }, insertion(list.close, text)];
  }
}

function withFormat(xf: string, number: number): string {
  const end = xf.indexOf('>') + 1;
  const tag = xf
    .slice(0, end)
    .replace(/\s(?:numFmtId|applyNumberFormat)\s*=\s*(?:"[^"]*"|'[^']*')/g, '')
    .replace(/^<[\w.:-]+/, (name) => `${name} numFmtId="${number}" applyNumberFormat="1"`);
  return tag + xf.slice(end);
}
