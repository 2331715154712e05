/** A workbook in memory behind the port. A formula of ours is calculated once, when it is written. */
import { cellName, parseArea } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import { answerOf } from './memoryFormulas';
import {
  CellsInUse,
  type CellToWrite,
  type RangeReading,
  type SheetArea,
  type WorkbookPort,
} from '../../taskpane/port';

export type Sheets = Readonly<Record<string, readonly (readonly CellValue[])[]>>;

interface Cell {
  readonly value: CellValue;
  readonly formula?: string;
}

const plainFormat = 'General';

export interface MemoryWorkbook {
  readonly port: WorkbookPort;
  /** `'Gas run'!A1:B9`; the active cell is its first. */
  select(reference: string): void;
  set(reference: string, value: CellValue): void;
  formulaAt(reference: string): string | undefined;
  numberFormat(reference: string): string;
  valueAt(reference: string): CellValue;
}

export function memoryWorkbook(sheets: Sheets): MemoryWorkbook {
  const cells = new Map<string, Cell>();
  const formats = new Map<string, string>();
  const names = Object.keys(sheets);
  const key = (sheet: string, row: number, column: number): string => `${sheet}!${row}!${column}`;
  for (const [sheet, rows] of Object.entries(sheets)) {
    rows.forEach((row, r) =>
      row.forEach((value, c) => value !== null && cells.set(key(sheet, r, c), { value })),
    );
  }
  let selected: SheetArea = { sheet: names[0], row: 0, column: 0, rows: 1, columns: 1 };
  const listeners = new Set<() => void>();

  const area = (reference: string): SheetArea => ({ sheet: names[0], ...parseArea(reference)! });
  const at = ({ sheet }: SheetArea, row: number, column: number): CellValue =>
    cells.get(key(sheet, row, column))?.value ?? null;
  const isFilled = (sheet: string, row: number, column: number): boolean =>
    cells.has(key(sheet, row, column));

  function places({ row, column, rows, columns }: SheetArea): [number, number][] {
    return Array.from({ length: rows * columns }, (_, i) => [
      row + Math.floor(i / columns),
      column + (i % columns),
    ]);
  }

  function reading(of: SheetArea): RangeReading {
    return {
      area: of,
      cells: Array.from({ length: of.rows }, (_, r) =>
        Array.from({ length: of.columns }, (_, c) => at(of, of.row + r, of.column + c)),
      ),
    };
  }

  /** The smallest block around some cells, or nothing. */
  function blockAround(sheet: string, found: readonly [number, number][]): SheetArea | null {
    if (found.length === 0) return null;
    const rows = found.map(([row]) => row);
    const columns = found.map(([, column]) => column);
    const [row, column] = [Math.min(...rows), Math.min(...columns)];
    return {
      sheet,
      row,
      column,
      rows: Math.max(...rows) - row + 1,
      columns: Math.max(...columns) - column + 1,
    };
  }

  function usedArea(sheet: string): SheetArea | null {
    const used = [...cells.keys()].map((name) => name.split('!')).filter(([name]) => name === sheet);
    return blockAround(
      sheet,
      used.map(([, row, column]): [number, number] => [Number(row), Number(column)]),
    );
  }

  function grownFrom(start: SheetArea): SheetArea {
    const { sheet, row, column, rows, columns } = start;
    const ring = places({ sheet, row: row - 1, column: column - 1, rows: rows + 2, columns: columns + 2 });
    const grown = blockAround(sheet, [...places(start), ...ring.filter(([r, c]) => isFilled(sheet, r, c))])!;
    return grown.rows * grown.columns === rows * columns ? start : grownFrom(grown);
  }

  const reachOf = ({ area: to, spills }: CellToWrite): SheetArea => ({ ...to, ...spills });
  const requireSheet = (sheet: string): void => {
    if (!names.includes(sheet)) throw new Error(`there is no sheet named "${sheet}"`);
  };
  const filled = (of: SheetArea): string[] =>
    places(of).flatMap(([row, column]) => (isFilled(of.sheet, row, column) ? [cellName(row, column)] : []));

  const port: WorkbookPort = {
    host: 'memory',
    canChart: false,
    async selection() {
      const used = usedArea(selected.sheet);
      if (!used) return null;
      const [row, column] = [Math.max(used.row, selected.row), Math.max(used.column, selected.column)];
      const rows = Math.min(used.row + used.rows, selected.row + selected.rows) - row;
      const columns = Math.min(used.column + used.columns, selected.column + selected.columns) - column;
      return rows > 0 && columns > 0 ? reading({ sheet: selected.sheet, row, column, rows, columns }) : null;
    },
    async regionAroundActiveCell() {
      const region = grownFrom({ ...selected, rows: 1, columns: 1 });
      return filled(region).length > 0 ? reading(region) : null;
    },
    activeCell: async () => ({ ...selected, rows: 1, columns: 1 }),
    async read(of) {
      requireSheet(of.sheet);
      return reading(of);
    },
    onSelectionChange(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    onActiveCell(listener) {
      const tell = (): void => {
        const { sheet, row, column } = selected;
        const formula = cells.get(key(sheet, row, column))?.formula ?? null;
        listener({ at: { sheet, row, column, rows: 1, columns: 1 }, formula });
      };
      listeners.add(tell);
      tell();
      return () => listeners.delete(tell);
    },
    async occupied(of) {
      requireSheet(of.sheet);
      return filled(of);
    },
    async write(toWrite, { overwrite, description }) {
      toWrite.forEach((one) => requireSheet(one.area.sheet));
      const inUse = toWrite.flatMap((one) => filled(reachOf(one)));
      if (inUse.length > 0 && !overwrite) throw new CellsInUse(inUse);
      const touched = toWrite.flatMap((one) =>
        places(reachOf(one)).map(([r, c]) => key(one.area.sheet, r, c)),
      );
      const snapshot = touched.map((name) => [name, cells.get(name), formats.get(name)] as const);
      for (const { area: to, numberFormats = [] } of toWrite) {
        numberFormats.forEach((row, r) =>
          row.forEach((format, c) => format && formats.set(key(to.sheet, to.row + r, to.column + c), format)),
        );
      }
      touched.forEach((name) => cells.delete(name));
      for (const one of toWrite) {
        const name = key(one.area.sheet, one.area.row, one.area.column);
        if ('value' in one.content) cells.set(name, { value: one.content.value });
        else {
          const formula = one.content.formula;
          const answer = answerOf(formula, one.area.sheet, (of) => reading(of).cells);
          places(reachOf(one)).forEach(([r, c]) => {
            const value = answer ? answer[r - one.area.row]?.[c - one.area.column] : 0;
            if (value !== undefined) cells.set(key(one.area.sheet, r, c), { value });
          });
          cells.set(name, { value: cells.get(name)?.value ?? 0, formula });
        }
      }
      return { description, area: reachOf(toWrite[0]), snapshot };
    },
    async undo({ snapshot }) {
      for (const [name, cell, format] of snapshot as [string, Cell?, string?][]) {
        if (cell) cells.set(name, cell);
        else cells.delete(name);
        if (format) formats.set(name, format);
        else formats.delete(name);
      }
    },
    async reveal(of) {
      selected = of;
      listeners.forEach((listener) => listener());
    },
  };

  return {
    port,
    select(reference) {
      selected = area(reference);
      listeners.forEach((listener) => listener());
    },
    set(reference, value) {
      const { sheet, row, column } = area(reference);
      if (value === null) cells.delete(key(sheet, row, column));
      else cells.set(key(sheet, row, column), { value });
    },
    formulaAt(reference) {
      const { sheet, row, column } = area(reference);
      return cells.get(key(sheet, row, column))?.formula;
    },
    numberFormat(reference) {
      const { sheet, row, column } = area(reference);
      return formats.get(key(sheet, row, column)) ?? plainFormat;
    },
    valueAt(reference) {
      const of = area(reference);
      return at(of, of.row, of.column);
    },
  };
}
