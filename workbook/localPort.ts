/** The pane's port over the grid of the local workbook. */
import { cellName, quotedSheet } from '../functions/address';
import type { CellValue } from '../functions/cell';
import {
  CellsInUse,
  type CellToWrite,
  type RangeReading,
  type SheetArea,
  type WorkbookFiles,
  type WorkbookPort,
} from '../taskpane/port';
import type { CellToSet, Grid } from './engine/grid';

export function localPort(grid: Grid, files: WorkbookFiles): WorkbookPort {
  const requireSheet = (sheet: string): void => {
    if (!grid.sheets().includes(sheet)) throw new Error(`there is no sheet named "${sheet}"`);
  };
  const reading = (area: SheetArea): RangeReading => ({ area, cells: grid.values(area) });
  /** A formula may show nothing yet: it fills its cell all the same. */
  const isFilled = (sheet: string, row: number, column: number, shown: CellValue): boolean =>
    shown !== null || grid.typed({ sheet, row, column }).formula !== undefined;

  function occupied(area: SheetArea): string[] {
    requireSheet(area.sheet);
    const used = usedPart(grid, area);
    if (!used) return [];
    return grid.values(used).flatMap((cells, r) =>
      cells.flatMap((shown, c) => {
        const [row, column] = [used.row + r, used.column + c];
        return isFilled(used.sheet, row, column, shown)
          ? [`${quotedSheet(used.sheet)}!${cellName(row, column)}`]
          : [];
      }),
    );
  }

  return {
    host: 'local workbook',
    files,
    canChart: false,
    async selection() {
      const selected = grid.selected();
      const used = selected && usedPart(grid, selected);
      return used && reading(used);
    },
    async regionAroundActiveCell() {
      const active = grid.active();
      const region = active && regionAround(grid, { ...active, rows: 1, columns: 1 });
      return region && reading(region);
    },
    async activeCell() {
      const active = grid.active();
      return active && { ...active, rows: 1, columns: 1 };
    },
    async read(area) {
      requireSheet(area.sheet);
      return reading(area);
    },
    onSelectionChange: (listener) => grid.onSelection(listener),
    onActiveCell(listener) {
      const tell = (): void => {
        const active = grid.active();
        listener(active && { at: { ...active, rows: 1, columns: 1 }, formula: grid.formula() });
      };
      const stops = [grid.onSelection(tell), grid.onTyping(tell), grid.onEdit(tell)];
      tell();
      return () => stops.forEach((stop) => stop());
    },
    mark: (areas) => grid.mark(areas),
    occupied: async (area) => occupied(area),
    async write(cells, { overwrite, description }) {
      const inUse = cells.flatMap((cell) => occupied(reachOf(cell)));
      if (inUse.length > 0 && !overwrite) throw new CellsInUse(inUse);
      const reach = cells.flatMap((cell) => placesIn(reachOf(cell)));
      const snapshot = reach.map((place): CellToSet => ({ ...place, ...grid.typed(place) }));
      // what stands where a formula will spill would block it
      const emptied = cells.flatMap((cell) =>
        placesIn(reachOf(cell)).map((place): CellToSet => ({
          ...place,
          value: null,
          ...formatAt(cell, place),
        })),
      );
      await grid.set([...emptied, ...cells.map(cellToSet)]);
      return { description, area: reachOf(cells[0]), snapshot };
    },
    async undo({ snapshot }) {
      await grid.set(snapshot as readonly CellToSet[]);
    },
    async reveal(area) {
      requireSheet(area.sheet);
      grid.select(area);
    },
  };
}

const reachOf = ({ area, spills }: CellToWrite): SheetArea => ({ ...area, ...spills });

function cellToSet({ area: { sheet, row, column }, content }: CellToWrite): CellToSet {
  const typed = 'formula' in content ? { value: null, formula: content.formula } : { value: content.value };
  return { sheet, row, column, ...typed };
}

function formatAt(
  { area, numberFormats }: CellToWrite,
  { row, column }: Pick<SheetArea, 'row' | 'column'>,
): Pick<CellToSet, 'numberFormat'> {
  const numberFormat = numberFormats?.[row - area.row]?.[column - area.column];
  return numberFormat ? { numberFormat } : {};
}

function placesIn({ sheet, row, column, rows, columns }: SheetArea): Omit<CellToSet, 'value'>[] {
  return Array.from({ length: rows * columns }, (_, place) => ({
    sheet,
    row: row + Math.floor(place / columns),
    column: column + (place % columns),
  }));
}

/** The part of the area that lies in what is filled. */
function usedPart(grid: Grid, area: SheetArea): SheetArea | null {
  const used = grid.used(area.sheet);
  if (!used) return null;
  const row = Math.max(used.row, area.row);
  const column = Math.max(used.column, area.column);
  const rows = Math.min(used.row + used.rows, area.row + area.rows) - row;
  const columns = Math.min(used.column + used.columns, area.column + area.columns) - column;
  return rows > 0 && columns > 0 ? { sheet: area.sheet, row, column, rows, columns } : null;
}

/** Grows until blank rows and columns stand all around, then drops the blank rim that was never filled. */
function regionAround(grid: Grid, start: SheetArea): SheetArea | null {
  const used = grid.used(start.sheet);
  if (!used) return null;
  const values = grid.values(used);
  const isFilled = (row: number, column: number): boolean =>
    (values[row - used.row]?.[column - used.column] ?? null) !== null;
  let { row, column, rows, columns } = start;
  const anyIn = (top: number, left: number, height: number, width: number): boolean =>
    placesIn({ sheet: start.sheet, row: top, column: left, rows: height, columns: width }).some((place) =>
      isFilled(place.row, place.column),
    );
  for (let grew = true; grew;) {
    // one cell further at the corners, since blocks may touch there
    const above = row > 0 && anyIn(row - 1, column - 1, 1, columns + 2);
    if (above) [row, rows] = [row - 1, rows + 1];
    const below = anyIn(row + rows, column - 1, 1, columns + 2);
    if (below) rows++;
    const left = column > 0 && anyIn(row - 1, column - 1, rows + 2, 1);
    if (left) [column, columns] = [column - 1, columns + 1];
    const right = anyIn(row - 1, column + columns, rows + 2, 1);
    if (right) columns++;
    grew = above || below || left || right;
  }
  return anyIn(row, column, rows, columns) ? { sheet: start.sheet, row, column, rows, columns } : null;
}
