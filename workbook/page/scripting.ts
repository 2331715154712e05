/** `flaskpace` in the browser's console: the open workbook for scripts, and for tests that drive the page. */
import { parseArea } from '../../functions/address';
import type { WorkbookPort } from '../../taskpane/port';
import type { BookModel } from '../engine/engine';
import type { Grid, GridArea } from '../engine/grid';

export interface Scripting {
  /** What the pane works through. */
  readonly port: WorkbookPort;
  /** Shows a book in place of the one that is open. */
  open(book: BookModel): Promise<void>;
  /** Selects cells as a person would: `'Gas run'!B2:B9`. */
  select(reference: string): void;
  /** Of one cell, as a file has it: `0.00`. */
  numberFormat(reference: string): string;
}

export function offerToScripts(grid: Grid, port: WorkbookPort): void {
  const areaOf = (reference: string): GridArea => {
    const area = parseArea(reference);
    if (!area) throw new Error(`a reference is written like 'Gas run'!B2:B9: got "${reference}"`);
    return { sheet: grid.active()?.sheet ?? grid.sheets()[0], ...area };
  };
  const scripting: Scripting = {
    port,
    open: (book) => grid.open(book),
    select(reference) {
      grid.select(areaOf(reference));
      grid.focus();
    },
    numberFormat: (reference) => grid.typed(areaOf(reference)).numberFormat ?? 'General',
  };
  Object.assign(window, { flaskpace: scripting });
}
