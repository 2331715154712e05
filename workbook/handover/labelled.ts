/** Text on the sheet "Method". */
import type { SheetCell } from './newSheet';
import { wrapped } from './wrapped';

/** Characters in a line. */
export const lineLength = 110;

/** Each text in lines of its own: cells to the right of it stay empty, so that it can be read to its end. */
export const labelled = (label: string | null, text: string): SheetCell[][] =>
  wrapped(text, lineLength).map((line, n) => [n === 0 ? label : null, null, line]);
