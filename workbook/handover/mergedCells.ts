/** Cells merged into one, where no array formula may stand. */
import { parseArea, type Area } from '../../functions/address';
import { readXml, type SheetPart } from '../xlsx/parts';
import type { Package } from '../xlsx/zip';
import type { Position } from './world';

export function mergedCells(pack: Package, sheets: readonly SheetPart[]): (position: Position) => boolean {
  const merged = new Map(sheets.map(({ name, path }) => [name, areasIn(readXml(pack, path))]));
  return ({ sheet, row, column }) =>
    (merged.get(sheet) ?? []).some(
      (area) =>
        row >= area.row &&
        row < area.row + area.rows &&
        column >= area.column &&
        column < area.column + area.columns,
    );
}

const areasIn = (xml: string): Area[] =>
  [...xml.matchAll(/<(?:[\w.-]+:)?mergeCell\s[^>]*?\bref="([^"]+)"/g)].flatMap(
    ([, ref]) => parseArea(ref) ?? [],
  );
