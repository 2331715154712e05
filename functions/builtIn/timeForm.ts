/** How a time written as text is made up, and how built-in functions take it apart. */
import { timeFromText } from '../../src/signal/timeText';
import { convertUnit } from '../../src/units';
import { NotSaid } from './said';
import { quoted } from './text';

/** How a text is made up: numbers, and what stands between and after them. */
export interface TimeForm {
  /** What follows each number. */
  readonly separators: readonly string[];
  /** What each number counts for, in seconds. */
  readonly seconds: readonly number[];
  /** The text without its figures; more than one where it means the same. */
  readonly spellings: readonly string[];
  /** A clock may pass midnight, a duration does not. */
  readonly isClock: boolean;
}

/** Hours, minutes, seconds. */
export const mostParts = 3;

/** @returns nothing for words without a figure. @throws NotSaid for forms that no formula here reads */
export function timeForm(cell: string): TimeForm | undefined {
  if (!/\d/.test(cell)) return undefined;
  const { kind } = timeFromText(cell)!;
  const plain = cell.replace(/,/g, '.').replace(/ +/g, ' ').replace(/^ | $/g, '');
  const [before, ...pieces] = plain.split(/(\d+(?:\.\d+)?)/);
  const numbers = pieces.filter((_, n) => n % 2 === 0);
  const separators = pieces.filter((_, n) => n % 2 === 1);
  const isClock = kind === 'clock';
  const isReadable = isClock
    ? separators.slice(0, -1).every((s) => s === ':') && separators.at(-1) === ''
    : separators.every((s) => /^ ?[a-zµ]+ ?$/i.test(s));
  if (kind === 'date' || before !== '' || numbers.length > mostParts || !isReadable)
    throw new NotSaid(`times hold "${cell}", which no formula can read`);
  const spelling = plain.replace(/\d/g, '');
  const last = separators.at(-1)!;
  const whole = spelling.slice(0, spelling.length - last.length).replace(/\.$/, '');
  // one colon with decimals is minutes, without them hours
  const isFixed = isClock && numbers.length === 2;
  return {
    separators,
    seconds: isClock ? clockSeconds(numbers) : separators.map((s) => convertUnit(1, s.trim(), 's', 'times')),
    spellings: isFixed ? [spelling] : [whole + last, `${whole}.${last}`],
    isClock,
  };
}

function clockSeconds(numbers: readonly string[]): number[] {
  if (numbers.length === 3) return [3600, 60, 1];
  return numbers[1].includes('.') ? [60, 1] : [3600, 60];
}

/** What is left of a text without its figures. */
export const withoutFigures = (cell: string): string =>
  [...'0123456789'].reduce((inner, figure) => `SUBSTITUTE(${inner},"${figure}","")`, cell);

/** The text with a colon for whatever follows a number. */
const withColons = (cell: string, { separators, isClock }: TimeForm): string =>
  isClock
    ? cell
    : separators.reduce((inner, separator) => `SUBSTITUTE(${inner},${quoted(separator)},":",1)`, cell);

/** Wider than any number in such a text. */
const width = 40;

/** One of the numbers, as text: spread out, each lies in a stretch of its own. */
export const partOf = (cell: string, form: TimeForm, k: number): string =>
  `TRIM(MID(SUBSTITUTE(${withColons(cell, form)},":",REPT(" ",${width})),${k * width + 1},${width}))`;

/** Its value: figures without their point, then divided, since what a point means differs from country to country. */
export const numberOf = (part: string): string =>
  `VALUE(SUBSTITUTE(${part},".",""))/10^MAX(0,LEN(${part})-FIND(".",${part}&"."))`;
