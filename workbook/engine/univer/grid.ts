/** The grid on the screen, over Univer. */
import {
  ICommandService,
  IUniverInstanceService,
  UniverInstanceType,
  type IWorkbookData,
  type Workbook,
} from '@univerjs/core';
import { SheetsSelectionsService } from '@univerjs/sheets';
import { FormulaCalculationSessionService } from '@univerjs/sheets-formula';
import { ILayoutService } from '@univerjs/ui';
import { merge, Subject } from 'rxjs';
import type { LongWork } from '../../../functions/longWork';
import type { BookModel } from '../engine';
import type { Grid, GridArea, GridPlace, Stop } from '../grid';
import { nameControls } from './grid/accessibleNames';
import {
  acceptSpillReferences,
  copySpilledValues,
  enterTakesNoSuggestion,
  showOwnErrorWords,
} from './grid/amendments';
import { bookOf, calculatedOf } from './grid/book';
import { bootGrid } from './grid/boot';
import { showFittingNumbers } from './grid/fittingNumbers';
import { markAreas } from './grid/marks';
import { screenData } from './grid/screenData';
import { sheetsOf, type Sheets } from './grid/sheets';
import { followTyping } from './grid/typing';
import { writeCells } from './grid/write';
import { forgetMessages } from './register';

/** What every change of a sheet's content or looks is called by; a selection or a scroll is no such thing. */
const edits = 'sheet.mutation.';

/** A calculation that takes longer goes on; whoever waits for it is let go. */
const longestWait = 60_000; // ms

/** Keys just struck go through the grid's editor in steps of its own. */
const keysUnderWay = 100; // ms

export interface GridOptions {
  readonly isDark?: boolean;
  /** Where long calculations are done; left out, on the page's own thread. */
  readonly longWork?: LongWork;
}

/** @param container an element of the page that has a size; the book is shown in it, and calculated in a while */
export function createGrid(
  container: HTMLElement,
  first: BookModel,
  { isDark = false, longWork }: GridOptions = {},
): Grid {
  const { univer, injector, api } = bootGrid(container, isDark, longWork);
  let opened = 0;
  const show = (book: BookModel): Sheets =>
    sheetsOf(
      univer.createUnit<IWorkbookData, Workbook>(
        UniverInstanceType.UNIVER_SHEET,
        screenData(book, `book${++opened}`),
      ),
      injector,
    );
  /** While one book goes and the next comes, events tell of neither. */
  let isOpening = false;
  const reopened = new Subject<void>();
  let sheets = show(first); // the engine's services exist only once it has a workbook
  const selections = injector.get(SheetsSelectionsService);
  const session = injector.get(FormulaCalculationSessionService);
  const commands = injector.get(ICommandService);
  const instances = injector.get(IUniverInstanceService);

  showOwnErrorWords(injector, ({ location: { subUnitId, row, col } }) => {
    const sheet = sheets.workbook.getSheetBySheetId(subUnitId);
    return String(sheet?.getCellRaw(row, col)?.v ?? '');
  });
  copySpilledValues(injector, () => sheets.workbook);
  acceptSpillReferences(injector);
  enterTakesNoSuggestion(injector);
  showFittingNumbers(injector);
  const stopNaming = nameControls(container);
  const typing = followTyping(api);
  const mark = markAreas(injector, () => api.getActiveWorkbook()?.getActiveSheet().refreshCanvas());

  const calculation = (): Promise<void> =>
    session.waitForLatestApplied(longestWait).catch(() => undefined) as Promise<void>;

  async function open(book: BookModel): Promise<void> {
    await api.getActiveWorkbook()?.abortEditingAsync(); // an editor left open would outlive its cell
    const before = sheets.workbook.getUnitId();
    isOpening = true;
    instances.disposeUnit(before);
    forgetMessages(before);
    sheets = show(book);
    isOpening = false;
    await calculation();
    reopened.next();
  }

  function selected(): GridArea | null {
    const range = selections.getCurrentLastSelection()?.range;
    const sheet = sheets.workbook.getActiveSheet();
    if (!range) return null;
    // a whole row or column has no numbers for its ends
    const from = (start: number): number => (Number.isFinite(start) ? start : 0);
    const to = (end: number, count: number): number => (Number.isFinite(end) ? end : count - 1);
    const [row, column] = [from(range.startRow), from(range.startColumn)];
    return {
      sheet: sheet.getName(),
      row,
      column,
      rows: to(range.endRow, sheet.getRowCount()) - row + 1,
      columns: to(range.endColumn, sheet.getColumnCount()) - column + 1,
    };
  }

  function active(): GridPlace | null {
    const primary = selections.getCurrentLastSelection()?.primary;
    const sheet = sheets.workbook.getActiveSheet();
    if (!primary) return null;
    return { sheet: sheet.getName(), row: primary.actualRow, column: primary.actualColumn };
  }

  function formula(): string | null {
    const place = active();
    const text = typing.text ?? (place && sheets.typed(place).formula) ?? '';
    return text.startsWith('=') ? text : null;
  }

  return {
    open,
    async settled() {
      await new Promise((resolve) => setTimeout(resolve, keysUnderWay));
      await api.getActiveWorkbook()?.endEditingAsync(true);
      await calculation();
    },
    book: () => bookOf(sheets, injector),
    calculated: () => calculatedOf(sheets),
    sheets: () => sheets.workbook.getSheets().map((sheet) => sheet.getName()),
    used: (sheet) => sheets.used(sheet),
    values({ sheet: name, row, column, rows, columns }) {
      const sheet = sheets.named(name);
      return Array.from({ length: rows }, (_, r) =>
        Array.from({ length: columns }, (__, c) => sheets.shown(sheet, row + r, column + c)),
      );
    },
    typed: (place) => sheets.typed(place),
    async set(cells) {
      await writeCells(sheets, injector, cells);
      await calculation();
    },
    active,
    formula,
    selected,
    select({ sheet: name, row, column, rows, columns }) {
      const book = api.getActiveWorkbook();
      const sheet = book?.getSheetByName(name);
      if (!book || !sheet) throw new Error(`there is no sheet named "${name}"`);
      book.setActiveSheet(sheet);
      sheet.getRange(row, column, rows, columns).activate();
      const seen = sheet.getVisibleRange();
      const isSeen =
        seen &&
        row >= seen.startRow &&
        row < seen.endRow &&
        column >= seen.startColumn &&
        column < seen.endColumn;
      // a cell at the very edge is half hidden
      if (!isSeen) sheet.scrollToCell(Math.max(0, row - 3), Math.max(0, column - 2));
    },
    mark,
    focus: () => injector.get(ILayoutService).focus(),
    setDark: (dark) => api.toggleDarkMode(dark),
    onSelection: (listener) =>
      stopOf(merge(selections.selectionChanged$, reopened).subscribe(() => isOpening || listener())),
    onTyping: (listener) => stopOf(typing.changes.subscribe(() => isOpening || listener())),
    onEdit: (listener) =>
      stopOf(
        commands.onCommandExecuted(({ id, params }, options) => {
          const isResult = options?.fromFormula || options?.onlyLocal;
          const unit = (params as { unitId?: string } | undefined)?.unitId;
          if (!isOpening && id.startsWith(edits) && !isResult && unit === sheets.workbook.getUnitId())
            listener();
        }),
      ),
    onCalculated: (listener) => stopOf(session.resultApplied$.subscribe(() => isOpening || listener())),
    dispose() {
      stopNaming();
      univer.dispose();
    },
  };
}

const stopOf =
  (listening: { unsubscribe(): void } | { dispose(): void }): Stop =>
  () =>
    'dispose' in listening ? listening.dispose() : listening.unsubscribe();
