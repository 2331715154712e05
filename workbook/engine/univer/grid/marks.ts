/** Numbers, and outlines, on areas of the grid. A formula that is edited has outlines from the grid itself. */
import { InterceptorEffectEnum, type ICellCustomRender, type Injector } from '@univerjs/core';
import { INTERCEPTOR_POINT, SheetInterceptorService } from '@univerjs/sheets';
import { IEditorBridgeService } from '@univerjs/sheets-ui';
import { markColour } from '../../../../taskpane/markColours';
import type { GridArea } from '../../grid';

/** After all that changes what a cell shows. */
const last = -0.6;

/** @returns what marks these areas in place of those before; the first is number 1 */
export function markAreas(injector: Injector, redraw: () => void): (areas: readonly GridArea[]) => void {
  let marked: readonly GridArea[] = [];
  const editor = injector.get(IEditorBridgeService);
  editor.visible$.subscribe(() => marked.length > 0 && redraw());
  injector.get(SheetInterceptorService).intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    effect: InterceptorEffectEnum.Style,
    priority: last,
    handler(cell, { worksheet, row, col }, next) {
      const sheet = worksheet.getName();
      const drawings = marked.flatMap((area, place): ICellCustomRender[] =>
        touches(area, sheet, row, col)
          ? [
              {
                drawWith: (canvas, { primaryWithCoord: box }) => draw(canvas, area, place, { row, col, box }),
              },
            ]
          : [],
      );
      return next(
        drawings.length > 0 ? { ...cell, customRender: [...(cell?.customRender ?? []), ...drawings] } : cell,
      );
    },
  });

  function draw(canvas: CanvasRenderingContext2D, area: GridArea, place: number, cell: CellOnCanvas): void {
    canvas.fillStyle = markColour(place); // in the dark the grid lightens every colour itself
    if (!editor.isVisible().visible) outline(canvas, area, cell);
    if (cell.col === area.column && cell.row <= area.row) badge(canvas, area, place + 1, cell);
  }

  return (areas) => {
    if (JSON.stringify(areas) === JSON.stringify(marked)) return;
    marked = areas;
    redraw();
  };
}

/** The cell above the first shares its number, which stands half in it. */
const touches = (
  { sheet, row, column, rows, columns }: GridArea,
  name: string,
  r: number,
  c: number,
): boolean =>
  sheet === name &&
  r < row + rows &&
  c >= column &&
  c < column + columns &&
  (r >= row || (r === row - 1 && c === column));

interface CellOnCanvas {
  readonly row: number;
  readonly col: number;
  readonly box: {
    readonly startX: number;
    readonly startY: number;
    readonly endX: number;
    readonly endY: number;
  };
}

const lineWidth = 2;

/** As much of it as lies along this cell. */
function outline(canvas: CanvasRenderingContext2D, area: GridArea, { row, col, box }: CellOnCanvas): void {
  if (row < area.row) return;
  const { startX: left, startY: top, endX: right, endY: bottom } = box;
  if (row === area.row) canvas.fillRect(left, top, right - left, lineWidth);
  if (row === area.row + area.rows - 1) canvas.fillRect(left, bottom - lineWidth, right - left, lineWidth);
  if (col === area.column) canvas.fillRect(left, top, lineWidth, bottom - top);
  if (col === area.column + area.columns - 1)
    canvas.fillRect(right - lineWidth, top, lineWidth, bottom - top);
}

const side = 12;
const handle = 5; // of the grid, at the corner of what is edited

/** Over the upper edge, where it hides the least; in the first row of the sheet below it. */
function badge(canvas: CanvasRenderingContext2D, area: GridArea, number: number, cell: CellOnCanvas): void {
  const { startX, startY, endY } = cell.box;
  const left = startX + handle;
  const edge = cell.row < area.row ? endY : startY;
  const top = area.row === 0 ? edge : edge - side / 2;
  canvas.fillRect(left, top, side, side);
  canvas.fillStyle = '#ffffff';
  canvas.font = '600 10px system-ui, sans-serif';
  canvas.textAlign = 'center';
  canvas.textBaseline = 'middle';
  canvas.fillText(String(number), left + side / 2, top + side / 2);
}
