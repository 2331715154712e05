/** What standards weigh in a calibration line, and how uncertain a reading between them is. */
import type { Area } from '../address';
import type { Given } from './given';
import { Pairs } from './pairs';
import { NotSaid } from './said';
import { fixedArea } from './text';
import { headingRow, type Table, type WorkingCell } from './workings';

export interface StandardWeights {
  /** The root of each standard's weight; 0 leaves one out. */
  readonly root: string;
  /** The weights themselves; nothing where all are alike. */
  readonly square?: string;
  readonly holds: readonly string[];
  /** Standard uncertainty of a reading of the unknown, by its place among them. */
  at(place: number): string;
}

export function standardWeights(given: Given, pairs: Pairs): StandardWeights {
  if (!given.has('uncertainties')) return { root: pairs.both, holds: [], at: () => '1' };
  const isRelative = given.isWord('uncertainties', 'relative');
  const u = isRelative ? `ABS(${pairs.y})` : Pairs.of(given, 'standards', 'uncertainties').y;
  const isWrong = isRelative ? `IF(${pairs.y}=0,1,0)` : `IF(ISNUMBER(${u}),IF(${u}>0,0,1),1)`;
  return {
    root: pairs.each(`1/${u}`),
    square: pairs.each(`1/${u}^2`),
    holds: [`0*SUM(${u})+SUM(${pairs.each(isWrong)})=0`],
    at: (place) => uncertaintiesAt(given, isRelative).cell(1 + place, uncertainty),
  };
}

/** Columns of the table. */
const [reading, below, above, ofBelow, ofAbove, uncertainty] = [0, 1, 2, 3, 4, 5];

/** For each reading: linear between those of the standards next to it, and beyond them that of the last. */
function uncertaintiesAt(given: Given, isRelative: boolean): Table {
  const far = given.fromWorkings();
  const pairs = Pairs.of(far, 'concentrations', 'standards');
  const u = isRelative ? undefined : Pairs.of(far, 'standards', 'uncertainties').y;
  const { cells, area, text } = far.argument('readings') ?? {};
  if (!cells) throw new NotSaid(`${text} is worked out within the formula`);
  const readings = cells.flatMap((line, r) =>
    line.map((cell, c): WorkingCell => (area ? { formula: numberAt(area, r, c) } : cell)),
  );
  const title = `Uncertainties of ${text}: those of ${pairs.y} over ${pairs.x} are ${u ?? 'relative'}`;
  return given.workings.table(title, (own) => [
    headingRow(
      'reading',
      'standard below',
      'standard above',
      'its uncertainty',
      'its uncertainty',
      'uncertainty',
    ),
    ...readings.map((cell, n) => row(pairs, u, (column) => own.cell(1 + n, column), cell)),
  ]);
}

function numberAt(area: Area, r: number, c: number): string {
  const cell = fixedArea({ ...area, row: area.row + r, column: area.column + c, rows: 1, columns: 1 });
  return `IF(ISNUMBER(${cell}),${cell},"")`;
}

/** @param u of the standards; left out where in proportion to their readings */
function row(
  pairs: Pairs,
  u: string | undefined,
  at: (column: number) => string,
  source: WorkingCell,
): WorkingCell[] {
  const { y, places } = pairs;
  const next = (side: '<' | '>=', nearest: 'MAX' | 'MIN'): string => {
    const among = `${y}${side}${at(reading)}`;
    const all = `${nearest}(${pairs.some(`IF(${among},${y},"")`)})`;
    return `IF(ISNUMBER(${at(reading)}),IF(SUM(${pairs.each(`IF(${among},1,0)`)})>0,${all},""),"")`;
  };
  // of equal standards the one that stands nearer in their order
  const own = (column: number, nearest: 'MAX' | 'MIN'): string => {
    const among = pairs.some(`IF(${y}=${at(column)},${places},"")`);
    const value = u === undefined ? `ABS(${at(column)})` : pairs.standingAt(u, `${nearest}(${among})`);
    return `IF(ISNUMBER(${at(column)}),${value},"")`;
  };
  const share = `(${at(reading)}-${at(below)})/(${at(above)}-${at(below)})`;
  const between = `${at(ofBelow)}+${share}*(${at(ofAbove)}-${at(ofBelow)})`;
  const known = `IF(ISNUMBER(${at(below)}),IF(ISNUMBER(${at(above)}),${between},${at(ofBelow)}),${at(ofAbove)})`;
  return [
    source,
    ...[
      next('<', 'MAX'),
      next('>=', 'MIN'),
      own(below, 'MAX'),
      own(above, 'MIN'),
      `IF(ISNUMBER(${at(reading)}),${known},"")`,
    ].map((formula) => ({ formula })),
  ];
}
