/** What can go wrong with an argument, by what its definition says of it. */
import type { CellRange, CellValue } from '../../../../functions/cell';
import type { Parameter } from '../../../../functions/parameters';

export interface Fault {
  readonly what: string;
  /** What stands in the argument's cells then; text that starts with = is a formula. */
  readonly cells: CellRange;
  /** It is of another kind than what the formula was made for, which may refuse it although PACE has an answer. */
  readonly isOfAnotherKind: boolean;
}

/** In any cell. */
const strays: Readonly<Record<string, CellValue>> = {
  'a blank': null,
  'an empty text': '=""',
  'an error': '=1/0',
  'a word': 'lost',
  TRUE: true,
};

/** Where a number stands. */
const numbers: Readonly<Record<string, CellValue>> = {
  ...strays,
  'a number as text, with a point': '2.5',
  'a number as text, with a comma': '2,5',
  zero: 0,
  'below zero': -2,
  'far too large': 1e4,
};

/** Where a number with a unit may stand. */
const quantities: Readonly<Record<string, CellValue>> = {
  ...numbers,
  'a unit that there is not': '21 foo',
  'a unit of something else': '21 cd',
};

const byKind: Readonly<Record<Parameter['kind'], Readonly<Record<string, CellValue>>>> = {
  number: numbers,
  quantity: quantities,
  quantities,
  column: numbers,
  readings: numbers,
  uncertainties: numbers,
  endpoint: numbers,
  flag: { ...strays, FALSE: false, 'another number': 2, zero: 0 },
  text: { ...strays, 'a number': 5 },
};

export function faultsOf(parameter: Parameter, cells: CellRange): Fault[] {
  const flat = cells.flat();
  const kinds = { ...byKind[parameter.kind], ...outside(parameter), ...withItsUnit(parameter, flat) };
  const single = Object.entries(kinds).map(([what, cell]): Fault => {
    const place = flat.length === 1 ? 0 : 1;
    return {
      what,
      cells: withCell(cells, place, cell),
      isOfAnotherKind: isOther(parameter, flat[place], cell),
    };
  });
  const all = flat.length === 1 ? single : [...single, ...ofSeveral(cells)];
  // a bound at 0 is a zero as well
  return [...new Map(all.map((fault) => [JSON.stringify(fault.cells), fault])).values()];
}

/** Words, flags and units are built into a formula, and so is that an argument was given. */
function isOther({ kind, optional }: Parameter, was: CellValue, cell: CellValue): boolean {
  const isEmptied = optional && (cell === null || cell === '=""');
  const isFigureInText = (one: CellValue): boolean => typeof one === 'string' && /^\d/.test(one);
  return isEmptied || kind === 'flag' || kind === 'text' || isFigureInText(cell) || isFigureInText(was);
}

/** On each bound and beyond it. */
function outside({ bounds = {} }: Parameter): Record<string, CellValue> {
  const { above, atLeast, below, atMost, whole } = bounds;
  return {
    ...(above === undefined ? {} : { 'at the lower bound': above }),
    ...(atLeast === undefined ? {} : { 'at the lower bound': atLeast, 'below the lower bound': atLeast - 1 }),
    ...(below === undefined ? {} : { 'at the upper bound': below }),
    ...(atMost === undefined ? {} : { 'at the upper bound': atMost, 'above the upper bound': atMost + 1 }),
    ...(whole ? { 'not whole': 2.5 } : {}),
  };
}

/** What is a number today may carry its unit tomorrow. */
function withItsUnit({ kind, unit }: Parameter, flat: readonly CellValue[]): Record<string, CellValue> {
  const isBare = kind.startsWith('quantit') && typeof flat[0] === 'number';
  return isBare ? { 'the same with its unit': `${flat[0]} ${unit}` } : {};
}

/** Of a range as a whole, and at its ends. */
function ofSeveral(cells: CellRange): Fault[] {
  const flat = cells.flat();
  const all = (cell: CellValue): CellRange => cells.map((row) => row.map(() => cell));
  const swapped = withCell(withCell(cells, 0, flat[1]), 1, flat[0]);
  const onlyTwo = flat.reduce<CellRange>((some, _, n) => (n < 2 ? some : withCell(some, n, 'lost')), cells);
  const faults = {
    'a gap at the start': withCell(cells, 0, null),
    'a gap at the end': withCell(cells, flat.length - 1, 'lost'),
    'two alike': withCell(cells, 1, flat[0]),
    'all alike': all(flat[1]),
    'no number': all(null),
    'two numbers': onlyTwo,
    'two exchanged': swapped,
  };
  return Object.entries(faults).map(([what, then]) => ({ what, cells: then, isOfAnotherKind: false }));
}

/** @param place counted row by row */
function withCell(cells: CellRange, place: number, cell: CellValue): CellRange {
  const columns = cells[0].length;
  return cells.map((row, r) => row.map((own, c) => (r * columns + c === place ? cell : own)));
}
