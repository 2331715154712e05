/** The formula in the active cell, where it is one of ours: what it reads is numbered in the sheet. */
import { cellsRead, formulaParts } from '../formulaParts';
import type { ActiveCell, SheetArea } from '../port';
import type { Bench } from './bench';

export interface Choosing {
  /** Is told whenever the active cell, or its formula, is another. */
  follow(cell: ActiveCell | null): void;
  /** Selects cells that a formula reads; the formula stays chosen meanwhile. */
  show(area: SheetArea): Promise<void>;
}

export function choosing({ store, port }: Bench): Choosing {
  let shown: SheetArea | null = null;
  return {
    follow(cell) {
      if (cell && shown && isFirstOf(shown, cell.at)) return;
      shown = null;
      const { formula = null, at } = cell ?? {};
      const parts = formula === null ? [] : formulaParts(formula);
      const isOurs = parts.some(({ says }) => says);
      port.mark?.(isOurs ? cellsRead(parts, at!.sheet).map(({ area }) => area) : []);
      if (isOurs || store.state.chosen)
        store.change({ chosen: isOurs ? { formula: formula!, at: at! } : null });
    },
    async show(area) {
      shown = area;
      await port.reveal(area);
    },
  };
}

const isFirstOf = (area: SheetArea, cell: SheetArea): boolean =>
  area.sheet === cell.sheet && area.row === cell.row && area.column === cell.column;
