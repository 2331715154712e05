/** The lists in which a file keeps its styles (ISO/IEC 29500-1, 18.8): they can grow, and nothing in them changes. */
import { applyEdits, insertion, type Edit } from './edits';
import { readXml } from './parts';
import { encodeXml, localName, scanXml, tagStart } from './xml';
import type { Package } from './zip';

/** As they follow each other in the file. */
const inOrder = [
  'numFmts',
  'fonts',
  'fills',
  'borders',
  'cellStyleXfs',
  'cellXfs',
  'cellStyles',
  'dxfs',
] as const;

type ListName = (typeof inOrder)[number];

/** A list as it stands in the file: `<cellXfs count="3">…</cellXfs>`. */
interface List {
  readonly open: { readonly start: number; readonly end: number };
  readonly close: number;
  readonly end: number;
  readonly isClosed: boolean;
  readonly elements: readonly string[];
}

export class StyleLists {
  private readonly xml: string;
  private readonly lists = new Map<string, List>();
  private readonly added = new Map<ListName, string[]>();
  private rootEnd = 0;
  /** Before every element's name. */
  prefix = '';

  constructor(
    private readonly pack: Package,
    private readonly path: string,
  ) {
    this.xml = opened(readXml(pack, path));
    this.scan();
  }

  private scan(): void {
    const inside: { name: string; start: number; end: number; elements: string[] }[] = [];
    scanXml(this.xml, this.path, {
      open: ({ name: full }, end) => {
        const name = localName(full);
        if (inside.length === 0) {
          this.prefix = full.slice(0, full.length - name.length);
          this.rootEnd = end;
        }
        inside.push({ name, start: tagStart(this.xml, end), end, elements: [] });
      },
      close: ({ isSelfClosing }, end) => {
        const { name, elements, ...open } = inside.pop()!;
        if (inside.length === 2) inside[1].elements.push(this.xml.slice(open.start, end));
        if (inside.length !== 1) return;
        const close = tagStart(this.xml, end);
        this.lists.set(name, { open, close, end, isClosed: isSelfClosing, elements });
      },
    });
  }

  /** The elements of a list as the file has them. */
  in(name: ListName): readonly string[] {
    return this.lists.get(name)?.elements ?? [];
  }

  /** @returns its number in the list; an element that was added already is not added again */
  add(name: ListName, element: string): number {
    const added = this.added.get(name) ?? this.firstOf(name);
    this.added.set(name, added);
    const known = added.indexOf(element);
    return this.in(name).length + (known >= 0 ? known : added.push(element) - 1);
  }

  /** Cells without a look of their own have the first of the list, and looks without a font its first font. */
  private firstOf(name: ListName): string[] {
    if (this.in(name).length > 0) return [];
    if (name === 'fonts') return [`<${this.prefix}font/>`];
    return name === 'cellXfs' ? [`<${this.prefix}xf numFmtId="0"/>`] : [];
  }

  write(): void {
    if (this.added.size === 0) return;
    const edits = inOrder.flatMap((name) => this.appended(name, this.added.get(name) ?? []));
    this.pack.write(this.path, encodeXml(applyEdits(this.xml, edits)));
  }

  private appended(name: ListName, elements: readonly string[]): Edit[] {
    if (elements.length === 0) return [];
    const list = this.lists.get(name);
    const [text, full] = [elements.join(''), `${this.prefix}${name}`];
    if (!list)
      return [insertion(this.placeOf(name), `<${full} count="${elements.length}">${text}</${full}>`)];
    const tag = this.xml.slice(list.open.start, list.open.end);
    const counted = tag.replace(
      /(\scount\s*=\s*["'])(\d+)/,
      (_, before: string, count: string) => `${before}${Number(count) + elements.length}`,
    );
    if (list.isClosed) return [{ ...list.open, text: `${counted.replace(/\s*\/>$/, '>')}${text}</${full}>` }];
    return [{ ...list.open, text: counted }, insertion(list.close, text)];
  }

  /** Of a list that is missing: after the last of those that come before it. */
  private placeOf(name: ListName): number {
    const before = inOrder.slice(0, inOrder.indexOf(name)).map((one) => this.lists.get(one)?.end ?? 0);
    return Math.max(this.rootEnd, ...before);
  }
}

/** `<styleSheet/>` has room for nothing. */
const opened = (xml: string): string => xml.replace(/<([\w.:-]*styleSheet)(\s[^>]*)?\/>\s*$/, '<$1$2></$1>');
