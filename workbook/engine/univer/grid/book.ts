/** The whole of the grid as a book: what is typed in it, and what its formulas come to. */
import { WrapStrategy, type ICellData, type Injector, type Nullable, type Worksheet } from '@univerjs/core';
import { IDefinedNamesService } from '@univerjs/engine-formula';
import { CellError } from '../../../../functions/cell';
import type { BookModel, Calculated, CalculatedBook, CellModel, DefinedName, SheetModel } from '../../engine';
import { characters } from './screenData';
import { plainFormat, type Sheets } from './sheets';

export function bookOf(sheets: Sheets, injector: Injector): BookModel {
  return {
    sheets: sheets.workbook.getSheets().map((sheet) => sheetModel(sheets, sheet)),
    names: definedNames(sheets, injector),
  };
}

function sheetModel(sheets: Sheets, sheet: Worksheet): SheetModel {
  const cells: CellModel[] = [];
  const styles = sheets.workbook.getStyles();
  sheet.getCellMatrix().forValue((row, column, cell: Nullable<ICellData>) => {
    const value = sheets.shown(sheet, row, column);
    const typed = sheets.formula(sheet, row, column);
    const style = styles.getStyleByCell(cell);
    const pattern = style?.n?.pattern;
    const hasFormat = pattern !== undefined && pattern !== plainFormat;
    if (value === null && typed === undefined && !hasFormat) return;
    cells.push({
      row,
      column,
      value,
      ...(typed === undefined ? {} : { formula: typed.replace(/^=/, '') }),
      ...(hasFormat ? { numberFormat: pattern } : {}),
      ...(style?.bl ? { bold: true } : {}),
      ...(style?.tb === WrapStrategy.WRAP ? { wrap: true } : {}),
    });
  });
  return { name: sheet.getName(), cells, columnWidths: columnWidths(sheet) };
}

function columnWidths(sheet: Worksheet): Record<number, number> {
  const widths: Record<number, number> = {};
  for (const [column, data] of Object.entries(sheet.getConfig().columnData ?? {})) {
    if (data?.w !== undefined) widths[Number(column)] = characters(data.w);
  }
  return widths;
}

function definedNames({ workbook }: Sheets, injector: Injector): DefinedName[] {
  const entries = Object.values(
    injector.get(IDefinedNamesService).getDefinedNameMap(workbook.getUnitId()) ?? {},
  );
  return entries.map(({ name, formulaOrRefString, localSheetId }) => {
    const sheet = localSheetId ? workbook.getSheetBySheetId(localSheetId)?.getName() : undefined;
    return {
      name,
      refersTo: formulaOrRefString.replace(/^=/, ''),
      ...(sheet === undefined ? {} : { sheet }),
    };
  });
}

export function calculatedOf(sheets: Sheets): CalculatedBook {
  const formula = (name: string, row: number, column: number): Calculated | undefined => {
    const sheet = sheets.named(name);
    if (sheets.formula(sheet, row, column) === undefined) return undefined;
    const spill = sheets.spill(sheet, row, column);
    const value = sheets.shown(sheet, row, column);
    const isBlocked = value instanceof CellError && value.code === '#SPILL!';
    return {
      value,
      spill:
        spill && !isBlocked
          ? { rows: spill.endRow - spill.startRow + 1, columns: spill.endColumn - spill.startColumn + 1 }
          : { rows: 1, columns: 1 },
    };
  };
  return {
    formula,
    shown: (name, row, column) => sheets.shown(sheets.named(name), row, column),
    errors: sheets.workbook.getSheets().flatMap((sheet) => errorsIn(sheets, sheet)),
  };
}

function errorsIn(sheets: Sheets, sheet: Worksheet): CalculatedBook['errors'][number][] {
  const found: CalculatedBook['errors'][number][] = [];
  sheet.getCellMatrix().forValue((row, column) => {
    if (sheets.formula(sheet, row, column) === undefined) return;
    const error = sheets.shown(sheet, row, column);
    if (error instanceof CellError) found.push({ sheet: sheet.getName(), row, column, error });
  });
  return found;
}
