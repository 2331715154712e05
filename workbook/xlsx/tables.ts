/** The tables of a workbook, so that formulas can refer to them by name. */
import { parseArea } from '../../functions/address';
import type { TableModel } from '../engine/tables';
import { elementsIn, relationshipsOf, type SheetPart } from './parts';
import { plainText } from './xml';
import type { Package } from './zip';

export function readTables(pack: Package, sheets: readonly SheetPart[]): TableModel[] {
  return sheets.flatMap((sheet) =>
    relationshipsOf(pack, sheet.path)
      .filter(({ kind, path }) => kind === 'table' && pack.has(path))
      .flatMap(({ path }) => readTable(pack, path, sheet.name)),
  );
}

function readTable(pack: Package, path: string, sheet: string): TableModel[] {
  const elements = elementsIn(pack, path);
  const { attributes } = elements[0];
  const area = parseArea(attributes.ref ?? '');
  if (!area) return [];
  return [
    {
      name: attributes.displayName ?? attributes.name,
      sheet,
      area,
      headRows: Number(attributes.headerRowCount ?? 1),
      totalRows: Number(attributes.totalsRowCount ?? 0),
      columns: elements
        .filter(({ name }) => name === 'tableColumn')
        .map((column) => plainText(column.attributes.name)),
    },
  ];
}
