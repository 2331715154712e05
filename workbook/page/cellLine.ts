/** The line under the sheet that says the active cell in words; a screen reader reads it out, since the grid is a picture. */
import { cellName } from '../../functions/address';
import { CellError, type CellValue } from '../../functions/cell';
import { h } from '../../taskpane/h';
import { patch } from '../../taskpane/patch';
import type { Grid } from '../engine/grid';

/** @returns a function that takes the line away */
export function followActiveCell(element: HTMLElement, grid: Grid): () => void {
  element.setAttribute('role', 'status');
  element.setAttribute('aria-label', 'Active cell');
  const draw = (): void => patch(element, withLine(element, grid));
  const stops = [grid.onSelection(draw), grid.onCalculated(draw), grid.onEdit(draw)];
  draw();
  return () => {
    stops.forEach((stop) => stop());
    element.replaceChildren();
  };
}

function withLine(element: HTMLElement, grid: Grid): HTMLElement {
  const next = element.cloneNode(false) as HTMLElement;
  const active = grid.active();
  if (!active) return next;
  const { sheet, row, column } = active;
  const shown = grid.values({ sheet, row, column, rows: 1, columns: 1 })[0][0];
  const { formula } = grid.typed(active);
  next.append(
    h('p', { className: 'where' }, cellName(row, column)),
    h('p', { className: 'shows' }, inWords(shown)),
    ...(formula === undefined ? [] : [h('code', {}, formula)]),
    ...(shown instanceof CellError && shown.message !== ''
      ? [h('p', { className: 'why' }, shown.message)]
      : []),
  );
  return next;
}

function inWords(shown: CellValue): string {
  if (shown === null) return 'blank';
  if (shown === '') return 'nothing to show';
  if (shown instanceof CellError) return shown.code;
  return typeof shown === 'boolean' ? String(shown).toUpperCase() : String(shown);
}
