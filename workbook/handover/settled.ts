/** A book as it shows on the day of the copy, to work formulas out in: as small as what they read allows. */
import type { Area } from '../../functions/address';
import type { BookModel, CellModel, SheetModel } from '../engine/engine';
import type { HandedFormula } from './handed';
import type { World } from './world';

type Place = Pick<CellModel, 'row' | 'column'>;

/** The book with every formula replaced by what it shows, and of its cells those that these formulas read. */
export function settled(world: World, formulas: readonly HandedFormula[]): BookModel {
  const isRead = cellsRead(world, formulas);
  const cellsOf = (sheet: SheetModel): CellModel[] =>
    sheet.cells.flatMap((cell) => {
      const shown = cell.formula === undefined ? [cell] : resultOf(cell, sheet, world);
      return shown.filter((place) => isRead(sheet.name, place));
    });
  const { book } = world;
  return { ...book, sheets: book.sheets.map((sheet) => ({ ...sheet, cells: cellsOf(sheet) })) };
}

function resultOf({ row, column }: Place, sheet: SheetModel, world: World): CellModel[] {
  const area = world.spillAt({ sheet: sheet.name, row, column });
  return world
    .cellsIn(area, sheet.name)
    .flatMap((line, r) => line.map((value, c) => ({ row: row + r, column: column + c, value })));
}

/** Everything, where one of them does not say what it reads. */
function cellsRead(
  world: World,
  formulas: readonly HandedFormula[],
): (sheet: string, place: Place) => boolean {
  const hulls = new Map<string, ColumnHulls>();
  for (const formula of formulas) {
    const areas = world.reads(formula.original, formula);
    if (!areas) return () => true;
    for (const area of areas) {
      const sheet = (area.sheet ?? formula.sheet).toLowerCase();
      const hull = hulls.get(sheet) ?? new ColumnHulls();
      hulls.set(sheet, hull);
      hull.add(area);
    }
  }
  return (sheet, place) => hulls.get(sheet.toLowerCase())?.holds(place) ?? false;
}

/** Of each column of a sheet, the rows from the first to the last that count. */
class ColumnHulls {
  private readonly rows = new Map<number, { first: number; last: number }>();

  add({ row, column, rows, columns }: Area): void {
    const [first, last] = [row, row + rows - 1];
    for (let c = column; c < column + columns; c++) {
      const hull = this.rows.get(c);
      this.rows.set(c, {
        first: Math.min(first, hull?.first ?? first),
        last: Math.max(last, hull?.last ?? last),
      });
    }
  }

  holds({ row, column }: Place): boolean {
    const hull = this.rows.get(column);
    return hull !== undefined && row >= hull.first && row <= hull.last;
  }
}
