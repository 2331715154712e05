/**
 * A number without a format of its own is shown with as many digits as its column has room for. The grid
 * (0.25.1) would write all it has across the cells beside it. The cell itself keeps every digit.
 */
import { InterceptorEffectEnum, type ICellData, type Injector, type Nullable } from '@univerjs/core';
import { BEFORE_CELL_EDIT, INTERCEPTOR_POINT, SheetInterceptorService } from '@univerjs/sheets';
import { fitting } from '../../fitting';

/** Digits of the usual letters are 0.556 of their height wide, and a point is 4/3 of a pixel. */
const digitWidth = (points: number): number => 0.556 * points * (4 / 3);
const usualPoints = 11;
const padding = 6; // px

/** More are never of use to the eye. */
const mostCharacters = 12;

/** The higher comes first: after formats (10) and spills (100), before the grid's own end of the line (-1). */
const last = -0.5;

export function showFittingNumbers(injector: Injector): void {
  const interceptors = injector.get(SheetInterceptorService);
  interceptors.intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    effect: InterceptorEffectEnum.Value,
    priority: last,
    handler(cell, { worksheet, workbook, col }, next) {
      if (typeof cell?.v !== 'number') return next(cell);
      const points = workbook.getStyles().getStyleByCell(cell)?.fs ?? usualPoints;
      const room = Math.floor((worksheet.getColumnWidth(col) - padding) / digitWidth(points));
      const v = fitting(cell.v, Math.min(room, mostCharacters));
      return next(v === cell.v ? cell : { ...cell, v });
    },
  });
  // what is edited is the number with all its digits: as words, since the editor rounds a number to twelve
  interceptors.writeCellInterceptor.intercept(BEFORE_CELL_EDIT, {
    priority: last,
    handler(cell: Nullable<ICellData>, { worksheet, row, col }, next) {
      const whole = worksheet.getCellRaw(row, col)?.v;
      const isPlain = typeof cell?.v === 'number' && typeof whole === 'number'; // a date is shown as one
      return next(isPlain ? { ...cell, v: String(whole) } : cell);
    },
  });
}
