/** The workbook port over Office.js; nothing but this and its folder calls it. Each call is one batch with as few syncs as it can do with. */
import { cellName, parseArea, type Area } from '../functions/address';
import { CellError, type CellRange, type CellValue, type ErrorCode } from '../functions/cell';
import { drawChart, removeChart, type DrawnChart } from './excel/chart';
import { excelFiles } from './excel/files';
import { onActiveCell, onSelection } from './excel/listening';
import { documentMemory } from './excel/memory';
import { oneEach, spilledInto } from './excel/spills';
import { allSupport, withoutSpills, type HostSupport } from './excel/support';
import {
  CellsInUse,
  type CellToWrite,
  type RangeReading,
  type SheetArea,
  type WorkbookPort,
  type WriteReceipt,
} from './port';

const shape = { rowIndex: true, columnIndex: true, rowCount: true, columnCount: true };
const contents = { values: true, valueTypes: true };

/** A cell as it was: its formula, or its value where it has none. */
interface Snapshot {
  readonly chart?: DrawnChart;
  readonly blocks: readonly {
    readonly area: SheetArea;
    readonly formulas: unknown[][];
    readonly numberFormat: unknown[][];
  }[];
}

export function excelPort({ name, files, charts, spills, memory }: HostSupport = allSupport): WorkbookPort {
  return {
    host: name,
    canChart: charts,
    ...(!spills && { remark: withoutSpills }),
    ...(files && { files: excelFiles }),
    ...(memory && { memory: documentMemory }),
    selection: () => Excel.run(readSelection),
    regionAroundActiveCell: () => Excel.run(readRegion),
    activeCell: () => Excel.run(readActiveCell),
    read: (area) =>
      Excel.run(async (context) => readArea(context, await sheetNamed(context, area.sheet), area)),
    onSelectionChange: onSelection,
    onActiveCell,
    occupied: (area) => Excel.run((context) => occupiedCells(context, area)),
    write: (cells, options) => Excel.run((context) => write(context, cells, options, spills)),
    undo: (receipt) => Excel.run((context) => putBack(context, receipt)),
    reveal: (area) =>
      Excel.run(async (context) => {
        const sheet = await sheetNamed(context, area.sheet);
        sheet.activate();
        rangeOf(sheet, area).select();
        await context.sync();
      }),
  };
}

/** Which cells of an area are blank: a custom function is handed 0 for both a blank and a zero. */
export function blanksIn(address: string): Promise<boolean[][]> {
  const area = parseArea(address.replace(/\[[^\]]*\]/, '')); // the name of the workbook can stand before the sheet's
  if (area?.sheet === undefined) return Promise.reject(new Error(`no place in a sheet: ${address}`));
  const { sheet: name } = area;
  return Excel.run(async (context) => {
    const range = rangeOf(context.workbook.worksheets.getItem(name), area);
    range.load({ valueTypes: true });
    await context.sync();
    return range.valueTypes.map((row) => row.map((type) => type === Excel.RangeValueType.empty));
  });
}

async function sheetNamed(context: Excel.RequestContext, name: string): Promise<Excel.Worksheet> {
  const sheet = context.workbook.worksheets.getItemOrNullObject(name);
  sheet.load({ name: true });
  await context.sync();
  if (sheet.isNullObject) throw new Error(`there is no sheet named "${name}"`);
  return sheet;
}

const rangeOf = (sheet: Excel.Worksheet, { row, column, rows, columns }: Area): Excel.Range =>
  sheet.getRangeByIndexes(row, column, rows, columns);

const areaOf = (range: Excel.Range): Area => ({
  row: range.rowIndex,
  column: range.columnIndex,
  rows: range.rowCount,
  columns: range.columnCount,
});

async function readArea(
  context: Excel.RequestContext,
  sheet: Excel.Worksheet,
  area: SheetArea,
): Promise<RangeReading> {
  const range = rangeOf(sheet, area);
  range.load(contents);
  await context.sync();
  return { area, cells: cellsOf(range) };
}

/** Excel shows errors as text and blanks as ""; the value types tell them from words. */
function cellsOf({ values, valueTypes }: Excel.Range): CellRange {
  return values.map((row, r) =>
    row.map((value, c): CellValue => {
      const type = valueTypes[r][c];
      if (type === Excel.RangeValueType.empty) return null;
      return type === Excel.RangeValueType.error ? new CellError(value as ErrorCode) : (value as CellValue);
    }),
  );
}

/** @returns null for several areas at once, and where nothing is filled in what is selected */
async function readSelection(context: Excel.RequestContext): Promise<RangeReading | null> {
  const selected = context.workbook.getSelectedRange();
  const sheet = context.workbook.worksheets.getActiveWorksheet();
  const used = sheet.getUsedRangeOrNullObject(true);
  selected.load(shape);
  used.load(shape);
  sheet.load({ name: true });
  try {
    await context.sync();
  } catch {
    return null; // Excel refuses getSelectedRange for a selection in several pieces
  }
  const common = used.isNullObject ? null : intersection(areaOf(selected), areaOf(used));
  return common && readArea(context, sheet, { sheet: sheet.name, ...common });
}

function intersection(a: Area, b: Area): Area | null {
  const [row, column] = [Math.max(a.row, b.row), Math.max(a.column, b.column)];
  const rows = Math.min(a.row + a.rows, b.row + b.rows) - row;
  const columns = Math.min(a.column + a.columns, b.column + b.columns) - column;
  return rows > 0 && columns > 0 ? { row, column, rows, columns } : null;
}

/** A block larger than this is no single run, and too much to carry over at every click. */
const mostCells = 200_000;

async function readRegion(context: Excel.RequestContext): Promise<RangeReading | null> {
  const region = context.workbook.getActiveCell().getSurroundingRegion();
  const sheet = context.workbook.worksheets.getActiveWorksheet();
  region.load(shape);
  sheet.load({ name: true });
  await context.sync();
  const area = areaOf(region);
  if (area.rows * area.columns > mostCells) return null;
  const reading = await readArea(context, sheet, { sheet: sheet.name, ...area });
  return reading.cells.flat().every((cell) => cell === null) ? null : reading;
}

async function readActiveCell(context: Excel.RequestContext): Promise<SheetArea | null> {
  const cell = context.workbook.getActiveCell();
  const sheet = context.workbook.worksheets.getActiveWorksheet();
  cell.load(shape);
  sheet.load({ name: true });
  await context.sync();
  return { sheet: sheet.name, ...areaOf(cell) };
}

async function occupiedCells(context: Excel.RequestContext, area: SheetArea): Promise<string[]> {
  const sheet = await sheetNamed(context, area.sheet);
  const range = rangeOf(sheet, area);
  range.load({ valueTypes: true, formulas: true });
  await context.sync();
  return filledCells(range, area);
}

/** A formula that answers "" counts as filled, and so does what has spilled into a cell. */
function filledCells({ valueTypes, formulas }: Excel.Range, area: SheetArea): string[] {
  return formulas.flatMap((row, r) =>
    row.flatMap((formula, c) => {
      const isEmpty = valueTypes[r][c] === Excel.RangeValueType.empty && formula === '';
      return isEmpty ? [] : [cellName(area.row + r, area.column + c)];
    }),
  );
}

/** Everything a cell will fill. */
const reachOf = ({ area, spills }: CellToWrite): SheetArea => ({ ...area, ...spills });

async function write(
  context: Excel.RequestContext,
  cells: readonly CellToWrite[],
  { overwrite, description, chart }: Parameters<WorkbookPort['write']>[1],
  canSpill: boolean,
): Promise<WriteReceipt> {
  const sheets = new Map<string, Excel.Worksheet>();
  for (const { area } of cells) {
    if (!sheets.has(area.sheet)) sheets.set(area.sheet, await sheetNamed(context, area.sheet));
  }
  const targets = cells.map((cell) => {
    const range = rangeOf(sheets.get(cell.area.sheet)!, reachOf(cell));
    range.load({ valueTypes: true, formulas: true, numberFormat: true });
    return { cell, range };
  });
  await context.sync();
  const inUse = targets.flatMap(({ cell, range }) => filledCells(range, reachOf(cell)));
  if (inUse.length > 0 && !overwrite) throw new CellsInUse(inUse);
  const blocks: Snapshot['blocks'][number][] = [];
  for (const { cell, range } of targets) {
    const area = reachOf(cell);
    const spilled = inUse.length > 0 && canSpill ? await spilledInto(context, range, area) : [];
    const formulas = range.formulas.map((row, r) => row.map((one, c) => (spilled[r]?.[c] ? '' : one)));
    blocks.push({ area, formulas, numberFormat: range.numberFormat });
  }
  for (const { cell, range } of targets) {
    // what stands where a formula will spill would stop it
    if (inUse.length > 0) range.clear(Excel.ClearApplyTo.contents);
    if (cell.numberFormats) range.numberFormat = cell.numberFormats as (string | null)[][]; // null: as it is
    const { content, spills } = cell;
    if (spills && !canSpill && 'formula' in content) range.formulas = oneEach(content.formula, spills);
    else fill(rangeOf(sheets.get(cell.area.sheet)!, cell.area), cell);
  }
  const sheet = chart && (await sheetNamed(context, chart.at.sheet));
  const drawn = sheet && drawChart(sheet, (area) => rangeOf(sheet, area), chart);
  await context.sync();
  const snapshot: Snapshot = {
    blocks,
    ...(drawn && { chart: { sheet: chart!.at.sheet, name: drawn.name } }),
  };
  return { description, area: around(cells.map(reachOf)), snapshot };
}

function fill(range: Excel.Range, { content }: CellToWrite): void {
  if ('formula' in content) range.formulas = [[content.formula]];
  else range.values = [[asTyped(content.value)]];
}

/** Excel reads what is put into a cell as if it were typed: "1/2" would become a date, "=x" a formula. */
function asTyped(value: CellValue): string | number | boolean {
  if (value === null) return '';
  if (value instanceof CellError) return value.code;
  return typeof value === 'string' && value !== '' && !/^\p{L}/u.test(value) ? `'${value}` : value;
}

async function putBack(context: Excel.RequestContext, receipt: WriteReceipt): Promise<void> {
  const { blocks, chart } = receipt.snapshot as Snapshot;
  if (chart) await removeChart(context, chart);
  const targets: Excel.Range[] = [];
  for (const { area } of blocks) {
    const range = rangeOf(await sheetNamed(context, area.sheet), area);
    range.clear(Excel.ClearApplyTo.contents);
    targets.push(range);
  }
  targets.forEach((range, place) => {
    const { formulas, numberFormat } = blocks[place];
    range.numberFormat = numberFormat;
    formulas.forEach((row, r) => row.forEach((formula, c) => restore(range.getCell(r, c), formula)));
  });
  await context.sync();
}

/** Cells that were blank stay untouched, so that a formula put back can spill over them. */
function restore(cell: Excel.Range, formula: unknown): void {
  if (formula === '') return;
  const isFormula = typeof formula === 'string' && formula.startsWith('=');
  cell.formulas = [[isFormula ? formula : asTyped(formula as CellValue)]];
}

function around(areas: readonly SheetArea[]): SheetArea {
  const row = Math.min(...areas.map((area) => area.row));
  const column = Math.min(...areas.map((area) => area.column));
  const bottom = Math.max(...areas.map((area) => area.row + area.rows));
  const right = Math.max(...areas.map((area) => area.column + area.columns));
  return { sheet: areas[0].sheet, row, column, rows: bottom - row, columns: right - column };
}
