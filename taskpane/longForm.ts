/** Several runs under each other, each row with the name of its run. */
import type { CellValue } from '../functions/cell';
import { placesInWords } from '../functions/series/places';
import type { Grid } from './findTable';
import type { Stretch, Table } from './runs';
import { placeName } from './turned';

type Found = Pick<Table, 'names' | 'stretches' | 'apart'>;
const oneRun: Found = { names: null, stretches: [], apart: '' };

/** The rows of one name, in the order of the sheet. */
interface Group {
  readonly name: string;
  readonly rows: readonly number[];
}

/** @param said the column of names, `null` for none; guessed where nobody said */
export function runsBelowEachOther(grid: Grid, said: number | null | undefined): Found {
  if (said === null) return oneRun;
  if (said !== undefined) return asFound(grid, said);
  // words name runs oftener than numbers do
  const numeric = new Set(grid.columns.map(({ column }) => column));
  const guess =
    grid.labels.find(({ column }) => !numeric.has(column) && namesRuns(grid, column)) ??
    grid.columns.find(({ column }) => namesRuns(grid, column));
  return guess ? asFound(grid, guess.column) : oneRun;
}

function asFound(grid: Grid, names: number): Found {
  const groups = groupsBy(grid, names);
  const [together, apart] = [groups.filter(liesTogether), groups.filter((one) => !liesTogether(one))];
  return {
    names,
    stretches: together.map(({ name, rows }): Stretch => ({
      name,
      firstRow: rows[0],
      lastRow: rows[rows.length - 1],
    })),
    apart: apart.length === 0 ? '' : apartInWords(grid, apart),
  };
}

function apartInWords({ isTurned }: Grid, [{ name, rows }, ...others]: readonly Group[]): string {
  const shape = isTurned ? { rows: 1, columns: 2 } : { rows: 2, columns: 1 };
  const where = placesInWords(rows, shape, (row) => placeName(row, isTurned));
  const more = others.length === 0 ? '' : ` and of ${others.length} more`;
  return `a formula takes rows that lie together, and those of run “${name}”${more} do not (${where}): sort the table by run`;
}

const liesTogether = ({ rows }: Group): boolean => rows[rows.length - 1] - rows[0] === rows.length - 1;

/**
 * Runs begin anew under each other, so that time falls from each to the next. Where their rows are mixed,
 * the same times come back under other names.
 */
function namesRuns(grid: Grid, names: number): boolean {
  const others = grid.columns.filter(({ column }) => column !== names);
  if (others.length < 2) return false;
  const { column } = others.find(({ heading }) => heading.quantity === 'time') ?? others[0];
  const timeAt = (row: number): CellValue => cellAt(grid, row, column);
  const groups = groupsBy(grid, names);
  const isRun = ({ rows }: Group): boolean =>
    rows.length > 1 && rows.every((row, i) => i === 0 || isLater(timeAt(row), timeAt(rows[i - 1])));
  if (groups.length < 2 || !groups.every(isRun)) return false;
  if (groups.every(liesTogether))
    return groups.every(({ rows }, i) => {
      const before = groups[i - 1]?.rows;
      return !before || isLater(timeAt(before[before.length - 1]), timeAt(rows[0]));
    });
  const times = groups.flatMap(({ rows }) => rows.map(timeAt));
  return new Set(times).size < times.length;
}

const isLater = (a: CellValue, b: CellValue): boolean =>
  typeof a === 'number' && typeof b === 'number' && a > b;

const cellAt = ({ cells, area }: Grid, row: number, column: number): CellValue =>
  cells[row - area.row]?.[column - area.column] ?? null;

/** A name written once at the head of its run holds for the blank cells below it. */
function groupsBy(grid: Grid, names: number): Group[] {
  const groups = new Map<string, number[]>();
  let name = '';
  for (let row = grid.firstRow; row <= grid.lastRow; row++) {
    const cell = cellAt(grid, row, names);
    const written = cell === null ? '' : String(cell).trim();
    if (written !== '') name = written;
    if (name === '') continue;
    const rows = groups.get(name);
    if (rows) rows.push(row);
    else groups.set(name, [row]);
  }
  return [...groups].map(([of, rows]) => ({ name: of, rows }));
}
