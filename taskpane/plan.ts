/** What "Put it in" would write, worked out before anything is touched. */
import { areaName, parseArea } from '../functions/address';
import type { PutChoice } from './choices';
import type { Insertion, Part } from './insertions/insertion';
import type { CellToWrite, ChartToDraw, SheetArea } from './port';

/** A cell to write whose formats are not worked out yet. */
export type PlannedCell = Omit<CellToWrite, 'numberFormats'> & Pick<Part, 'formats'>;

/** The formats take the answer, so they are worked out only for what is put in. */
export function finished({ formats, ...cell }: PlannedCell): CellToWrite {
  const numberFormats = formats?.() ?? [];
  const { rows, columns } = cell.spills ?? cell.area;
  const fits = numberFormats.length === rows && numberFormats.every((row) => row.length === columns);
  return fits ? { ...cell, numberFormats } : cell; // an answer that is refused has no formats
}

export interface Plan {
  readonly cells: readonly PlannedCell[];
  /** Everything that will be filled, as one block. */
  readonly area: SheetArea;
  /** The first cell below the headings. */
  readonly target: SheetArea;
  /** Where one is asked for. */
  readonly chart?: ChartToDraw;
  /** For the undo button: `rate at 30 s in 'Gas run'!E3`. */
  readonly description: string;
}

/** @returns the cell meant, on the given sheet, where there is one, unless it names another; words when it means none */
function readTarget(sheet: string, typed: string): SheetArea | string {
  if (typed.trim() === '') return 'type the cell to write to, such as E3';
  const area = parseArea(typed);
  if (!area) return `a cell is written like E3 or 'Gas run'!E3: got "${typed.trim()}"`;
  if (area.sheet === undefined && sheet === '')
    return `name the sheet as well, such as 'Gas run'!E3: got "${typed.trim()}"`;
  return { sheet: area.sheet ?? sheet, row: area.row, column: area.column, rows: 1, columns: 1 };
}

/** @returns the plan, or why there is none, in words */
export function planFor(insertion: Insertion, sheet: string, put: PutChoice): Plan | string {
  const target = readTarget(sheet, put.target);
  if (typeof target === 'string') return target;
  const { name, parts, size, reads } = insertion;
  const headings = put.withHeading ? insertion.headings : [];
  const isLeft = insertion.headingsStand === 'left';
  if (headings.length > 0 && (isLeft ? target.column : target.row) === 0)
    return isLeft
      ? 'column A leaves no room for a heading left of it: choose a cell further right, or no heading'
      : 'row 1 leaves no room for a heading above: choose a lower cell, or no heading';
  const answer = { ...target, ...size };
  const overlapped = reads.find((area) => meets(answer, area));
  if (overlapped)
    return `the answer would cover its own readings in ${areaName(overlapped)}: choose another cell`;
  const area = headings.length > 0 ? withHeadings(answer, isLeft) : answer;
  return {
    cells: [
      ...headings.map((value, place) => ({
        area: isLeft ? cell(target, place, -1) : cell(target, -1, place),
        content: { value },
      })),
      ...parts.map(({ down, right, ...rest }) => ({ area: cell(target, down, right), ...rest })),
    ],
    area,
    target,
    ...(put.withChart && insertion.chart && { chart: chartBeside(area, answer, insertion) }),
    description: `${name} in ${areaName(target)}`,
  };
}

/** One column clear of all that is put in. */
function chartBeside(area: SheetArea, answer: SheetArea, { name, chart }: Insertion): ChartToDraw {
  const { axes, x, y, isFit } = chart!;
  const readings = { name: axes.y, x, y, isLine: false };
  return {
    title: isFit ? `${axes.y}: ${name}` : axes.y,
    axes,
    series: isFit ? [readings, { name, x, y: answer, isLine: true }] : [readings],
    at: { ...area, column: area.column + area.columns + 1, rows: 1, columns: 1 },
  };
}

const withHeadings = (answer: SheetArea, isLeft: boolean): SheetArea =>
  isLeft
    ? { ...answer, column: answer.column - 1, columns: answer.columns + 1 }
    : { ...answer, row: answer.row - 1, rows: answer.rows + 1 };

const cell = (target: SheetArea, down: number, right: number): SheetArea => ({
  ...target,
  row: target.row + down,
  column: target.column + right,
});

const meets = (a: SheetArea, b: SheetArea): boolean =>
  a.sheet === b.sheet &&
  a.row < b.row + b.rows &&
  b.row < a.row + a.rows &&
  a.column < b.column + b.columns &&
  b.column < a.column + a.columns;
