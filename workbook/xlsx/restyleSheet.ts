/** One sheet's XML with other looks for some of its cells; what stands in them stays as it was. */
import { cellXml } from './cellXml';
import { applyEdits, type Edit } from './edits';
import { placeCells, type NewCell } from './placeCells';
import { scanSheet } from './sheetScan';

export interface Restyling {
  readonly row: number;
  readonly column: number;
  readonly numberFormat: string;
}

/** @param look the number of a look like the first one, but with that number format */
export function restyleSheet(
  xml: string,
  part: string,
  restyled: readonly Restyling[],
  look: (own: number, numberFormat: string) => number,
): string {
  const sheet = scanSheet(xml, part);
  const cells = new Map(
    sheet.rows.flatMap((row) => row.cells).map((cell) => [`${cell.row},${cell.column}`, cell]),
  );
  const edits: Edit[] = [];
  const added: NewCell[] = [];
  for (const { row, column, numberFormat } of restyled) {
    const cell = cells.get(`${row},${column}`);
    const s = String(look(Number(cell?.attributes.s ?? 0), numberFormat));
    if (cell) edits.push(withLook(xml.slice(cell.start, cell.openEnd), cell.start, s));
    else
      added.push({
        row,
        column,
        xml: cellXml({ prefix: sheet.prefix, row, column, value: null, attributes: { s } }),
      });
  }
  return applyEdits(xml, [...edits, ...placeCells(xml, sheet, added)]);
}

function withLook(tag: string, start: number, s: string): Edit {
  const stated = /\ss\s*=\s*(?:"[^"]*"|'[^']*')/.exec(tag);
  if (stated)
    return { start: start + stated.index, end: start + stated.index + stated[0].length, text: ` s="${s}"` };
  const at = start + /\s*\/?>$/.exec(tag)!.index;
  return { start: at, end: at, text: ` s="${s}"` };
}
