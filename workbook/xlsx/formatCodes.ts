/** The number by which a file knows each format of numbers; new ones are added to its list. */
import { builtInFormats } from './numberFormats';
import type { StyleLists } from './styleLists';
import { elementsOf, xmlAttribute } from './xml';

/** How a number is shown where nobody said (ISO/IEC 29500-1, 18.8.30). */
export const plainNumber = 'General';

/** Formats of one's own are numbered from here (18.8.30). */
const firstOwnFormat = 164;

export class FormatCodes {
  private readonly numbers: Map<string, number>;

  constructor(
    private readonly lists: StyleLists,
    path: string,
  ) {
    const own = lists.in('numFmts').flatMap((element) => elementsOf(element, path));
    this.numbers = new Map([
      ...[...builtInFormats].map(([number, code]) => [code, number] as const),
      [plainNumber, 0],
      ...own.map(({ attributes }) => [attributes.formatCode, Number(attributes.numFmtId)] as const),
    ]);
  }

  numberOf(format: string): number {
    const known = this.numbers.get(format);
    if (known !== undefined) return known;
    const number = Math.max(firstOwnFormat - 1, ...this.numbers.values()) + 1;
    this.numbers.set(format, number);
    const code = xmlAttribute(format);
    this.lists.add('numFmts', `<${this.lists.prefix}numFmt numFmtId="${number}" formatCode="${code}"/>`);
    return number;
  }
}
