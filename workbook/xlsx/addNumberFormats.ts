/** Number formats for cells of an opened file: looks are added to its list, and none that it has is touched. */
import { FormatCodes } from './formatCodes';
import { StyleLists } from './styleLists';
import type { Package } from './zip';

export class AddedNumberFormats {
  private readonly lists: StyleLists;
  private readonly codes: FormatCodes;

  constructor(pack: Package, path: string) {
    this.lists = new StyleLists(pack, path);
    this.codes = new FormatCodes(this.lists, path);
  }

  /** The look, by its number, that differs from the cell's own in its number format alone. */
  look(own: number, format: string): number {
    const xf = this.lists.in('cellXfs')[own] ?? `<${this.lists.prefix}xf/>`;
    return this.lists.add('cellXfs', withFormat(xf, this.codes.numberOf(format)));
  }

  write(): void {
    this.lists.write();
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
