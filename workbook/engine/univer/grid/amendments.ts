/** What the grid (0.25.1) does not do by itself, and a person expects. */
import {
  ICommandService,
  toDisposable,
  type Injector,
  type IDisposable,
  type Workbook,
} from '@univerjs/core';
import { FormulaDataModel } from '@univerjs/engine-formula';
import { SetRangeValuesCommand, SetRangeValuesMutation } from '@univerjs/sheets';
import { CellAlertManagerService, ISheetClipboardService, type ICellAlert } from '@univerjs/sheets-ui';
import { IShortcutService, KeyCode } from '@univerjs/ui';
import { messageAt, withoutHash } from '../register';

/** The key under which the grid explains an error in a cell. */
const errorAlert = 'SHEET_FORMULA_ALERT';

/** Hovering over an error of ours shows our words, where the grid would show its own for the code. */
export function showOwnErrorWords(injector: Injector, shownAt: (alert: ICellAlert) => string): void {
  const alerts = injector.get(CellAlertManagerService);
  const show = alerts.showAlert.bind(alerts);
  alerts.showAlert = (alert) => {
    const { unitId, subUnitId, row, col } = alert.location;
    const words =
      alert.key === errorAlert ? messageAt(unitId, subUnitId, row, col, shownAt(alert)) : undefined;
    show(words === undefined ? alert : { ...alert, message: words, width: 300, height: heightFor(words) });
  };
}

/** The alert is a box of fixed size: some 40 characters a line, below a title. */
const heightFor = (words: string): number => 54 + 20 * Math.ceil(words.length / 40);

/** A copied spill is copied as what it shows; the grid alone would copy blanks. */
export function copySpilledValues(injector: Injector, workbook: () => Workbook): IDisposable {
  const model = injector.get(FormulaDataModel);
  return injector.get(ISheetClipboardService).addClipboardHook({
    id: 'flaskpace-spilled-values',
    getCellValueBySpecialMatrix: (row: number, column: number) => {
      const book = workbook();
      const sheetId = book.getActiveSheet()?.getSheetId();
      if (!sheetId) return undefined;
      const cell = model.getArrayFormulaCellData()?.[book.getUnitId()]?.[sheetId]?.[row]?.[column];
      return cell?.v === undefined || cell.v === null ? undefined : { v: cell.v, t: cell.t };
    },
  } as Parameters<ISheetClipboardService['addClipboardHook']>[0]);
}

/** What the grid calls the keys of its list of function names, followed by the editor's own name. */
const suggestionKeys = 'sheet.formula-embedding-editor.search_function.';

/**
 * Enter puts the formula into the cell as it was typed; only Tab or a click takes a suggested name. The grid's
 * Enter would take one too, also from a list that has not caught up with quick typing: another function then
 * stands in the cell than the one that was typed.
 */
export function enterTakesNoSuggestion(injector: Injector): void {
  const shortcuts = injector.get(IShortcutService);
  const register = shortcuts.registerShortcut.bind(shortcuts);
  shortcuts.registerShortcut = (item) =>
    item.id.startsWith(suggestionKeys) && item.binding === KeyCode.ENTER
      ? toDisposable(() => undefined)
      : register(item);
}

/** `F2#` typed into a cell becomes the function that the engine knows it by. */
export function acceptSpillReferences(injector: Injector): IDisposable {
  const writing: ReadonlySet<string> = new Set([SetRangeValuesCommand.id, SetRangeValuesMutation.id]);
  return injector.get(ICommandService).beforeCommandExecuted(({ id, params }) => {
    if (!writing.has(id)) return;
    const { value, cellValue } = (params ?? {}) as { value?: unknown; cellValue?: unknown };
    rewriteFormulas(value);
    rewriteFormulas(cellValue);
  });
}

/** In place: the command goes on with what it was given. */
function rewriteFormulas(cells: unknown): void {
  if (typeof cells !== 'object' || cells === null) return;
  const cell = cells as { f?: unknown };
  if (typeof cell.f === 'string') cell.f = withoutHash(cell.f);
  else Object.values(cells).forEach(rewriteFormulas);
}
