/** How a time written as text is made up, and what its numbers stand for in built-in functions. */
import { timeFromText, type TimeReading } from '../../src/signal/timeText';
import { convertUnit } from '../../src/units';
import { NotSaid } from './said';
import { numberText, quoted } from './text';

/** What the numbers of a text mean. */
interface Meaning {
  /** In days, from formulas of the numbers. @param text the cell of the text */
  days(numbers: readonly string[], text: string): string;
  /** That the numbers make a time. */
  within(numbers: readonly string[]): readonly string[];
  /** What may follow the last number: one thing, or the two halves of a day. */
  readonly ends: readonly string[];
  /** The last number may have decimals or not. */
  readonly takesDecimals: boolean;
}

/** How a text is made up: numbers, and what stands between and after them. */
export interface TimeForm extends Meaning {
  readonly kind: TimeReading['kind'];
  /** How many numbers it has. */
  readonly size: number;
  /** What follows each number but the last. */
  readonly separators: readonly string[];
  /** The text without its figures; more than one where it means the same kind of time. */
  readonly spellings: readonly string[];
}

/** @returns nothing for words without a figure. @throws NotSaid for forms that no formula here reads */
export function timeForm(cell: string): TimeForm | undefined {
  if (!/\d/.test(cell)) return undefined;
  const { kind } = timeFromText(cell)!;
  const plain = cell.replace(/,/g, '.').replace(/ +/g, ' ').replace(/^ | $/g, '');
  const [before, ...pieces] = plain.split(/(\d+(?:\.\d+)?)/);
  const numbers = pieces.filter((_, n) => n % 2 === 0);
  const separators = pieces.filter((_, n) => n % 2 === 1);
  const end = separators.pop()!;
  const read = kind === 'date' ? [dateTime] : kind === 'clock' ? [clock] : [primes, units];
  const meaning =
    before === '' && numbers.length <= mostParts
      ? read.map((one) => one(numbers, separators, end)).find((found) => found)
      : undefined;
  if (!meaning) throw new NotSaid(`times hold "${cell}", which no formula can read`);
  // a point is no figure
  const point = numbers.at(-1)!.includes('.') ? '.' : '';
  const points = meaning.takesDecimals ? ['', '.'] : [point];
  const inner = numbers.slice(0, -1).map((number, n) => (number.includes('.') ? '.' : '') + separators[n]);
  return {
    ...meaning,
    kind,
    size: numbers.length,
    separators,
    spellings: points.flatMap((one) => meaning.ends.map((last) => inner.join('') + one + last)),
  };
}

/** Year, month, day, hours, minutes, seconds. */
const mostParts = 6;

type Read = (numbers: readonly string[], separators: readonly string[], end: string) => Meaning | undefined;

const inDays = (numbers: readonly string[], seconds: readonly number[]): string =>
  `(${numbers.map((number, k) => `${number}*${numberText(seconds[k])}`).join('+')})/86400`;

/** `0:04:30`, `10:15 pm`; one colon with decimals is minutes, without them hours. */
const clock: Read = (numbers, separators, end) => {
  const isMinutes = numbers.length === 2 && numbers[1].includes('.');
  const isHalved = !isMinutes && /^ ?[ap]\.?(?:m\.?)?$/i.test(end);
  if (separators.some((one) => one !== ':') || !(isHalved || end === '')) return undefined;
  const seconds = isMinutes ? [60, 1] : [3600, 60, 1];
  const ends = isHalved ? ['a', 'p'].map((half) => withHalf(end, half)) : [''];
  const hourOf = (hour: string, text: string): string =>
    isHalved ? `(MOD(${hour},12)+IF(ISERROR(FIND(${quoted(ends[1])},${text})),0,12))` : hour;
  return {
    days: ([first, ...others], text) => inDays([hourOf(first, text), ...others], seconds),
    within: ([first, ...others]) => [
      ...(isHalved ? [`${first}>=1`, `${first}<=12`] : []),
      ...others.map((number) => `${number}<60`),
    ],
    ends,
    takesDecimals: numbers.length === 3,
  };
};

/** ` PM` for the other half: ` AM`. */
const withHalf = (end: string, half: string): string =>
  end.replace(/[ap]/i, (letter) => (letter === letter.toLowerCase() ? half : half.toUpperCase()));

/** `2026-03-02`, `2026-03-02 10:15`, `2026-03-02T10:15:30Z`. */
const dateTime: Read = (numbers, separators, end) => {
  const day = ([year, month, date]: readonly string[]): string => `DATE(${year},${month},${date})`;
  const isDay = (of: readonly string[]): string[] => [
    `${of[0]}>1900`,
    `${of[0]}<10000`,
    `MONTH(${day(of)})=${of[1]}`,
    `DAY(${day(of)})=${of[2]}`,
  ];
  if (numbers.length === 3)
    return end === '' ? { days: day, within: isDay, ends: [''], takesDecimals: false } : undefined;
  const isUniversal = end === 'Z';
  const time = clock(numbers.slice(3), separators.slice(3), isUniversal ? '' : end);
  if (!time || !/^[T ]$/.test(separators[2])) return undefined;
  return {
    days: (of, text) => `${day(of)}+${time.days(of.slice(3), text)}`,
    within: (of) => [...isDay(of), `${of[3]}<24`, ...time.within(of.slice(3))],
    ends: isUniversal ? [end] : time.ends,
    takesDecimals: time.takesDecimals,
  };
};

/** `5'30"`, `5′ 30″`, `5'`. */
const primes: Read = (numbers, separators, end) => {
  const [minutes, seconds] = numbers.length === 2 ? [separators[0], end] : [end, ''];
  if (numbers.length > 2 || !/^ ?['′] ?$/.test(minutes) || !/^ ?(?:"|″|'')?$/.test(seconds)) return undefined;
  return {
    days: (of) => inDays(of, [60, 1]),
    // two figures
    within: (of) => of.slice(1).map((number) => `${number}<100`),
    ends: [end],
    takesDecimals: numbers.length === 2,
  };
};

/** `1 h 4 min 30 s`. */
const units: Read = (_numbers, separators, end) => {
  const all = [...separators, end];
  if (!all.every((one) => /^ ?[a-zµ]+ ?$/i.test(one))) return undefined;
  const seconds = all.map((unit) => convertUnit(1, unit.trim(), 's', 'times'));
  return { days: (of) => inDays(of, seconds), within: () => [], ends: [end], takesDecimals: true };
};
