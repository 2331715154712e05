/** Cells put into the grid by the pane, as one step that the grid's own undo can take back. */
import { CellValueType, ICommandService, type ICellData, type Injector } from '@univerjs/core';
import { SetRangeValuesCommand, type ISetRangeValuesCommandParams } from '@univerjs/sheets';
import { CellError, type CellValue } from '../../../../functions/cell';
import type { CellToSet } from '../../grid';
import { withoutHash } from '../register';
import { plainFormat, type Sheets } from './sheets';

export async function writeCells(
  sheets: Sheets,
  injector: Injector,
  cells: readonly CellToSet[],
): Promise<void> {
  const bySheet = new Map<string, Record<number, Record<number, ICellData>>>();
  for (const cell of cells) {
    const sheetId = sheets.named(cell.sheet).getSheetId();
    const matrix = bySheet.get(sheetId) ?? {};
    bySheet.set(sheetId, matrix);
    (matrix[cell.row] ??= {})[cell.column] = { ...matrix[cell.row][cell.column], ...cellData(cell) };
  }
  const commands = injector.get(ICommandService);
  for (const [subUnitId, value] of bySheet) {
    const params: ISetRangeValuesCommandParams = { unitId: sheets.workbook.getUnitId(), subUnitId, value };
    const isDone = await commands.executeCommand(SetRangeValuesCommand.id, params);
    if (!isDone) throw new Error('the grid did not take the cells');
  }
}

/** `null` takes away what stood there; what is left out stays. */
function cellData({ value, formula, numberFormat }: CellToSet): ICellData {
  const style =
    numberFormat === undefined
      ? {}
      : { s: { n: numberFormat === plainFormat ? null : { pattern: numberFormat } } };
  const content =
    formula === undefined
      ? { f: null, ...typedValue(value) }
      : { f: withoutHash(formula.startsWith('=') ? formula : `=${formula}`), v: null };
  return { p: null, si: null, ...content, ...style };
}

function typedValue(value: CellValue): ICellData {
  if (value === null) return { v: null };
  if (value instanceof CellError) return { v: value.code, t: CellValueType.STRING };
  if (typeof value === 'boolean') return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: value, t: typeof value === 'number' ? CellValueType.NUMBER : CellValueType.STRING };
}
