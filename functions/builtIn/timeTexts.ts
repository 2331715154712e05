/** Clock times and durations written as text, read on the sheet "Workings": each must keep the form it has. */
import { timeFromText } from '../../src/signal/timeText';
import type { CellValue } from '../cell';
import type { Given } from './given';
import { Readings } from './readings';
import { NotSaid } from './said';
import { timeForm, type TimeForm } from './timeForm';
import { numberOf, partOf, withoutFigures } from './timeParts';
import { fixedArea, quoted } from './text';
import { headingRow, type Table, type WorkingCell } from './workings';

export interface TimeTexts {
  /** In days, one below the other. */
  readonly days: Readings;
  /** That every text has kept its form. */
  readonly holds: readonly string[];
  readonly areClocks: boolean;
  /** Whether they stand side by side where they come from. */
  readonly isRow: boolean;
}

/** Columns of the table; the numbers of a text come last. */
const [reading, text, form, days, isRead, firstPart] = [0, 1, 2, 3, 4, 5];

const ordinals = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];

/** Whether any of the times is such a text. */
export const hasTimeTexts = (given: Given): boolean =>
  given
    .argument('times')
    ?.cells?.flat()
    .some((cell) => typeof cell === 'string' && /\d/.test(cell)) ?? false;

/** @throws NotSaid for a block, and for forms that no formula here reads */
export function timeTexts(given: Given): TimeTexts {
  const { cells = [], area } = given.fromWorkings().argument('times') ?? {};
  if (cells.length > 1 && cells[0].length > 1) throw new NotSaid('times are a block');
  const all = cells.flat();
  const forms = all.map((cell) => (typeof cell === 'string' ? timeForm(cell) : undefined));
  const source = (n: number): WorkingCell => {
    if (!area) return all[n];
    const [row, column] = cells.length > 1 ? [area.row + n, area.column] : [area.row, area.column + n];
    const cell = fixedArea({ ...area, row, column, rows: 1, columns: 1 });
    return { formula: `IF(OR(ISTEXT(${cell}),ISNUMBER(${cell}),ISERROR(${cell})),${cell},"")` };
  };
  const numbers = ordinals.slice(0, Math.max(...forms.map((one) => one?.size ?? 0)));
  const title = area ? fixedArea(area) : all.join('; ');
  const table = given.workings.table(`Times as text: ${title}`, (own) => [
    headingRow('reading', 'as text', 'without figures', 'days', '1 where it can be read', ...numbers),
    ...forms.map((one, n) => row(own, n + 1, source(n), one)),
  ]);
  const origin = table.area(all.length, 1);
  const own = { ...origin, row: origin.row + 1, column: origin.column + days };
  const values = all.map((cell, n) => [forms[n] ? timeFromText(cell as string)!.days : withoutText(cell)]);
  return {
    days: new Readings({ text: fixedArea(own), area: own, cells: values }, 'times'),
    holds: [`COUNTIF(${table.range(1, isRead, all.length)},1)=${all.length}`],
    isRow: cells.length === 1 && all.length > 1,
    areClocks: forms.every((one) => one === undefined || one.kind === 'clock'),
  };
}

const withoutText = (cell: CellValue): CellValue => (typeof cell === 'string' ? null : cell);

function row(own: Table, n: number, source: WorkingCell, one: TimeForm | undefined): WorkingCell[] {
  const at = (column: number): string => own.cell(n, column);
  const isTime = `LEN(${at(form)})<LEN(${at(text)})`;
  const inDays = one ? daysOf(at, one) : '""';
  return [
    source,
    { formula: `IF(ISTEXT(${at(reading)}),TRIM(SUBSTITUTE(${at(reading)},",",".")),"")` },
    { formula: withoutFigures(at(text)) },
    {
      formula: `IF(${isTime},${inDays},IF(OR(ISNUMBER(${at(reading)}),ISERROR(${at(reading)})),${at(reading)},""))`,
    },
    { formula: `IF(${isTime},${one ? canBeRead(at, one) : '0'},1)` },
    ...(one ? placesOf(one).map((k) => ({ formula: partOf(at(text), one, k) })) : []),
  ];
}

type At = (column: number) => string;

const placesOf = ({ size }: TimeForm): number[] => Array.from({ length: size }, (_, k) => k);

const numbersOf = (at: At, one: TimeForm): string[] => placesOf(one).map((k) => numberOf(at(firstPart + k)));

const daysOf = (at: At, one: TimeForm): string =>
  `IF(${at(isRead)}=1,${one.days(numbersOf(at, one), at(text))},"")`;

/** 1 where the text has kept its form, and its numbers make a time. */
function canBeRead(at: At, one: TimeForm): string {
  const isKept = `OR(${one.spellings.map((spelling) => `EXACT(${at(form)},${quoted(spelling)})`).join(',')})`;
  const areThere = placesOf(one).map((k) => `${at(firstPart + k)}<>""`);
  const within = one.within(numbersOf(at, one));
  const isWithin = within.length > 0 ? `IF(AND(${within.join(',')}),1,0)` : '1';
  return `IF(AND(${isKept},${areThere.join(',')}),${isWithin},0)`;
}
