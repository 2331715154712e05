/** A file with something typed into it, as its reader would. */
import type { BookModel, CellModel } from '../../../workbook/engine/engine';
import { readWorkbook } from '../../../workbook/xlsx/read';
import { typeCells } from '../../../workbook/xlsx/typeCells';

/** @param typed cells of sheets that the file has; what stands there is typed over */
export function withTyped(bytes: Uint8Array, typed: BookModel): Uint8Array {
  const now = readWorkbook(bytes);
  const sheets = now.sheets.map((sheet) => {
    const changes = typed.sheets.find(({ name }) => name === sheet.name)?.cells ?? [];
    const changed = new Set(changes.map(placeOf));
    return { ...sheet, cells: [...sheet.cells.filter((cell) => !changed.has(placeOf(cell))), ...changes] };
  });
  return typeCells(bytes, now, { ...now, sheets });
}

const placeOf = ({ row, column }: CellModel): string => `${row},${column}`;
