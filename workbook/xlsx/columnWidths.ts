/** How wide the columns of a sheet are, which it says before its cells (ISO/IEC 29500-1, 18.3.1.13). */
import { elementsOf } from './xml';

/** In characters, where the sheet does not say. */
const usual = 9;

/** @returns the width of a column, in characters; of one that is hidden 0 */
export function columnWidths(xml: string, part: string): (column: number) => number {
  const before = xml.slice(0, xml.search(/<(?:[\w.-]+:)?sheetData[\s/>]/));
  const tags = before.match(/<(?:[\w.-]+:)?col\s[^>]*\/>/g) ?? [];
  const stretches = tags
    .flatMap((tag) => elementsOf(tag, part))
    .map(({ attributes: { min, max, width, hidden } }) => ({
      first: Number(min) - 1,
      last: Number(max) - 1,
      width: hidden === '1' || hidden === 'true' ? 0 : Number(width ?? usual),
    }));
  return (column) => stretches.find(({ first, last }) => column >= first && column <= last)?.width ?? usual;
}
