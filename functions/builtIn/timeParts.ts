/** Built-in functions that take a text of figures and what stands between them apart. */
import type { TimeForm } from './timeForm';
import { quoted } from './text';

/** What is left of a text without its figures. */
export const withoutFigures = (cell: string): string =>
  [...'0123456789'].reduce((inner, figure) => `SUBSTITUTE(${inner},"${figure}","")`, cell);

/** The text with a colon for whatever follows a number. */
const withColons = (cell: string, { separators, ends }: TimeForm): string =>
  [...separators, ...ends]
    .filter((separator) => separator !== ':' && separator !== '')
    .reduce((inner, separator) => `SUBSTITUTE(${inner},${quoted(separator)},":",1)`, cell);

/** Wider than any number in such a text. */
const width = 40;

/** One of the numbers, as text: spread out, each lies in a stretch of its own. */
export const partOf = (cell: string, form: TimeForm, k: number): string =>
  `TRIM(MID(SUBSTITUTE(${withColons(cell, form)},":",REPT(" ",${width})),${k * width + 1},${width}))`;

/** Its value: figures without their point, then divided, since what a point means differs from country to country. */
export const numberOf = (part: string): string =>
  `VALUE(SUBSTITUTE(${part},".",""))/10^MAX(0,LEN(${part})-FIND(".",${part}&"."))`;
