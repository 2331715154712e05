/**
 * Excel's object model over cells in memory, as far as the port uses it, on office-addin-mock: a property
 * read before load and sync is not there, and what is set takes effect at sync, as in Excel.
 */
import { OfficeMockObject } from 'office-addin-mock';
import { parseArea, type Area } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { fakeCharts, type FakeChart } from './fakeCharts';
import type { BenchSheets } from './portContract';

interface Cell {
  readonly value: unknown;
  readonly type: string;
  readonly formula: unknown;
  readonly format: string;
}

const blank: Cell = { value: '', type: 'Empty', formula: '', format: 'General' };

function cellOf(value: CellValue): Cell {
  if (value === null) return blank;
  if (value instanceof CellError) return { ...blank, value: value.code, type: 'Error', formula: value.code };
  const types: Record<string, string> = { number: 'Double', string: 'String', boolean: 'Boolean' };
  return { ...blank, value, type: types[typeof value], formula: value };
}

/** What Excel makes of something typed: an apostrophe keeps words words, a fraction is a date. */
function typed(input: unknown): Cell {
  if (typeof input !== 'string') return cellOf(input as CellValue);
  if (input === '') return blank;
  if (input.startsWith("'")) return cellOf(input.slice(1));
  if (input.startsWith('=')) return { ...blank, value: 2, type: 'Double', formula: input };
  return /^\d+\/\d+/.test(input) ? cellOf(45658) : cellOf(input);
}

type Loose = Record<string, unknown>;

export interface FakeExcel {
  select(reference: string): void;
  /** What Excel draws over its cells. */
  readonly charts: readonly FakeChart[];
  /** A formula of the first of these cells has filled them all, each with 7, and each tells of it as its own. */
  spill(reference: string, formula: string): void;
  /** Of one cell. */
  numberFormat(reference: string): string;
}

export function fakeExcel(sheets: BenchSheets): FakeExcel {
  const names = Object.keys(sheets);
  const cells = new Map<string, Cell>();
  const key = (sheet: string, row: number, column: number): string => `${sheet}!${row}!${column}`;
  for (const [sheet, rows] of Object.entries(sheets)) {
    rows.forEach((row, r) =>
      row.forEach((value, c) => value !== null && cells.set(key(sheet, r, c), cellOf(value))),
    );
  }
  let [shownSheet, selected]: [string, Area] = [names[0], { row: 0, column: 0, rows: 1, columns: 1 }];
  const handlers = new Set<() => Promise<void>>();
  const drawn = fakeCharts();
  /** Cells that a formula has filled, its own among them, and where it stands. */
  const spilled = new Map<string, Pick<Area, 'row' | 'column'>>();
  let created: { mock: OfficeMockObject; commit(): void }[] = [];

  const grid = <T>({ rows, columns }: Area, pick: (r: number, c: number) => T): T[][] =>
    Array.from({ length: rows }, (_, r) => Array.from({ length: columns }, (_, c) => pick(r, c)));

  function rangeAt(sheet: string, area: Area): Loose {
    const at = (r: number, c: number): Cell => cells.get(key(sheet, area.row + r, area.column + c)) ?? blank;
    const pending: (() => void)[] = [];
    const mock = new OfficeMockObject({
      rowIndex: area.row,
      columnIndex: area.column,
      rowCount: area.rows,
      columnCount: area.columns,
      values: grid(area, (r, c) => at(r, c).value),
      valueTypes: grid(area, (r, c) => at(r, c).type),
      formulas: grid(area, (r, c) => at(r, c).formula),
      numberFormat: grid(area, (r, c) => at(r, c).format),
      // of contents alone: formats stay
      clear: () =>
        pending.push(() =>
          grid(area, (r, c) =>
            cells.set(key(sheet, area.row + r, area.column + c), { ...blank, format: at(r, c).format }),
          ),
        ),
      select: () => pending.push(() => ((shownSheet = sheet), (selected = area))),
      getCell: (r: number, c: number) =>
        rangeAt(sheet, { row: area.row + r, column: area.column + c, rows: 1, columns: 1 }),
      getSpillParentOrNullObject: () => {
        const parent = spilled.get(key(sheet, area.row, area.column));
        return parent ? rangeAt(sheet, { ...parent, rows: 1, columns: 1 }) : nothing();
      },
      getSurroundingRegion: () => rangeAt(sheet, surrounding(sheet, area)),
    });
    created.push({ mock, commit: () => pending.splice(0).forEach((change) => change()) });
    const put = (rows: unknown[][], merge: (old: Cell, next: unknown) => Cell): void => {
      if (rows.length !== area.rows || rows[0].length !== area.columns)
        throw new Error('the shape does not fit the range');
      pending.push(() =>
        rows.forEach((row, r) =>
          row.forEach((next, c) =>
            cells.set(key(sheet, area.row + r, area.column + c), merge(at(r, c), next)),
          ),
        ),
      );
    };
    const setters: Setters = {
      values: (rows) => put(rows, ({ format }, next) => ({ ...typed(next), format })),
      formulas: (rows) => put(rows, ({ format }, next) => ({ ...typed(next), format })),
      numberFormat: (rows) =>
        put(rows, (old, next) => (next === null ? old : { ...old, format: String(next) })),
    };
    return settable(mock, setters, false, { place: { sheet, ...area } });
  }

  function surrounding(sheet: string, start: Area): Area {
    const filled = (row: number, column: number): boolean =>
      (cells.get(key(sheet, row, column))?.type ?? 'Empty') !== 'Empty';
    for (let area = start; ;) {
      const ring = grid({ ...area, rows: area.rows + 2, columns: area.columns + 2 }, (r, c) => [
        area.row + r - 1,
        area.column + c - 1,
      ]);
      const all = ring.flat().filter(([row, column]) => filled(row, column));
      const rows = [...all.map(([row]) => row), area.row, area.row + area.rows - 1];
      const columns = [...all.map(([, column]) => column), area.column, area.column + area.columns - 1];
      const next = boundsOf(rows, columns);
      if (next.rows * next.columns === area.rows * area.columns) return area;
      area = next;
    }
  }

  function sheetObject(name: string): Loose {
    const isThere = names.includes(name);
    const mock = new OfficeMockObject({
      name,
      activate: () => (shownSheet = name),
      getRangeByIndexes: (row: number, column: number, rows: number, columns: number) =>
        rangeAt(name, { row, column, rows, columns }),
      getUsedRangeOrNullObject: () => usedRange(name),
    });
    created.push({ mock, commit: () => undefined });
    return settable(mock, {}, !isThere, { charts: drawn.on(name) });
  }

  function usedRange(name: string): Loose {
    const places = [...cells].filter(([place, { type }]) => place.startsWith(`${name}!`) && type !== 'Empty');
    const used = places.map(([place]) => place.split('!').slice(1).map(Number));
    if (used.length > 0)
      return rangeAt(
        name,
        boundsOf(
          used.map(([row]) => row),
          used.map(([, column]) => column),
        ),
      );
    return nothing();
  }

  function nothing(): Loose {
    const mock = new OfficeMockObject({ rowIndex: 0, columnIndex: 0, rowCount: 0, columnCount: 0 });
    created.push({ mock, commit: () => undefined });
    return settable(mock, {}, true);
  }

  const workbook = {
    worksheets: {
      getItem: (name: string) => sheetObject(name),
      getItemOrNullObject: (name: string) => sheetObject(name),
      getActiveWorksheet: () => sheetObject(shownSheet),
    },
    getSelectedRange: () => rangeAt(shownSheet, selected),
    getActiveCell: () => rangeAt(shownSheet, { ...selected, rows: 1, columns: 1 }),
    onSelectionChanged: {
      add: (handler: () => Promise<void>) => {
        handlers.add(handler);
        return { context, remove: () => handlers.delete(handler) };
      },
    },
  };
  const context = {
    workbook,
    async sync() {
      created.forEach(({ commit }) => commit());
      drawn.commit();
      await Promise.all(created.map(({ mock }) => mock.sync()));
    },
  };

  Object.assign(globalThis, {
    Excel: {
      run: async (...args: ((given: typeof context) => Promise<unknown>)[]) => {
        const result = await args[args.length - 1](context);
        await context.sync();
        created = [];
        return result;
      },
      RangeValueType: { empty: 'Empty', error: 'Error' },
      ClearApplyTo: { contents: 'Contents' },
      ChartType: { xyscatter: 'XYScatter', xyscatterSmoothNoMarkers: 'XYScatterSmoothNoMarkers' },
      ChartSeriesBy: { rows: 'Rows', columns: 'Columns' },
    },
  });

  return {
    charts: drawn.shown,
    spill(reference, formula) {
      const { sheet = shownSheet, ...area } = parseArea(reference)!;
      grid(area, (r, c) => {
        const place = key(sheet, area.row + r, area.column + c);
        cells.set(place, { ...cellOf(7), formula });
        spilled.set(place, area);
      });
    },
    select(reference) {
      const { sheet = shownSheet, ...area } = parseArea(reference)!;
      [shownSheet, selected] = [sheet, area];
      handlers.forEach((handler) => void handler());
    },
    numberFormat(reference) {
      const { sheet = shownSheet, row, column } = parseArea(reference)!;
      return (cells.get(key(sheet, row, column)) ?? blank).format;
    },
  };
}

function boundsOf(rows: readonly number[], columns: readonly number[]): Area {
  const [row, column] = [Math.min(...rows), Math.min(...columns)];
  return { row, column, rows: Math.max(...rows) - row + 1, columns: Math.max(...columns) - column + 1 };
}

type Setters = Record<string, (rows: unknown[][]) => void>;

/**
 * The mock as the code under test sees it: setting a property is a command; `isNullObject` needs no load of
 * its own, nor has what stands beside the mock.
 */
function settable(mock: OfficeMockObject, setters: Setters, isNullObject = false, beside: Loose = {}): Loose {
  return new Proxy(mock as unknown as Loose, {
    get(target, property: string) {
      if (property === 'isNullObject') return isNullObject;
      if (property in beside) return beside[property];
      const value = target[property];
      return typeof value === 'function' ? (value as (...args: unknown[]) => unknown).bind(target) : value;
    },
    set(_, property: string, value: unknown[][]) {
      if (!(property in setters)) throw new Error(`${property} cannot be set`);
      setters[property](value);
      return true;
    },
  });
}
