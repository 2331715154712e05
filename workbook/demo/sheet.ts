/** Builds a sheet of the demo from blocks that are put down at a cell. */
import { parseArea } from '../../functions/address';
import type { CellValue } from '../../functions/cell';
import type { CellModel, SheetModel } from '../engine/engine';

/** What stands in a cell: a value, or a formula with its `=`. */
export type Content = CellValue;

interface Look {
  readonly bold?: boolean;
  readonly numberFormat?: string;
}

export class SheetBuilder {
  private readonly cells: CellModel[] = [];

  constructor(private readonly name: string) {}

  /** Rows of cells from the cell named on, to the right and down; `null` leaves a cell blank. */
  block(first: string, rows: readonly (readonly Content[])[], look: Look = {}): this {
    const { row, column } = parseArea(first)!;
    rows.forEach((contents, r) =>
      contents.forEach((content, c) => {
        if (content !== null)
          this.cells.push({ row: row + r, column: column + c, ...typed(content), ...look });
      }),
    );
    return this;
  }

  /** A column of cells from the cell named on. */
  down(first: string, contents: readonly Content[], look: Look = {}): this {
    return this.block(
      first,
      contents.map((content) => [content]),
      look,
    );
  }

  /** Empty cells that only carry a look, for what will spill into them. */
  format(area: string, numberFormat: string): this {
    return this.look(area, { numberFormat });
  }

  look(area: string, look: Look): this {
    const { row, column, rows, columns } = parseArea(area)!;
    const isTaken = new Set(this.cells.map((cell) => `${cell.row},${cell.column}`));
    for (let r = row; r < row + rows; r++) {
      for (let c = column; c < column + columns; c++) {
        if (isTaken.has(`${r},${c}`)) continue;
        this.cells.push({ row: r, column: c, value: null, ...look });
      }
    }
    return this;
  }

  /** @param columnWidths in characters, from column A on */
  build(columnWidths: readonly number[]): SheetModel {
    const cells = [...this.cells].sort((a, b) => a.row - b.row || a.column - b.column);
    return { name: this.name, cells, columnWidths: { ...columnWidths } };
  }
}

const typed = (content: Content): Pick<CellModel, 'value' | 'formula'> =>
  typeof content === 'string' && content.startsWith('=')
    ? { value: null, formula: content.slice(1) }
    : { value: content };
