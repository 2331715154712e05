/** Looks for a sheet that is added to an opened file, in the file's own plain font: nothing that it has is touched. */
import { FormatCodes, plainNumber } from './formatCodes';
import { StyleLists } from './styleLists';
import type { Package } from './zip';

export interface AddedLook {
  readonly numberFormat?: string;
  readonly bold?: boolean;
  readonly wrap?: boolean;
  readonly align?: 'left' | 'right';
  /** In widths of three blanks (ISO/IEC 29500-1, 18.8.1). */
  readonly indent?: number;
  readonly vertical: 'top' | 'bottom';
}

export class AddedLooks {
  private readonly lists: StyleLists;
  private readonly codes: FormatCodes;

  constructor(pack: Package, path: string) {
    this.lists = new StyleLists(pack, path);
    this.codes = new FormatCodes(this.lists, path);
  }

  /** The look's number, for the cells that have it. */
  look({ numberFormat = plainNumber, bold, wrap, align, indent, vertical }: AddedLook): number {
    const { prefix } = this.lists;
    const alignment = [
      ...(align ? [`horizontal="${align}"`] : []),
      `vertical="${vertical}"`,
      ...(wrap ? ['wrapText="1"'] : []),
      ...(indent ? [`indent="${indent}"`] : []),
    ].join(' ');
    const [format, font] = [this.codes.numberOf(numberFormat), bold ? this.boldFont() : 0];
    return this.lists.add(
      'cellXfs',
      `<${prefix}xf numFmtId="${format}" fontId="${font}" fillId="0" borderId="0" applyNumberFormat="1" applyFont="1" applyAlignment="1"><${prefix}alignment ${alignment}/></${prefix}xf>`,
    );
  }

  /** The number of a look laid over a cell that a rule picks out: bold, dark red on a pale ground. */
  warning(): number {
    const p = this.lists.prefix;
    return this.lists.add(
      'dxfs',
      `<${p}dxf><${p}font><${p}b/><${p}color rgb="FF8A1C00"/></${p}font><${p}fill><${p}patternFill patternType="solid"><${p}bgColor rgb="FFFDE9D9"/></${p}patternFill></${p}fill></${p}dxf>`,
    );
  }

  private boldFont(): number {
    const p = this.lists.prefix;
    const plain = this.lists.in('fonts')[0] ?? `<${p}font/>`;
    const open = plain.replace(/\s*\/>$/, `></${p}font>`);
    const without = open.replace(new RegExp(`<${p}b(?:\\s[^>]*)?(?:/>|></${p}b>)`, 'g'), '');
    return this.lists.add(
      'fonts',
      without.replace(/^<[^>]*>/, (tag) => `${tag}<${p}b/>`),
    );
  }

  write(): void {
    this.lists.write();
  }
}
