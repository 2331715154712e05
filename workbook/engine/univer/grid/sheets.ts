/** What stands in the cells of the grid at this moment. */
import {
  CellValueType,
  type ICellData,
  type Injector,
  type Nullable,
  type Workbook,
  type Worksheet,
} from '@univerjs/core';
import { FormulaDataModel } from '@univerjs/engine-formula';
import { CellError, type CellValue } from '../../../../functions/cell';
import type { GridArea, GridPlace, TypedCell } from '../../grid';
import { messageAt, withHash } from '../register';
import { errorCode, isErrorText } from '../values';

/** A format that shows a value as it is. */
export const plainFormat = 'General';

export interface Spill {
  readonly startRow: number;
  readonly endRow: number;
  readonly startColumn: number;
  readonly endColumn: number;
}

export interface Sheets {
  readonly workbook: Workbook;
  /** @throws when there is no such sheet */
  named(sheet: string): Worksheet;
  shown(sheet: Worksheet, row: number, column: number): CellValue;
  formula(sheet: Worksheet, row: number, column: number): string | undefined;
  typed(place: GridPlace): TypedCell;
  spill(sheet: Worksheet, row: number, column: number): Spill | undefined;
  used(sheet: string): GridArea | null;
}

export function sheetsOf(workbook: Workbook, injector: Injector): Sheets {
  const model = injector.get(FormulaDataModel);
  const unitId = workbook.getUnitId();

  function named(name: string): Worksheet {
    const sheet = workbook.getSheetBySheetName(name);
    if (!sheet) throw new Error(`there is no sheet named "${name}"`);
    return sheet;
  }

  const spilledCells = (sheet: Worksheet): Matrix | undefined =>
    model.getArrayFormulaCellData()?.[unitId]?.[sheet.getSheetId()] as Matrix | undefined;

  function formula(sheet: Worksheet, row: number, column: number): string | undefined {
    const cell = sheet.getCellRaw(row, column);
    if (!cell?.f && !cell?.si) return undefined;
    const text = model.getFormulaStringByCell(row, column, sheet.getSheetId(), unitId) ?? cell.f;
    return text ? withHash(text) : undefined;
  }

  function value(cell: Nullable<ICellData>, sheet: Worksheet, row: number, column: number): CellValue {
    const plain = plainValue(cell);
    if (typeof plain !== 'string' || !isErrorText(plain)) return plain;
    return new CellError(errorCode(plain), messageAt(unitId, sheet.getSheetId(), row, column, plain));
  }

  function shown(sheet: Worksheet, row: number, column: number): CellValue {
    const own = sheet.getCellRaw(row, column);
    const isOwn = own?.f || own?.si || plainValue(own) !== null;
    return value(isOwn ? own : spilledCells(sheet)?.[row]?.[column], sheet, row, column);
  }

  return {
    workbook,
    named,
    shown,
    formula,
    typed({ sheet: name, row, column }) {
      const sheet = named(name);
      const cell = sheet.getCellRaw(row, column);
      const numberFormat = workbook.getStyles().getStyleByCell(cell)?.n?.pattern ?? plainFormat;
      const typedFormula = formula(sheet, row, column);
      if (typedFormula !== undefined) return { value: null, formula: typedFormula, numberFormat };
      return { value: value(cell, sheet, row, column), numberFormat };
    },
    spill: (sheet, row, column) =>
      (model.getArrayFormulaRange()?.[unitId]?.[sheet.getSheetId()]?.[row]?.[column] as Spill | undefined) ??
      undefined,
    used(name) {
      const sheet = named(name);
      const edge = { top: Infinity, left: Infinity, bottom: -1, right: -1 };
      const widen = (row: number, column: number): void => {
        edge.top = Math.min(edge.top, row);
        edge.left = Math.min(edge.left, column);
        edge.bottom = Math.max(edge.bottom, row);
        edge.right = Math.max(edge.right, column);
      };
      sheet.getCellMatrix().forValue((row, column, cell: Nullable<ICellData>) => {
        if (cell?.f || cell?.si || plainValue(cell) !== null) widen(row, column);
      });
      for (const [row, cells] of Object.entries(spilledCells(sheet) ?? {})) {
        for (const column of Object.keys(cells ?? {})) widen(Number(row), Number(column));
      }
      if (edge.bottom < 0) return null;
      return {
        sheet: name,
        row: edge.top,
        column: edge.left,
        rows: edge.bottom - edge.top + 1,
        columns: edge.right - edge.left + 1,
      };
    },
  };
}

type Matrix = Readonly<Record<number, Readonly<Record<number, ICellData | null>> | undefined>>;

/** Words in several styles are kept as a small document, which ends every line with a mark of its own. */
function plainValue(cell: Nullable<ICellData>): CellValue {
  if (!cell) return null;
  const rich = cell.p?.body?.dataStream;
  if (rich !== undefined) return rich.replace(/[\r\n]+$/, '').replace(/\r/g, '\n');
  const { v, t } = cell;
  if (v === null || v === undefined) return null;
  if (t === CellValueType.BOOLEAN) return v === true || Number(v) === 1 || /^true$/i.test(String(v));
  return v;
}
